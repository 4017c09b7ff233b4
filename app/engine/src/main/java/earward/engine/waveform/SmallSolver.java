package earward.engine.waveform;

/**
 * Elimination with partial pivoting on a few unknowns; matrix and side are filled by the caller and
 * destroyed, the side becomes the solution. The factors stay for more sides. Allocates nothing.
 */
final class SmallSolver {
  private final int size;
  final double[] matrix;
  final double[] side;
  private final int[] pivots;

  SmallSolver(int size) {
    this.size = size;
    matrix = new double[size * size];
    side = new double[size];
    pivots = new int[size];
  }

  /** Factors and solves the own side; false where no pivot is left. */
  boolean solve() {
    for (int k = 0; k < size; k++) {
      int best = k;
      for (int row = k + 1; row < size; row++) {
        if (Math.abs(matrix[row * size + k]) > Math.abs(matrix[best * size + k])) {
          best = row;
        }
      }
      pivots[k] = best;
      double pivot = matrix[best * size + k];
      if (pivot == 0 || Double.isNaN(pivot)) {
        return false;
      }
      for (int j = 0; j < size && best != k; j++) {
        double kept = matrix[k * size + j];
        matrix[k * size + j] = matrix[best * size + j];
        matrix[best * size + j] = kept;
      }
      double inverse = 1 / pivot;
      for (int row = k + 1; row < size; row++) {
        double factor = matrix[row * size + k] * inverse;
        matrix[row * size + k] = factor;
        for (int j = k + 1; j < size && factor != 0; j++) {
          matrix[row * size + j] -= factor * matrix[k * size + j];
        }
      }
    }
    again(side);
    return true;
  }

  /** Solves another side with the factors that are there. */
  void again(double[] other) {
    for (int k = 0; k < size; k++) {
      double kept = other[pivots[k]];
      other[pivots[k]] = other[k];
      other[k] = kept;
    }
    for (int row = 1; row < size; row++) {
      double sum = other[row];
      for (int j = 0; j < row; j++) {
        sum -= matrix[row * size + j] * other[j];
      }
      other[row] = sum;
    }
    for (int row = size - 1; row >= 0; row--) {
      double sum = other[row];
      for (int j = row + 1; j < size; j++) {
        sum -= matrix[row * size + j] * other[j];
      }
      other[row] = sum / matrix[row * size + row];
    }
  }
}
