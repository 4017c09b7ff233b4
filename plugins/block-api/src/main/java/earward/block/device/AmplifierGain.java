package earward.block.device;

import java.util.List;

/**
 * What sets an amplifier's gain and its band.
 *
 * <p>Fixed gain: signal = gain · input. Set from outside: {@code feedbackOhms} stands inside the IC
 * between OUTPUT and GAIN, and the parts from GAIN to ground make it 1 + feedbackOhms/Zgain.
 *
 * @param fixedGain gain of the whole output (both outputs of a bridge), above 1; not used where the
 *     gain is set from outside
 * @param feedbackOhms internal feedback resistor, above 0, infinite where the gain is fixed
 * @param openLoopGain gain without feedback, above 1
 * @param bandwidthHertz upper edge (-3 dB) without a compensation capacitor, above 0
 * @param compensationHertzFarad upper edge times compensation capacitance, 0 where there is no pin
 * @param control gain against control voltage, ascending; empty where there is no control pin
 */
public record AmplifierGain(
    double fixedGain,
    double feedbackOhms,
    double openLoopGain,
    double bandwidthHertz,
    double compensationHertzFarad,
    List<ControlPoint> control) {
  public AmplifierGain {
    Require.positive(1e6, fixedGain, "fixed gain");
    Require.above(0, feedbackOhms, "internal feedback resistor (Ω)");
    Require.above(1, openLoopGain, "open-loop gain");
    Require.atMost(1e9, openLoopGain, "open-loop gain");
    Require.positive(1e9, bandwidthHertz, "bandwidth (Hz)");
    Require.atLeast(0, compensationHertzFarad, "bandwidth times capacitance (Hz·F)");
    control = List.copyOf(control);
    for (int i = 1; i < control.size(); i++) {
      Require.above(
          control.get(i - 1).controlVolts(), control.get(i).controlVolts(), "control voltage (V)");
    }
  }

  /** Whether parts outside the IC set the gain. */
  public boolean setFromOutside() {
    return Double.isFinite(feedbackOhms);
  }
}
