package earward.engine;

import earward.block.device.AmplifierGain;
import earward.block.device.AmplifierModel;
import earward.block.device.AmplifierRatings;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.Capacitor;
import earward.block.device.CarrierGenerator;
import earward.block.device.Device;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.OutputSwing;
import earward.block.device.Pin;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.device.TunedFeed;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** A circuit for a test, part by part, and its figures by name. */
final class TrialCircuit {
  private final List<CircuitPart> parts = new ArrayList<>();
  private final List<Seam> seams = new ArrayList<>();
  private final List<Probe> probes = new ArrayList<>();
  private final List<SolveCase> cases = new ArrayList<>();
  private final List<FigureName> wanted = new ArrayList<>();

  TrialCircuit part(String name, Device device, Map<Terminal, String> nodes) {
    parts.add(new CircuitPart(name, device, nodes));
    return this;
  }

  TrialCircuit resistor(String name, double ohms, String a, String b) {
    return two(name, new Resistor(ohms), a, b);
  }

  TrialCircuit capacitor(String name, double farads, String a, String b) {
    return two(name, new Capacitor(farads, Dielectric.FILM, 63, 0, 0), a, b);
  }

  TrialCircuit two(String name, Device device, String a, String b) {
    return part(name, device, Map.of(Terminal.A, a, Terminal.B, b));
  }

  TrialCircuit generator(double ohms, String node) {
    return part(
        "feed.generator",
        new CarrierGenerator(ohms),
        Map.of(Terminal.TOP, node, Terminal.BOTTOM, Circuit.GROUND));
  }

  TrialCircuit tuned(double ohms, double quality, String node) {
    return part(
        "feed.can",
        new TunedFeed(ohms, quality, 0, 1, 0.001),
        Map.of(Terminal.TOP, node, Terminal.BOTTOM, Circuit.GROUND));
  }

  TrialCircuit diode(
      String name, double saturation, double n, double ohms, String anode, String cathode) {
    DiodeModel model = DiodeModel.plain(name, DiodeMaterial.SCHOTTKY, saturation, n, ohms);
    return part(name, new Diode(model), Map.of(Terminal.ANODE, anode, Terminal.CATHODE, cathode));
  }

  TrialCircuit battery(double volts, double ohms, String node) {
    BatteryModel model =
        new BatteryModel("cell", volts, ohms, volts / 2, ohms * 2, 1, 0.1, 0, volts, 1);
    return part(
        "supply.battery",
        new Battery(model),
        Map.of(Terminal.PLUS, node, Terminal.MINUS, Circuit.GROUND));
  }

  /** An amplifier that loses nothing: rests at half its supply, swings from rail to rail. */
  TrialCircuit idealAmplifier(boolean bridge, double quiescent, String in, String rail) {
    return amplifier(bridge, quiescent, new OutputSwing(0, 0, 0, 0, 0), in, rail);
  }

  TrialCircuit amplifier(
      boolean bridge, double quiescent, OutputSwing swing, String in, String rail) {
    List<Pin> pins =
        new ArrayList<>(
            List.of(
                new Pin(1, Terminal.INPUT),
                new Pin(2, Terminal.OUTPUT),
                new Pin(3, Terminal.SUPPLY),
                new Pin(4, Terminal.GROUND)));
    if (bridge) {
      pins.add(new Pin(5, Terminal.OUTPUT_TWO));
    }
    AmplifierModel model =
        new AmplifierModel(
            "ideal",
            bridge,
            new AmplifierGain(20, Double.POSITIVE_INFINITY, 1e4, 1e6, 0, List.of()),
            swing,
            new AmplifierRatings(0.1, 100, 1, 10, 150, 50, 10),
            quiescent,
            0.5,
            0,
            100e3,
            0,
            100,
            100,
            0,
            "DIP-8",
            pins);
    Map<Terminal, String> nodes = new HashMap<>();
    nodes.put(Terminal.INPUT, in);
    nodes.put(Terminal.OUTPUT, "plus");
    nodes.put(Terminal.SUPPLY, rail);
    nodes.put(Terminal.GROUND, Circuit.GROUND);
    if (bridge) {
      nodes.put(Terminal.OUTPUT_TWO, "minus");
    }
    return part("power.amplifier", new AudioAmplifier(model), nodes);
  }

  TrialCircuit seam(String name, String before, String after) {
    seams.add(new Seam(name, before, after));
    return this;
  }

  TrialCircuit probe(String name, String plus, String minus) {
    probes.add(new Probe(name, plus, minus));
    return this;
  }

  TrialCircuit solved(CaseName name, Drive drive, Map<String, Double> overrides) {
    cases.add(new SolveCase(name, drive, overrides));
    return this;
  }

  /** A test case at 455 kHz. */
  TrialCircuit signal(double peakVolts, double depth, double toneHertz) {
    return solved(
        CaseName.TEST,
        Drive.SIGNAL,
        Map.of(Slot.CARRIER_PEAK_VOLTS, peakVolts, Slot.DEPTH, depth, Slot.TONE_HERTZ, toneHertz));
  }

  TrialCircuit want(String place, Quantity quantity, CaseName caseName) {
    wanted.add(new FigureName(place, quantity, caseName));
    return this;
  }

  TrialCircuit want(String place, Quantity quantity) {
    return want(place, quantity, CaseName.TEST);
  }

  Circuit circuit() {
    return new Circuit(parts, seams, probes);
  }

  CompiledCircuit compile() {
    return Engine.compile(circuit(), cases, wanted);
  }

  /** The wanted figures of the nominal circuit, in the order in which they were asked for. */
  double[] figures() {
    CompiledCircuit compiled = compile();
    double[] figures = new double[wanted.size()];
    SolveOutcome outcome = compiled.newSolver().solve(compiled.nominalValues(), figures);
    if (!outcome.solved()) {
      throw new AssertionError(outcome.findings().toString());
    }
    return figures;
  }

  double figure() {
    return figures()[0];
  }
}
