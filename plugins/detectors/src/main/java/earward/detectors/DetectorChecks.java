package earward.detectors;

import earward.block.Conditions;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.DiodeModel;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import java.util.ArrayList;
import java.util.List;

/** What must hold at a diode that recovers the envelope. */
final class DetectorChecks {
  private static final double BOLTZMANN = 1.380649e-23;
  private static final double CHARGE = 1.602176634e-19;
  private static final double ZERO_CELSIUS_KELVIN = 273.15;

  /** E/(n·Vt) below which a diode detects by its square law rather than as a peak rectifier. */
  private static final double LEAST_DRIVE = 4;

  /** Share of the breakdown voltage that is used (common practice). */
  private static final double REVERSE_MARGIN = 0.8;

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
}
