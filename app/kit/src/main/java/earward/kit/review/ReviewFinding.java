package earward.kit.review;

import earward.block.check.Finding;
import java.util.List;
import java.util.Objects;

/**
 * A finding of a review with what would clear it.
 *
 * @param finding what was found
 * @param remedies proven edits, best first; empty where none was looked for or found
 */
public record ReviewFinding(Finding finding, List<Remedy> remedies) {
  public ReviewFinding {
    Objects.requireNonNull(finding);
    remedies = List.copyOf(remedies);
  }
}
