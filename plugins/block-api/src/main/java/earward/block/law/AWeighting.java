package earward.block.law;

/**
 * The weighting curve A of a sound level meter, by which noise is judged about as loud as it is
 * heard.
 *
 * <p>Source: IEC 61672-1, design goals of frequency weighting A with its four pole frequencies.
 */
public final class AWeighting {
  private static final double FIRST_HERTZ = 20.598997;
  private static final double SECOND_HERTZ = 107.65265;
  private static final double THIRD_HERTZ = 737.86223;
  private static final double FOURTH_HERTZ = 12194.217;

  /** The curve is 0 dB at 1 kHz, exactly. */
  private static final double AT_ONE_KILOHERTZ = bare(1000);

  private AWeighting() {}

  /**
   * Weight as a plain factor of voltage or sound pressure: 1 at 1 kHz.
   *
   * @param hertz frequency, above 0
   */
  public static double factor(double hertz) {
    return bare(hertz) / AT_ONE_KILOHERTZ;
  }

  /**
   * Weight in decibels: 0 at 1 kHz.
   *
   * @param hertz frequency, above 0
   */
  public static double decibels(double hertz) {
    return 20 * Math.log10(factor(hertz));
  }

  private static double bare(double hertz) {
    double square = hertz * hertz;
    return FOURTH_HERTZ
        * FOURTH_HERTZ
        * square
        * square
        / ((square + FIRST_HERTZ * FIRST_HERTZ)
            * Math.sqrt(
                (square + SECOND_HERTZ * SECOND_HERTZ) * (square + THIRD_HERTZ * THIRD_HERTZ))
            * (square + FOURTH_HERTZ * FOURTH_HERTZ));
  }
}
