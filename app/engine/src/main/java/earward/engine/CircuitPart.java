package earward.engine;

import earward.block.device.Device;
import earward.block.device.Terminal;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;

/**
 * One part on the nodes of the whole circuit.
 *
 * @param name unique, with its block: {@code detector.diode}
 * @param device what it is; its parameters become slots
 * @param nodes node of each terminal; a terminal that is missing here is left unconnected
 */
public record CircuitPart(String name, Device device, Map<Terminal, String> nodes) {
  public CircuitPart {
    Objects.requireNonNull(device);
    if (name.isBlank()) {
      throw new IllegalArgumentException("a part of the circuit has no name");
    }
    EnumMap<Terminal, String> copy = new EnumMap<>(Terminal.class);
    copy.putAll(nodes);
    for (Terminal terminal : copy.keySet()) {
      if (!device.terminals().contains(terminal)) {
        throw new IllegalArgumentException("part '" + name + "' has no terminal " + terminal);
      }
    }
    nodes = Collections.unmodifiableMap(copy);
  }
}
