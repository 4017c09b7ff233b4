package earward.engine.waveform;

import earward.engine.linear.RealLu;

/**
 * A dense real system with its rows brought to one scale, so that equations in amperes and in volts
 * stand side by side, and one correction of the residual. One owner.
 */
final class ScaledSolver {
  private final int size;
  private final double[][] matrix;
  private final double[] scale;
  private final RealLu factors;
  private final double[] side;
  private final double[] rest;

  /**
   * Factors a matrix, which is kept and scaled in place.
   *
   * @throws IllegalArgumentException when it is singular
   */
  ScaledSolver(double[][] matrix) {
    this.matrix = matrix;
    size = matrix.length;
    scale = new double[size];
    factors = new RealLu(size);
    side = new double[size];
    rest = new double[size];
    for (int i = 0; i < size; i++) {
      double most = 0;
      for (double each : matrix[i]) {
        most = Math.max(most, Math.abs(each));
      }
      scale[i] = most > 0 ? 1 / most : 1;
      for (int j = 0; j < size; j++) {
        matrix[i][j] *= scale[i];
        if (matrix[i][j] != 0) {
          factors.add(i, j, matrix[i][j]);
        }
      }
    }
    if (!factors.factor()) {
      throw new IllegalArgumentException("the circuit's equations over time are singular");
    }
  }

  /** Replaces a right side by the solution. */
  void solve(double[] vector) {
    for (int i = 0; i < size; i++) {
      side[i] = vector[i] * scale[i];
      vector[i] = side[i];
    }
    factors.solve(vector);
    for (int i = 0; i < size; i++) {
      double sum = side[i];
      for (int j = 0; j < size; j++) {
        sum -= matrix[i][j] * vector[j];
      }
      rest[i] = sum;
    }
    factors.solve(rest);
    for (int i = 0; i < size; i++) {
      vector[i] += rest[i];
    }
  }
}
