package earward.block.device;

import java.util.List;
import java.util.Objects;

/**
 * An audio power amplifier IC by its data.
 *
 * <p>At rest each output stands at restFraction·Vs + restVolts. The signal is added to OUTPUT and,
 * in a bridge, half of it to OUTPUT and half of it inverted to OUTPUT_TWO.
 *
 * @param name part type
 * @param bridge whether the load hangs between two outputs
 * @param gain what sets gain and band
 * @param swing how near the output comes to its rails
 * @param ratings what it bears
 * @param quiescentAmperes supply current at rest, at least 0
 * @param restFraction share of the supply at which the output rests, from 0 to 1
 * @param restVolts what is added to that share
 * @param inputOhms input resistance, above 0
 * @param biasAmperes current out of the input pin, at least 0
 * @param rippleRejectionDecibels supply ripple over what of it appears at the output, with the data
 *     sheet's capacitor at RIPPLE
 * @param rippleRejectionBareDecibels the same with nothing at RIPPLE
 * @param noiseVolts rms noise at the input over 22 Hz to 22 kHz, at least 0
 * @param packageName for instance DIP-8
 * @param pins the pins, each terminal that the type has exactly once or more (several grounds)
 * @param traits what else a kit must mind
 */
public record AmplifierModel(
    String name,
    boolean bridge,
    AmplifierGain gain,
    OutputSwing swing,
    AmplifierRatings ratings,
    double quiescentAmperes,
    double restFraction,
    double restVolts,
    double inputOhms,
    double biasAmperes,
    double rippleRejectionDecibels,
    double rippleRejectionBareDecibels,
    double noiseVolts,
    String packageName,
    List<Pin> pins,
    AmplifierTraits traits)
    implements PartModel {
  public AmplifierModel {
    Require.named(name, "amplifier");
    Require.notNegative(10, quiescentAmperes, name + ": quiescent current (A)");
    Require.within(0, 1, restFraction, name + ": rest voltage as a share of the supply");
    Require.within(-100, 100, restVolts, name + ": rest voltage beside that share (V)");
    Require.positive(1e12, inputOhms, name + ": input resistance (Ω)");
    Require.notNegative(1, biasAmperes, name + ": input bias current (A)");
    Require.notNegative(1, noiseVolts, name + ": input noise (V)");
    Require.notNegative(200, rippleRejectionBareDecibels, name + ": ripple rejection (dB)");
    Require.atLeast(
        rippleRejectionBareDecibels, rippleRejectionDecibels, name + ": ripple rejection (dB)");
    Objects.requireNonNull(traits);
    pins = List.copyOf(pins);
    for (Terminal needed :
        List.of(Terminal.INPUT, Terminal.OUTPUT, Terminal.SUPPLY, Terminal.GROUND)) {
      if (!has(pins, needed)) {
        throw new IllegalArgumentException(name + " has no pin for " + needed);
      }
    }
    if (bridge != has(pins, Terminal.OUTPUT_TWO)) {
      throw new IllegalArgumentException(
          name + ": a bridge amplifier, and only that, has a pin for OUTPUT_TWO");
    }
    if (gain.setFromOutside() && !has(pins, Terminal.GAIN)) {
      throw new IllegalArgumentException(name + ": its gain is set from outside, so it has GAIN");
    }
  }

  /** A linear amplifier that is stable without a network at its output. */
  public AmplifierModel(
      String name,
      boolean bridge,
      AmplifierGain gain,
      OutputSwing swing,
      AmplifierRatings ratings,
      double quiescentAmperes,
      double restFraction,
      double restVolts,
      double inputOhms,
      double biasAmperes,
      double rippleRejectionDecibels,
      double rippleRejectionBareDecibels,
      double noiseVolts,
      String packageName,
      List<Pin> pins) {
    this(
        name,
        bridge,
        gain,
        swing,
        ratings,
        quiescentAmperes,
        restFraction,
        restVolts,
        inputOhms,
        biasAmperes,
        rippleRejectionDecibels,
        rippleRejectionBareDecibels,
        noiseVolts,
        packageName,
        pins,
        AmplifierTraits.PLAIN);
  }

  private static boolean has(List<Pin> pins, Terminal terminal) {
    return pins.stream().anyMatch(pin -> pin.terminal() == terminal);
  }

  /** Whether the type has a pin of this kind. */
  public boolean has(Terminal terminal) {
    return has(pins, terminal);
  }

  @Override
  public PartKind kind() {
    return PartKind.AMPLIFIER;
  }
}
