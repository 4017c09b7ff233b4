package earward.kit.path;

import earward.block.check.Finding;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/**
 * A kit with its figures.
 *
 * @param assembly what was solved
 * @param figures what came out; none where the assembly is not complete or nothing converged
 * @param findings of the solve
 * @param solved whether every case found its solution
 * @param deepestKnobs where the deepest modulation is worst, by slot {@code volume.track:position};
 *     empty where the knobs make no difference
 */
public record SolvedKit(
    Assembly assembly,
    Figures figures,
    List<Finding> findings,
    boolean solved,
    Map<String, Double> deepestKnobs) {
  public SolvedKit {
    Objects.requireNonNull(assembly);
    Objects.requireNonNull(figures);
    findings = List.copyOf(findings);
    deepestKnobs = Map.copyOf(deepestKnobs);
  }

  /** A kit whose knobs make no difference to the deepest modulation. */
  public SolvedKit(Assembly assembly, Figures figures, List<Finding> findings, boolean solved) {
    this(assembly, figures, findings, solved, Map.of());
  }
}
