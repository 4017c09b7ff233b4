package earward.block.device;

/**
 * What a kit must mind about an amplifier IC beyond its figures.
 *
 * @param needsOutputNetwork whether its data sheet wants a resistor and a capacitor from the output
 *     to ground, without which it may oscillate
 * @param switching whether its output switches at a rate whose harmonics fall on the AM bands
 * @param mostInputVolts highest voltage at its input, peak; infinite where none is known
 */
public record AmplifierTraits(
    boolean needsOutputNetwork, boolean switching, double mostInputVolts) {
  /** Linear, and stable without a network. */
  public static final AmplifierTraits PLAIN =
      new AmplifierTraits(false, false, Double.POSITIVE_INFINITY);

  public AmplifierTraits {
    Require.above(0, mostInputVolts, "highest input (V)");
  }
}
