package earward.engine.waveform;

import java.util.List;

/**
 * What is to be run.
 *
 * @param carrierHertz the carrier
 * @param peakVolts its peak at no load
 * @param depth of its modulation, 0 for none
 * @param toneHertz the tone wanted; the nearest whole fraction of the carrier is run
 * @param tankOhms Rp of a tuned feed; NaN for an untuned one
 * @param tankFarads its C; NaN for an untuned one
 * @param detuningRadians by how much its peak lies above the carrier, in rad/s
 * @param peaked whether a tuned feed is peaked on the carrier first, devices in place; otherwise
 *     its own resonance is the carrier
 * @param places what is measured
 * @param squares whether mean squares are wanted, which cost time
 */
public record WaveformTask(
    double carrierHertz,
    double peakVolts,
    double depth,
    double toneHertz,
    double tankOhms,
    double tankFarads,
    double detuningRadians,
    boolean peaked,
    List<WaveformPlace> places,
    boolean squares) {
  public WaveformTask {
    places = List.copyOf(places);
    if (!(carrierHertz > 0 && toneHertz > 0 && carrierHertz >= 2 * toneHertz)) {
      throw new IllegalArgumentException(
          "the carrier is "
              + carrierHertz
              + " Hz and the tone "
              + toneHertz
              + " Hz; wanted is a carrier of at least twice the tone");
    }
  }

  /** Carrier cycles in a period of the tone that is run. */
  public int cycles() {
    return (int) Math.round(carrierHertz / toneHertz);
  }

  boolean tuned() {
    return !Double.isNaN(tankOhms);
  }
}
