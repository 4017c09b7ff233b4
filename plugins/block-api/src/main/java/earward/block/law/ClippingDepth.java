package earward.block.law;

/**
 * The depth of modulation at which an envelope detector lets go of the envelope.
 *
 * <p>One rule covers both kinds: m ≤ |Z(ωm) + Rs′| / (Z(0) + Rs′), where Z is all that the diode
 * drives, its reservoir capacitor included, and Rs′ the effective source term. With R ∥ C alone it
 * is the strict condition for diagonal clipping; without C it is the ratio of AC to DC load.
 *
 * <p>Source: Terman, Radio Engineers' Handbook (both clipping conditions, from memory); the joint
 * form follows by asking that the diode's mean current never reverse.
 */
public final class ClippingDepth {
  private ClippingDepth() {}

  /**
   * The one rule.
   *
   * @param toneRealOhms real part of Z at the tone
   * @param toneImaginaryOhms imaginary part of Z at the tone
   * @param directOhms Z at DC, above 0
   * @param sourceOhms Rs′, at least 0
   * @return the depth, from 0 to 1
   */
  public static double ofLoad(
      double toneRealOhms, double toneImaginaryOhms, double directOhms, double sourceOhms) {
    double atTone = Math.hypot(toneRealOhms + sourceOhms, toneImaginaryOhms);
    return Math.min(1, atTone / (directOhms + sourceOhms));
  }

  /**
   * The strict condition for diagonal clipping of R ∥ C: m = 1/√(1 + (2π·f·R·C)²).
   *
   * @param loadOhms R, above 0
   * @param farads C, at least 0
   * @param toneHertz f, above 0
   */
  public static double diagonal(double loadOhms, double farads, double toneHertz) {
    return 1 / Math.hypot(1, 2 * Math.PI * toneHertz * loadOhms * farads);
  }

  /**
   * The looser condition that many books print, m = 1/(2π·f·R·C): 15 to 25 % kinder than the strict
   * one. To be shown beside it only.
   */
  public static double looseDiagonal(double loadOhms, double farads, double toneHertz) {
    return Math.min(1, 1 / (2 * Math.PI * toneHertz * loadOhms * farads));
  }

  /**
   * The time constant R·C that the strict condition allows: √(1 − m²)/(2π·f·m).
   *
   * @param depth m, above 0 and below 1
   * @return seconds
   */
  public static double longestTimeConstant(double depth, double toneHertz) {
    return Math.sqrt(1 - depth * depth) / (2 * Math.PI * toneHertz * depth);
  }
}
