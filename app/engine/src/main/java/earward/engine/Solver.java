package earward.engine;

import java.util.Arrays;
import java.util.List;

/** Solves one compiled circuit. For one thread; allocates nothing when it succeeds. */
public final class Solver {
  private final CompiledCircuit compiled;

  Solver(CompiledCircuit compiled) {
    this.compiled = compiled;
  }

  /**
   * Solves all cases.
   *
   * @param values a row of values, one for each slot
   * @param figures receives the figures, NaN for one that does not exist
   */
  public SolveOutcome solve(double[] values, double[] figures) {
    if (figures.length != compiled.figures().size()) {
      throw new IllegalArgumentException("the row of figures has the wrong length");
    }
    Arrays.fill(figures, Double.NaN);
    return new SolveOutcome(false, List.of());
  }
}
