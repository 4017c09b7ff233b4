package earward.desktop.model;

import earward.block.BlockType;
import earward.block.check.Finding;
import earward.block.setting.Setting;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.design.SettingEntry;
import earward.kit.parts.SettingException;
import earward.kit.parts.SettingReader;
import earward.kit.path.Assembler;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.BiFunction;

/** Tries whether blocks can stand where they are put. */
final class Standings {
  /** What is wrong with an order or with ports that do not fit. */
  private static final Set<String> OF_ORDER = Set.of("path-order", "port-mismatch", "port-missing");

  private final Workshop workshop;

  Standings(Workshop workshop) {
    this.workshop = workshop;
  }

  private List<Finding> faults(KitDesign design) {
    return Assembler.assemble(design, workshop.types(), workshop.parts()).findings().stream()
        .filter(finding -> OF_ORDER.contains(finding.code()))
        .toList();
  }

  /** Whether a design has no more faults of order than the one before. */
  boolean noWorse(KitDesign before, KitDesign after) {
    return faults(after).size() <= faults(before).size();
  }

  /**
   * The design with a block put into it, where it can stand: as it is, or with one of its choices
   * made so that its ports fit.
   */
  Optional<KitDesign> fitted(
      KitDesign design, BlockEntry entry, BiFunction<KitDesign, BlockEntry, KitDesign> put) {
    int before = faults(design).size();
    KitDesign plain = put.apply(design, entry);
    List<Finding> wrong = faults(plain);
    if (wrong.size() <= before) {
      return Optional.of(plain);
    }
    if (wrong.stream().anyMatch(finding -> finding.code().equals("path-order"))) {
      return Optional.empty();
    }
    for (Setting setting : workshop.settings(entry)) {
      if (setting instanceof Setting.Choice choice) {
        for (String option : choice.options()) {
          KitDesign chosen = put.apply(design, entry.with(setting.id(), option));
          if (faults(chosen).size() <= before) {
            return Optional.of(chosen);
          }
        }
      }
    }
    return Optional.empty();
  }

  /** A block of another type under the same id, with those settings of the old that suit it. */
  BlockEntry keeping(BlockEntry old, BlockType type) {
    BlockEntry entry =
        new BlockEntry(old.id(), type.id(), Map.of(), old.rails(), old.joinsAt(), old.written());
    SettingReader reader = new SettingReader(workshop.parts());
    for (Setting setting : type.settings()) {
      SettingEntry kept = old.settings().get(setting.id());
      if (kept != null && suits(reader, old.id(), setting, kept)) {
        entry = entry.with(setting.id(), kept);
      }
    }
    return entry;
  }

  private static boolean suits(
      SettingReader reader, String blockId, Setting setting, SettingEntry entry) {
    try {
      var unused = reader.read(blockId, setting, Optional.of(entry));
      return true;
    } catch (SettingException | IllegalArgumentException e) {
      return false;
    }
  }
}
