package earward.study.batch;

import earward.engine.Solver;

/** One thread's solver with its rows. */
final class KitRun {
  private final BatchPlan plan;
  private final Solver solver;
  private final double[] values;
  private final double[] row;

  KitRun(BatchPlan plan) {
    this.plan = plan;
    solver = plan.kit().circuit().newSolver();
    values = new double[plan.kit().circuit().slots().size()];
    row = new double[plan.kit().circuit().figures().size()];
  }

  /** Readings and checks' figures of a kit; an empty row where it has no solution. */
  double[] solve(long seed, long kit) {
    plan.draw().draw(seed, kit, values);
    return solved();
  }

  /** The same of the nominal kit. */
  double[] nominal() {
    System.arraycopy(plan.draw().nominal(), 0, values, 0, values.length);
    return solved();
  }

  private double[] solved() {
    return solver.solve(values, row).solved() ? plan.figures(row) : new double[0];
  }
}
