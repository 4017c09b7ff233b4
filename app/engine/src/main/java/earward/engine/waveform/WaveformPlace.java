package earward.engine.waveform;

import java.util.Objects;

/**
 * A place to be measured.
 *
 * @param name of the place
 * @param plus node of the red lead, −1 for ground
 * @param minus node of the black lead
 */
public record WaveformPlace(String name, int plus, int minus) {
  public WaveformPlace {
    Objects.requireNonNull(name);
  }
}
