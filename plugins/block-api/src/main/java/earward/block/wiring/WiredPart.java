package earward.block.wiring;

import earward.block.device.Device;
import earward.block.device.Terminal;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;

/**
 * One part of a block, in its place: network, drawing, parts list, fitting order and faults all
 * derive from this.
 *
 * @param id local to the block: letters, digits and hyphens
 * @param device what it is
 * @param placement where it stands
 * @param entering the terminal at the side from which the signal comes (RUN), at the signal (DOWN,
 *     UP), at the upper end (COLUMN), at the left (BRIDGE), or the main input (BODY)
 * @param nodes the node at each terminal that is connected, in the order of the device's terminals
 */
public record WiredPart(
    String id, Device device, Placement placement, Terminal entering, Map<Terminal, String> nodes) {
  public WiredPart {
    Objects.requireNonNull(device);
    Objects.requireNonNull(placement);
    Names.require(id, "part");
    EnumMap<Terminal, String> copy = new EnumMap<>(Terminal.class);
    nodes.forEach(
        (terminal, node) -> {
          Names.require(node, "node at " + terminal + " of part '" + id + "'");
          if (!device.terminals().contains(terminal)) {
            throw new IllegalArgumentException(
                "part '" + id + "' has no terminal " + terminal + "; it has " + device.terminals());
          }
          copy.put(terminal, node);
        });
    nodes = Collections.unmodifiableMap(copy);
    if (!nodes.containsKey(entering)) {
      throw new IllegalArgumentException(
          "part '" + id + "' is entered at " + entering + ", which is not connected");
    }
  }

  /**
   * The node at a terminal.
   *
   * @throws IllegalArgumentException when the terminal is not connected
   */
  public String node(Terminal terminal) {
    String node = nodes.get(terminal);
    if (node == null) {
      throw new IllegalArgumentException("part '" + id + "': " + terminal + " is not connected");
    }
    return node;
  }
}
