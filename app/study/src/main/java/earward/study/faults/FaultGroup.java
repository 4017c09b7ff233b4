package earward.study.faults;

import java.util.List;
import java.util.Objects;

/**
 * Faults that a builder cannot tell apart with their bench.
 *
 * @param number from 1, the probable groups first
 * @param faults the probable ones first
 * @param signs what the first of them shows
 * @param tells keys of the readings and observations that differ from those of a healthy kit
 */
public record FaultGroup(int number, List<FaultSigns> faults, Signs signs, List<String> tells) {
  public FaultGroup {
    faults = List.copyOf(faults);
    Objects.requireNonNull(signs);
    tells = List.copyOf(tells);
  }

  /** Probability that it is one of these, given that there is one fault. */
  public double prior() {
    return faults.stream().mapToDouble(each -> each.fault().prior()).sum();
  }
}
