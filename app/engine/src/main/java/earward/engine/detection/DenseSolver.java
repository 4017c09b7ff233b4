package earward.engine.detection;

/**
 * Gaussian elimination with partial pivoting on one flat matrix that it owns. One a thread; solves
 * any number of right-hand sides per factorisation and allocates nothing after construction.
 */
final class DenseSolver {
  private final int capacity;
  private final int[] pivots;

  /** The matrix, row after row; {@link #factor} replaces it by its factors. */
  final double[] matrix;

  private int size;

  DenseSolver(int capacity) {
    this.capacity = capacity;
    this.matrix = new double[capacity * capacity];
    this.pivots = new int[capacity];
  }

  /** Declares the size of the next matrix, whose rows are {@code size} long. */
  void begin(int size) {
    if (size > capacity) {
      throw new IllegalArgumentException("a matrix of " + size + " in room for " + capacity);
    }
    this.size = size;
  }

  /** Factors the matrix; false when it is singular to working precision. */
  boolean factor() {
    double[] a = matrix;
    int n = size;
    for (int k = 0; k < n; k++) {
      int pivot = largestInColumn(k);
      pivots[k] = pivot;
      double value = a[pivot * n + k];
      if (!(Math.abs(value) > 0) || Double.isInfinite(value)) {
        return false;
      }
      swapRows(pivot, k);
      double inverse = 1 / value;
      int rowK = k * n;
      for (int i = k + 1; i < n; i++) {
        int rowI = i * n;
        double factor = a[rowI + k] * inverse;
        a[rowI + k] = factor;
        if (factor != 0) {
          for (int j = k + 1; j < n; j++) {
            a[rowI + j] -= factor * a[rowK + j];
          }
        }
      }
    }
    return true;
  }

  /** Replaces a right-hand side by its solution. */
  void solve(double[] b, int offset) {
    double[] a = matrix;
    int n = size;
    for (int k = 0; k < n; k++) {
      double swapped = b[offset + pivots[k]];
      b[offset + pivots[k]] = b[offset + k];
      b[offset + k] = swapped;
    }
    for (int i = 1; i < n; i++) {
      double sum = b[offset + i];
      for (int j = 0; j < i; j++) {
        sum -= a[i * n + j] * b[offset + j];
      }
      b[offset + i] = sum;
    }
    for (int i = n - 1; i >= 0; i--) {
      double sum = b[offset + i];
      for (int j = i + 1; j < n; j++) {
        sum -= a[i * n + j] * b[offset + j];
      }
      b[offset + i] = sum / a[i * n + i];
    }
  }

  private int largestInColumn(int k) {
    int pivot = k;
    for (int i = k + 1; i < size; i++) {
      if (Math.abs(matrix[i * size + k]) > Math.abs(matrix[pivot * size + k])) {
        pivot = i;
      }
    }
    return pivot;
  }

  private void swapRows(int first, int second) {
    if (first == second) {
      return;
    }
    for (int j = 0; j < size; j++) {
      double kept = matrix[first * size + j];
      matrix[first * size + j] = matrix[second * size + j];
      matrix[second * size + j] = kept;
    }
  }
}
