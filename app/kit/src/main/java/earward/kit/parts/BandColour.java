package earward.kit.parts;

/**
 * A colour of the resistor code.
 *
 * <p>Source: IEC 60062 (from memory).
 */
public enum BandColour {
  PINK(-1, -3),
  SILVER(-1, -2),
  GOLD(-1, -1),
  BLACK(0, 0),
  BROWN(1, 1),
  RED(2, 2),
  ORANGE(3, 3),
  YELLOW(4, 4),
  GREEN(5, 5),
  BLUE(6, 6),
  VIOLET(7, 7),
  GREY(8, 8),
  WHITE(9, 9);

  private final int digit;
  private final int exponent;

  BandColour(int digit, int exponent) {
    this.digit = digit;
    this.exponent = exponent;
  }

  static BandColour ofDigit(int digit) {
    for (BandColour colour : values()) {
      if (colour.digit == digit) {
        return colour;
      }
    }
    throw new IllegalArgumentException("no digit: " + digit);
  }

  static BandColour ofExponent(int exponent) {
    for (BandColour colour : values()) {
      if (colour.exponent == exponent) {
        return colour;
      }
    }
    throw new IllegalArgumentException("no multiplier: 10^" + exponent);
  }
}
