package earward.engine.waveform;

/**
 * One step of fixed length of the linear part, by the two-stage Radau IIA rule (Hairer and Wanner,
 * Solving Ordinary Differential Equations II): third order, and stiff parts die out instead of
 * ringing as they would by the trapezoidal rule. All that a step needs is reduced to three tables:
 *
 * <pre>controls at both stages = base·(s, 1, e₁, e₂) + reach·w
 * change of the states     = base'·(s, 1, e₁, e₂) + push·w</pre>
 *
 * <p>with w the outputs at both stages. Immutable; arrays are not to be written.
 */
final class StepTables {
  /** Coefficients of the rule, row by row. */
  static final double[] A = {5.0 / 12, -1.0 / 12, 3.0 / 4, 1.0 / 4};

  /** Their inverse. */
  static final double[] INVERSE = {1.5, 0.5, -4.5, 2.5};

  /** Where the first stage stands in the step; the second stands at its end. */
  static final double FIRST = 1.0 / 3;

  final WaveformCircuit circuit;
  final double seconds;

  /** Controls at both stages, then states: stages·controls + states. */
  final int baseRows;

  /** States, one, drive at both stages. */
  final int baseColumns;

  /** Column after column. */
  final double[] base;

  /** Controls (device controls stage by stage, then kinks) by outputs, column after column. */
  final double[] reach;

  /** States by outputs, column after column. */
  final double[] push;

  StepTables(WaveformCircuit circuit, double seconds) {
    this.circuit = circuit;
    this.seconds = seconds;
    int controls = circuit.controls.length;
    baseRows = 2 * controls + circuit.states;
    baseColumns = circuit.states + 3;
    base = new double[baseRows * baseColumns];
    reach = new double[2 * controls * 2 * circuit.outputs()];
    push = new double[circuit.states * 2 * circuit.outputs()];
    ScaledSolver solver = new ScaledSolver(matrix());
    int n = circuit.size;
    for (int column = 0; column < baseColumns; column++) {
      double[] side = new double[2 * n];
      boolean both = column <= circuit.states;
      int from = column < circuit.states ? circuit.firstState() + column : circuit.one();
      if (column > circuit.states) {
        from = circuit.drive();
      }
      for (int stage = 0; stage < 2; stage++) {
        if (both || column - circuit.states - 1 == stage) {
          pull(side, stage, from);
        }
      }
      solver.solve(side);
      store(side, column, from, both);
    }
    for (int column = 0; column < 2 * circuit.outputs(); column++) {
      double[] side = new double[2 * n];
      pull(side, outputStage(column), circuit.firstOutput() + outputIndex(column));
      solver.solve(side);
      storeReach(side, column);
    }
  }

  /** Outputs stand stage by stage: devices' of both stages, then kinks' of both. */
  private int outputStage(int column) {
    int devices = 2 * circuit.deviceOutputs;
    return column < devices ? column / circuit.deviceOutputs : (column - devices) / circuit.kinks;
  }

  private int outputIndex(int column) {
    int devices = 2 * circuit.deviceOutputs;
    return column < devices
        ? column % circuit.deviceOutputs
        : circuit.deviceOutputs + (column - devices) % circuit.kinks;
  }

  private double[][] matrix() {
    int n = circuit.size;
    double[][] matrix = new double[2 * n][2 * n];
    for (int i = 0; i < 2; i++) {
      for (int row = 0; row < n; row++) {
        double[] terms = circuit.rows[row];
        System.arraycopy(terms, 0, matrix[i * n + row], i * n, n);
        for (int j = 0; j < 2; j++) {
          for (int k = 0; k < circuit.states; k++) {
            matrix[i * n + row][j * n + circuit.unknowns + k] +=
                seconds * A[2 * i + j] * terms[circuit.firstState() + k];
          }
        }
      }
    }
    return matrix;
  }

  private void pull(double[] side, int stage, int column) {
    for (int row = 0; row < circuit.size; row++) {
      side[stage * circuit.size + row] -= circuit.rows[row][column];
    }
  }

  private void store(double[] solution, int column, int from, boolean both) {
    int controls = circuit.controls.length;
    int at = column * baseRows;
    for (int c = 0; c < controls; c++) {
      for (int stage = 0; stage < 2; stage++) {
        boolean own = both || column - circuit.states - 1 == stage;
        base[at + controlRow(c, stage)] =
            control(solution, c, stage) + (own ? circuit.controls[c][from] : 0);
      }
    }
    for (int k = 0; k < circuit.states; k++) {
      base[at + 2 * controls + k] = change(solution, k);
    }
  }

  /** Row of a control at a stage: devices' of both stages, then kinks' of both. */
  int controlRow(int control, int stage) {
    int devices = circuit.deviceControls;
    return control < devices
        ? stage * devices + control
        : 2 * devices + stage * circuit.kinks + control - devices;
  }

  private void storeReach(double[] solution, int column) {
    int controls = circuit.controls.length;
    for (int c = 0; c < controls; c++) {
      for (int stage = 0; stage < 2; stage++) {
        reach[column * 2 * controls + controlRow(c, stage)] = control(solution, c, stage);
      }
    }
    for (int k = 0; k < circuit.states; k++) {
      push[column * circuit.states + k] = change(solution, k);
    }
  }

  /** A control at a stage, by what is solved for. */
  private double control(double[] solution, int control, int stage) {
    double[] terms = circuit.controls[control];
    int n = circuit.size;
    double sum = 0;
    for (int j = 0; j < n; j++) {
      sum += terms[j] * solution[stage * n + j];
    }
    for (int k = 0; k < circuit.states; k++) {
      double factor = terms[circuit.firstState() + k];
      for (int j = 0; j < 2 && factor != 0; j++) {
        sum += factor * seconds * A[2 * stage + j] * solution[j * n + circuit.unknowns + k];
      }
    }
    return sum;
  }

  private double change(double[] solution, int state) {
    int n = circuit.size;
    return seconds
        * (A[2] * solution[circuit.unknowns + state]
            + A[3] * solution[n + circuit.unknowns + state]);
  }
}
