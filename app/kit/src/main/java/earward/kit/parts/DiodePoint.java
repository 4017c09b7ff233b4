package earward.kit.parts;

/**
 * One point of a diode's forward curve at 25 °C, from a data sheet or from the bench.
 *
 * @param volts across the diode, above 0
 * @param amperes through it, above 0
 * @param typical whether it is a typical point; otherwise the voltage is the highest of any
 *     specimen
 */
public record DiodePoint(double volts, double amperes, boolean typical) {
  public DiodePoint {
    requirePositive(volts, "forward voltage (V)");
    requirePositive(amperes, "forward current (A)");
  }

  private static void requirePositive(double value, String what) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(
          "the " + what + " of a point is " + value + "; it must be above 0");
    }
  }
}
