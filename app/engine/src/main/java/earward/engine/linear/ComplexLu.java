package earward.engine.linear;

import org.jspecify.annotations.Nullable;

/**
 * A complex linear system. Its order of elimination is found once and replayed (Markowitz 1957);
 * each solution's residual is looked at, and where one refinement does not make it that of rounding
 * the system is solved anew, densely, with partial pivoting by magnitude.
 *
 * <p>Mutable, for one thread; allocates nothing once its pattern is known.
 */
public final class ComplexLu {
  /** Relative difference of elements that are the same but for rounding, and what counts as 0. */
  private static final double SAME = 1e-12;

  private static final double SMALL = 1e-15;

  private final int size;
  private final double[] re;
  private final double[] im;
  private final double[] keptRe;
  private final double[] keptIm;
  private final double[] inverseRe;
  private final double[] inverseIm;
  private final double[] unknownRe;
  private final double[] unknownIm;
  private final double[] sideRe;
  private final double[] sideIm;
  private final double[] offRe;
  private final double[] offIm;
  private final double[] scale;
  private final DenseComplexLu dense;
  private final Pattern pattern;
  private @Nullable Elimination replayed;
  private int tried;

  public ComplexLu(int size) {
    this.size = size;
    re = new double[size * size];
    im = new double[size * size];
    keptRe = new double[size * size];
    keptIm = new double[size * size];
    inverseRe = new double[size];
    inverseIm = new double[size];
    unknownRe = new double[size];
    unknownIm = new double[size];
    sideRe = new double[size];
    sideIm = new double[size];
    offRe = new double[size];
    offIm = new double[size];
    scale = new double[size];
    dense = new DenseComplexLu(size, re, im);
    pattern = new Pattern(size);
  }

  /** Sets all elements to 0. */
  public void clear() {
    pattern.clear(re, replayed);
    pattern.clear(im, replayed);
    pattern.begin();
  }

  /** Adds to one element. */
  public void add(int row, int column, double real, double imaginary) {
    int at = row * size + column;
    pattern.touch(at);
    re[at] += real;
    im[at] += imaginary;
  }

  /** Keeps the orders of elimination from now on: a system that none suits is solved densely. */
  public void freeze() {
    pattern.freeze();
  }

  /** How many systems were solved densely. */
  public int fallBacks() {
    return pattern.fallBacks();
  }

  /**
   * Replaces the matrix by its factors.
   *
   * @return whether a pivot other than 0 was found in every column
   */
  public boolean factor() {
    System.arraycopy(re, 0, keptRe, 0, re.length);
    System.arraycopy(im, 0, keptIm, 0, im.length);
    tried = 0;
    return factorFrom();
  }

  /** Replays the first order that suits, from the one to be tried next. */
  private boolean factorFrom() {
    for (boolean clean = tried == 0; ; clean = false, tried++) {
      Elimination order = pattern.order(tried, keptRe, keptIm);
      if (!clean) {
        System.arraycopy(keptRe, 0, re, 0, re.length);
        System.arraycopy(keptIm, 0, im, 0, im.length);
      }
      replayed = order;
      if (order == null) {
        pattern.fellBack();
        return dense.factor();
      }
      if (replay(order)) {
        return true;
      }
    }
  }

  private boolean replay(Elimination order) {
    for (int k = 0; k < size; k++) {
      int at = order.pivot[k];
      double norm = re[at] * re[at] + im[at] * im[at];
      if (!(norm > 0) || Double.isInfinite(norm)) {
        return false;
      }
      inverseRe[k] = re[at] / norm;
      inverseIm[k] = -im[at] / norm;
      int from = order.row[k] * size;
      int column = order.column[k];
      for (int l = order.lowerFrom[k]; l < order.lowerFrom[k + 1]; l++) {
        int to = order.lowerRow[l] * size;
        double br = re[to + column];
        double bi = im[to + column];
        double fr = br * inverseRe[k] - bi * inverseIm[k];
        double fi = br * inverseIm[k] + bi * inverseRe[k];
        re[to + column] = fr;
        im[to + column] = fi;
        for (int u = order.upperFrom[k]; u < order.upperFrom[k + 1]; u++) {
          int c = order.upperColumn[u];
          double pr = re[from + c];
          double pi = im[from + c];
          re[to + c] -= fr * pr - fi * pi;
          im[to + c] -= fr * pi + fi * pr;
        }
      }
    }
    return true;
  }

  /**
   * Whether the matrix that was factored last is, but for rounding, the one in the rows of the
   * caller, which takes it over.
   */
  public boolean repeats(double[] rowsRe, double[] rowsIm) {
    double off = 0;
    for (int at = 0; at < keptRe.length; at++) {
      double here = Math.abs(keptRe[at] - rowsRe[at]) + Math.abs(keptIm[at] - rowsIm[at]);
      off = Math.max(off, here / (SMALL + Math.abs(keptRe[at]) + Math.abs(keptIm[at])));
    }
    System.arraycopy(keptRe, 0, rowsRe, 0, keptRe.length);
    System.arraycopy(keptIm, 0, rowsIm, 0, keptIm.length);
    return off <= SAME;
  }

  /** Replaces the right side by the solution. */
  public void solve(double[] valuesRe, double[] valuesIm) {
    solve(valuesRe, valuesIm, false);
  }

  /** Replaces the right side by the solution of the transposed system: an adjoint solve. */
  public void solveTransposed(double[] valuesRe, double[] valuesIm) {
    solve(valuesRe, valuesIm, true);
  }

  private void solve(double[] valuesRe, double[] valuesIm, boolean transposed) {
    if (replayed != null) {
      System.arraycopy(valuesRe, 0, sideRe, 0, size);
      System.arraycopy(valuesIm, 0, sideIm, 0, size);
    }
    for (Elimination order = replayed; order != null; order = replayed) {
      replay(order, valuesRe, valuesIm, transposed);
      if (good(order, valuesRe, valuesIm, transposed)
          || refined(order, valuesRe, valuesIm, transposed)) {
        return;
      }
      System.arraycopy(sideRe, 0, valuesRe, 0, size);
      System.arraycopy(sideIm, 0, valuesIm, 0, size);
      tried++;
      if (!factorFrom()) {
        return;
      }
    }
    solveDensely(valuesRe, valuesIm, transposed);
  }

  private void replay(Elimination order, double[] valuesRe, double[] valuesIm, boolean transposed) {
    if (transposed) {
      substituteTransposed(order, valuesRe, valuesIm);
    } else {
      substitute(order, valuesRe, valuesIm);
    }
  }

  /** One step of iterative refinement: the residual's own solution is added. */
  private boolean refined(
      Elimination order, double[] valuesRe, double[] valuesIm, boolean transposed) {
    replay(order, offRe, offIm, transposed);
    for (int i = 0; i < size; i++) {
      valuesRe[i] += offRe[i];
      valuesIm[i] += offIm[i];
    }
    return good(order, valuesRe, valuesIm, transposed);
  }

  private void solveDensely(double[] valuesRe, double[] valuesIm, boolean transposed) {
    if (transposed) {
      dense.solveTransposed(valuesRe, valuesIm);
    } else {
      dense.solve(valuesRe, valuesIm);
    }
  }

  private void substitute(Elimination order, double[] valuesRe, double[] valuesIm) {
    for (int k = 0; k < size; k++) {
      double r = valuesRe[order.row[k]];
      double i = valuesIm[order.row[k]];
      if (r != 0 || i != 0) {
        int column = order.column[k];
        for (int l = order.lowerFrom[k]; l < order.lowerFrom[k + 1]; l++) {
          int row = order.lowerRow[l];
          int at = row * size + column;
          valuesRe[row] -= re[at] * r - im[at] * i;
          valuesIm[row] -= re[at] * i + im[at] * r;
        }
      }
    }
    for (int k = size - 1; k >= 0; k--) {
      int from = order.row[k] * size;
      double r = valuesRe[order.row[k]];
      double i = valuesIm[order.row[k]];
      for (int u = order.upperFrom[k]; u < order.upperFrom[k + 1]; u++) {
        int c = order.upperColumn[u];
        r -= re[from + c] * unknownRe[c] - im[from + c] * unknownIm[c];
        i -= re[from + c] * unknownIm[c] + im[from + c] * unknownRe[c];
      }
      unknownRe[order.column[k]] = r * inverseRe[k] - i * inverseIm[k];
      unknownIm[order.column[k]] = r * inverseIm[k] + i * inverseRe[k];
    }
    System.arraycopy(unknownRe, 0, valuesRe, 0, size);
    System.arraycopy(unknownIm, 0, valuesIm, 0, size);
  }

  private void substituteTransposed(Elimination order, double[] valuesRe, double[] valuesIm) {
    for (int k = 0; k < size; k++) {
      double br = valuesRe[order.column[k]];
      double bi = valuesIm[order.column[k]];
      double r = br * inverseRe[k] - bi * inverseIm[k];
      double i = br * inverseIm[k] + bi * inverseRe[k];
      int from = order.row[k] * size;
      for (int u = order.upperFrom[k]; u < order.upperFrom[k + 1]; u++) {
        int c = order.upperColumn[u];
        valuesRe[c] -= re[from + c] * r - im[from + c] * i;
        valuesIm[c] -= re[from + c] * i + im[from + c] * r;
      }
      unknownRe[order.row[k]] = r;
      unknownIm[order.row[k]] = i;
    }
    for (int k = size - 1; k >= 0; k--) {
      int column = order.column[k];
      double r = unknownRe[order.row[k]];
      double i = unknownIm[order.row[k]];
      for (int l = order.lowerFrom[k]; l < order.lowerFrom[k + 1]; l++) {
        int row = order.lowerRow[l];
        int at = row * size + column;
        r -= re[at] * unknownRe[row] - im[at] * unknownIm[row];
        i -= re[at] * unknownIm[row] + im[at] * unknownRe[row];
      }
      unknownRe[order.row[k]] = r;
      unknownIm[order.row[k]] = i;
    }
    System.arraycopy(unknownRe, 0, valuesRe, 0, size);
    System.arraycopy(unknownIm, 0, valuesIm, 0, size);
  }

  /** Whether every equation is met but for rounding. */
  private boolean good(
      Elimination order, double[] valuesRe, double[] valuesIm, boolean transposed) {
    int[] rows = transposed ? order.entryColumn : order.entryRow;
    int[] columns = transposed ? order.entryRow : order.entryColumn;
    for (int row = 0; row < size; row++) {
      offRe[row] = sideRe[row];
      offIm[row] = sideIm[row];
      scale[row] = Math.abs(sideRe[row]) + Math.abs(sideIm[row]);
    }
    for (int e = 0; e < rows.length; e++) {
      int at = order.entries[e];
      double r = keptRe[at] * valuesRe[columns[e]] - keptIm[at] * valuesIm[columns[e]];
      double i = keptRe[at] * valuesIm[columns[e]] + keptIm[at] * valuesRe[columns[e]];
      offRe[rows[e]] -= r;
      offIm[rows[e]] -= i;
      scale[rows[e]] += Math.abs(r) + Math.abs(i);
    }
    double most = 0;
    for (int row = 0; row < size; row++) {
      most = Math.max(most, scale[row]);
    }
    double nothing = RealLu.NOTHING * most;
    for (int row = 0; row < size; row++) {
      double off = Math.abs(offRe[row]) + Math.abs(offIm[row]);
      if (!(off <= RealLu.GOOD * (scale[row] + nothing))) {
        return false;
      }
    }
    return true;
  }
}
