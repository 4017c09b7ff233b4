package earward.kit.path;

import earward.block.check.Finding;
import java.util.List;
import java.util.Objects;

/**
 * A kit with its figures.
 *
 * @param assembly what was solved
 * @param figures what came out; none where the assembly is not complete or nothing converged
 * @param findings of the solve
 * @param solved whether every case found its solution
 */
public record SolvedKit(
    Assembly assembly, Figures figures, List<Finding> findings, boolean solved) {
  public SolvedKit {
    Objects.requireNonNull(assembly);
    Objects.requireNonNull(figures);
    findings = List.copyOf(findings);
  }
}
