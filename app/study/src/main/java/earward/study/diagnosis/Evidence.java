package earward.study.diagnosis;

import earward.study.faults.Tone;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What a builder has read and seen. A reading taken twice guards against a slip of the pen.
 *
 * @param readings by key, {@code TP3:no-signal}, in SI units, as often as each was taken
 * @param tones what is heard of the test tone, as often as it was listened to
 * @param heats whether something gets hot at rest, as often as it was felt
 */
public record Evidence(Map<String, List<Double>> readings, List<Tone> tones, List<Boolean> heats) {
  /** Nothing yet. */
  public static final Evidence NONE = new Evidence(Map.of(), List.of(), List.of());

  public Evidence {
    Map<String, List<Double>> copy = new LinkedHashMap<>();
    readings.forEach((key, values) -> copy.put(key, List.copyOf(values)));
    readings = Collections.unmodifiableMap(copy);
    tones = List.copyOf(tones);
    heats = List.copyOf(heats);
  }

  /** How many readings and observations there are. */
  public int size() {
    return readings.values().stream().mapToInt(List::size).sum() + tones.size() + heats.size();
  }

  /** How often a reading was taken. */
  public int times(String key) {
    return readings.getOrDefault(key, List.of()).size();
  }

  /** This with one reading more. */
  public Evidence with(String key, double value) {
    Map<String, List<Double>> more = new LinkedHashMap<>(readings);
    List<Double> values = new ArrayList<>(readings.getOrDefault(key, List.of()));
    values.add(value);
    more.put(key, values);
    return new Evidence(more, tones, heats);
  }

  /** This with a tone. */
  public Evidence with(Tone heard) {
    List<Tone> more = new ArrayList<>(tones);
    more.add(heard);
    return new Evidence(readings, more, heats);
  }

  /** This with what a finger feels. */
  public Evidence withHeat(boolean felt) {
    List<Boolean> more = new ArrayList<>(heats);
    more.add(felt);
    return new Evidence(readings, tones, more);
  }
}
