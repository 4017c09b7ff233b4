package earward.preamplifiers;

import static earward.block.device.Terminal.BASE;
import static earward.block.device.Terminal.COLLECTOR;
import static earward.block.device.Terminal.EMITTER;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Finding;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.BipolarTransistor;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * One transistor in common emitter, with a divider at its base, a resistor in the emitter that sets
 * the gain, and one behind it, bypassed, that holds the current.
 *
 * <p>Source: gain about Rc/(Rg + Vt/I) (common practice); it is solved at its operating point.
 */
public final class CommonEmitter implements BlockType {
  /** What the transistor needs from collector to emitter for any swing (common practice). */
  private static final double LEAST_ACROSS_VOLTS = 1;

  private static final double LEAST_GAIN_OHMS = 10;
  private static final double MOST_GAIN_OHMS = 4.7e3;

  @Override
  public String id() {
    return "preamplifier.common-emitter";
  }

  @Override
  public Role role() {
    return Role.PREAMPLIFIER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Part("transistor", PartKind.TRANSISTOR, "BC547B"),
        Stage.coupling("c-in"),
        new Setting.Value("r-upper", Unit.OHM, 100e3, 4.7e3, 2.2e6, Series.E12),
        new Setting.Value("r-lower", Unit.OHM, 22e3, 1e3, 470e3, Series.E12),
        new Setting.Value("r-collector", Unit.OHM, 4.7e3, 220, 100e3, Series.E12),
        new Setting.Value("r-gain", Unit.OHM, 220, LEAST_GAIN_OHMS, MOST_GAIN_OHMS, Series.E12),
        new Setting.Value("r-emitter", Unit.OHM, 820, 47, 47e3, Series.E12),
        new Setting.Value("c-emitter", Unit.FARAD, 47e-6, 100e-9, 1e-3, Series.E6),
        Stage.coupling("c-out"),
        Stage.feedResistor(),
        Stage.feedCapacitor());
  }

  static boolean goTogether(Values values) {
    return !values.part("transistor", TransistorModel.class).pnp();
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    TransistorModel model = values.part("transistor", TransistorModel.class);
    if (!goTogether(values)) {
      throw new IllegalArgumentException(
          "transistor " + model.name() + " is a pnp; an npn is wanted, its emitter towards ground");
    }
    WiringPlan plan = Wiring.from(new Single("in"));
    Stage.feed(plan, values);
    plan.run("c-in", Stage.film(values.amount("c-in")), "base")
        .up("r-upper", new Resistor(values.amount("r-upper")), Stage.FED)
        .down("r-lower", new Resistor(values.amount("r-lower")), GROUND)
        .body(
            "q1",
            new BipolarTransistor(model),
            Map.of(BASE, "base", COLLECTOR, "collector", EMITTER, "emitter"))
        .at("emitter")
        .down("r-gain", new Resistor(values.amount("r-gain")), "foot")
        .at("foot")
        .down("r-emitter", new Resistor(values.amount("r-emitter")), GROUND);
    Stage.bypass(plan, "c-emitter", values.amount("c-emitter"));
    plan.at("collector")
        .up("r-collector", new Resistor(values.amount("r-collector")), Stage.FED)
        .run("c-out", Stage.film(values.amount("c-out")), "out")
        .testPoint("emitter", "emitter")
        .testPoint("collector", "collector")
        .testPoint("out", "out")
        .fit("r-upper", "r-lower", "r-collector", "r-gain", "r-emitter", "r-feed")
        .fit("c-in", "c-out", "c-emitter", "c-feed", "q1");
    return new BlockDescription(
        plan.to(new Single("out")),
        List.of(
            Stage.couplingEdge(
                conditions,
                RemedyHint.raise("c-in"),
                RemedyHint.raise("c-out"),
                RemedyHint.raise("c-emitter")),
            Stage.supplyHigh(model.mostVolts())),
        List.of(levelOverGain(values)));
  }

  private static Curve levelOverGain(Values values) {
    double ohms = values.amount("r-gain");
    return new Curve(
        "level-over-gain",
        "r-gain",
        Math.max(LEAST_GAIN_OHMS, ohms / 5),
        Math.min(MOST_GAIN_OHMS, ohms * 5),
        21,
        List.of(new FigureName("out", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST)));
  }

  /** Whether the transistor is left room to swing, which no figure alone says. */
  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    double across =
        figure.applyAsDouble("collector:dc-volts@no-signal")
            - figure.applyAsDouble("emitter:dc-volts@no-signal");
    return across < LEAST_ACROSS_VOLTS
        ? List.of(Finding.inWords(Severity.WEIGH, "no-room"))
        : List.of();
  }

  /** Coupling capacitors that keep the lowest tone, each an octave below it. */
  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(
        asked -> {
          Values values = asked.values();
          double lowest = asked.conditions().lowestToneHertz();
          double divider = 1 / (1 / values.amount("r-upper") + 1 / values.amount("r-lower"));
          return Map.<String, SettingValue>of(
              "c-in",
              new SettingValue.Amount(Stage.fitted(asked.sourceOhms() + divider, lowest)),
              "c-out",
              new SettingValue.Amount(
                  Stage.fitted(values.amount("r-collector") + asked.loadOhms(), lowest)));
        });
  }
}
