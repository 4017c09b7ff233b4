package earward.engine.waveform;

import earward.engine.law.WaveformDevice;
import java.util.Arrays;

/**
 * How the states at the end of a period move with those at its start, by the slopes that Newton's
 * method has anyway (Aprille and Trick 1972). Followed through a few carrier cycles spread over the
 * period, each standing for those up to the next; it steers the search for the periodic solution
 * and has no part in the solution itself. Kept as the difference from doing nothing, so that time
 * constants of minutes are not lost beside those of a step. Mutable, for one thread.
 */
final class Sensitivity {
  private static final int MOST_SAMPLES = 16;

  private final Stepper stepper;
  private final WaveformCircuit circuit;
  private final int states;
  private final int outputs;
  private final int size;
  private final double[][] cycle;
  private final double[][] whole;
  private final double[] column;
  private final double[] base;
  private final double[] kinkChange;
  private final double[] outputChange;
  private final double[] controlChange;
  private int period;
  private int samples;

  Sensitivity(Stepper stepper) {
    this.stepper = stepper;
    circuit = stepper.circuit;
    states = circuit.states;
    outputs = circuit.deviceOutputs;
    size = states + outputs;
    cycle = new double[size][size];
    whole = new double[size][size];
    column = new double[size];
    base = new double[stepper.tables.baseRows];
    kinkChange = new double[stepper.kinks.count()];
    outputChange = new double[2 * outputs];
    controlChange = new double[2 * circuit.deviceControls];
  }

  int size() {
    return size;
  }

  void begin(int cycles) {
    period = cycles;
    samples = Math.min(MOST_SAMPLES, cycles);
    clear(whole);
  }

  /** Whether a cycle of the period is followed. */
  boolean follows(int index) {
    return index == first(sampleOf(index));
  }

  private int sampleOf(int index) {
    return (int) ((long) index * samples / period);
  }

  private int first(int sample) {
    return (int) (((long) sample * period + samples - 1) / samples);
  }

  void beginCycle() {
    clear(cycle);
  }

  private static void clear(double[][] matrix) {
    for (double[] row : matrix) {
      Arrays.fill(row, 0);
    }
  }

  /** Follows one step that was just made. */
  void step() {
    for (int j = 0; j < size; j++) {
      for (int k = 0; k < size; k++) {
        column[k] = cycle[k][j] + (k == j ? 1 : 0);
      }
      move();
      for (int k = 0; k < states; k++) {
        cycle[k][j] += column[k];
      }
      for (int o = 0; o < outputs; o++) {
        cycle[states + o][j] = column[states + o] - (states + o == j ? 1 : 0);
      }
    }
  }

  /** Replaces a move at the step's start: states by their change, charges by their end. */
  private void move() {
    int rows = stepper.tables.baseRows;
    int devices = 2 * circuit.deviceControls;
    Kinks kinks = stepper.kinks;
    Arrays.fill(base, 0);
    for (int k = 0; k < states; k++) {
      double factor = column[k];
      for (int i = 0; i < rows && factor != 0; i++) {
        base[i] += stepper.tables.base[k * rows + i] * factor;
      }
    }
    for (int i = 0; i < kinks.actives; i++) {
      double sum = 0;
      for (int j = 0; j < kinks.actives; j++) {
        sum += kinks.inverse[i * kinks.actives + j] * base[devices + kinks.active[j]];
      }
      kinkChange[i] = sum;
    }
    chargesAtStart();
    for (int c = 0; c < devices; c++) {
      double sum = base[c];
      for (int i = 0; i < kinks.actives; i++) {
        sum += kinks.toDevice(c, kinks.active[i]) * kinkChange[i];
      }
      for (int o = 0; o < 2 * outputs; o++) {
        sum += kinks.reach[o * devices + c] * outputChange[o];
      }
      controlChange[c] = sum;
    }
    if (devices > 0) {
      stepper.solver.again(controlChange);
    }
    outputs();
    for (int i = 0; i < kinks.actives; i++) {
      for (int o = 0; o < 2 * outputs; o++) {
        kinkChange[i] += kinks.follow[i * 2 * outputs + o] * outputChange[o];
      }
    }
    changes();
  }

  private void chargesAtStart() {
    double perSecond = 2 / stepper.tables.seconds;
    for (int o = 0; o < outputs; o++) {
      outputChange[o] = -perSecond * column[states + o];
      outputChange[outputs + o] = perSecond * column[states + o];
    }
  }

  /** Outputs' changes by those of the controls; the charges at the step's end. */
  private void outputs() {
    int slope = 0;
    for (int stage = 0; stage < 2; stage++) {
      int c = stage * circuit.deviceControls;
      int o = stage * outputs;
      for (WaveformDevice device : circuit.devices) {
        for (int a = 0; a < device.outputs(); a++) {
          for (int b = 0; b < device.controls(); b++) {
            outputChange[o + a] += stepper.slopes[slope++] * controlChange[c + b];
          }
        }
        if (device.charged()) {
          double moved = stepper.farads[o] * controlChange[c];
          int own = o - stage * outputs;
          double seconds = stepper.tables.seconds;
          outputChange[own] += StepTables.INVERSE[stage] * moved / seconds;
          outputChange[outputs + own] += StepTables.INVERSE[2 + stage] * moved / seconds;
          if (stage == 1) {
            column[states + own] = moved;
          }
        } else if (stage == 1) {
          Arrays.fill(column, states + o - outputs, states + o - outputs + device.outputs(), 0);
        }
        c += device.controls();
        o += device.outputs();
      }
    }
  }

  private void changes() {
    int from = 2 * circuit.controls.length;
    System.arraycopy(base, from, column, 0, states);
    for (int o = 0; o < 2 * outputs; o++) {
      push(o, outputChange[o]);
    }
    for (int i = 0; i < stepper.kinks.actives; i++) {
      push(2 * outputs + stepper.kinks.active[i], kinkChange[i]);
    }
  }

  private void push(int output, double amount) {
    for (int k = 0; k < states && amount != 0; k++) {
      column[k] += stepper.tables.push[output * states + k] * amount;
    }
  }

  /** Takes in the cycle that was followed, for all cycles that it stands for. */
  void endCycle(int index) {
    int sample = sampleOf(index);
    int times = first(sample + 1) - first(sample);
    double[][] power = copy(cycle);
    for (int left = times; left > 0; left >>= 1) {
      if ((left & 1) == 1) {
        after(whole, power);
      }
      after(power, copy(power));
    }
  }

  private double[][] copy(double[][] from) {
    double[][] to = new double[size][];
    for (int k = 0; k < size; k++) {
      to[k] = from[k].clone();
    }
    return to;
  }

  /** (1 + a) becomes (1 + b)·(1 + a), both kept without their ones. */
  private void after(double[][] a, double[][] b) {
    double[][] product = new double[size][size];
    for (int i = 0; i < size; i++) {
      for (int k = 0; k < size; k++) {
        double factor = b[i][k];
        for (int j = 0; j < size && factor != 0; j++) {
          product[i][j] += factor * a[k][j];
        }
      }
    }
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        a[i][j] += b[i][j] + product[i][j];
      }
    }
  }

  /**
   * Replaces what a period changed by what its start must change by to be periodic.
   *
   * @return whether the equations could be solved
   */
  boolean toPeriodic(double[] change) {
    double[][] matrix = new double[size][size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        matrix[i][j] = -whole[i][j];
      }
    }
    try {
      new ScaledSolver(matrix).solve(change);
    } catch (IllegalArgumentException e) {
      return false; // a state that nothing moves; the period is run on from where it ends
    }
    for (double each : change) {
      if (!Double.isFinite(each)) {
        return false;
      }
    }
    return true;
  }
}
