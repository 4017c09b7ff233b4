package earward.engine.waveform;

import earward.engine.law.WaveformDevice;

/**
 * Steps a circuit through time: a table times the states, then Newton's method on the few controls
 * of the curved devices at both stages, then the change of the states. Mutable, for one thread;
 * allocates nothing after construction.
 */
final class Stepper {
  private static final int MOST_ITERATIONS = 100;
  private static final int MOST_SWITCHES = 24;

  /** A Newton step of so much of a knee is the last: what is left is half its square. */
  private static final double SMALL_STEP = 1e-3;

  final StepTables tables;
  final WaveformCircuit circuit;
  final Kinks kinks;
  final SmallSolver solver;

  /** States, now. */
  final double[] s;

  /** Charges of the charged devices at the last step's end, by output. */
  final double[] charges;

  /** Base of this step: controls without outputs, then the states' change without them. */
  final double[] base;

  /** Outputs of the devices, stage by stage, charges' currents included. */
  final double[] w;

  /** Outputs of the kinks at work. */
  final double[] kinkOutputs;

  /** Slopes of the devices' outputs by their controls, stage by stage. */
  final double[] slopes;

  /** Capacitances, stage by stage, by output. */
  final double[] farads;

  private final double[] charge;
  private final double[] u;
  private final double[] guess;
  private final double[] open;
  private final int slopesPerStage;
  private final int perStage;
  private final int outputs;
  private final boolean charged;

  Stepper(StepTables tables) {
    this.tables = tables;
    circuit = tables.circuit;
    kinks = new Kinks(tables);
    perStage = circuit.deviceControls;
    outputs = circuit.deviceOutputs;
    int count = 0;
    boolean any = false;
    for (WaveformDevice device : circuit.devices) {
      count += device.controls() * device.outputs();
      any |= device.charged();
    }
    slopesPerStage = count;
    charged = any;
    s = circuit.starts.clone();
    charges = new double[outputs];
    base = new double[tables.baseRows];
    w = new double[2 * outputs];
    kinkOutputs = new double[kinks.count()];
    slopes = new double[2 * slopesPerStage];
    farads = new double[2 * outputs];
    charge = new double[2 * outputs];
    u = new double[2 * perStage];
    guess = new double[2 * perStage];
    open = new double[2 * perStage];
    solver = new SmallSolver(2 * perStage);
  }

  /** Goes on where another stands, whatever its step. */
  void takeOver(Stepper other) {
    System.arraycopy(other.s, 0, s, 0, s.length);
    System.arraycopy(other.charges, 0, charges, 0, charges.length);
    System.arraycopy(other.u, perStage, u, 0, perStage);
    System.arraycopy(other.u, perStage, u, perStage, perStage);
  }

  /**
   * One step.
   *
   * @param first drive at the first stage
   * @param second drive at the step's end
   * @return whether Newton's method converged
   */
  boolean step(double first, double second) {
    product(first, second);
    for (int c = 0; c < perStage; c++) {
      double rise = u[perStage + c] - u[c];
      guess[c] = u[perStage + c] + 0.5 * rise;
      guess[perStage + c] = u[perStage + c] + 1.5 * rise;
    }
    boolean found = settle();
    if (!found) {
      for (int c = 0; c < perStage; c++) {
        guess[c] = 0;
        guess[perStage + c] = 0;
      }
      found = settle();
    }
    advance();
    return found;
  }

  private void product(double first, double second) {
    int rows = tables.baseRows;
    double[] table = tables.base;
    int states = circuit.states;
    int at = states * rows;
    for (int i = 0; i < rows; i++) {
      base[i] = table[at + i] + table[at + rows + i] * first + table[at + 2 * rows + i] * second;
    }
    for (int k = 0; k < states; k++) {
      double factor = s[k];
      int from = k * rows;
      for (int i = 0; i < rows; i++) {
        base[i] += table[from + i] * factor;
      }
    }
  }

  /** Devices by Newton, kinks in turn, until the kinks at work are those that should be. */
  private boolean settle() {
    System.arraycopy(guess, 0, u, 0, u.length);
    for (int round = 0; round < MOST_SWITCHES; round++) {
      openControls();
      if (!newton()) {
        return false;
      }
      follow();
      if (!switched()) {
        return true;
      }
      kinks.reduce();
    }
    return true; // two answers on either side of a corner: they differ by next to nothing
  }

  private void openControls() {
    System.arraycopy(base, 0, open, 0, 2 * perStage);
    for (int i = 0; i < kinks.actives; i++) {
      double sum = 0;
      for (int j = 0; j < kinks.actives; j++) {
        sum += kinks.inverse[i * kinks.actives + j] * base[2 * perStage + kinks.active[j]];
      }
      kinkOutputs[i] = sum;
      for (int c = 0; c < 2 * perStage; c++) {
        open[c] += kinks.toDevice(c, kinks.active[i]) * sum;
      }
    }
  }

  private boolean newton() {
    int size = 2 * perStage;
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      evaluate();
      if (size == 0) {
        return true;
      }
      jacobian();
      double[] side = solver.side;
      for (int c = 0; c < size; c++) {
        double sum = open[c] - u[c];
        for (int o = 0; o < 2 * outputs; o++) {
          sum += kinks.reach[o * size + c] * w[o];
        }
        side[c] = sum;
      }
      if (!solver.solve()) {
        return false;
      }
      if (take(side)) {
        lastStep(side);
        return true;
      }
    }
    return false;
  }

  /** Takes a Newton step; returns whether it was small. */
  private boolean take(double[] step) {
    boolean small = true;
    for (int stage = 0; stage < 2; stage++) {
      int c = stage * perStage;
      for (WaveformDevice device : circuit.devices) {
        double knee = SMALL_STEP * device.kneeVolts();
        for (int k = 0; k < device.controls(); k++) {
          double to = device.limited(k, u[c], u[c] + step[c]);
          double moved = Math.abs(to - u[c]);
          small &= moved <= knee + 1e-12 * Math.abs(to);
          u[c++] = to;
        }
      }
    }
    return small;
  }

  /** Outputs and charges at the end of a last step, along their tangents. */
  private void lastStep(double[] step) {
    for (int stage = 0; stage < 2; stage++) {
      int c = stage * perStage;
      int o = stage * outputs;
      int slope = stage * slopesPerStage;
      for (WaveformDevice device : circuit.devices) {
        for (int a = 0; a < device.outputs(); a++) {
          for (int b = 0; b < device.controls(); b++) {
            w[o + a] += slopes[slope++] * step[c + b];
          }
        }
        if (charged && device.charged()) {
          double moved = farads[o] * step[c];
          int own = o - stage * outputs;
          charge[o] += moved;
          w[own] += StepTables.INVERSE[stage] * moved / tables.seconds;
          w[outputs + own] += StepTables.INVERSE[2 + stage] * moved / tables.seconds;
        }
        c += device.controls();
        o += device.outputs();
      }
    }
  }

  private void evaluate() {
    for (int stage = 0; stage < 2; stage++) {
      int c = stage * perStage;
      int o = stage * outputs;
      int slope = stage * slopesPerStage;
      for (WaveformDevice device : circuit.devices) {
        device.evaluate(u, c, w, o, slopes, slope);
        if (charged && device.charged()) {
          charge[o] = device.charge(u[c]);
          farads[o] = device.capacitance(u[c]);
        }
        c += device.controls();
        o += device.outputs();
        slope += device.controls() * device.outputs();
      }
    }
    if (charged) {
      chargeCurrents();
    }
  }

  /** dQ/dt at both stages, from the charges there and at the step's start. */
  private void chargeCurrents() {
    for (int o = 0; o < outputs; o++) {
      double first = charge[o] - charges[o];
      double second = charge[outputs + o] - charges[o];
      w[o] += (StepTables.INVERSE[0] * first + StepTables.INVERSE[1] * second) / tables.seconds;
      w[outputs + o] +=
          (StepTables.INVERSE[2] * first + StepTables.INVERSE[3] * second) / tables.seconds;
    }
  }

  /** 1 − reach·(slopes): the derivative of the controls' equations. */
  private void jacobian() {
    int size = 2 * perStage;
    double[] matrix = solver.matrix;
    for (int i = 0; i < size * size; i++) {
      matrix[i] = 0;
    }
    for (int i = 0; i < size; i++) {
      matrix[i * size + i] = 1;
    }
    for (int stage = 0; stage < 2; stage++) {
      int c = stage * perStage;
      int o = stage * outputs;
      int slope = stage * slopesPerStage;
      for (WaveformDevice device : circuit.devices) {
        for (int a = 0; a < device.outputs(); a++) {
          for (int b = 0; b < device.controls(); b++) {
            subtract(matrix, size, o + a, c + b, slopes[slope++]);
          }
        }
        if (charged && device.charged()) {
          double perSecond = farads[o] / tables.seconds;
          for (int to = 0; to < 2; to++) {
            int output = to * outputs + o - stage * outputs;
            subtract(matrix, size, output, c, StepTables.INVERSE[2 * to + stage] * perSecond);
          }
        }
        c += device.controls();
        o += device.outputs();
      }
    }
  }

  private void subtract(double[] matrix, int size, int output, int control, double slope) {
    if (slope != 0) {
      int from = output * size;
      for (int row = 0; row < size; row++) {
        matrix[row * size + control] -= kinks.reach[from + row] * slope;
      }
    }
  }

  private void follow() {
    for (int i = 0; i < kinks.actives; i++) {
      for (int o = 0; o < 2 * outputs; o++) {
        kinkOutputs[i] += kinks.follow[i * 2 * outputs + o] * w[o];
      }
    }
  }

  /** Whether other kinks should be at work; they are set. */
  private boolean switched() {
    boolean any = false;
    for (int k = 0; k < kinks.count(); k++) {
      double control = base[2 * perStage + k];
      for (int o = 0; o < 2 * outputs; o++) {
        control += kinks.fromDevice(k, o) * w[o];
      }
      for (int i = 0; i < kinks.actives; i++) {
        control += kinks.reach(k, kinks.active[i]) * kinkOutputs[i];
      }
      boolean works = control > 0;
      if (works != kinks.atWork(k)) {
        kinks.set(k, works);
        any = true;
      }
    }
    return any;
  }

  private void advance() {
    int states = circuit.states;
    int from = 2 * circuit.controls.length;
    for (int k = 0; k < states; k++) {
      s[k] += base[from + k];
    }
    for (int o = 0; o < 2 * outputs; o++) {
      add(o, w[o]);
    }
    for (int i = 0; i < kinks.actives; i++) {
      add(2 * outputs + kinks.active[i], kinkOutputs[i]);
    }
    if (charged) {
      System.arraycopy(charge, outputs, charges, 0, outputs);
    }
  }

  private void add(int column, double amount) {
    int states = circuit.states;
    int at = column * states;
    for (int k = 0; k < states; k++) {
      s[k] += tables.push[at + k] * amount;
    }
  }

  /** Writes states, all outputs at the step's end, one and drive, for reading. */
  void read(double drive, double[] into) {
    int states = circuit.states;
    System.arraycopy(s, 0, into, 0, states);
    System.arraycopy(w, outputs, into, states, outputs);
    int first = states + outputs;
    for (int k = 0; k < circuit.kinks; k++) {
      into[first + k] = 0;
    }
    for (int i = 0; i < kinks.actives; i++) {
      int k = kinks.active[i] - circuit.kinks;
      if (k >= 0) {
        into[first + k] = kinkOutputs[i];
      }
    }
    into[first + circuit.kinks] = 1;
    into[first + circuit.kinks + 1] = drive;
  }
}
