package earward.study.faults;

import java.util.List;
import java.util.Objects;

/**
 * What the readings look like for each single fault.
 *
 * @param readings all readings that a builder may take
 * @param healthy what a healthy kit shows
 * @param groups faults that leave a trace, by what can be told apart, the probable ones first
 * @param withoutTrace faults after which a kit reads and sounds as a healthy one
 * @param faults how many faults were solved
 * @param deviations of each reading, the deviation of healthy kits as a share of it
 */
public record FaultGuide(
    List<FaultReading> readings,
    Signs healthy,
    List<FaultGroup> groups,
    List<FaultSigns> withoutTrace,
    int faults,
    List<Double> deviations) {
  public FaultGuide {
    readings = List.copyOf(readings);
    Objects.requireNonNull(healthy);
    groups = List.copyOf(groups);
    withoutTrace = List.copyOf(withoutTrace);
    deviations = List.copyOf(deviations);
  }
}
