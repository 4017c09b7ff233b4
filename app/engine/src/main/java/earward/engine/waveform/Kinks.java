package earward.engine.waveform;

/**
 * The kinks max(0, control) of one step, eliminated while it is known which of them are at work:
 * what is left for the devices is linear in their outputs. Rows and columns are kinks of the first
 * stage, then of the second. Mutable, for one thread; allocates nothing after construction.
 */
final class Kinks {
  private final StepTables tables;
  private final int count;
  private final int controls;
  private final int deviceControls;
  private final int deviceOutputs;
  private final boolean[] atWork;
  private final double[] work;

  /** Indices of those at work. */
  final int[] active;

  int actives;

  /** (1 − reach)⁻¹ among those at work, row by row with {@code active} columns. */
  final double[] inverse;

  /** Reach of device outputs to device controls with the kinks at work, column after column. */
  final double[] reach;

  /** Outputs of the kinks at work by device outputs, row by row. */
  final double[] follow;

  Kinks(StepTables tables) {
    this.tables = tables;
    count = 2 * tables.circuit.kinks;
    controls = 2 * tables.circuit.controls.length;
    deviceControls = 2 * tables.circuit.deviceControls;
    deviceOutputs = 2 * tables.circuit.deviceOutputs;
    atWork = new boolean[count];
    active = new int[count];
    inverse = new double[count * count];
    work = new double[count * count];
    reach = new double[deviceControls * deviceOutputs];
    follow = new double[count * deviceOutputs];
    reduce();
  }

  int count() {
    return count;
  }

  /** Reach of a kink's output to the control of another. */
  double reach(int to, int from) {
    return tables.reach[(deviceOutputs + from) * controls + deviceControls + to];
  }

  /** Reach of a kink's output to a device's control. */
  double toDevice(int control, int from) {
    return tables.reach[(deviceOutputs + from) * controls + control];
  }

  /** Reach of a device's output to a kink's control. */
  double fromDevice(int to, int output) {
    return tables.reach[output * controls + deviceControls + to];
  }

  boolean atWork(int kink) {
    return atWork[kink];
  }

  /** Says which are at work; {@link #reduce} must follow. */
  void set(int kink, boolean works) {
    atWork[kink] = works;
  }

  /** Works the elimination out anew. */
  void reduce() {
    actives = 0;
    for (int k = 0; k < count; k++) {
      if (atWork[k]) {
        active[actives++] = k;
      }
    }
    invert();
    for (int output = 0; output < deviceOutputs; output++) {
      for (int i = 0; i < actives; i++) {
        double sum = 0;
        for (int j = 0; j < actives; j++) {
          sum += inverse[i * actives + j] * fromDevice(active[j], output);
        }
        follow[i * deviceOutputs + output] = sum;
      }
      for (int c = 0; c < deviceControls; c++) {
        double sum = tables.reach[output * controls + c];
        for (int i = 0; i < actives; i++) {
          sum += toDevice(c, active[i]) * follow[i * deviceOutputs + output];
        }
        reach[output * deviceControls + c] = sum;
      }
    }
  }

  /** Gauss and Jordan with the largest pivot of each column. */
  private void invert() {
    int n = actives;
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        work[i * n + j] = (i == j ? 1 : 0) - reach(active[i], active[j]);
        inverse[i * n + j] = i == j ? 1 : 0;
      }
    }
    for (int k = 0; k < n; k++) {
      int best = k;
      for (int row = k + 1; row < n; row++) {
        best = Math.abs(work[row * n + k]) > Math.abs(work[best * n + k]) ? row : best;
      }
      swap(work, k, best, n);
      swap(inverse, k, best, n);
      double pivot = 1 / work[k * n + k];
      for (int j = 0; j < n; j++) {
        work[k * n + j] *= pivot;
        inverse[k * n + j] *= pivot;
      }
      for (int row = 0; row < n; row++) {
        double factor = row == k ? 0 : work[row * n + k];
        for (int j = 0; j < n && factor != 0; j++) {
          work[row * n + j] -= factor * work[k * n + j];
          inverse[row * n + j] -= factor * inverse[k * n + j];
        }
      }
    }
  }

  private static void swap(double[] matrix, int one, int other, int n) {
    for (int j = 0; j < n && one != other; j++) {
      double kept = matrix[one * n + j];
      matrix[one * n + j] = matrix[other * n + j];
      matrix[other * n + j] = kept;
    }
  }
}
