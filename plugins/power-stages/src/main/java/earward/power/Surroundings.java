package earward.power;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.B;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.device.AmplifierModel;
import earward.block.device.AudioAmplifier;
import earward.block.device.Capacitor;
import earward.block.device.Loudspeaker;
import earward.block.device.LoudspeakerModel;
import earward.block.device.Potentiometer;
import earward.block.device.Resistor;
import earward.block.device.Taper;
import earward.block.device.Terminal;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port;
import earward.block.wiring.Port.Pair;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.EnumMap;
import java.util.Map;

/** An amplifier IC amid the parts that its pins need, for one set of settings; used once. */
final class Surroundings {
  private static final double FILM_RATED_VOLTS = 63;
  private static final double LOW_RATED_VOLTS = 25;
  private static final double HIGH_RATED_VOLTS = 35;

  /** Highest supply for which an electrolytic of the lower rating is fitted (common practice). */
  private static final double MOST_VOLTS_AT_LOW_RATING = 20;

  /** What holds this much can hurt a meter set to ohms, and the IC (common practice). */
  private static final double LEAST_FARADS_TO_DISCHARGE = 100e-6;

  /** What bears no more than this is worn at the ear (common practice). */
  private static final double MOST_WATTS_AT_THE_EAR = 0.25;

  private static final String INVERTING_CAPACITOR = "inverting-capacitor";

  private final Values values;
  private final AmplifierModel model;
  private final WiringPlan plan = Wiring.from(new Single("in"));
  private final String output;

  Surroundings(Values values, AmplifierModel model) {
    this.values = values;
    this.model = model;
    this.output = model.bridge() ? "plus" : "amp-out";
  }

  /** The node at which the signal leaves; the plus one of a bridge. */
  String exitNode() {
    return model.bridge() ? "plus" : "out";
  }

  Wiring wiring() {
    plan.testPoint("in", "in");
    control();
    amplifier();
    aroundThePins();
    outputNetwork("", output);
    if (model.bridge()) {
      outputNetwork("-two", "minus");
    } else {
      plan.at(output).run("output-capacitor", electrolytic("output-capacitor"), "out");
      polarised("output-capacitor");
    }
    plan.testPoint(model.bridge() ? "plus" : "output", output);
    if (model.bridge()) {
      plan.testPoint("minus", "minus");
    }
    loudspeaker();
    fittingOrder();
    Port exit = model.bridge() ? new Pair("plus", "minus") : new Single("out");
    return plan.to(exit);
  }

  /** A DC volume control: a potentiometer from a dropped rail, its wiper at the control pin. */
  private void control() {
    if (!model.has(Terminal.CONTROL)) {
      return;
    }
    Potentiometer track =
        new Potentiometer(
            values.amount("control-track"), Taper.LINEAR, values.position("control-knob"));
    plan.column(
            "control-series",
            new Resistor(values.amount("control-series")),
            A,
            Map.of(A, MAIN_RAIL, B, "control-top"))
        .column(
            "control-track",
            track,
            Terminal.TOP,
            Map.of(Terminal.TOP, "control-top", Terminal.WIPER, "control", Terminal.BOTTOM, GROUND))
        .at("control")
        .down("control-capacitor", electrolytic("control-capacitor"), GROUND)
        .testPoint("control", "control");
    polarised("control-capacitor");
  }

  private void amplifier() {
    Map<Terminal, String> nodes = new EnumMap<>(Terminal.class);
    for (Terminal terminal : new AudioAmplifier(model).terminals()) {
      if (inUse(terminal)) {
        nodes.put(terminal, nodeAt(terminal));
      }
    }
    boolean cooled = values.chosen("cooling", "heat-sink");
    AudioAmplifier amplifier =
        cooled ? new AudioAmplifier(model, values.amount("heat-sink")) : new AudioAmplifier(model);
    plan.at("in").body("amplifier", amplifier, nodes).caution("amplifier", Caution.HOT_PART);
    if (model.bridge()) {
      plan.caution("amplifier", Caution.BRIDGE_NEVER_TO_GROUND);
    }
  }

  private boolean inUse(Terminal terminal) {
    if (terminal == Terminal.RIPPLE) {
      return values.chosen("ripple", "capacitor");
    }
    return terminal != Terminal.BOOTSTRAP || values.chosen("bootstrap", "capacitor");
  }

  private String nodeAt(Terminal terminal) {
    if (terminal == Terminal.INPUT) {
      return "in";
    } else if (terminal == Terminal.OUTPUT) {
      return output;
    } else if (terminal == Terminal.OUTPUT_TWO) {
      return "minus";
    } else if (terminal == Terminal.SUPPLY) {
      return MAIN_RAIL;
    } else if (terminal == Terminal.GROUND) {
      return GROUND;
    }
    return terminal.name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
  }

  private void aroundThePins() {
    if (model.has(Terminal.GAIN)) {
      plan.at("gain")
          .down("gain-resistor", new Resistor(values.amount("gain-resistor")), "gain-foot")
          .at("gain-foot")
          .down("gain-capacitor", electrolytic("gain-capacitor"), GROUND);
      polarised("gain-capacitor");
    }
    invertingInputs();
    downFrom(Terminal.RIPPLE, "ripple-capacitor", values.chosen("ripple", "capacitor"));
    bootstrap();
    if (model.has(Terminal.COMPENSATION)) {
      plan.bridge("compensation-capacitor", film("compensation-capacitor"), "compensation", output);
    }
    plan.at(MAIN_RAIL).down("bypass-capacitor", electrolytic("bypass-capacitor"), GROUND);
    polarised("bypass-capacitor");
  }

  /**
   * One inverting input is held at ground for the signal; the two of a bridge are joined, so that
   * the second half amplifies what the first one leaves.
   *
   * <p>Source: the stereo and bridge test circuits of the ST TDA2822M (March 1995) and of the
   * Contek TDA2822 data sheet (10 µF in the bridge).
   */
  private void invertingInputs() {
    if (model.has(Terminal.INVERTING_TWO)) {
      plan.at(nodeAt(Terminal.INVERTING))
          .bridge(
              INVERTING_CAPACITOR,
              electrolytic(INVERTING_CAPACITOR),
              nodeAt(Terminal.INVERTING),
              nodeAt(Terminal.INVERTING_TWO));
      polarised(INVERTING_CAPACITOR);
    } else {
      downFrom(Terminal.INVERTING, INVERTING_CAPACITOR, true);
    }
  }

  /**
   * The pin is held near the supply by a resistor and lifted above it by a capacitor at the output.
   *
   * <p>Source of the resistor: the test circuit of the Contek TBA820M data sheet (56 Ω); that it
   * stands between supply and bootstrap pin where the load goes to ground: from memory.
   */
  private void bootstrap() {
    if (model.has(Terminal.BOOTSTRAP) && values.chosen("bootstrap", "capacitor")) {
      plan.at("bootstrap")
          .up("bootstrap-resistor", new Resistor(values.amount("bootstrap-resistor")), MAIN_RAIL)
          .bridge("bootstrap-capacitor", electrolytic("bootstrap-capacitor"), "bootstrap", output);
      polarised("bootstrap-capacitor");
    }
  }

  private void downFrom(Terminal pin, String capacitorId, boolean fitted) {
    if (model.has(pin) && fitted) {
      plan.at(nodeAt(pin)).down(capacitorId, electrolytic(capacitorId), GROUND);
      polarised(capacitorId);
    }
  }

  private void outputNetwork(String suffix, String node) {
    if (values.chosen("network", "fitted")) {
      plan.at(node)
          .down(
              "network-resistor" + suffix,
              new Resistor(values.amount("network-resistor")),
              "network" + suffix)
          .at("network" + suffix)
          .down("network-capacitor" + suffix, film("network-capacitor"), GROUND);
    }
  }

  private void loudspeaker() {
    if (!values.chosen("output", "loudspeaker")) {
      return;
    }
    LoudspeakerModel speaker = values.part("loudspeaker", LoudspeakerModel.class);
    plan.at(exitNode())
        .down("loudspeaker", new Loudspeaker(speaker), model.bridge() ? "minus" : GROUND);
    if (speaker.ratedWatts() <= MOST_WATTS_AT_THE_EAR) {
      plan.caution("loudspeaker", Caution.HEARING);
    }
    if (model.bridge()) {
      plan.caution("loudspeaker", Caution.BRIDGE_NEVER_TO_GROUND);
    }
  }

  /** Low parts first: resistors, then small capacitors, the IC, electrolytics, off-board parts. */
  private void fittingOrder() {
    Wiring all = plan.to(model.bridge() ? new Pair("plus", "minus") : new Single("out"));
    all.partsOf(Resistor.class).forEach(part -> plan.fit(part.id()));
    all.partsOf(Capacitor.class).stream()
        .filter(part -> !((Capacitor) part.device()).dielectric().polarised())
        .forEach(part -> plan.fit(part.id()));
    plan.fit("amplifier");
    all.partsOf(Capacitor.class).stream()
        .filter(part -> ((Capacitor) part.device()).dielectric().polarised())
        .forEach(part -> plan.fit(part.id()));
  }

  private void polarised(String capacitorId) {
    plan.caution(capacitorId, Caution.POLARITY);
    if (values.amount(capacitorId) >= LEAST_FARADS_TO_DISCHARGE) {
      plan.caution(capacitorId, Caution.CAPACITOR_DISCHARGE);
    }
  }

  private Capacitor film(String settingId) {
    return Capacitor.of(values.amount(settingId), FILM_RATED_VOLTS);
  }

  private Capacitor electrolytic(String settingId) {
    double rated =
        model.ratings().mostVolts() <= MOST_VOLTS_AT_LOW_RATING
            ? LOW_RATED_VOLTS
            : HIGH_RATED_VOLTS;
    return Capacitor.electrolytic(values.amount(settingId), rated);
  }
}
