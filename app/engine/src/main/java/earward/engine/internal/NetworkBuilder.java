package earward.engine.internal;

import earward.block.device.AudioAmplifier;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Pin;
import earward.block.device.Potentiometer;
import earward.block.device.Terminal;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.Probe;
import earward.engine.Seam;
import earward.engine.law.CapacitorLaw;
import earward.engine.law.CarrierDriven;
import earward.engine.law.FeedLaw;
import earward.engine.law.Law;
import earward.engine.law.Laws;
import earward.engine.law.Seat;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Numbers nodes and branches and gives every part its law; used once. */
final class NetworkBuilder implements Laws.Surroundings {
  private final Circuit circuit;
  private final Slots slots;
  private final List<String> drivenParts;
  private final Map<String, Integer> nodeOf = new LinkedHashMap<>();
  private final Map<String, CapacitorLaw> capacitors = new HashMap<>();
  private final List<Law> laws = new ArrayList<>();
  private final List<Port> ports = new ArrayList<>();
  private @Nullable FeedLaw feed;
  private int size;
  private int diodes;
  private int amplifiers;

  /**
   * A builder.
   *
   * @param drivenParts the carrier-driven parts
   */
  NetworkBuilder(Circuit circuit, Slots slots, List<String> drivenParts) {
    this.circuit = circuit;
    this.slots = slots;
    this.drivenParts = drivenParts;
  }

  Network build() {
    for (CircuitPart part : circuit.parts()) {
      for (Terminal terminal : part.device().terminals()) {
        number(nodeName(part, terminal));
      }
    }
    for (Probe probe : circuit.probes()) {
      number(probe.plus());
      number(probe.minus());
    }
    for (Seam seam : circuit.seams()) {
      number(seam.before());
      number(seam.after());
    }
    size = nodeOf.size();
    // capacitors first: amplifiers ask for those at their pins
    Map<String, Law> made = new HashMap<>();
    for (boolean first : new boolean[] {true, false}) {
      for (CircuitPart part : circuit.parts()) {
        if (part.device() instanceof Capacitor == first) {
          made.put(part.name(), make(part));
        }
      }
    }
    circuit.parts().forEach(part -> register(part.name(), made.get(part.name())));
    size += circuit.seams().size();
    return new Network(this);
  }

  private Law make(CircuitPart part) {
    Law law = Laws.of(part.device(), seat(part), this);
    if (law instanceof CapacitorLaw capacitor) {
      capacitors.put(part.name(), capacitor);
    }
    return law;
  }

  private void register(String name, @Nullable Law law) {
    if (law == null) {
      throw new IllegalStateException("part '" + name + "' got no law");
    }
    laws.add(law);
    if (law instanceof CarrierDriven part && part.driven() >= 0) {
      for (int k = 0; k < part.ports(); k++) {
        ports.add(new Port(name, part, k));
      }
      ports.sort(Comparator.comparingInt(port -> port.law().driven() + port.which()));
    }
    if (law instanceof FeedLaw only) {
      feed = only;
    }
  }

  private void number(String node) {
    if (!node.equals(Circuit.GROUND)) {
      nodeOf.putIfAbsent(node, nodeOf.size());
    }
  }

  /** A terminal that is joined to nothing has a node of its own. */
  private static String nodeName(CircuitPart part, Terminal terminal) {
    String node = part.nodes().get(terminal);
    return node != null ? node : part.name() + "/" + terminal;
  }

  private Seat seat(CircuitPart part) {
    Device device = part.device();
    List<Terminal> terminals = device.terminals();
    int[] nodes = new int[terminals.size()];
    int[] reversed = new int[nodes.length];
    for (int i = 0; i < nodes.length; i++) {
      nodes[i] = index(nodeName(part, terminals.get(i)));
      reversed[i] = index(nodeName(part, opposite(device, terminals.get(i))));
    }
    int firstBranch = size;
    size += Laws.branches(device);
    int openSlot = slots.of(part.name() + ":open");
    int firstSlot = openSlot - device.parameters().size();
    return new Seat(part.name(), nodes, reversed, firstSlot, openSlot, firstBranch);
  }

  private int index(String node) {
    return node.equals(Circuit.GROUND) ? -1 : nodeOf.getOrDefault(node, -1);
  }

  /**
   * Whose place a terminal takes when the part is fitted the wrong way round: the other end of
   * parts with up to five ends, the pin across the body of an IC turned by half a turn.
   */
  private static Terminal opposite(Device device, Terminal terminal) {
    List<Terminal> terminals = device.terminals();
    if (device instanceof Potentiometer) {
      return exchanged(terminal);
    }
    if (!(device instanceof AudioAmplifier)) {
      return terminals.get(terminals.size() - 1 - terminals.indexOf(terminal));
    }
    List<Pin> pins = device.pins();
    int most = pins.stream().mapToInt(Pin::number).max().orElse(1);
    int places = most + most % 2;
    int own =
        pins.stream().filter(p -> p.terminal() == terminal).findFirst().orElseThrow().number();
    int across = (own - 1 + places / 2) % places + 1;
    Optional<Pin> there = pins.stream().filter(p -> p.number() == across).findFirst();
    return there.map(Pin::terminal).orElse(terminal);
  }

  /** The outer ends of a track change places; wiper and tap stay. */
  private static Terminal exchanged(Terminal terminal) {
    if (terminal == Terminal.TOP) {
      return Terminal.BOTTOM;
    }
    return terminal == Terminal.BOTTOM ? Terminal.TOP : terminal;
  }

  @Override
  public int nextDiode() {
    return diodes++;
  }

  @Override
  public int driven(String part) {
    int place = 0;
    for (String each : drivenParts) {
      if (each.equals(part)) {
        return place;
      }
      place += portsOf(each);
    }
    return -1;
  }

  private int portsOf(String part) {
    return circuit.parts().stream()
            .anyMatch(each -> each.name().equals(part) && each.device() instanceof Diode)
        ? 1
        : 2;
  }

  @Override
  public int nextAmplifier() {
    return amplifiers++;
  }

  @Override
  public List<CapacitorLaw> compensation(String part) {
    return between(part, Terminal.COMPENSATION);
  }

  @Override
  public List<CapacitorLaw> bootstrap(String part) {
    return between(part, Terminal.BOOTSTRAP);
  }

  private List<CapacitorLaw> between(String amplifier, Terminal pin) {
    CircuitPart owner =
        circuit.parts().stream().filter(p -> p.name().equals(amplifier)).findFirst().orElseThrow();
    if (!owner.device().terminals().contains(pin)) {
      return List.of();
    }
    String one = nodeName(owner, pin);
    String other = nodeName(owner, Terminal.OUTPUT);
    return circuit.parts().stream()
        .filter(p -> p.device() instanceof Capacitor)
        .filter(p -> p.nodes().containsValue(one) && p.nodes().containsValue(other))
        .map(p -> capacitors.get(p.name()))
        .toList();
  }

  Circuit circuit() {
    return circuit;
  }

  Slots slots() {
    return slots;
  }

  Map<String, Integer> nodeOf() {
    return nodeOf;
  }

  int size() {
    return size;
  }

  List<Law> laws() {
    return laws;
  }

  List<Port> ports() {
    return ports;
  }

  int diodes() {
    return diodes;
  }

  @Nullable FeedLaw feed() {
    return feed;
  }

  /** Names of all parts of a circuit that a carrier may drive. */
  static List<String> drivable(Circuit circuit) {
    return circuit.parts().stream()
        .filter(
            part ->
                part.device() instanceof Diode
                    || part.device() instanceof BipolarTransistor
                    || part.device() instanceof FieldEffectTransistor)
        .map(CircuitPart::name)
        .toList();
  }
}
