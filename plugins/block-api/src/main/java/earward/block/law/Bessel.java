package earward.block.law;

/**
 * Modified Bessel functions of the first kind, scaled so that they never overflow.
 *
 * <p>Source: Abramowitz and Stegun 9.6.19, I_n(x) = (1/π)·∫ e^{x·cos θ}·cos nθ dθ over 0 to π, by
 * the trapezoidal rule, which for this periodic integrand errs only by about exp(−N²/2x).
 */
public final class Bessel {
  private Bessel() {}

  /**
   * e^{−|x|}·I_n(x).
   *
   * @param order n, at least 0
   * @param x any real number
   */
  public static double scaled(int order, double x) {
    double size = Math.abs(x);
    int points = 24 + 2 * order + (int) Math.ceil(9 * Math.sqrt(size));
    double sum = 0.5 * (1 + Math.exp(-2 * size) * (order % 2 == 0 ? 1 : -1));
    for (int k = 1; k < points; k++) {
      double angle = Math.PI * k / points;
      sum += Math.exp(size * (Math.cos(angle) - 1)) * Math.cos(order * angle);
    }
    double value = sum / points;
    return x < 0 && order % 2 == 1 ? -value : value;
  }
}
