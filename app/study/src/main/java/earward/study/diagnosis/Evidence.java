package earward.study.diagnosis;

import earward.study.faults.Tone;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;

/**
 * What a builder has read and seen.
 *
 * @param readings by key, {@code TP3:no-signal}, in SI units
 * @param tone what is heard of the test tone; empty: not listened to
 * @param hot whether something gets hot at rest; empty: not felt
 */
public record Evidence(Map<String, Double> readings, Optional<Tone> tone, Optional<Boolean> hot) {
  /** Nothing yet. */
  public static final Evidence NONE = new Evidence(Map.of(), Optional.empty(), Optional.empty());

  public Evidence {
    readings = Collections.unmodifiableMap(new LinkedHashMap<>(readings));
    Objects.requireNonNull(tone);
    Objects.requireNonNull(hot);
  }

  /** How many readings and observations there are. */
  public int size() {
    return readings.size() + (tone.isPresent() ? 1 : 0) + (hot.isPresent() ? 1 : 0);
  }

  /** This with one reading more. */
  public Evidence with(String key, double value) {
    Map<String, Double> more = new LinkedHashMap<>(readings);
    more.put(key, value);
    return new Evidence(more, tone, hot);
  }

  /** This with a tone. */
  public Evidence with(Tone heard) {
    return new Evidence(readings, Optional.of(heard), hot);
  }

  /** This with what a finger feels. */
  public Evidence withHeat(boolean felt) {
    return new Evidence(readings, tone, Optional.of(felt));
  }
}
