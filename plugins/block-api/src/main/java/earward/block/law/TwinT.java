package earward.block.law;

/**
 * The twin-T: R, R in series with 2C to ground between them, beside C, C in series with R/2 to
 * ground between them. From a low source into no load nothing passes at f0 = 1/(2π·R·C).
 *
 * <p>With its foot on a share k of its own output, by a follower, the notch narrows: Q = 1/(4(1 −
 * k)). Source: any network text for the balance; the bootstrapped form as in active-filter
 * handbooks (common practice).
 */
public final class TwinT {
  private TwinT() {}

  /** The frequency at which nothing passes, in hertz. */
  public static double hertz(double ohms, double farads) {
    return RcEdge.hertz(ohms, farads);
  }

  /**
   * The response at a frequency, as a plain number, without load and from a source of no
   * resistance: |1 − x²| / √((1 − x²)² + (x/Q)²), x = f/f0.
   *
   * @param ratio f/f0, at least 0
   * @param share k, from 0 and below 1
   */
  public static double response(double ratio, double share) {
    double through = Math.abs(1 - ratio * ratio);
    double damping = 4 * (1 - share) * ratio;
    return through == 0 ? 0 : through / Math.hypot(through, damping);
  }

  /**
   * The share of the output on which the foot stands for a notch of this Q: 1 − 1/(4Q).
   *
   * @param quality Q, at least a quarter, which is the plain network's
   */
  public static double share(double quality) {
    return 1 - 1 / (4 * quality);
  }

  /** The lower frequency at which the response is 3.01 dB down, over f0. */
  public static double lowerEdgeRatio(double quality) {
    double half = 1 / (2 * quality);
    return Math.hypot(1, half) - half;
  }
}
