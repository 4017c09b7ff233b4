package earward.engine.waveform;

/**
 * What stands where at one instant: rows over (states, outputs of devices and kinks, one, drive).
 * Immutable.
 */
final class Reader {
  private final WaveformCircuit circuit;

  /** How long a row is. */
  final int length;

  /** Unknowns and rates by column of what is known. */
  private final double[][] columns;

  Reader(WaveformCircuit circuit) {
    this.circuit = circuit;
    int size = circuit.size;
    length = circuit.columns - size;
    double[][] matrix = new double[size][size];
    for (int row = 0; row < size; row++) {
      System.arraycopy(circuit.rows[row], 0, matrix[row], 0, size);
    }
    ScaledSolver solver = new ScaledSolver(matrix);
    columns = new double[length][size];
    for (int c = 0; c < length; c++) {
      for (int row = 0; row < size; row++) {
        columns[c][row] = -circuit.rows[row][size + c];
      }
      solver.solve(columns[c]);
    }
  }

  /** Voltage between two nodes, −1 for ground. */
  double[] between(int plus, int minus) {
    double[] row = new double[length];
    for (int c = 0; c < length; c++) {
      row[c] = (plus < 0 ? 0 : columns[c][plus]) - (minus < 0 ? 0 : columns[c][minus]);
    }
    return row;
  }

  /** What the drive is multiplied by to give the feed's power. */
  double[] power() {
    double[] row = new double[length];
    for (int c = 0; c < length; c++) {
      row[c] = circuit.power[circuit.size + c];
      for (int j = 0; j < circuit.unknowns; j++) {
        row[c] += circuit.power[j] * columns[c][j];
      }
    }
    return row;
  }
}
