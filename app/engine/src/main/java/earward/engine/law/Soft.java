package earward.engine.law;

/** Smooth stand-ins for max(x, 0), so that Newton's method sees no corner. */
final class Soft {
  private Soft() {}

  /** ln(1 + exp x). */
  static double plus(double x) {
    return x > 30 ? x : Math.log1p(Math.exp(x));
  }

  /** Derivative of {@link #plus}. */
  static double plusSlope(double x) {
    return 1 / (1 + Math.exp(-x));
  }
}
