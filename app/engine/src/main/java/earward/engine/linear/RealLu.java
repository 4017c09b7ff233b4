package earward.engine.linear;

import java.util.Arrays;

/**
 * A real linear system, solved by elimination with partial pivoting by magnitude.
 *
 * <p>Mutable, for one thread; allocates nothing after construction. Fill the matrix, {@link
 * #factor()}, then {@link #solve} as often as wanted; a second {@link #factor()} needs a fresh
 * matrix.
 */
public final class RealLu {
  private final int size;
  private final double[] a;
  private final int[] pivots;

  public RealLu(int size) {
    this.size = size;
    a = new double[size * size];
    pivots = new int[size];
  }

  /** Sets all elements to 0. */
  public void clear() {
    Arrays.fill(a, 0);
  }

  /** Adds to one element. */
  public void add(int row, int column, double value) {
    a[row * size + column] += value;
  }

  /**
   * Replaces the matrix by its factors.
   *
   * @return whether a pivot other than 0 was found in every column
   */
  public boolean factor() {
    for (int k = 0; k < size; k++) {
      int best = k;
      double most = Math.abs(a[k * size + k]);
      for (int row = k + 1; row < size; row++) {
        double here = Math.abs(a[row * size + k]);
        if (here > most) {
          most = here;
          best = row;
        }
      }
      pivots[k] = best;
      if (!(most > 0) || Double.isInfinite(most)) {
        return false;
      }
      if (best != k) {
        swapRows(k, best);
      }
      eliminate(k);
    }
    return true;
  }

  private void swapRows(int one, int other) {
    for (int c = 0; c < size; c++) {
      double kept = a[one * size + c];
      a[one * size + c] = a[other * size + c];
      a[other * size + c] = kept;
    }
  }

  private void eliminate(int k) {
    double inverse = 1 / a[k * size + k];
    int from = k * size;
    for (int row = k + 1; row < size; row++) {
      int to = row * size;
      double factor = a[to + k];
      if (factor != 0) {
        factor *= inverse;
        a[to + k] = factor;
        for (int c = k + 1; c < size; c++) {
          a[to + c] -= factor * a[from + c];
        }
      }
    }
  }

  /** Replaces the right side by the solution. */
  public void solve(double[] side) {
    for (int k = 0; k < size; k++) {
      int p = pivots[k];
      double kept = side[p];
      side[p] = side[k];
      side[k] = kept;
    }
    for (int row = 1; row < size; row++) {
      double sum = side[row];
      for (int c = 0; c < row; c++) {
        sum -= a[row * size + c] * side[c];
      }
      side[row] = sum;
    }
    for (int row = size - 1; row >= 0; row--) {
      double sum = side[row];
      for (int c = row + 1; c < size; c++) {
        sum -= a[row * size + c] * side[c];
      }
      side[row] = sum / a[row * size + row];
    }
  }
}
