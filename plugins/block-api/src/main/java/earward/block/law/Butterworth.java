package earward.block.law;

/**
 * Maximally flat low-pass filters of unity gain with equal resistors: each capacitance is a figure
 * of its place over ω0·R.
 *
 * <p>Second order, from input: R, node with the feedback capacitor from the output, R, input of the
 * follower with the capacitor to ground. Third order: R and a capacitor to ground go before it.
 *
 * <p>Source: Sallen and Key 1955; the figures of the third order as printed in filter handbooks
 * (3.546, 1.392, 0.2024), here from their equations y³ − 2y² + 3y − 3 = 0, x = (2 − y)/3 and
 * 1/(x·y), which ask for the denominator s³ + 2s² + 2s + 1.
 */
public final class Butterworth {
  /** Second order: the capacitor from the output. */
  public static final double SECOND_FEEDBACK = Math.sqrt(2);

  /** Second order: the capacitor at the follower's input. */
  public static final double SECOND_INPUT = Math.sqrt(0.5);

  /** Third order: the capacitor of the first section, to ground. */
  public static final double THIRD_FIRST = 1.392647;

  /** Third order: the capacitor at the follower's input, to ground. */
  public static final double THIRD_INPUT = (2 - THIRD_FIRST) / 3;

  /** Third order: the capacitor from the output. */
  public static final double THIRD_FEEDBACK = 1 / (THIRD_FIRST * THIRD_INPUT);

  private Butterworth() {}

  /**
   * A capacitance, in farads.
   *
   * @param figure one of the constants of this class
   * @param ohms R, above 0
   * @param cornerHertz where the response is 3.01 dB down, above 0
   */
  public static double farads(double figure, double ohms, double cornerHertz) {
    return figure / (2 * Math.PI * cornerHertz * ohms);
  }

  /**
   * Response in decibels over that at DC: −10·log10(1 + (f/fc)^2n).
   *
   * @param order n, at least 1
   * @param cornerRatio f/fc, at least 0
   */
  public static double decibels(int order, double cornerRatio) {
    return -10 * Math.log10(1 + Math.pow(cornerRatio, 2.0 * order));
  }
}
