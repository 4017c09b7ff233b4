package earward.block.law;

/**
 * A sine that is clipped hard and evenly at both sides.
 *
 * <p>Source: Fourier series of the symmetrically clipped sine; total power over that of the sine
 * which just touches the clip level.
 */
public final class ClippedSine {
  private ClippedSine() {}

  /**
   * Total harmonic distortion.
   *
   * @param overdrive drive peak over clip level, at least 1
   * @return harmonics over fundamental, as a share of 1
   */
  public static double distortion(double overdrive) {
    double fundamental = fundamental(overdrive);
    double fundamentalPower = fundamental * fundamental / 2;
    return Math.sqrt(Math.max(0, meanSquare(overdrive) - fundamentalPower) / fundamentalPower);
  }

  /** Total power over that of the sine which just touches the clip level. */
  public static double powerRatio(double overdrive) {
    return 2 * meanSquare(overdrive);
  }

  /**
   * Drive peak over clip level at which a distortion is reached.
   *
   * @param distortion a share of 1, from 0 to 0.4
   */
  public static double overdriveOf(double distortion) {
    double low = 1;
    double high = 50;
    for (int i = 0; i < 80; i++) {
      double middle = (low + high) / 2;
      if (distortion(middle) < distortion) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }

  /** Power at 10 % distortion over power at the edge of clipping: 1.288. */
  public static double tenPercentRatio() {
    return powerRatio(overdriveOf(0.10));
  }

  /** Fundamental peak over the clip level. */
  private static double fundamental(double overdrive) {
    double angle = Math.asin(1 / overdrive);
    return 2
        / Math.PI
        * (overdrive * (angle - Math.sin(angle) * Math.cos(angle)) + 2 * Math.cos(angle));
  }

  /** Mean square over the clip level's square. */
  private static double meanSquare(double overdrive) {
    double angle = Math.asin(1 / overdrive);
    double inside = overdrive * overdrive * (angle / 2 - Math.sin(2 * angle) / 4);
    return 2 / Math.PI * (inside + Math.PI / 2 - angle);
  }
}
