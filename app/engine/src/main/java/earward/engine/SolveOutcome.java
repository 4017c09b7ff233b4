package earward.engine;

import earward.block.check.Finding;
import java.util.List;

/**
 * How a solve went.
 *
 * @param solved whether every case found its solution
 * @param findings what went wrong or is worth knowing, case by case
 */
public record SolveOutcome(boolean solved, List<Finding> findings) {
  public SolveOutcome {
    findings = List.copyOf(findings);
  }
}
