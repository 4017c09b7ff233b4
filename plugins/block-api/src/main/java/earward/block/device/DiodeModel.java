package earward.block.device;

/**
 * A diode by its model figures: i = Is·(exp((v − i·Rs)/(n·Vt)) − 1) + v/leakage, a junction charge
 * of Cj0/(1 − v/Vj)^M, and breakdown.
 *
 * <p>Source: Shockley 1949; junction capacitance of the abrupt and graded junction as in any device
 * text.
 *
 * @param name part type
 * @param material sets the movement with temperature
 * @param saturationAmperes Is at 25 °C, above 0
 * @param saturationLeastAmperes low end of the band in which specimens lie
 * @param saturationMostAmperes high end of that band
 * @param emissionCoefficient n, from 0.9 to 3
 * @param seriesOhms Rs, at least 0
 * @param junctionFarads Cj0, at least 0
 * @param builtInVolts Vj, above 0
 * @param gradingExponent M, from 0 to 0.9
 * @param leakageOhms resistance in parallel, at least 1, infinite for none
 * @param breakdownVolts reverse voltage that it bears, above 0
 * @param recoverySeconds reverse recovery time, at least 0
 */
public record DiodeModel(
    String name,
    DiodeMaterial material,
    double saturationAmperes,
    double saturationLeastAmperes,
    double saturationMostAmperes,
    double emissionCoefficient,
    double seriesOhms,
    double junctionFarads,
    double builtInVolts,
    double gradingExponent,
    double leakageOhms,
    double breakdownVolts,
    double recoverySeconds)
    implements PartModel {

  /** Far above any diode's; what is said to have more is a slip of the pen. */
  private static final double MOST_SATURATION_AMPERES = 0.01;

  public DiodeModel {
    Require.named(name, "diode");
    Require.positive(MOST_SATURATION_AMPERES, saturationAmperes, name + ": saturation current (A)");
    Require.within(
        0, saturationAmperes, saturationLeastAmperes, name + ": least saturation current (A)");
    Require.atLeast(
        saturationAmperes, saturationMostAmperes, name + ": most saturation current (A)");
    Require.atMost(
        MOST_SATURATION_AMPERES, saturationMostAmperes, name + ": most saturation current (A)");
    Require.within(0.9, 3, emissionCoefficient, name + ": emission coefficient");
    Require.notNegative(1e6, seriesOhms, name + ": series resistance (Ω)");
    Require.notNegative(1e-6, junctionFarads, name + ": junction capacitance (F)");
    Require.positive(5, builtInVolts, name + ": built-in voltage (V)");
    Require.within(0, 0.9, gradingExponent, name + ": grading exponent");
    Require.atLeast(1, leakageOhms, name + ": leakage resistance (Ω)");
    Require.positive(1e5, breakdownVolts, name + ": breakdown voltage (V)");
    Require.notNegative(1e-3, recoverySeconds, name + ": recovery time (s)");
  }

  /**
   * A diode of exponential law and series resistance alone: no band, charge, leakage, breakdown.
   */
  public static DiodeModel plain(
      String name, DiodeMaterial material, double saturationAmperes, double n, double seriesOhms) {
    return new DiodeModel(
        name,
        material,
        saturationAmperes,
        saturationAmperes,
        saturationAmperes,
        n,
        seriesOhms,
        0,
        0.5,
        0.5,
        Double.POSITIVE_INFINITY,
        1000,
        0);
  }

  @Override
  public PartKind kind() {
    return PartKind.DIODE;
  }
}
