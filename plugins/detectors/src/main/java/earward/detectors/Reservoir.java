package earward.detectors;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
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
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;

/** What every detector ends in: the reservoir capacitor C1 and, where it has its own, its load. */
final class Reservoir {
  static final String OWN_LOAD = "resistor";
  static final double LEAST_FARADS = 10e-12;
  static final double MOST_FARADS = 470e-9;
  static final double FILM_RATED_VOLTS = 63;

  /** Depth below which a detector follows nothing: there is no way for its DC. */
  private static final double LEAST_DEPTH = 0.01;

  private Reservoir() {}

  /** C1, as a setting. */
  static Setting capacitor(double usualFarads) {
    return new Setting.Value("c1", Unit.FARAD, usualFarads, LEAST_FARADS, MOST_FARADS, Series.E12);
  }

  /** Whether the load is its own. */
  static Setting load() {
    return new Setting.Choice("load", List.of(OWN_LOAD, "next-block"));
  }

  /** R1, as a setting. */
  static Setting resistor(double usualOhms) {
    return new Setting.Value("r1", Unit.OHM, usualOhms, 470, 10e6, Series.E12);
  }

  static boolean ownLoad(Values values) {
    return values.chosen("load", OWN_LOAD);
  }

  /** C1 and R1 from the cursor to ground; R1 is fitted first where there is one. */
  static WiringPlan hang(WiringPlan plan, Values values) {
    plan.down("c1", Capacitor.of(values.amount("c1"), FILM_RATED_VOLTS), GROUND);
    if (ownLoad(values)) {
      plan.down("r1", new Resistor(values.amount("r1")), GROUND).fit("r1");
    }
    return plan;
  }

  /** That nothing loads the detector for DC, where that is so. */
  static List<Finding> judge(Values values, String diode, ToDoubleFunction<String> figure) {
    double depth = figure.applyAsDouble(diode + ":clipping-depth@deepest");
    if (ownLoad(values) || !(depth < LEAST_DEPTH)) {
      return List.of();
    }
    return List.of(Finding.inWords(Severity.WEIGH, "no-direct-load"));
  }

  static Curve clippingOverCapacitor(Values values, String diode) {
    double c1 = values.amount("c1");
    return new Curve(
        "clipping-over-c1",
        "c1",
        Math.max(LEAST_FARADS, c1 / 5),
        Math.min(MOST_FARADS, c1 * 5),
        21,
        List.of(
            new FigureName(diode, Quantity.CLIPPING_DEPTH, CaseName.DEEPEST),
            new FigureName("out", Quantity.CARRIER_RMS_VOLTS, CaseName.TEST)));
  }

  /**
   * The reservoir capacitor by the strict diagonal rule for the load as it stands; only the load
   * inside the block, or what stands after it, counts.
   */
  static Map<String, SettingValue> proposed(Proposer.Setting asked) {
    Values values = asked.values();
    Conditions conditions = asked.conditions();
    double ohms =
        ownLoad(values) ? 1 / (1 / values.amount("r1") + 1 / asked.loadOhms()) : asked.loadOhms();
    double depth = Math.min(conditions.deepestDepth(), 0.95);
    double seconds = ClippingDepth.longestTimeConstant(depth, conditions.highestToneHertz());
    double fitted = Series.E12.nearest(Math.max(LEAST_FARADS, seconds / ohms));
    return Map.of("c1", new SettingValue.Amount(Math.min(MOST_FARADS, fitted)));
  }
}
