package earward.detectors;

import earward.block.Conditions;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.DiodeModel;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.ThermalVoltage;
import java.util.ArrayList;
import java.util.List;

/** What must hold at a diode that recovers the envelope. */
final class DetectorChecks {
  /** E/(n·Vt) below which a diode detects by its square law rather than as a peak rectifier. */
  private static final double LEAST_DRIVE = 4;

  /** Share of the breakdown voltage that is used (common practice). */
  private static final double REVERSE_MARGIN = 0.8;

  /** Share of the carrier's peak that comes out as DC of a reservoir that holds it. */
  private static final double LEAST_EFFICIENCY = 0.4;

  private DetectorChecks() {}

  /**
   * The checks of every diode in the list.
   *
   * @param less where to turn first against clipping, beside C1 and R1
   */
  static List<Check> of(
      List<String> diodes,
      DiodeModel model,
      Conditions conditions,
      boolean ownLoad,
      RemedyHint... less) {
    List<Check> checks = new ArrayList<>();
    diodes.forEach(diode -> checks.add(clipping(diode, conditions, ownLoad, less)));
    diodes.forEach(diode -> checks.add(drive(diode, model, conditions, ownLoad)));
    diodes.forEach(diode -> checks.add(reverse(diode, model)));
    return checks;
  }

  static Check clipping(String diode, Conditions conditions, boolean ownLoad, RemedyHint... less) {
    List<RemedyHint> lessClipping = new ArrayList<>(List.of(less));
    lessClipping.add(RemedyHint.lower("c1"));
    if (ownLoad) {
      lessClipping.add(RemedyHint.lower("r1"));
    }
    return Check.atLeast(
        "clipping-depth",
        Severity.WEIGH,
        new FigureName(diode, Quantity.CLIPPING_DEPTH, CaseName.DEEPEST),
        conditions.deepestDepth(),
        "Terman, Radio Engineers' Handbook: both clipping conditions, joined (from memory)",
        lessClipping.toArray(RemedyHint[]::new));
  }

  private static Check drive(
      String diode, DiodeModel model, Conditions conditions, boolean ownLoad) {
    RemedyHint[] moreDrive =
        ownLoad ? new RemedyHint[] {RemedyHint.raise("r1")} : new RemedyHint[0];
    return Check.atLeast(
        "little-drive",
        Severity.WEIGH,
        new FigureName(diode, Quantity.CARRIER_PEAK_VOLTS, CaseName.WEAK),
        LEAST_DRIVE
            * model.emissionCoefficient()
            * ThermalVoltage.volts(conditions.ambientCelsius()),
        "common practice: below about 4·n·Vt a diode detects by its square law",
        moreDrive);
  }

  /** Whether the reservoir holds the peak between two carrier cycles. */
  static Check following(String diode, boolean ownLoad) {
    List<RemedyHint> more = new ArrayList<>(List.of(RemedyHint.raise("c1")));
    if (ownLoad) {
      more.add(RemedyHint.raise("r1"));
    }
    return Check.atLeast(
        "carrier-following",
        Severity.WEIGH,
        new FigureName(diode, Quantity.DETECTION_EFFICIENCY, CaseName.TEST),
        LEAST_EFFICIENCY,
        "Terman, Radio Engineers' Handbook: 80 to 90 % in ordinary practice (from memory); half of"
            + " the peak is where the output follows the carrier rather than its envelope",
        more.toArray(RemedyHint[]::new));
  }

  static Check reverse(String diode, DiodeModel model) {
    return Check.atMost(
        "reverse-voltage",
        Severity.STOP,
        new FigureName(diode, Quantity.REVERSE_PEAK_VOLTS, CaseName.DEEPEST),
        REVERSE_MARGIN * model.breakdownVolts(),
        "common practice: 80 % of the diode's breakdown voltage");
  }
}
