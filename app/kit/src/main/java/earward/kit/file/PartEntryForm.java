package earward.kit.file;

import earward.block.device.AmplifierModel;
import earward.block.device.PartKind;
import earward.block.device.PartModel;
import earward.block.device.Pin;
import earward.kit.parts.PartEntry;
import java.util.ArrayList;
import java.util.List;

/** One entry of the parts library: a part's figures, and where they are from. */
final class PartEntryForm {
  private static final String MEMORY = "from memory";

  private PartEntryForm() {}

  static PartEntry read(PartKind kind, Json item, FileSource source) throws DesignFileException {
    MembersReader unnamed = MembersReader.of(item, source, "an entry of 'parts'");
    String name = unnamed.requiredText("name");
    MembersReader in = new MembersReader(unnamed.object(), source, kind.key() + " '" + name + "'");
    FittedPart part = PartForms.read(kind, in, name);
    PartModel model = part.model();
    String from = in.requiredText("source");
    List<String> notes = notes(in);
    part.fit().ifPresent(fit -> notes.add(fit.sentence()));
    String packageName = in.text("package").orElse("");
    List<Pin> pins =
        model instanceof AmplifierModel amplifier ? amplifier.pins() : PinsForm.read(in);
    requireAllKnown(in);
    try {
      return new PartEntry(
          model, from, from.contains(MEMORY), notes, part.fit(), packageName, pins);
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  /** In the parts library, unlike in a design, a member that is not known is a fault. */
  static void requireAllKnown(MembersReader in) throws DesignFileException {
    if (!in.unasked().isEmpty()) {
      Json.Member unknown = in.unasked().get(0);
      throw in.fault(
          "unknown-member", unknown.value(), unknown.name(), "is not known; check its spelling");
    }
  }

  private static List<String> notes(MembersReader in) throws DesignFileException {
    List<String> notes = new ArrayList<>();
    for (Json item : in.items("notes")) {
      if (!(item instanceof Json.Scalar note) || !note.quoted()) {
        throw in.fault("wrong-form", item, "notes", "has an entry that is no text");
      }
      notes.add(note.words());
    }
    return notes;
  }
}
