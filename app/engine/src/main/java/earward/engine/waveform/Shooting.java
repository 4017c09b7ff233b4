package earward.engine.waveform;

/**
 * Finds the periodic solution: a period is run, and its start moved by what the sensitivity says it
 * lacks, until it lacks nothing that a place would show. Source: Aprille and Trick 1972, Steady-
 * state analysis of nonlinear circuits with periodic inputs.
 */
final class Shooting {
  /** Share of its own signal by which a place may still move. */
  private static final double SETTLED = 2e-5;

  /** A smaller signal is held as still as one of this size, in V. */
  private static final double LEAST_VOLTS = 1e-4;

  private static final int MOST_PERIODS = 40;

  /** How a search ended. */
  enum End {
    FOUND,
    NOT_FOUND,
    FAILED,
    CANCELLED
  }

  private final Stepper stepper;
  private final Periods periods;
  private final Gauge gauge;
  private final double[][] rows;
  private final boolean modulated;
  private final double[] before;
  private final double[] change;
  private int run;

  Shooting(Stepper stepper, Drive drive, Gauge gauge, double[][] rows) {
    this.stepper = stepper;
    this.gauge = gauge;
    this.rows = rows;
    periods = new Periods(stepper, drive);
    modulated = drive.cycles > 1;
    before = new double[periods.sensitivity().size()];
    change = new double[before.length];
  }

  Periods periods() {
    return periods;
  }

  /** How many periods the last search ran. */
  int run() {
    return run;
  }

  /** Searches; the gauge holds the last period. */
  End search(WaveformListener listener, int shownSteps) {
    double former = Double.POSITIVE_INFINITY;
    boolean steered = true;
    for (run = 1; run <= MOST_PERIODS; run++) {
      save(before);
      if (!periods.run(gauge, listener, shownSteps, run)) {
        return End.CANCELLED;
      }
      save(change);
      for (int i = 0; i < change.length; i++) {
        change[i] -= before[i];
      }
      boolean solved = periods.sensitivity().toPeriodic(change);
      double off = solved ? off() : Double.POSITIVE_INFINITY;
      if (off <= 1 && !periods.failed()) {
        return End.FOUND;
      }
      steered = solved && (off < 0.7 * former || !steered);
      if (steered) {
        move();
      }
      former = off;
    }
    return periods.failed() ? End.FAILED : End.NOT_FOUND;
  }

  private void save(double[] into) {
    int states = stepper.circuit.states;
    System.arraycopy(stepper.s, 0, into, 0, states);
    System.arraycopy(stepper.charges, 0, into, states, stepper.charges.length);
  }

  private void move() {
    int states = stepper.circuit.states;
    for (int k = 0; k < states; k++) {
      stepper.s[k] = before[k] + change[k];
    }
    for (int o = 0; o < stepper.charges.length; o++) {
      stepper.charges[o] = before[states + o] + change[states + o];
    }
  }

  /** The largest move of a place that is still wanted, over what it may be. */
  private double off() {
    double most = 0;
    for (int p = 0; p < rows.length; p++) {
      double moved = 0;
      for (int k = 0; k < stepper.circuit.states; k++) {
        moved += rows[p][k] * change[k];
      }
      double signal = modulated ? gauge.peak(p, 1) : Math.abs(gauge.mean(p));
      most = Math.max(most, Math.abs(moved) / (SETTLED * Math.max(LEAST_VOLTS, signal)));
    }
    return most;
  }
}
