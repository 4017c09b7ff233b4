package earward.detectors;

import static earward.block.device.Terminal.ANODE;
import static earward.block.device.Terminal.CATHODE;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.ClippingDepth;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** A diode, its reservoir capacitor and, where nothing else loads it, its load resistor. */
public final class EnvelopeDiode implements BlockType {
  static final String OWN_LOAD = "resistor";

  /** Depth below which a detector follows nothing: there is no way for its DC. */
  private static final double LEAST_DEPTH = 0.01;

  private static final double LEAST_FARADS = 10e-12;
  private static final double MOST_FARADS = 470e-9;
  private static final double FILM_RATED_VOLTS = 63;

  @Override
  public String id() {
    return "detector.envelope-diode";
  }

  @Override
  public Role role() {
    return Role.DETECTOR;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("direction", List.of("positive", "negative")),
        new Setting.Part("diode", PartKind.DIODE, "BAT46"),
        new Setting.Value("c1", Unit.FARAD, 1e-9, LEAST_FARADS, MOST_FARADS, Series.E12),
        new Setting.Choice("load", List.of(OWN_LOAD, "next-block")),
        new Setting.Value("r1", Unit.OHM, 22e3, 470, 10e6, Series.E12));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    DiodeModel model = values.part("diode", DiodeModel.class);
    boolean ownLoad = values.chosen("load", OWN_LOAD);
    WiringPlan plan =
        Wiring.from(new Single("in"))
            .run(
                "d1",
                new Diode(model),
                values.chosen("direction", "positive") ? ANODE : CATHODE,
                "out")
            .down("c1", Capacitor.of(values.amount("c1"), FILM_RATED_VOLTS), GROUND)
            .caution("d1", Caution.GLASS_DIODE);
    if (ownLoad) {
      plan.down("r1", new Resistor(values.amount("r1")), GROUND).fit("r1");
    }
    if (model.material() == DiodeMaterial.GERMANIUM) {
      plan.caution("d1", Caution.GERMANIUM_HEAT);
    }
    Wiring wiring = plan.fit("d1", "c1").testPoint("out", "out").to(new Single("out"));
    return new BlockDescription(
        wiring, DetectorChecks.of(model, conditions, ownLoad), List.of(clippingOverC1(values)));
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    double depth = figure.applyAsDouble("d1:clipping-depth@deepest");
    if (values.chosen("load", OWN_LOAD) || !(depth < LEAST_DEPTH)) {
      return List.of();
    }
    return List.of(
        Finding.of(
            Severity.WEIGH,
            "no-direct-load",
            "",
            "Nothing loads the detector for DC: C1 stays charged to the highest peak, and no audio"
                + " comes out. Give it a load resistor of its own, or put a block after it that"
                + " leads to ground."));
  }

  private static Curve clippingOverC1(Values values) {
    double c1 = values.amount("c1");
    return new Curve(
        "clipping-over-c1",
        "c1",
        Math.max(LEAST_FARADS, c1 / 5),
        Math.min(MOST_FARADS, c1 * 5),
        21,
        List.of(
            new FigureName("d1", Quantity.CLIPPING_DEPTH, CaseName.DEEPEST),
            new FigureName("out", Quantity.CARRIER_RMS_VOLTS, CaseName.TEST)));
  }

  /**
   * The reservoir capacitor by the strict diagonal rule for the load as it stands; only the load
   * inside the block, or what stands after it, counts.
   */
  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(
        setting -> {
          Values values = setting.values();
          Conditions conditions = setting.conditions();
          double ohms =
              values.chosen("load", OWN_LOAD)
                  ? 1 / (1 / values.amount("r1") + 1 / setting.loadOhms())
                  : setting.loadOhms();
          double depth = Math.min(conditions.deepestDepth(), 0.95);
          double seconds = ClippingDepth.longestTimeConstant(depth, conditions.highestToneHertz());
          double fitted = Series.E12.nearest(Math.max(LEAST_FARADS, seconds / ohms));
          return Map.of("c1", new SettingValue.Amount(Math.min(MOST_FARADS, fitted)));
        });
  }
}
