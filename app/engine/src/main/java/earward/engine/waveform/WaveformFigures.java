package earward.engine.waveform;

import java.util.Objects;

/**
 * What the full waveform shows at one place.
 *
 * @param place its name
 * @param dcVolts mean over the audio period
 * @param audioRmsVolts fundamental of the tone, rms
 * @param distortion harmonics 2 to 10 over the fundamental; NaN where that is below 1 µV
 * @param carrierRmsVolts what there is of the carrier, rms over the audio period
 * @param secondCarrierRmsVolts the same at twice the carrier
 * @param thirdCarrierRmsVolts the same at three times the carrier
 * @param meanSquareVolts mean of the square of all that stands there, in V²; NaN unless asked for
 */
public record WaveformFigures(
    String place,
    double dcVolts,
    double audioRmsVolts,
    double distortion,
    double carrierRmsVolts,
    double secondCarrierRmsVolts,
    double thirdCarrierRmsVolts,
    double meanSquareVolts) {
  public WaveformFigures {
    Objects.requireNonNull(place);
  }
}
