package earward.engine.internal;

import earward.block.device.Device;
import earward.block.device.Loudspeaker;
import earward.block.device.Resistor;
import earward.engine.Circuit;
import earward.engine.Probe;
import earward.engine.Seam;
import earward.engine.Slot;
import earward.engine.law.AmplifierLaw;
import earward.engine.law.FeedLaw;
import earward.engine.law.Law;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/**
 * The structure of a circuit: nodes, laws, ports, slots. Immutable once built; shared. Arrays
 * rather than lists, since a solve that walks them must make no garbage; they are not to be
 * written.
 */
public final class Network {
  /** The probe at the path's end. */
  private static final String PATH = "path";

  final Circuit circuit;
  final Slots slots;
  final int nodes;
  final int size;
  final Law[] laws;

  /** Those whose part of the alternating equations is the same at all frequencies, and others. */
  final Law[] steadyLaws;

  final Law[] swingingLaws;
  final Map<String, Law> lawOf = new HashMap<>();
  final Port[] ports;
  final AmplifierLaw[] amplifiers;
  final int diodes;
  final @Nullable FeedLaw feed;
  final int[] probePlus;
  final int[] probeMinus;
  final int[] probeMeter;
  final int[] seamBefore;
  final int[] seamAfter;
  final int firstSeamBranch;

  /** Nodes of the path's end, both ground where there is none, and what loads it there. */
  final int endPlus;

  final int endMinus;
  final int[] loads;
  final int carrierHertz;
  final int carrierPeak;
  final int depth;
  final int tone;
  final int lowestTone;
  final int highestTone;
  final int ambient;
  final int loadTolerance;
  private final Map<String, Integer> nodeOf;
  private final String[] names;

  Network(NetworkBuilder from) {
    circuit = from.circuit();
    slots = from.slots();
    nodeOf = Map.copyOf(from.nodeOf());
    nodes = nodeOf.size();
    size = from.size();
    laws = from.laws().toArray(Law[]::new);
    steadyLaws = from.laws().stream().filter(Law::steady).toArray(Law[]::new);
    swingingLaws = from.laws().stream().filter(law -> !law.steady()).toArray(Law[]::new);
    from.laws().forEach(law -> lawOf.put(law.seat().name(), law));
    ports = from.ports().toArray(Port[]::new);
    diodes = from.diodes();
    feed = from.feed();
    amplifiers =
        from.laws().stream()
            .filter(AmplifierLaw.class::isInstance)
            .map(AmplifierLaw.class::cast)
            .toArray(AmplifierLaw[]::new);
    firstSeamBranch = size - circuit.seams().size();
    names = new String[size];
    nodeOf.forEach((name, node) -> names[node] = name);
    probePlus = new int[circuit.probes().size()];
    probeMinus = new int[circuit.probes().size()];
    probeMeter = new int[circuit.probes().size()];
    for (int i = 0; i < probePlus.length; i++) {
      Probe probe = circuit.probes().get(i);
      probePlus[i] = node(probe.plus());
      probeMinus[i] = node(probe.minus());
      probeMeter[i] = slots.of(probe.name() + ":meter-siemens");
    }
    int end = endProbe();
    endPlus = end < 0 ? -1 : probePlus[end];
    endMinus = end < 0 ? -1 : probeMinus[end];
    loads = loadsAt(endPlus, endMinus);
    seamBefore = circuit.seams().stream().map(Seam::before).mapToInt(this::node).toArray();
    seamAfter = circuit.seams().stream().map(Seam::after).mapToInt(this::node).toArray();
    carrierHertz = slots.of(Slot.CARRIER_HERTZ);
    carrierPeak = slots.of(Slot.CARRIER_PEAK_VOLTS);
    depth = slots.of(Slot.DEPTH);
    tone = slots.of(Slot.TONE_HERTZ);
    lowestTone = slots.of(Slot.LOWEST_TONE_HERTZ);
    highestTone = slots.of(Slot.HIGHEST_TONE_HERTZ);
    ambient = slots.of(Slot.AMBIENT_CELSIUS);
    loadTolerance = slots.of(Slot.LOAD_TOLERANCE);
  }

  private int endProbe() {
    for (int i = 0; i < probePlus.length; i++) {
      if (circuit.probes().get(i).name().equals(PATH)) {
        return i;
      }
    }
    return -1;
  }

  /** Loudspeakers between two nodes or, where there is none, resistors. */
  private int[] loadsAt(int plus, int minus) {
    for (Class<? extends Device> kind : List.of(Loudspeaker.class, Resistor.class)) {
      int[] found =
          IntStream.range(0, laws.length)
              .filter(i -> kind.isInstance(circuit.parts().get(i).device()))
              .filter(i -> laws[i].node(0) == plus && laws[i].node(1) == minus)
              .toArray();
      if (found.length > 0 && plus != minus) {
        return found;
      }
    }
    return new int[0];
  }

  /** Its values. */
  public Slots slots() {
    return slots;
  }

  /** Index of a node, −1 for ground. */
  int node(String name) {
    if (name.equals(Circuit.GROUND)) {
      return -1;
    }
    Integer node = nodeOf.get(name);
    if (node == null) {
      throw new IllegalArgumentException("there is no node '" + name + "'");
    }
    return node;
  }

  boolean hasNode(String name) {
    return name.equals(Circuit.GROUND) || nodeOf.containsKey(name);
  }

  /**
   * The two nodes of a probe, or a node and ground.
   *
   * @throws IllegalArgumentException when there is no such place
   */
  int[] place(String place) {
    for (int i = 0; i < probePlus.length; i++) {
      if (circuit.probes().get(i).name().equals(place)) {
        return new int[] {probePlus[i], probeMinus[i]};
      }
    }
    return new int[] {node(place), -1};
  }

  /** The carrier-driven parts, for messages. */
  String drivenNames() {
    return Arrays.stream(ports)
        .map(port -> "'" + port.part() + "'")
        .distinct()
        .collect(Collectors.joining(", "));
  }

  /** Which part or node an unknown belongs to, for messages. */
  String nameOf(int unknown) {
    if (unknown < nodes) {
      return "node '" + names[unknown] + "'";
    }
    for (Law law : laws) {
      int first = law.seat().firstBranch();
      if (unknown >= first && unknown < first + law.branches()) {
        return "part '" + law.seat().name() + "'";
      }
    }
    return "seam '" + circuit.seams().get(unknown - firstSeamBranch).name() + "'";
  }
}
