package earward.drawing.internal.place;

import earward.block.device.BipolarTransistor;
import earward.block.device.Device;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Potentiometer;
import earward.block.device.Terminal;
import earward.block.wiring.Placement;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * A part to be drawn, on nets of the whole circuit.
 *
 * @param key {@code block.part}
 * @param device what it is
 * @param placement where it stands
 * @param entering as in the wiring
 * @param nets the net at each connected terminal
 * @param label reference and value, empty lines left out
 */
public record Part(
    String key,
    Device device,
    Placement placement,
    Terminal entering,
    Map<Terminal, String> nets,
    List<String> label) {
  public Part {
    EnumMap<Terminal, String> copy = new EnumMap<>(Terminal.class);
    copy.putAll(nets);
    nets = Collections.unmodifiableMap(copy);
    label = List.copyOf(label);
  }

  boolean twoEnded() {
    return device.terminals().size() == 2;
  }

  /** The net at a terminal; one of its own where it is not connected. */
  String net(Terminal terminal) {
    return nets.getOrDefault(terminal, "open " + key + ":" + terminal);
  }

  String from() {
    return net(entering);
  }

  /** The other end of a two-ended part. */
  Terminal leaving() {
    List<Terminal> both = device.terminals();
    return both.get(0) == entering ? both.get(1) : both.get(0);
  }

  String to() {
    return net(leaving());
  }

  /** In a column: the terminal at the lower end. */
  Terminal lower() {
    if (device instanceof BipolarTransistor) {
      return entering == Terminal.EMITTER ? Terminal.COLLECTOR : Terminal.EMITTER;
    } else if (device instanceof FieldEffectTransistor) {
      return entering == Terminal.SOURCE ? Terminal.DRAIN : Terminal.SOURCE;
    } else if (device instanceof Potentiometer) {
      return entering == Terminal.BOTTOM ? Terminal.TOP : Terminal.BOTTOM;
    }
    return leaving();
  }

  /** Whether it can be a link of a column. */
  boolean stacks() {
    return twoEnded()
        || device instanceof BipolarTransistor
        || device instanceof FieldEffectTransistor
        || device instanceof Potentiometer;
  }

  boolean touches(String net) {
    return nets.containsValue(net);
  }
}
