package earward.engine.detection;

/**
 * From a start near by, carrier cycles and audio balance in one Newton iteration: every cycle is
 * stepped once, its answer to first order goes into the balance, and the balance's step moves all
 * of them. The matrix of the balance is that of the nominal solution, bettered by Broyden's
 * rank-one updates (Broyden 1965, in the form of Kelley 1995 that keeps only the steps), so that a
 * kit near the nominal one needs no elimination of its own; where that does not converge quickly
 * the matrix is made anew.
 *
 * <p>Works on the rows of the solver that owns it; gives up rather than damp.
 */
final class JointNewton {
  private static final int MOST_ITERATIONS = 24;

  /** Steps that a matrix is bettered by before it is made anew. */
  private static final int MOST_STEPS = 8;

  /** A step that shrinks by less than this asks for a new matrix. */
  private static final double SLOW = 0.4;

  private final EnvelopeSolver owner;
  private final DenseSolver kept;
  private final DenseSolver fresh;
  private final double[] rows;
  private final double[] savedState;
  private final double[] savedJunctions;
  private final double[] step;
  private final double[][] steps = new double[MOST_STEPS][];
  private final double[] squares = new double[MOST_STEPS];
  private int taken;
  private int keptSize;

  JointNewton(EnvelopeSolver owner, int unknowns) {
    this.owner = owner;
    kept = new DenseSolver(unknowns);
    fresh = owner.solver;
    rows = new double[owner.samples * owner.cycle.rowLength()];
    savedState = new double[unknowns];
    savedJunctions = new double[owner.junctions.length];
    step = new double[unknowns];
    for (int i = 0; i < MOST_STEPS; i++) {
      steps[i] = new double[unknowns];
    }
  }

  /** Keeps the matrix at the solution that the owner holds. */
  void keep(CarrierSurroundings around) {
    owner.balance.assemble(around, owner.slopes, kept);
    keptSize = kept.factor() ? owner.balance.size(around) : 0;
  }

  /** Puts back what {@link #solve} started from. */
  void undo() {
    System.arraycopy(savedState, 0, owner.state, 0, savedState.length);
    System.arraycopy(savedJunctions, 0, owner.junctions, 0, savedJunctions.length);
  }

  /** Solves from where the owner stands; false where that led nowhere. */
  boolean solve(
      CarrierSurroundings around, double peakVolts, double depth, double toneRadians, int count) {
    System.arraycopy(owner.state, 0, savedState, 0, savedState.length);
    System.arraycopy(owner.junctions, 0, savedJunctions, 0, savedJunctions.length);
    owner.balance.begin(around, peakVolts, depth, toneRadians, count);
    int size = owner.balance.size(around);
    double enough = 1e-11 * peakVolts + 1e-13;
    DenseSolver matrix = size == keptSize ? kept : fresh;
    boolean made = matrix == kept;
    double former = Double.POSITIVE_INFINITY;
    taken = 0;
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      if (!linearise(around, count)) {
        return false;
      }
      double off =
          owner.balance.residuals(
              around, owner.state, owner.meanAmperes, owner.drawn, owner.stored);
      if (!(off < 1e9)) {
        return false;
      }
      if (!made) {
        owner.balance.assemble(around, owner.slopes, fresh);
        matrix = fresh;
        taken = 0;
        if (!fresh.factor()) {
          return false;
        }
      }
      direct(matrix, size);
      double largest = move(size, count);
      if (largest < enough) {
        correct(around, count);
        return true;
      }
      made = taken < MOST_STEPS && largest < SLOW * former;
      former = largest;
    }
    return false;
  }

  private boolean linearise(CarrierSurroundings around, int count) {
    int ports = owner.cycle.ports;
    int wide = owner.cycle.ports * owner.cycle.samples;
    for (int s = 0; s < count; s++) {
      double real = around.tuned ? owner.state[ports * count + s] : owner.balance.envelope[s];
      double imaginary = around.tuned ? owner.state[(ports + 1) * count + s] : 0;
      int row = s * owner.cycle.rowLength();
      if (!owner.cycle.linearise(
          around, owner.state, s, count, real, imaginary, owner.junctions, s * wide, rows, row)) {
        return false;
      }
      owner.keep(around, s, count, real, imaginary);
    }
    return true;
  }

  /** The next step: the matrix's own, bettered by all steps taken since it was made. */
  private void direct(DenseSolver matrix, int size) {
    System.arraycopy(owner.balance.residual, 0, step, 0, size);
    matrix.solve(step, 0);
    for (int i = 0; i < size; i++) {
      step[i] = -step[i];
    }
    for (int k = 0; k + 1 < taken; k++) {
      double share = dot(steps[k], step, size) / squares[k];
      for (int i = 0; i < size; i++) {
        step[i] += share * steps[k + 1][i];
      }
    }
    if (taken > 0) {
      double share = dot(steps[taken - 1], step, size) / squares[taken - 1];
      double scale = 1 / Math.max(0.2, 1 - share);
      for (int i = 0; i < size; i++) {
        step[i] *= scale;
      }
    }
    if (taken < MOST_STEPS) {
      System.arraycopy(step, 0, steps[taken], 0, size);
      squares[taken] = Math.max(Double.MIN_NORMAL, dot(step, step, size));
    }
    taken++;
  }

  private static double dot(double[] one, double[] other, int size) {
    double sum = 0;
    for (int i = 0; i < size; i++) {
      sum += one[i] * other[i];
    }
    return sum;
  }

  /** Takes the step at every sample; returns the largest change of a voltage. */
  private double move(int size, int count) {
    double largest = 0;
    for (int i = 0; i < size; i++) {
      owner.state[i] += step[i];
      largest = Math.max(largest, Math.abs(step[i]));
      step[i] = -step[i];
    }
    for (int i = size; i < step.length; i++) {
      step[i] = 0;
    }
    int wide = owner.cycle.ports * owner.cycle.samples;
    for (int s = 0; s < count; s++) {
      int row = s * owner.cycle.rowLength();
      double here = owner.cycle.move(owner.junctions, s * wide, rows, row, step, s, count);
      largest = Math.max(largest, here);
    }
    return largest;
  }

  /** Adds to the means and the fundamentals what the last step changed in them. */
  private void correct(CarrierSurroundings around, int count) {
    int ports = owner.cycle.ports;
    int blocks = ports + 2;
    int used = around.tuned ? blocks : ports;
    for (int s = 0; s < count; s++) {
      for (int b = 0; b < used; b++) {
        double change = -step[b * count + s];
        for (int p = 0; p < ports; p++) {
          owner.meanAmperes[p * count + s] += owner.slopes[(s * blocks + p) * blocks + b] * change;
        }
      }
      if (around.tuned) {
        owner.feedReal[s] = owner.state[ports * count + s];
        owner.feedImaginary[s] = owner.state[(ports + 1) * count + s];
      }
    }
  }
}
