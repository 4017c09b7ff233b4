package earward.kit.review;

import earward.block.check.Severity;
import earward.kit.path.Figures;
import earward.kit.path.SolvedKit;
import java.util.List;
import java.util.Objects;

/**
 * A solved kit with all that was found: on assembling, on solving, and by its checks.
 *
 * @param solved the kit
 * @param findings the weightiest first, nothing twice
 */
public record ReviewedKit(SolvedKit solved, List<ReviewFinding> findings) {
  public ReviewedKit {
    Objects.requireNonNull(solved);
    findings = List.copyOf(findings);
  }

  /** The figures. */
  public Figures figures() {
    return solved.figures();
  }

  /** Whether any finding says: do not build this. */
  public boolean doNotBuild() {
    return findings.stream().anyMatch(f -> f.finding().severity() == Severity.STOP);
  }
}
