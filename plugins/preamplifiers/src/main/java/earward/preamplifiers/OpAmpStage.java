package earward.preamplifiers;

import static earward.block.device.Terminal.INPUT;
import static earward.block.device.Terminal.INVERTING;
import static earward.block.device.Terminal.OUTPUT;
import static earward.block.device.Terminal.SUPPLY;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.OpAmpModel;
import earward.block.device.OperationalAmplifier;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
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

/**
 * A non-inverting op-amp stage from one supply, its input held at half of it: gain 1 + Rf/Rg in the
 * band, 1 at DC. Source: any op-amp text.
 */
public final class OpAmpStage implements BlockType {
  private static final double LEAST_FEEDBACK_OHMS = 1e3;
  private static final double MOST_FEEDBACK_OHMS = 1e6;

  @Override
  public String id() {
    return "preamplifier.op-amp";
  }

  @Override
  public Role role() {
    return Role.PREAMPLIFIER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Part("op-amp", PartKind.OP_AMP, "TLC272 half"),
        Stage.coupling("c-in"),
        new Setting.Value("bias-ohms", Unit.OHM, 220e3, 10e3, 10e6, Series.E12),
        new Setting.Value(
            "r-feedback", Unit.OHM, 100e3, LEAST_FEEDBACK_OHMS, MOST_FEEDBACK_OHMS, Series.E12),
        new Setting.Value("r-gain", Unit.OHM, 10e3, 100, 100e3, Series.E12),
        new Setting.Value("c-gain", Unit.FARAD, 4.7e-6, 10e-9, 1e-3, Series.E6),
        Stage.coupling("c-out"),
        Stage.feedResistor(),
        Stage.feedCapacitor());
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    OpAmpModel model = values.part("op-amp", OpAmpModel.class);
    WiringPlan plan = Wiring.from(new Single("in"));
    Stage.feed(plan, values);
    Resistor bias = new Resistor(values.amount("bias-ohms"));
    Map<Terminal, String> pins =
        Map.of(
            INPUT,
            "plus",
            INVERTING,
            "minus",
            OUTPUT,
            "drive",
            SUPPLY,
            Stage.FED,
            Terminal.GROUND,
            GROUND);
    plan.run("c-in", Stage.film(values.amount("c-in")), "plus")
        .up("r-upper", bias, Stage.FED)
        .down("r-lower", bias, GROUND)
        .body("ic1", new OperationalAmplifier(model), pins)
        .at("minus")
        .down("r-gain", new Resistor(values.amount("r-gain")), "foot")
        .at("foot");
    Stage.bypass(plan, "c-gain", values.amount("c-gain"));
    plan.bridge("r-feedback", new Resistor(values.amount("r-feedback")), "minus", "drive")
        .at("drive")
        .run("c-out", Stage.film(values.amount("c-out")), "out")
        .testPoint("drive", "drive")
        .testPoint("out", "out")
        .fit("r-upper", "r-lower", "r-feedback", "r-gain", "r-feed")
        .fit("c-in", "c-out", "c-gain", "c-feed", "ic1");
    return new BlockDescription(
        plan.to(new Single("out")),
        List.of(
            Stage.couplingEdge(
                conditions,
                RemedyHint.raise("c-in"),
                RemedyHint.raise("c-gain"),
                RemedyHint.raise("c-out")),
            Stage.supplyHigh(model.mostVolts()),
            supplyLow(model)),
        List.of(levelOverFeedback(values)));
  }

  private static Check supplyLow(OpAmpModel model) {
    return Check.atLeast(
        "supply-low",
        Severity.WEIGH,
        new FigureName(Stage.FED, Quantity.DC_VOLTS, CaseName.BATTERY_LOW),
        model.leastVolts(),
        "lowest supply of the op-amp",
        RemedyHint.lower("r-feed"));
  }

  private static Curve levelOverFeedback(Values values) {
    double ohms = values.amount("r-feedback");
    return new Curve(
        "level-over-feedback",
        "r-feedback",
        Math.max(LEAST_FEEDBACK_OHMS, ohms / 5),
        Math.min(MOST_FEEDBACK_OHMS, ohms * 5),
        21,
        List.of(new FigureName("out", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST)));
  }

  /** Capacitors that keep the lowest tone, each an octave below it. */
  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(
        asked -> {
          Values values = asked.values();
          double lowest = asked.conditions().lowestToneHertz();
          double bias = values.amount("bias-ohms") / 2;
          return Map.<String, SettingValue>of(
              "c-in",
              new SettingValue.Amount(Stage.fitted(asked.sourceOhms() + bias, lowest)),
              "c-out",
              new SettingValue.Amount(Stage.fitted(asked.loadOhms(), lowest)));
        });
  }
}
