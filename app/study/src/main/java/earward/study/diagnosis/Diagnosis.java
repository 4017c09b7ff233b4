package earward.study.diagnosis;

import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * What a builder's readings say.
 *
 * @param ranked all groups, the probable ones first
 * @param next key of the reading most worth taking; empty where none would tell more
 */
public record Diagnosis(List<RankedGroup> ranked, Optional<String> next) {
  public Diagnosis {
    ranked = List.copyOf(ranked);
    Objects.requireNonNull(next);
  }

  /** Whether no fault is the best explanation. */
  public boolean healthy() {
    return !ranked.isEmpty() && ranked.get(0).group().isEmpty();
  }
}
