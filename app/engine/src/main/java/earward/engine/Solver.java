package earward.engine;

import earward.engine.internal.Run;

/**
 * Solves one compiled circuit. For one thread. Every solve starts from the solution of the nominal
 * kit, so that no former row leaves a trace.
 */
public final class Solver {
  private final CompiledCircuit compiled;
  private final Run run;

  Solver(CompiledCircuit compiled, Run run) {
    this.compiled = compiled;
    this.run = run;
  }

  /**
   * Solves all cases.
   *
   * @param values a row of values, one for each slot
   * @param figures receives the figures, NaN for one that does not exist
   * @throws IllegalArgumentException when a row has the wrong length
   */
  public SolveOutcome solve(double[] values, double[] figures) {
    if (figures.length != compiled.figures().size()) {
      throw new IllegalArgumentException(
          "the row of figures has "
              + figures.length
              + " places; wanted "
              + compiled.figures().size());
    }
    return run.solve(values, figures);
  }
}
