package earward.engine.detection;

/**
 * Powers of one exponent, for arguments of a quarter to some billions: two to the exponent times
 * the argument's own, the power of the nearest of 128 mantissas, and the binomial series of what is
 * left (to the sixth term, below rounding). Mutable, for one thread.
 */
final class PowerTable {
  private static final int BITS = 7;
  private static final int INTERVALS = 1 << BITS;
  private static final int MANTISSA_BITS = 52;
  private static final int BIAS = 1023;
  private static final int LEAST = -2;
  private static final int SCALES = 34;
  private static final long MANTISSA = (1L << MANTISSA_BITS) - 1;
  private static final long ONE = (long) BIAS << MANTISSA_BITS;

  private final double[] middlePower = new double[INTERVALS];
  private final double[] inverseMiddle = new double[INTERVALS];
  private final double[] scale = new double[SCALES];
  private double exponent = Double.NaN;
  private double first;
  private double second;
  private double third;
  private double fourth;
  private double fifth;
  private double sixth;

  /** Sets the exponent; nothing to do where it stays. */
  void set(double wanted) {
    if (wanted == exponent) {
      return;
    }
    exponent = wanted;
    for (int i = 0; i < INTERVALS; i++) {
      double middle = 1 + (i + 0.5) / INTERVALS;
      middlePower[i] = Math.pow(middle, wanted);
      inverseMiddle[i] = 1 / middle;
    }
    for (int e = 0; e < SCALES; e++) {
      scale[e] = Math.pow(2, wanted * (e + LEAST));
    }
    first = wanted;
    second = first * (wanted - 1) / 2;
    third = second * (wanted - 2) / 3;
    fourth = third * (wanted - 3) / 4;
    fifth = fourth * (wanted - 4) / 5;
    sixth = fifth * (wanted - 5) / 6;
  }

  /** The power of an argument above 0. */
  double of(double argument) {
    long bits = Double.doubleToRawLongBits(argument);
    int power = (int) (bits >>> MANTISSA_BITS) - BIAS - LEAST;
    if (power < 0 || power >= SCALES) {
      return Math.pow(argument, exponent);
    }
    int i = (int) (bits >>> (MANTISSA_BITS - BITS)) & (INTERVALS - 1);
    double d = Double.longBitsToDouble((bits & MANTISSA) | ONE) * inverseMiddle[i] - 1;
    double series =
        1 + d * (first + d * (second + d * (third + d * (fourth + d * (fifth + d * sixth)))));
    return scale[power] * middlePower[i] * series;
  }
}
