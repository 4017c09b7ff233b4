package earward.engine.internal;

import earward.engine.law.DirectStage;
import earward.engine.law.Law;
import java.util.Arrays;

/**
 * The DC point of a circuit, by Newton's method on the equations of modified nodal analysis (Ho,
 * Ruehli, Brennan 1975). Steps into exponentials are shortened by the laws themselves; where that
 * does not suffice the sources are walked up from nothing. Judged by residuals against the currents
 * that they are the difference of. Mutable, for one thread.
 */
final class DirectSolver {
  private static final int MOST_ITERATIONS = 60;
  private static final double SURE = 1e-11;
  private static final double GOOD = 1e-8;

  /** Share that one step leaves of a residual where the matrix has not changed by it. */
  private static final double SAME = 1e-10;

  private static final double LEAST_AMPERES = 1e-13;

  private final Network network;
  private final DirectStage stage;
  private final double[] step;
  private final double[] kept;
  private final double[] before;
  private int worst;

  DirectSolver(Network network) {
    this.network = network;
    stage =
        new DirectStage(
            network.nodes,
            network.size,
            network.ports.length,
            network.amplifiers.length,
            network.diodes);
    step = new double[network.size];
    kept = new double[network.size];
    before = new double[network.size];
  }

  DirectStage stage() {
    return stage;
  }

  /** Remembers the present point as the start of later solves. */
  void keep() {
    System.arraycopy(stage.solution(), 0, kept, 0, kept.length);
  }

  /** Goes back to the point that was kept. */
  void recall() {
    System.arraycopy(kept, 0, stage.solution(), 0, kept.length);
  }

  /** Goes back to nothing. */
  void forget() {
    Arrays.fill(stage.solution(), 0);
  }

  /** Where the equations were furthest from being met when the last solve failed. */
  String worst() {
    return network.nameOf(worst);
  }

  /**
   * Solves with the state that the stage holds, from the point where it is.
   *
   * @return whether it converged; then the stage's matrix holds the factors at the point
   */
  boolean solve() {
    for (Law law : network.laws) {
      law.prepare(stage);
    }
    stage.continuation(1, DirectStage.FLOOR_SIEMENS);
    return newton() || bySources();
  }

  private boolean bySources() {
    Arrays.fill(stage.solution(), 0);
    double share = 0;
    double grow = 0.1;
    for (int tries = 0; tries < 60; tries++) {
      double next = Math.min(1, share + grow);
      System.arraycopy(stage.solution(), 0, before, 0, before.length);
      stage.continuation(next, DirectStage.FLOOR_SIEMENS);
      if (newton()) {
        share = next;
        grow *= 1.6;
        if (share == 1) {
          return true;
        }
      } else {
        System.arraycopy(before, 0, stage.solution(), 0, before.length);
        grow /= 3;
      }
    }
    return false;
  }

  private boolean newton() {
    double former = Double.POSITIVE_INFINITY;
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      // where one step met the equations by so much, the factors are those of the point as well
      if (iteration > 0) {
        double off = residual();
        if (off <= SURE && off <= SAME * former) {
          return true;
        }
      }
      stamp(true);
      double off = off();
      if (!stage.matrix().factor()) {
        return false;
      }
      if (off <= SURE || (iteration > 25 && off <= GOOD)) {
        return true;
      }
      former = off;
      if (Double.isNaN(correct())) {
        return false;
      }
    }
    return false;
  }

  /** How far the equations are from being met at the present point; the factors stay. */
  double residual() {
    stamp(false);
    return off();
  }

  /** Whether a residual is that of rounding. */
  static boolean sure(double residual) {
    return residual <= SURE;
  }

  /** Makes the factors anew at the present point. */
  boolean factor() {
    stamp(true);
    return stage.matrix().factor();
  }

  /**
   * Takes the step that the present residual and factors ask for.
   *
   * @return the largest change of an unknown; NaN where there is no such step
   */
  double correct() {
    double[] x = stage.solution();
    System.arraycopy(stage.residual(), 0, step, 0, step.length);
    stage.matrix().solve(step);
    for (int i = 0; i < x.length; i++) {
      step[i] = x[i] - step[i];
      if (!Double.isFinite(step[i])) {
        worst = i;
        return Double.NaN;
      }
    }
    for (Law law : network.laws) {
      law.limit(stage, step);
    }
    double largest = 0;
    for (int i = 0; i < x.length; i++) {
      largest = Math.max(largest, Math.abs(step[i] - x[i]));
      x[i] = step[i];
    }
    return largest;
  }

  private void stamp(boolean withSlopes) {
    stage.begin(withSlopes);
    for (Law law : network.laws) {
      law.direct(stage);
    }
    for (int i = 0; i < network.probePlus.length; i++) {
      double siemens = stage.value(network.probeMeter[i]);
      stage.conductance(network.probePlus[i], network.probeMinus[i], siemens);
    }
    for (int i = 0; i < network.seamBefore.length; i++) {
      int branch = network.firstSeamBranch + i;
      stage.branchCurrent(branch, network.seamBefore[i], network.seamAfter[i]);
      stage.term(branch, network.seamBefore[i], 1);
      stage.term(branch, network.seamAfter[i], -1);
    }
  }

  /** The largest residual over what it is the difference of. */
  private double off() {
    double largest = 0;
    double[] residual = stage.residual();
    double[] flow = stage.flow();
    for (int i = 0; i < residual.length; i++) {
      double here = Math.abs(residual[i]) / (flow[i] + LEAST_AMPERES / SURE);
      if (!(here <= largest)) {
        largest = here;
        worst = i;
      }
    }
    return Double.isNaN(largest) ? Double.POSITIVE_INFINITY : largest;
  }

  /** Writes the change of all unknowns by one ampere from node {@code from} to node {@code to}. */
  void push(int from, int to, double[] into) {
    Arrays.fill(into, 0);
    if (from >= 0) {
      into[from] -= 1;
    }
    if (to >= 0) {
      into[to] += 1;
    }
    stage.matrix().solve(into);
  }
}
