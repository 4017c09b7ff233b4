package earward.kit.design;

/**
 * One point of the front end's response to a sideband.
 *
 * @param offsetHertz distance from the carrier, above 0
 * @param decibels response relative to the carrier
 */
public record SidebandPoint(double offsetHertz, double decibels) {
  public SidebandPoint {
    if (!(offsetHertz > 0) || Double.isInfinite(offsetHertz)) {
      throw new IllegalArgumentException(
          "a sideband stands " + offsetHertz + " Hz from the carrier; wanted above 0 Hz");
    }
    if (!Double.isFinite(decibels)) {
      throw new IllegalArgumentException("a sideband response is " + decibels + " dB");
    }
  }
}
