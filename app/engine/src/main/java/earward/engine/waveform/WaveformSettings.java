package earward.engine.waveform;

import java.util.List;

/**
 * What is wanted of a full waveform.
 *
 * @param places probes or nodes to be measured
 * @param peaked whether a tuned feed is peaked on the carrier first, as a builder does it, devices
 *     in place; otherwise its winding alone resonates at the carrier
 * @param squares whether mean squares are wanted, which cost time
 */
public record WaveformSettings(List<String> places, boolean peaked, boolean squares) {
  public WaveformSettings {
    places = List.copyOf(places);
  }

  /** The usual: peaked, no squares. */
  public static WaveformSettings of(List<String> places) {
    return new WaveformSettings(places, true, false);
  }
}
