package earward.drawing;

import earward.block.device.Terminal;

/** The names of ends in a netlist. */
final class EndNames {
  private EndNames() {}

  static String of(String blockId, String partId, Terminal terminal) {
    return blockId + "." + partId + ":" + terminal;
  }

  static String ofTestPoint(String blockId, String testPointId) {
    return blockId + "#" + testPointId;
  }
}
