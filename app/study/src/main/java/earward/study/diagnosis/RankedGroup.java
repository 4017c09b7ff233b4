package earward.study.diagnosis;

import earward.study.faults.FaultGroup;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * How well a group of faults explains the evidence.
 *
 * @param group the group; empty: no fault, or one that leaves no trace
 * @param probability from 0 to 1; all of a diagnosis add up to 1
 * @param fits readings and observations that agree with it
 * @param misfits keys of those that do not
 */
public record RankedGroup(
    Optional<FaultGroup> group, double probability, int fits, List<String> misfits) {
  public RankedGroup {
    Objects.requireNonNull(group);
    misfits = List.copyOf(misfits);
  }
}
