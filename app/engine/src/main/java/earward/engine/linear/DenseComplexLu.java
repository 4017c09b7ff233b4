package earward.engine.linear;

/**
 * Dense elimination with partial pivoting by magnitude on another's arrays: what a replayed order
 * falls back to.
 */
final class DenseComplexLu {
  private final int size;
  private final double[] re;
  private final double[] im;
  private final int[] pivots;

  DenseComplexLu(int size, double[] re, double[] im) {
    this.size = size;
    this.re = re;
    this.im = im;
    pivots = new int[size];
  }

  /** Replaces the matrix by its factors; whether every column had a pivot other than 0. */
  boolean factor() {
    for (int k = 0; k < size; k++) {
      int best = k;
      double most = 0;
      for (int row = k; row < size; row++) {
        double here = squared(row * size + k);
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

  private double squared(int at) {
    return re[at] * re[at] + im[at] * im[at];
  }

  private void swapRows(int one, int other) {
    for (int c = 0; c < size; c++) {
      double r = re[one * size + c];
      re[one * size + c] = re[other * size + c];
      re[other * size + c] = r;
      double i = im[one * size + c];
      im[one * size + c] = im[other * size + c];
      im[other * size + c] = i;
    }
  }

  private void eliminate(int k) {
    int from = k * size;
    double norm = squared(from + k);
    double inverseRe = re[from + k] / norm;
    double inverseIm = -im[from + k] / norm;
    for (int row = k + 1; row < size; row++) {
      int to = row * size;
      double br = re[to + k];
      double bi = im[to + k];
      if (br != 0 || bi != 0) {
        double fr = br * inverseRe - bi * inverseIm;
        double fi = br * inverseIm + bi * inverseRe;
        re[to + k] = fr;
        im[to + k] = fi;
        for (int c = k + 1; c < size; c++) {
          double pr = re[from + c];
          double pi = im[from + c];
          re[to + c] -= fr * pr - fi * pi;
          im[to + c] -= fr * pi + fi * pr;
        }
      }
    }
  }

  /** Replaces the right side by the solution. */
  void solve(double[] sideRe, double[] sideIm) {
    for (int k = 0; k < size; k++) {
      swap(sideRe, k, pivots[k]);
      swap(sideIm, k, pivots[k]);
    }
    for (int row = 1; row < size; row++) {
      reduce(row, 0, row, 1, size, sideRe, sideIm);
    }
    for (int row = size - 1; row >= 0; row--) {
      reduce(row, row + 1, size, 1, size, sideRe, sideIm);
      divide(row, sideRe, sideIm);
    }
  }

  /** Replaces the right side by the solution of the transposed system. */
  void solveTransposed(double[] sideRe, double[] sideIm) {
    for (int row = 0; row < size; row++) {
      reduce(row, 0, row, size, 1, sideRe, sideIm);
      divide(row, sideRe, sideIm);
    }
    for (int row = size - 2; row >= 0; row--) {
      reduce(row, row + 1, size, size, 1, sideRe, sideIm);
    }
    for (int k = size - 1; k >= 0; k--) {
      swap(sideRe, k, pivots[k]);
      swap(sideIm, k, pivots[k]);
    }
  }

  private static void swap(double[] side, int one, int other) {
    double kept = side[other];
    side[other] = side[one];
    side[one] = kept;
  }

  private void divide(int row, double[] sideRe, double[] sideIm) {
    int at = row * size + row;
    double norm = squared(at);
    double r = sideRe[row];
    double i = sideIm[row];
    sideRe[row] = (r * re[at] + i * im[at]) / norm;
    sideIm[row] = (i * re[at] - r * im[at]) / norm;
  }

  /** Takes from one row what the others give; strides walk along a row or down a column. */
  private void reduce(
      int row, int from, int to, int along, int across, double[] sideRe, double[] sideIm) {
    double r = sideRe[row];
    double i = sideIm[row];
    for (int c = from; c < to; c++) {
      int at = row * across + c * along;
      r -= re[at] * sideRe[c] - im[at] * sideIm[c];
      i -= re[at] * sideIm[c] + im[at] * sideRe[c];
    }
    sideRe[row] = r;
    sideIm[row] = i;
  }
}
