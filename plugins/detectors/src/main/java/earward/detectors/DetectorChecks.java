package earward.detectors;

import earward.block.Conditions;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.DiodeModel;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** What must hold at a diode that recovers the envelope. */
final class DetectorChecks {
  private static final double BOLTZMANN = 1.380649e-23;
  private static final double CHARGE = 1.602176634e-19;
  private static final double ZERO_CELSIUS_KELVIN = 273.15;

  /** E/(n·Vt) below which a diode detects by its square law rather than as a peak rectifier. */
  private static final double LEAST_DRIVE = 4;

  /** Share of the breakdown voltage that is used (common practice). */
  private static final double REVERSE_MARGIN = 0.8;

  /** Two causes are named together when taking either away helps about as much. */
  private static final double ALIKE = 0.2;

  private DetectorChecks() {}

  static List<Check> of(DiodeModel model, Conditions conditions, boolean ownLoad) {
    double thermalVolts = BOLTZMANN * (conditions.ambientCelsius() + ZERO_CELSIUS_KELVIN) / CHARGE;
    List<RemedyHint> lessClipping = new ArrayList<>(List.of(RemedyHint.lower("c1")));
    List<RemedyHint> moreDrive = new ArrayList<>();
    if (ownLoad) {
      lessClipping.add(RemedyHint.lower("r1"));
      moreDrive.add(RemedyHint.raise("r1"));
    }
    return List.of(
        Check.atLeast(
            "clipping-depth",
            Severity.WEIGH,
            new FigureName("d1", Quantity.CLIPPING_DEPTH, CaseName.DEEPEST),
            conditions.deepestDepth(),
            "Terman, Radio Engineers' Handbook: both clipping conditions, joined (from memory)",
            lessClipping.toArray(RemedyHint[]::new)),
        Check.atLeast(
            "little-drive",
            Severity.WEIGH,
            new FigureName("d1", Quantity.CARRIER_PEAK_VOLTS, CaseName.WEAK),
            LEAST_DRIVE * model.emissionCoefficient() * thermalVolts,
            "common practice: below about 4·n·Vt a diode detects by its square law",
            moreDrive.toArray(RemedyHint[]::new)),
        Check.atMost(
            "reverse-voltage",
            Severity.STOP,
            new FigureName("d1", Quantity.REVERSE_PEAK_VOLTS, CaseName.DEEPEST),
            REVERSE_MARGIN * model.breakdownVolts(),
            "common practice: 80 % of the diode's breakdown voltage"));
  }

  /**
   * Names why the detector lets go: its capacitor is taken away, then the AC coupling, and the one
   * whose removal raises the depth more is the cause.
   */
  static List<Finding> cause(Conditions conditions, ToDoubleFunction<String> figure) {
    double depth = figure.applyAsDouble("d1:clipping-depth@deepest");
    if (!(depth < conditions.deepestDepth())) {
      return List.of();
    }
    double byCapacitor =
        figure.applyAsDouble("d1:clipping-depth-without-capacitor@deepest") - depth;
    double byCoupling = figure.applyAsDouble("d1:clipping-depth-without-coupling@deepest") - depth;
    if (Double.isNaN(byCapacitor) || Double.isNaN(byCoupling)) {
      return List.of();
    }
    return List.of(
        Finding.of(Severity.NOTE, "clipping-cause", "", sentence(byCapacitor, byCoupling)));
  }

  private static String sentence(double byCapacitor, double byCoupling) {
    double larger = Math.max(byCapacitor, byCoupling);
    if (Math.abs(byCapacitor - byCoupling) <= ALIKE * larger) {
      return "The detector lets go for two reasons alike: C1 is too large for its load, and what"
          + " is coupled through capacitors loads it too heavily.";
    }
    return byCapacitor > byCoupling
        ? "The detector lets go because C1 is too large for its load: the envelope falls faster"
            + " than C1 can discharge."
        : "The detector lets go because what is coupled to it through capacitors loads it too"
            + " heavily: it sees a lower resistance for audio than for DC.";
  }
}
