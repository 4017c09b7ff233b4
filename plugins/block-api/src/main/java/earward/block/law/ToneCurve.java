package earward.block.law;

/**
 * A curve that the response of a receiver is wanted to follow, in decibels over the gain at low
 * frequency.
 *
 * <p>Source: maximally flat second order (Butterworth 1930) for the low-pass; NRSC-1 for the North
 * American AM curve; the single time constants of ITU-R BS.450.
 *
 * @param kind which curve
 * @param cornerHertz -3 dB corner of a low-pass, above 0; not used by the others
 */
public record ToneCurve(Kind kind, double cornerHertz) {
  private static final double FIFTY_MICROSECONDS = 50e-6;
  private static final double SEVENTY_FIVE_MICROSECONDS = 75e-6;

  /** The curves, with the name of each as written in files. */
  public enum Kind {
    FLAT("flat"),
    LOW_PASS("low-pass"),
    /** De-emphasis of 75 µs with its second corner at 8.7 kHz. */
    NORTH_AMERICAN_AM("north-american-am"),
    FIFTY_MICROSECONDS("50-microseconds"),
    SEVENTY_FIVE_MICROSECONDS("75-microseconds");

    private final String key;

    Kind(String key) {
      this.key = key;
    }

    /** The name as written. */
    public String key() {
      return key;
    }
  }

  public ToneCurve {
    if (!(cornerHertz > 0)) {
      throw new IllegalArgumentException(
          "corner of the wanted curve (Hz) is " + cornerHertz + "; it must be above 0");
    }
  }

  /** No curve at all. */
  public static ToneCurve flat() {
    return new ToneCurve(Kind.FLAT, 1);
  }

  /** Flat up to a corner, then falling by 12 dB an octave. */
  public static ToneCurve lowPass(double cornerHertz) {
    return new ToneCurve(Kind.LOW_PASS, cornerHertz);
  }

  /**
   * The curve at one frequency, in dB over its value at low frequency.
   *
   * @param hertz frequency, at least 0
   */
  public double decibels(double hertz) {
    return switch (kind) {
      case FLAT -> 0;
      case LOW_PASS -> -10 * Math.log10(1 + Math.pow(hertz / cornerHertz, 4));
      case NORTH_AMERICAN_AM -> -DeEmphasis.nrscBoostDecibels(hertz);
      case FIFTY_MICROSECONDS -> -DeEmphasis.boostDecibels(hertz, FIFTY_MICROSECONDS);
      case SEVENTY_FIVE_MICROSECONDS -> -DeEmphasis.boostDecibels(hertz, SEVENTY_FIVE_MICROSECONDS);
    };
  }
}
