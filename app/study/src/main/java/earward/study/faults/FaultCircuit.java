package earward.study.faults;

import earward.block.Conditions;
import earward.block.Role;
import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.CarrierGenerator;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.Pin;
import earward.block.device.Potentiometer;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.device.TunedFeed;
import earward.block.figure.CaseName;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.Drive;
import earward.engine.Slot;
import earward.engine.SolveCase;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * A kit's circuit with what faults and a builder's tests need beside it: a link in the leads that
 * may come loose, a bridge between neighbouring pins, a cell for DC injection, an ohmmeter for each
 * test point. Which of them counts is a matter of values. Immutable.
 */
final class FaultCircuit {
  /** A cell of 1.5 V through 1 kΩ at the diode, the feed lifted. */
  static final CaseName INJECTION = new CaseName("dc-injection");

  static final double INJECTED_VOLTS = 1.5;
  private static final double INJECTION_OHMS = 1000;

  /** Voltage of an ohmmeter, and the resistance behind it (common practice of cheap meters). */
  static final double OHMMETER_VOLTS = 0.5;

  static final double OHMMETER_OHMS = 10e3;

  private static final double LINK_OHMS = 1e-3;
  private static final double NO_BRIDGE_OHMS = 1e12;
  private static final String CELL = "fault.cell";
  private static final String OHMMETER = "fault.ohmmeter";
  private static final String INJECTOR = "fault.injector";

  /** Pins of an IC whose lead is looked at: those beside which no capacitor is sought by name. */
  private static final Set<Terminal> LINKED_PINS =
      EnumSet.of(Terminal.INPUT, Terminal.SUPPLY, Terminal.GROUND, Terminal.CONTROL);

  private final Assembly assembly;
  private final List<CircuitPart> parts = new ArrayList<>();
  private final List<CircuitPart> extras = new ArrayList<>();
  private final Map<String, String> links = new LinkedHashMap<>();
  private final Map<String, List<String>> bridges = new LinkedHashMap<>();
  private final Map<String, String> ohmmeters = new LinkedHashMap<>();
  private boolean injects;

  FaultCircuit(Assembly assembly) {
    this.assembly = assembly;
    for (CircuitPart part : assembly.circuit().parts()) {
      parts.add(linked(part));
      bridged(part);
    }
    cell(CELL, INJECTED_VOLTS);
    cell(OHMMETER, OHMMETER_VOLTS);
    injectionNode().ifPresent(this::injector);
    for (PlacedTestPoint point : assembly.testPoints()) {
      if (!point.node().equals(Circuit.GROUND)) {
        String name = OHMMETER + "-" + point.reference();
        resistor(name, OHMMETER_OHMS, OHMMETER, point.node());
        ohmmeters.put(point.place(), name);
      }
    }
  }

  Circuit circuit() {
    List<CircuitPart> all = new ArrayList<>(parts);
    all.addAll(extras);
    Circuit from = assembly.circuit();
    return new Circuit(all, from.seams(), from.probes(), from.frontEnd(), from.curve());
  }

  /** Slot of the link in each lead that may come loose, by {@code part/TERMINAL}. */
  Map<String, String> links() {
    return links;
  }

  /** Slots of the bridges between neighbouring pins of a part, by its name. */
  Map<String, List<String>> bridges() {
    return bridges;
  }

  boolean injects() {
    return injects;
  }

  /** Test points at which resistance may be measured. */
  Set<String> ohmPlaces() {
    return ohmmeters.keySet();
  }

  static CaseName ohms(PlacedTestPoint point) {
    return new CaseName("ohms-" + point.reference().toLowerCase(java.util.Locale.ROOT));
  }

  private CircuitPart linked(CircuitPart part) {
    Set<Terminal> looked =
        part.device() instanceof Potentiometer
            ? EnumSet.of(Terminal.TOP, Terminal.WIPER, Terminal.BOTTOM)
            : part.device() instanceof AudioAmplifier ? LINKED_PINS : Set.of();
    Map<Terminal, String> nodes = new EnumMap<>(Terminal.class);
    nodes.putAll(part.nodes());
    for (Terminal terminal : looked) {
      String node = nodes.get(terminal);
      if (node != null) {
        String inner = part.name() + ".lead-" + terminal.name().toLowerCase(java.util.Locale.ROOT);
        nodes.put(terminal, inner);
        resistor(inner, LINK_OHMS, node, inner);
        links.put(part.name() + "/" + terminal, inner + ":ohms");
      }
    }
    return new CircuitPart(part.name(), part.device(), nodes);
  }

  /** A bridge between each two pins that stand side by side. */
  private void bridged(CircuitPart part) {
    List<Pin> pins =
        part.device().pins().stream()
            .sorted(java.util.Comparator.comparingInt(Pin::number))
            .toList();
    if (part.device().terminals().size() < 3 || !part.device().fitted()) {
      return;
    }
    List<String> names = new ArrayList<>();
    for (int i = 1; i < pins.size(); i++) {
      Optional<String> one = node(part, pins.get(i - 1));
      Optional<String> other = node(part, pins.get(i));
      boolean sides = part.device() instanceof AudioAmplifier && 2 * i == pins.size();
      if (one.isPresent() && other.isPresent() && !one.equals(other) && !sides) {
        String name =
            part.name() + ".bridge-" + pins.get(i - 1).number() + "-" + pins.get(i).number();
        resistor(name, NO_BRIDGE_OHMS, one.get(), other.get());
        names.add(name + ":ohms");
      }
    }
    bridges.put(part.name(), names);
  }

  private static Optional<String> node(CircuitPart part, Pin pin) {
    return Optional.ofNullable(part.nodes().get(pin.terminal()));
  }

  private void resistor(String name, double ohms, String one, String other) {
    extras.add(
        new CircuitPart(name, new Resistor(ohms), Map.of(Terminal.A, one, Terminal.B, other)));
  }

  private void cell(String name, double volts) {
    BatteryModel model = new BatteryModel(name, volts, 1e-3, volts / 2, 1e-3, 1, 1, 0, volts, 1);
    extras.add(
        new CircuitPart(
            name, new Battery(model), Map.of(Terminal.PLUS, name, Terminal.MINUS, Circuit.GROUND)));
  }

  private void injector(String node) {
    resistor(INJECTOR, INJECTION_OHMS, CELL, node);
    injects = true;
  }

  /**
   * The end of the first detector's first diode that looks to the feed. Where its cathode looks
   * there, a cell would have to be turned round, and there is no injection.
   */
  private Optional<String> injectionNode() {
    for (PlacedBlock block : assembly.path()) {
      if (block.type().role() != Role.DETECTOR) {
        continue;
      }
      for (CircuitPart part : assembly.circuit().parts()) {
        String anode = part.nodes().get(Terminal.ANODE);
        if (part.device() instanceof Diode
            && part.name().startsWith(block.id() + ".")
            && anode != null
            && !anode.equals(Circuit.GROUND)) {
          return Optional.of(anode);
        }
      }
    }
    return Optional.empty();
  }

  List<SolveCase> cases() {
    List<SolveCase> cases = new ArrayList<>();
    cases.add(with(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, signal(), ""));
    if (hasFeed()) {
      cases.add(with(CaseName.TEST, Drive.SIGNAL, signal(), ""));
    }
    if (injects) {
      Map<String, Double> lifted = new HashMap<>(signal());
      feeds().forEach(feed -> lifted.put(feed + ":open", 1.0));
      cases.add(with(INJECTION, Drive.NO_SIGNAL, lifted, INJECTOR));
    }
    for (PlacedTestPoint point : assembly.testPoints()) {
      String ohmmeter = ohmmeters.get(point.place());
      if (ohmmeter != null) {
        cases.add(with(ohms(point), Drive.NO_SIGNAL, dead(), ohmmeter));
      }
    }
    return cases;
  }

  private boolean hasFeed() {
    return !feeds().isEmpty();
  }

  private List<String> feeds() {
    return named(TunedFeed.class, CarrierGenerator.class);
  }

  @SafeVarargs
  private List<String> named(Class<? extends Device>... kinds) {
    List<String> names = new ArrayList<>();
    for (CircuitPart part : assembly.circuit().parts()) {
      for (Class<? extends Device> kind : kinds) {
        if (kind.isInstance(part.device())) {
          names.add(part.name());
        }
      }
    }
    return names;
  }

  /** Supplies taken off and ICs out of their sockets: only then do ohms tell something. */
  private Map<String, Double> dead() {
    Map<String, Double> dead = new HashMap<>(signal());
    named(Battery.class, Adaptor.class, AudioAmplifier.class)
        .forEach(name -> dead.put(name + ":open", 1.0));
    return dead;
  }

  private Map<String, Double> signal() {
    Conditions conditions = assembly.design().conditions().core();
    return Map.of(
        Slot.CARRIER_HERTZ, conditions.carrierHertz(),
        Slot.CARRIER_PEAK_VOLTS, conditions.testPeakVolts(),
        Slot.DEPTH, conditions.testDepth(),
        Slot.TONE_HERTZ, conditions.toneHertz(),
        Slot.HIGHEST_TONE_HERTZ, conditions.highestToneHertz(),
        Slot.LOWEST_TONE_HERTZ, conditions.lowestToneHertz(),
        Slot.AMBIENT_CELSIUS, conditions.ambientCelsius());
  }

  /** A case in which of all injectors and ohmmeters only one is joined, or none. */
  private SolveCase with(CaseName name, Drive drive, Map<String, Double> base, String joined) {
    Map<String, Double> overrides = new HashMap<>(base);
    if (injects) {
      overrides.put(INJECTOR + ":open", joined.equals(INJECTOR) ? 0.0 : 1.0);
    }
    ohmmeters
        .values()
        .forEach(each -> overrides.put(each + ":open", joined.equals(each) ? 0.0 : 1.0));
    return new SolveCase(name, drive, overrides);
  }
}
