package earward.detectors;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.B;
import static earward.block.device.Terminal.CATHODE;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Diode;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * A diode that a small current from the rail holds at the bend of its curve, for weak signals and
 * for silicon. The current flows from the output through the diode into the winding, so that the
 * output is positive at rest and a stronger station makes it less so.
 *
 * <p>Source: forward bias of a detector diode by some microamperes (common practice).
 */
public final class BiasedDiode implements BlockType {
  private static final FigureName REST =
      new FigureName("d1", Quantity.DC_AMPERES, CaseName.NO_SIGNAL);

  /** Bias below which the diode is as good as without, in A (common practice). */
  private static final double LEAST_AMPERES = 0.5e-6;

  /** Bias above which the diode's own resistance n·Vt/I, about 1 kΩ, loads the feed, in A. */
  private static final double MOST_AMPERES = 30e-6;

  private static final double LEAST_BIAS_OHMS = 10e3;
  private static final double MOST_BIAS_OHMS = 22e6;
  private static final double RATED_VOLTS = 35;

  @Override
  public String id() {
    return "detector.biased-diode";
  }

  @Override
  public Role role() {
    return Role.DETECTOR;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Part("diode", PartKind.DIODE, "1N4148"),
        Reservoir.capacitor(1e-9),
        Reservoir.load(),
        Reservoir.resistor(47e3),
        new Setting.Value("r-bias", Unit.OHM, 470e3, LEAST_BIAS_OHMS, MOST_BIAS_OHMS, Series.E12),
        new Setting.Value("r-feed", Unit.OHM, 10e3, 100, 1e6, Series.E12),
        new Setting.Value("c-feed", Unit.FARAD, 10e-6, 10e-9, 1e-3, Series.E6));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    DiodeModel model = values.part("diode", DiodeModel.class);
    Capacitor decoupling = Capacitor.of(values.amount("c-feed"), RATED_VOLTS);
    WiringPlan plan = Wiring.from(new Single("in")).run("d1", new Diode(model), CATHODE, "out");
    Reservoir.hang(DiodeCautions.of(plan, "d1", model), values)
        .run("r-bias", new Resistor(values.amount("r-bias")), B, "bias")
        .up("r-feed", new Resistor(values.amount("r-feed")), B, MAIN_RAIL)
        .down("c-feed", decoupling, A, GROUND);
    if (decoupling.dielectric().polarised()) {
      plan.caution("c-feed", Caution.POLARITY);
    }
    List<Check> checks = new ArrayList<>(List.of(littleBias(), muchBias()));
    checks.add(DetectorChecks.clipping("d1", conditions, Reservoir.ownLoad(values)));
    checks.add(DetectorChecks.reverse("d1", model));
    return new BlockDescription(
        plan.fit("r-bias", "r-feed", "d1", "c1", "c-feed")
            .testPoint("bias", "bias")
            .testPoint("out", "out")
            .to(new Single("out")),
        checks,
        List.of(restOverBias(values)));
  }

  private static Check littleBias() {
    return Check.atLeast(
        "little-bias",
        Severity.NOTE,
        REST,
        LEAST_AMPERES,
        "common practice: from half a microampere",
        RemedyHint.lower("r-bias"));
  }

  private static Check muchBias() {
    return Check.atMost(
        "much-bias",
        Severity.WEIGH,
        REST,
        MOST_AMPERES,
        "common practice: n·Vt/I of about 1 kΩ and above",
        RemedyHint.raise("r-bias"));
  }

  private static Curve restOverBias(Values values) {
    double ohms = values.amount("r-bias");
    return new Curve(
        "rest-over-bias",
        "r-bias",
        Math.max(LEAST_BIAS_OHMS, ohms / 10),
        Math.min(MOST_BIAS_OHMS, ohms * 10),
        21,
        List.of(REST, new FigureName("out", Quantity.AUDIO_RMS_VOLTS, CaseName.WEAK)));
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    return Reservoir.judge(values, "d1", figure);
  }

  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(Reservoir::proposed);
  }
}
