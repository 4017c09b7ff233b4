package earward.study.faults;

import java.util.List;
import java.util.Objects;

/**
 * What a kit shows.
 *
 * @param readings in the order of the guide's readings; NaN where there is no prediction
 * @param tone what is heard of the test tone
 * @param hot whether something gets hot at rest
 */
public record Signs(List<Double> readings, Tone tone, boolean hot) {
  public Signs {
    readings = List.copyOf(readings);
    Objects.requireNonNull(tone);
  }
}
