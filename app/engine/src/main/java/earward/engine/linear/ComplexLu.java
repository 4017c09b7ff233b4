package earward.engine.linear;

import java.util.Arrays;

/**
 * A complex linear system, solved by elimination with partial pivoting by magnitude; it keeps the
 * matrix beside its factors, so that the residual of a solution can be had.
 *
 * <p>Mutable, for one thread; allocates nothing after construction.
 */
public final class ComplexLu {
  private final int size;
  private final double[] re;
  private final double[] im;
  private final double[] keptRe;
  private final double[] keptIm;
  private final int[] pivots;

  public ComplexLu(int size) {
    this.size = size;
    re = new double[size * size];
    im = new double[size * size];
    keptRe = new double[size * size];
    keptIm = new double[size * size];
    pivots = new int[size];
  }

  /** Sets all elements to 0. */
  public void clear() {
    Arrays.fill(re, 0);
    Arrays.fill(im, 0);
  }

  /** Adds to one element. */
  public void add(int row, int column, double real, double imaginary) {
    re[row * size + column] += real;
    im[row * size + column] += imaginary;
  }

  /**
   * Replaces the matrix by its factors.
   *
   * @return whether a pivot other than 0 was found in every column
   */
  public boolean factor() {
    System.arraycopy(re, 0, keptRe, 0, re.length);
    System.arraycopy(im, 0, keptIm, 0, im.length);
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
  public void solve(double[] sideRe, double[] sideIm) {
    for (int k = 0; k < size; k++) {
      int p = pivots[k];
      double r = sideRe[p];
      sideRe[p] = sideRe[k];
      sideRe[k] = r;
      double i = sideIm[p];
      sideIm[p] = sideIm[k];
      sideIm[k] = i;
    }
    for (int row = 1; row < size; row++) {
      reduce(row, 0, row, sideRe, sideIm);
    }
    for (int row = size - 1; row >= 0; row--) {
      reduce(row, row + 1, size, sideRe, sideIm);
      int at = row * size + row;
      double norm = squared(at);
      double r = sideRe[row];
      double i = sideIm[row];
      sideRe[row] = (r * re[at] + i * im[at]) / norm;
      sideIm[row] = (i * re[at] - r * im[at]) / norm;
    }
  }

  private void reduce(int row, int from, int to, double[] sideRe, double[] sideIm) {
    double r = sideRe[row];
    double i = sideIm[row];
    for (int c = from; c < to; c++) {
      int at = row * size + c;
      r -= re[at] * sideRe[c] - im[at] * sideIm[c];
      i -= re[at] * sideIm[c] + im[at] * sideRe[c];
    }
    sideRe[row] = r;
    sideIm[row] = i;
  }

  /** Writes side − matrix · solution. */
  public void residual(
      double[] solutionRe,
      double[] solutionIm,
      double[] sideRe,
      double[] sideIm,
      double[] residualRe,
      double[] residualIm) {
    for (int row = 0; row < size; row++) {
      double r = sideRe[row];
      double i = sideIm[row];
      for (int c = 0; c < size; c++) {
        int at = row * size + c;
        r -= keptRe[at] * solutionRe[c] - keptIm[at] * solutionIm[c];
        i -= keptRe[at] * solutionIm[c] + keptIm[at] * solutionRe[c];
      }
      residualRe[row] = r;
      residualIm[row] = i;
    }
  }
}
