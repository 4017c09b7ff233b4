package earward.kit.path;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.block.Conditions;
import earward.block.check.Finding;
import earward.block.device.AudioAmplifier;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.PartModel;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.block.wiring.WiredPart;
import earward.block.wiring.Wiring;
import earward.kit.design.BlockEntry;
import earward.kit.design.SettingEntry;
import earward.kit.parts.PartsLibrary;
import earward.kit.parts.SettingException;
import earward.kit.parts.SettingReader;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Reads one entry's settings, has its type describe it and names its nodes in the whole kit. */
final class BlockPlacer {
  private static final Set<String> RESERVED =
      Set.of("path", "seam", "signal", "ambient", "added", Nodes.GROUND);

  private final BlockTypes types;
  private final SettingReader settings;
  private final Conditions conditions;
  private final List<Finding> findings;

  BlockPlacer(
      BlockTypes types, PartsLibrary library, Conditions conditions, List<Finding> findings) {
    this.types = types;
    this.settings = new SettingReader(library);
    this.conditions = conditions;
    this.findings = findings;
  }

  /** The block in its place, or empty with a finding that says why not. */
  Optional<PlacedBlock> place(BlockEntry entry) {
    if (RESERVED.contains(entry.id()) || Nodes.isRail(entry.id())) {
      findings.add(PathFindings.reservedId(entry));
      return Optional.empty();
    }
    Optional<BlockType> type = types.find(entry.typeId());
    if (type.isEmpty()) {
      List<String> known = types.all().stream().map(BlockType::id).toList();
      findings.add(PathFindings.unknownBlock(entry, known));
      return Optional.empty();
    }
    Optional<PlacedBlock> placed =
        values(entry, type.get()).flatMap(values -> described(entry, type.get(), values));
    placed.ifPresent(this::remark);
    return placed;
  }

  /** Says of parts that stand in the block how their figures were fitted. */
  private void remark(PlacedBlock block) {
    for (Setting setting : block.type().settings()) {
      if (setting instanceof Setting.Part part && stands(block, part)) {
        Optional<SettingEntry> said = Optional.ofNullable(block.entry().settings().get(part.id()));
        settings
            .remarks(part, said)
            .forEach(sentence -> findings.add(PathFindings.fitted(block, part.id(), sentence)));
      }
    }
  }

  /** Whether the block fits a part of these figures: a choice may leave it without use. */
  private static boolean stands(PlacedBlock block, Setting.Part part) {
    PartModel model = block.values().part(part.id(), PartModel.class);
    return block.description().wiring().parts().stream()
        .map(WiredPart::device)
        .anyMatch(device -> isFitted(device, model));
  }

  private static boolean isFitted(Device device, PartModel model) {
    if (device instanceof Diode diode) {
      return diode.model().equals(model);
    }
    return device instanceof AudioAmplifier amplifier && amplifier.model().equals(model);
  }

  private Optional<Values> values(BlockEntry entry, BlockType type) {
    Map<String, SettingValue> byId = new HashMap<>();
    boolean sound = true;
    List<String> known = type.settings().stream().map(Setting::id).toList();
    for (Setting setting : type.settings()) {
      Optional<SettingEntry> said = Optional.ofNullable(entry.settings().get(setting.id()));
      try {
        byId.put(setting.id(), settings.read(entry.id(), setting, said));
      } catch (SettingException e) {
        sound = false;
        findings.add(PathFindings.setting(entry, setting.id(), e.code(), e.sentence()));
      }
    }
    for (String named : entry.settings().keySet()) {
      if (!known.contains(named)) {
        findings.add(PathFindings.unknownSetting(entry, named, known));
      }
    }
    return sound ? Optional.of(Values.of(byId)) : Optional.empty();
  }

  @SuppressWarnings("CatchingUnchecked") // whatever a plug-in throws is a failure of that plug-in
  private Optional<PlacedBlock> described(BlockEntry entry, BlockType type, Values values) {
    try {
      BlockDescription description = type.describe(values, conditions);
      return Optional.of(
          new PlacedBlock(entry, type, values, description, nodes(entry, description.wiring())));
    } catch (IllegalArgumentException e) {
      findings.add(PathFindings.refusedSettings(entry, String.valueOf(e.getMessage())));
    } catch (RuntimeException | LinkageError | StackOverflowError e) {
      findings.add(PathFindings.plugInFailed(entry, e));
    }
    return Optional.empty();
  }

  private static Map<String, String> nodes(BlockEntry entry, Wiring wiring) {
    Set<String> locals = new LinkedHashSet<>();
    wiring.entry().map(Port::nodes).ifPresent(locals::addAll);
    wiring.parts().forEach(part -> locals.addAll(part.nodes().values()));
    wiring.exit().map(Port::nodes).ifPresent(locals::addAll);
    locals.addAll(wiring.offeredRails().values());
    Map<String, String> offered = new HashMap<>();
    wiring.offeredRails().forEach((rail, node) -> offered.put(node, kitRail(entry, rail)));
    Map<String, String> global = new LinkedHashMap<>();
    for (String local : locals) {
      global.put(local, offered.getOrDefault(local, global(entry, local)));
    }
    return global;
  }

  private static String global(BlockEntry entry, String local) {
    if (Nodes.isRail(local)) {
      return kitRail(entry, local.substring(Nodes.rail("").length()));
    }
    return Nodes.isShared(local) ? local : entry.id() + "." + local;
  }

  private static String kitRail(BlockEntry entry, String ownName) {
    return Nodes.rail(entry.rails().getOrDefault(ownName, ownName));
  }
}
