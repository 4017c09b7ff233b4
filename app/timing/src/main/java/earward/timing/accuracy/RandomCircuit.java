package earward.timing.accuracy;

import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.CarrierGenerator;
import earward.block.device.Device;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.FieldEffectModel;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.device.TunedFeed;
import earward.block.figure.CaseName;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.Drive;
import earward.engine.Slot;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * A random design as a circuit: feed → detector → A (C1 ∥ R1) → R2 → B (C2) → Cc → W (RL). Used
 * once.
 */
final class RandomCircuit {
  static final String DETECTED = "a";
  static final String WIPER = "w";
  private static final double RAIL_VOLTS = 12;
  private static final double BIAS_VOLTS = 6;
  private static final double LARGE_FARADS = 10e-6;

  private final Draw draw;
  private final List<CircuitPart> parts = new ArrayList<>();

  private RandomCircuit(Draw draw) {
    this.draw = draw;
  }

  static Circuit of(Draw draw) {
    RandomCircuit made = new RandomCircuit(draw);
    made.feed();
    switch (draw.kind()) {
      case UNTUNED_DIODE, TUNED_DIODE -> made.diode("d1", "in", DETECTED);
      case DOUBLER -> made.doubler();
      case FULL_WAVE -> made.fullWave();
      case BIASED_DIODE -> made.biased();
      case TRANSISTOR_FOLLOWER -> made.transistor();
      case FIELD_EFFECT_FOLLOWER -> made.fieldEffect();
    }
    made.load();
    return new Circuit(made.parts, List.of(), List.of());
  }

  static SolveCase test(Draw draw) {
    return new SolveCase(
        CaseName.TEST,
        Drive.SIGNAL,
        Map.of(
            Slot.CARRIER_HERTZ, draw.carrierHertz(),
            Slot.CARRIER_PEAK_VOLTS, draw.peakVolts(),
            Slot.DEPTH, draw.depth(),
            Slot.TONE_HERTZ, draw.toneHertz()));
  }

  private void part(String name, Device device, Map<Terminal, String> nodes) {
    parts.add(new CircuitPart("design." + name, device, nodes));
  }

  private void resistor(String name, double ohms, String a, String b) {
    part(name, new Resistor(ohms), Map.of(Terminal.A, a, Terminal.B, b));
  }

  private void capacitor(String name, double farads, String a, String b) {
    Capacitor film = new Capacitor(farads, Dielectric.FILM, 63, 0, 0);
    part(name, film, Map.of(Terminal.A, a, Terminal.B, b));
  }

  private void feed() {
    if (!draw.tuned()) {
      part(
          "feed",
          new CarrierGenerator(draw.sourceOhms()),
          Map.of(Terminal.TOP, "in", Terminal.BOTTOM, Circuit.GROUND));
      return;
    }
    boolean tapped = draw.kind() == DetectorKind.FULL_WAVE;
    TunedFeed can =
        new TunedFeed(draw.sourceOhms(), draw.quality(), draw.detuningHertz(), tapped ? 0.5 : 1, 2);
    part(
        "feed",
        can,
        tapped
            ? Map.of(Terminal.TOP, "in", Terminal.TAP, Circuit.GROUND, Terminal.BOTTOM, "minus")
            : Map.of(Terminal.TOP, "in", Terminal.BOTTOM, Circuit.GROUND));
  }

  private void diode(String name, String anode, String cathode) {
    DiodeModel model =
        new DiodeModel(
            name,
            DiodeMaterial.SCHOTTKY,
            draw.saturationAmperes(),
            draw.saturationAmperes(),
            draw.saturationAmperes(),
            draw.emission(),
            draw.seriesOhms(),
            draw.junctionFarads(),
            0.5,
            0.4,
            20e6,
            50,
            0);
    part(name, new Diode(model), Map.of(Terminal.ANODE, anode, Terminal.CATHODE, cathode));
  }

  private void doubler() {
    capacitor("pump", 10 * draw.reservoirFarads(), "in", "x");
    diode("d1", Circuit.GROUND, "x");
    diode("d2", "x", DETECTED);
  }

  private void fullWave() {
    diode("d1", "in", DETECTED);
    diode("d2", "minus", DETECTED);
  }

  private void biased() {
    rail(BIAS_VOLTS);
    resistor("feed-in", 10e3, "rail", "bias");
    capacitor("quiet", LARGE_FARADS, "bias", Circuit.GROUND);
    resistor("bias", BIAS_VOLTS / draw.restAmperes(), "bias", DETECTED);
    diode("d1", DETECTED, "in");
  }

  private void rail(double volts) {
    BatteryModel model = new BatteryModel("cells", volts, 0.5, volts / 2, 1, 1, 0.1, 0, volts, 1);
    part(
        "battery",
        new Battery(model),
        Map.of(Terminal.PLUS, "rail", Terminal.MINUS, Circuit.GROUND));
  }

  /** Rests near cut-off: a divider that lifts the base by what the rest current asks. */
  private void transistor() {
    rail(RAIL_VOLTS);
    resistor("feed-in", 100, "rail", "fed");
    capacitor("quiet", LARGE_FARADS, "fed", Circuit.GROUND);
    TransistorModel model =
        new TransistorModel("npn", false, 1e-14, 200, 2, 80, 45, 0.1, 150, 500, 100);
    double base = 0.0257 * Math.log(draw.restAmperes() / 1e-14) + draw.restAmperes() * 5e3;
    double lower = 22e3;
    resistor("upper", lower * (RAIL_VOLTS - base) / base, "rail", "base");
    resistor("lower", lower, "base", Circuit.GROUND);
    capacitor("c-in", 10e-9, "in", "base");
    part(
        "q1",
        new BipolarTransistor(model),
        Map.of(Terminal.COLLECTOR, "fed", Terminal.BASE, "base", Terminal.EMITTER, DETECTED));
  }

  private void fieldEffect() {
    rail(RAIL_VOLTS);
    resistor("feed-in", 100, "rail", "fed");
    capacitor("quiet", LARGE_FARADS, "fed", Circuit.GROUND);
    FieldEffectModel model =
        new FieldEffectModel("jfet", false, 5e-3, draw.pinchOffVolts(), 30, 150, 400);
    part(
        "q1",
        new FieldEffectTransistor(model),
        Map.of(Terminal.DRAIN, "fed", Terminal.GATE, "in", Terminal.SOURCE, DETECTED));
  }

  private void load() {
    double r1 = draw.loadOhms();
    capacitor("c1", draw.reservoirFarads(), DETECTED, Circuit.GROUND);
    resistor("r1", r1, DETECTED, Circuit.GROUND);
    resistor("r2", r1 / 10, DETECTED, "b");
    capacitor("c2", draw.filterFarads(), "b", Circuit.GROUND);
    capacitor("cc", 1e-6, "b", WIPER);
    resistor("rl", r1 * draw.acShare(), WIPER, Circuit.GROUND);
  }
}
