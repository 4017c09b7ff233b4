package earward.block.law;

/**
 * Pre-emphasis curves, in decibels over the gain at DC; a receiver's de-emphasis is the negative.
 *
 * <p>Source: ITU-R BS.450 for the single time constant; NRSC-1 for the AM curve with its second
 * corner at 8.7 kHz.
 */
public final class DeEmphasis {
  /** Second corner of the North American AM curve, Hz. Source: NRSC-1. */
  public static final double SECOND_CORNER_HERTZ = 8700;

  /** Time constant of the North American AM curve, s. Source: NRSC-1. */
  public static final double NRSC_SECONDS = 75e-6;

  private DeEmphasis() {}

  /** Boost of a single time constant: 10·log10(1 + (2π·f·τ)²), in dB. */
  public static double boostDecibels(double hertz, double seconds) {
    double ratio = 2 * Math.PI * hertz * seconds;
    return 10 * Math.log10(1 + ratio * ratio);
  }

  /** Boost of the North American AM curve, in dB. */
  public static double nrscBoostDecibels(double hertz) {
    double second = hertz / SECOND_CORNER_HERTZ;
    return boostDecibels(hertz, NRSC_SECONDS) - 10 * Math.log10(1 + second * second);
  }

  /** Time constant of the second corner of the North American AM curve, s: 1/(2π·8.7 kHz). */
  public static final double NRSC_SECOND_SECONDS = 1 / (2 * Math.PI * SECOND_CORNER_HERTZ);

  /** Where a single time constant is 3.01 dB down, in hertz. */
  public static double edgeHertz(double seconds) {
    return RcEdge.ofTimeConstant(seconds);
  }

  /**
   * Where the receiver's inverse of the North American AM curve is 3.01 dB down, in hertz: f² =
   * 1/(1/fp² − 2/fz²) with its pole fp and its zero fz.
   */
  public static double nrscEdgeHertz() {
    double pole = RcEdge.ofTimeConstant(NRSC_SECONDS);
    return 1 / Math.sqrt(1 / (pole * pole) - 2 / (SECOND_CORNER_HERTZ * SECOND_CORNER_HERTZ));
  }
}
