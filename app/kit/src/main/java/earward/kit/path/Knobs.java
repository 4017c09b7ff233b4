package earward.kit.path;

import earward.block.setting.Setting;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The knobs of a kit: the slots of its position settings. */
final class Knobs {
  /** Positions of a scan over the whole turn, both ends included. */
  private static final int SCANNED = 9;

  private final List<String> slots = new ArrayList<>();

  Knobs(Assembly assembly) {
    for (PlacedBlock block : assembly.blocks()) {
      for (Setting setting : block.type().settings()) {
        if (setting instanceof Setting.Position position
            && block.description().wiring().part(position.partId()).isPresent()) {
          slots.add(block.partName(position.partId()) + ":position");
        }
      }
    }
  }

  /** Slot of each. */
  List<String> slots() {
    return List.copyOf(slots);
  }

  /** Every knob at its upper stop. */
  Map<String, Double> allFull() {
    Map<String, Double> full = new LinkedHashMap<>();
    slots.forEach(slot -> full.put(slot, 1.0));
    return full;
  }

  /** Every knob in turn over its whole way, the others where they usually stand. */
  List<Map<String, Double>> scan() {
    List<Map<String, Double>> scan = new ArrayList<>();
    for (String slot : slots) {
      for (int i = 0; i < SCANNED; i++) {
        scan.add(Map.of(slot, i / (SCANNED - 1.0)));
      }
    }
    return scan;
  }
}
