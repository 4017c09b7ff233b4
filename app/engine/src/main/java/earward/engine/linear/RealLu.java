package earward.engine.linear;

import org.jspecify.annotations.Nullable;

/**
 * A real linear system. Its order of elimination is found once and replayed (Markowitz 1957); each
 * solution's residual is looked at, and where one refinement does not make it that of rounding the
 * system is solved anew, densely, with partial pivoting by magnitude.
 *
 * <p>Mutable, for one thread; allocates nothing once its pattern is known. Fill the matrix, {@link
 * #factor()}, then solve as often as wanted; a second {@link #factor()} needs a fresh matrix.
 */
public final class RealLu {
  /** Residual over the sum of its terms' magnitudes beyond which a replay is not trusted. */
  static final double GOOD = 1e-11;

  /**
   * Share of the largest such sum that counts as nothing in any other: what rounding leaves in a
   * part of the circuit that the right side does not reach.
   */
  static final double NOTHING = 1e-12;

  private final int size;
  private final double[] a;
  private final double[] kept;
  private final double[] zero;
  private final int[] pivots;
  private final double[] unknown;
  private final double[] side;
  private final double[] off;
  private final double[] scale;
  private final Pattern pattern;
  private @Nullable Elimination replayed;
  private int tried;

  public RealLu(int size) {
    this.size = size;
    a = new double[size * size];
    kept = new double[size * size];
    zero = new double[size * size];
    pivots = new int[size];
    unknown = new double[size];
    side = new double[size];
    off = new double[size];
    scale = new double[size];
    pattern = new Pattern(size);
  }

  /** Sets all elements to 0. */
  public void clear() {
    pattern.clear(a, replayed);
    pattern.begin();
  }

  /** Adds to one element. */
  public void add(int row, int column, double value) {
    int at = row * size + column;
    pattern.touch(at);
    a[at] += value;
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
    System.arraycopy(a, 0, kept, 0, a.length);
    tried = 0;
    return factorFrom();
  }

  /** Replays the first order that suits, from the one to be tried next. */
  private boolean factorFrom() {
    for (boolean clean = tried == 0; ; clean = false, tried++) {
      Elimination order = pattern.order(tried, kept, zero);
      if (!clean) {
        System.arraycopy(kept, 0, a, 0, a.length);
      }
      replayed = order;
      if (order == null) {
        pattern.fellBack();
        return factorDensely();
      }
      if (replay(order)) {
        return true;
      }
    }
  }

  private boolean replay(Elimination order) {
    for (int k = 0; k < size; k++) {
      double pivot = a[order.pivot[k]];
      if (pivot == 0 || !Double.isFinite(pivot)) {
        return false;
      }
      double inverse = 1 / pivot;
      int from = order.row[k] * size;
      int column = order.column[k];
      int last = order.upperFrom[k + 1];
      for (int l = order.lowerFrom[k]; l < order.lowerFrom[k + 1]; l++) {
        int to = order.lowerRow[l] * size;
        double factor = a[to + column] * inverse;
        a[to + column] = factor;
        for (int u = order.upperFrom[k]; u < last; u++) {
          int c = order.upperColumn[u];
          a[to + c] -= factor * a[from + c];
        }
      }
    }
    return true;
  }

  private boolean factorDensely() {
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
      double former = a[one * size + c];
      a[one * size + c] = a[other * size + c];
      a[other * size + c] = former;
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
  public void solve(double[] values) {
    if (replayed != null) {
      System.arraycopy(values, 0, side, 0, size);
    }
    for (Elimination order = replayed; order != null; order = replayed) {
      substitute(order, values);
      if (good(order, values) || refined(order, values)) {
        return;
      }
      System.arraycopy(side, 0, values, 0, size);
      tried++;
      if (!factorFrom()) {
        return;
      }
    }
    solveDensely(values);
  }

  private void substitute(Elimination order, double[] values) {
    for (int k = 0; k < size; k++) {
      double here = values[order.row[k]];
      if (here != 0) {
        int column = order.column[k];
        for (int l = order.lowerFrom[k]; l < order.lowerFrom[k + 1]; l++) {
          values[order.lowerRow[l]] -= a[order.lowerRow[l] * size + column] * here;
        }
      }
    }
    for (int k = size - 1; k >= 0; k--) {
      int from = order.row[k] * size;
      double sum = values[order.row[k]];
      for (int u = order.upperFrom[k]; u < order.upperFrom[k + 1]; u++) {
        sum -= a[from + order.upperColumn[u]] * unknown[order.upperColumn[u]];
      }
      unknown[order.column[k]] = sum / a[order.pivot[k]];
    }
    System.arraycopy(unknown, 0, values, 0, size);
  }

  /** One step of iterative refinement: the residual's own solution is added. */
  private boolean refined(Elimination order, double[] values) {
    for (int i = 0; i < size; i++) {
      off[i] = -off[i];
    }
    substitute(order, off);
    for (int i = 0; i < size; i++) {
      values[i] += off[i];
    }
    return good(order, values);
  }

  /** Whether every equation is met but for rounding. */
  private boolean good(Elimination order, double[] values) {
    int[] entries = order.entries;
    int at = 0;
    double most = 0;
    for (int row = 0; row < size; row++) {
      double sum = -side[row];
      double flow = Math.abs(sum);
      int end = (row + 1) * size;
      for (; at < entries.length && entries[at] < end; at++) {
        double term = kept[entries[at]] * values[entries[at] - row * size];
        sum += term;
        flow += Math.abs(term);
      }
      off[row] = sum;
      scale[row] = flow;
      most = Math.max(most, flow);
    }
    for (int row = 0; row < size; row++) {
      if (!(Math.abs(off[row]) <= GOOD * (scale[row] + NOTHING * most))) {
        return false;
      }
    }
    return true;
  }

  private void solveDensely(double[] values) {
    for (int k = 0; k < size; k++) {
      int p = pivots[k];
      double former = values[p];
      values[p] = values[k];
      values[k] = former;
    }
    for (int row = 1; row < size; row++) {
      double sum = values[row];
      for (int c = 0; c < row; c++) {
        sum -= a[row * size + c] * values[c];
      }
      values[row] = sum;
    }
    for (int row = size - 1; row >= 0; row--) {
      double sum = values[row];
      for (int c = row + 1; c < size; c++) {
        sum -= a[row * size + c] * values[c];
      }
      values[row] = sum / a[row * size + row];
    }
  }
}
