package earward.kit.file;

import earward.block.device.PartKind;
import earward.kit.design.AsWritten;
import earward.kit.design.BlockEntry;
import earward.kit.design.SettingEntry;
import earward.kit.parts.FitReport;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** One block of a design, as a JSON object. */
final class BlockForm {
  private static final String SETTINGS = "settings";
  private static final String RAILS = "rails";
  private static final String JOINS_AT = "joins at";
  private static final String LOCKED = "locked";

  private BlockForm() {}

  static List<BlockEntry> readAll(MembersReader design, String list, GivenNames names)
      throws DesignFileException {
    List<BlockEntry> blocks = new ArrayList<>();
    for (Json item : design.ownItems(list)) {
      MembersReader block = MembersReader.of(item, design.source(), "a block of '" + list + "'");
      names.take(block);
      blocks.add(read(block));
    }
    return blocks;
  }

  private static BlockEntry read(MembersReader unnamed) throws DesignFileException {
    String id = unnamed.requiredText("id");
    MembersReader in = new MembersReader(unnamed.object(), unnamed.source(), "block '" + id + "'");
    Map<String, SettingEntry> settings = new LinkedHashMap<>();
    Optional<MembersReader> inner = in.openOwn(SETTINGS);
    if (inner.isPresent()) {
      for (Json.Member member : inner.get().object().members()) {
        in.source().stands(id + "." + member.name(), member.value().at());
        settings.put(member.name(), setting(in, member));
      }
    }
    Map<String, String> rails = new LinkedHashMap<>();
    Optional<MembersReader> railMembers = in.openOwn(RAILS);
    if (railMembers.isPresent()) {
      railMembers.get().allScalars().forEach((own, kit) -> rails.put(own, kit.words()));
    }
    in.find("id");
    in.source().stands(id, in.object().at());
    Set<String> locked = locked(in);
    try {
      return new BlockEntry(
          id, in.requiredText("type"), settings, rails, in.text(JOINS_AT), locked, in.written());
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  private static Set<String> locked(MembersReader in) throws DesignFileException {
    Set<String> locked = new LinkedHashSet<>();
    for (Json item : in.ownItems(LOCKED)) {
      if (item instanceof Json.Scalar scalar && scalar.quoted()) {
        locked.add(scalar.words());
      } else {
        throw in.fault("wrong-form", item, LOCKED, "names a setting that is no text");
      }
    }
    return locked;
  }

  /** What an entry of the parts library says beside the part's figures. */
  private static final List<String> LIBRARY_WORDS =
      List.of("source", "notes", "package", "points", "output powers");

  private static SettingEntry setting(MembersReader block, Json.Member member)
      throws DesignFileException {
    if (member.value() instanceof Json.Scalar scalar && !scalar.isNull()) {
      return new SettingEntry.Words(scalar.words(), !scalar.quoted());
    }
    String json = JsonWriting.line(member.value());
    if (member.value() instanceof Json.Members object) {
      String what = "'" + member.name() + "' of " + block.what();
      MembersReader part = new MembersReader(object, block.source(), what);
      Optional<PartKind> kind = kind(part, member.name());
      if (kind.isPresent()) {
        FittedPart read = PartForms.read(kind.get(), part, member.name() + " as given");
        LIBRARY_WORDS.forEach(
            part::find); // of an entry copied from the library: kept, not asked for
        part.noteUnknown();
        return new SettingEntry.Inline(
            read.model(), json, read.fit().map(FitReport::sentence).stream().toList());
      }
    }
    return new SettingEntry.Unread(json);
  }

  private static Optional<PartKind> kind(MembersReader part, String settingId)
      throws DesignFileException {
    String key = part.text("kind").orElse(settingId);
    return Arrays.stream(PartKind.values()).filter(kind -> kind.key().equals(key)).findFirst();
  }

  static Json.Items writeAll(List<BlockEntry> blocks) {
    return Json.array(blocks.stream().map(BlockForm::write).toList());
  }

  private static Json.Members write(BlockEntry block) {
    MembersWriter out = new MembersWriter(block.written());
    out.text("id", block.id()).text("type", block.typeId());
    if (block.joinsAt().isPresent()) {
      out.text(JOINS_AT, block.joinsAt().get());
    } else {
      out.skip(JOINS_AT);
    }
    MembersWriter rails = new MembersWriter(AsWritten.NEW);
    block.rails().forEach(rails::text);
    List<Json.Member> settings = new ArrayList<>();
    block.settings().forEach((id, entry) -> settings.add(new Json.Member(id, json(entry))));
    Json.Items locked = Json.array(block.locked().stream().map(Json.Scalar::text).toList());
    return out.nested(RAILS, rails.done())
        .nested(SETTINGS, Json.object(settings))
        .nested(LOCKED, locked)
        .done();
  }

  private static Json json(SettingEntry entry) {
    if (entry instanceof SettingEntry.Words words) {
      return words.bare() ? Json.Scalar.bare(words.words()) : Json.Scalar.text(words.words());
    }
    if (entry instanceof SettingEntry.Inline inline) {
      return JsonReading.kept(inline.json());
    }
    return JsonReading.kept(((SettingEntry.Unread) entry).json());
  }
}
