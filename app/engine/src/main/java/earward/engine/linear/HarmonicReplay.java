package earward.engine.linear;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/** An order of elimination as steps over rows of numbers, with the factors it leaves. */
final class HarmonicReplay {
  private final int size;
  private final int count;

  /** Steps as in {@link Elimination}; elements as places among the factors. */
  private final int[] row;

  private final int[] column;
  private final int[] pivot;
  private final int[] lowerFrom;
  private final int[] lowerRow;
  private final int[] lower;
  private final int[] upperFrom;
  private final int[] upperColumn;
  private final int[] upper;

  /** What each pair of a lower and an upper element is taken from, in the order of the steps. */
  private final int[] target;

  /** Elements as stamped, row after row: column, and place among the stamped ones. */
  final int[] rowFrom;

  final int[] rowColumn;
  final int[] rowPlace;

  /** Place among the stamped elements of each factor, −1 for what elimination fills in. */
  private final int[] stamped;

  private final double[][] re;
  private final double[][] im;
  private final double[][] inverseRe;
  private final double[][] inverseIm;
  private final double[][] unknownRe;
  private final double[][] unknownIm;
  private final boolean[] touched;

  /**
   * Finds an order by the first system's elements.
   *
   * @param elements {@code row * size + column} of each stamped element
   * @return null where some step has no pivot other than 0
   */
  static @Nullable HarmonicReplay of(
      int size, int count, int[] elements, double[][] stampedRe, double[][] stampedIm) {
    boolean[] used = new boolean[size * size];
    double[] real = new double[size * size];
    double[] imaginary = new double[size * size];
    for (int e = 0; e < elements.length; e++) {
      used[elements[e]] = true;
      real[elements[e]] = stampedRe[e][0];
      imaginary[elements[e]] = stampedIm[e][0];
    }
    Elimination order = Elimination.of(size, used, real, imaginary);
    return order == null ? null : new HarmonicReplay(order, count, elements);
  }

  private HarmonicReplay(Elimination order, int count, int[] elements) {
    size = order.size;
    this.count = count;
    row = order.row;
    column = order.column;
    lowerFrom = order.lowerFrom;
    lowerRow = order.lowerRow;
    upperFrom = order.upperFrom;
    upperColumn = order.upperColumn;
    int[] factorAt = new int[size * size];
    Arrays.fill(factorAt, -1);
    for (int f = 0; f < order.filled.length; f++) {
      factorAt[order.filled[f]] = f;
    }
    pivot = Arrays.stream(order.pivot).map(at -> factorAt[at]).toArray();
    lower = new int[lowerRow.length];
    upper = new int[upperColumn.length];
    int pairs = 0;
    for (int k = 0; k < size; k++) {
      pairs += (lowerFrom[k + 1] - lowerFrom[k]) * (upperFrom[k + 1] - upperFrom[k]);
    }
    target = new int[pairs];
    int pair = 0;
    for (int k = 0; k < size; k++) {
      for (int u = upperFrom[k]; u < upperFrom[k + 1]; u++) {
        upper[u] = factorAt[row[k] * size + upperColumn[u]];
      }
      for (int l = lowerFrom[k]; l < lowerFrom[k + 1]; l++) {
        lower[l] = factorAt[lowerRow[l] * size + column[k]];
        for (int u = upperFrom[k]; u < upperFrom[k + 1]; u++) {
          target[pair++] = factorAt[lowerRow[l] * size + upperColumn[u]];
        }
      }
    }
    stamped = new int[order.filled.length];
    Arrays.fill(stamped, -1);
    int[] placeOf = new int[size * size];
    for (int e = 0; e < elements.length; e++) {
      stamped[factorAt[elements[e]]] = e;
      placeOf[elements[e]] = e;
    }
    rowFrom = new int[size + 1];
    rowColumn = order.entryColumn;
    rowPlace = Arrays.stream(order.entries).map(at -> placeOf[at]).toArray();
    for (int entryRow : order.entryRow) {
      rowFrom[entryRow + 1]++;
    }
    for (int r = 0; r < size; r++) {
      rowFrom[r + 1] += rowFrom[r];
    }
    re = new double[stamped.length][count];
    im = new double[stamped.length][count];
    inverseRe = new double[size][count];
    inverseIm = new double[size][count];
    unknownRe = new double[size][count];
    unknownIm = new double[size][count];
    touched = new boolean[size];
  }

  /** Factors the stamped elements. A pivot of 0 shows in the solutions, which are looked at. */
  void factor(double[][] stampedRe, double[][] stampedIm) {
    for (int f = 0; f < stamped.length; f++) {
      if (stamped[f] < 0) {
        Arrays.fill(re[f], 0);
        Arrays.fill(im[f], 0);
      } else {
        System.arraycopy(stampedRe[stamped[f]], 0, re[f], 0, count);
        System.arraycopy(stampedIm[stamped[f]], 0, im[f], 0, count);
      }
    }
    int pair = 0;
    for (int k = 0; k < size; k++) {
      invert(re[pivot[k]], im[pivot[k]], inverseRe[k], inverseIm[k]);
      for (int l = lowerFrom[k]; l < lowerFrom[k + 1]; l++) {
        double[] fr = re[lower[l]];
        double[] fi = im[lower[l]];
        scale(fr, fi, inverseRe[k], inverseIm[k]);
        for (int u = upperFrom[k]; u < upperFrom[k + 1]; u++) {
          int to = target[pair++];
          subtract(fr, fi, re[upper[u]], im[upper[u]], re[to], im[to]);
        }
      }
    }
  }

  /** Replaces right sides by solutions. */
  void substitute(double[][] valuesRe, double[][] valuesIm) {
    for (int i = 0; i < size; i++) {
      touched[i] = any(valuesRe[i], valuesIm[i]);
    }
    for (int k = 0; k < size; k++) {
      if (touched[row[k]]) {
        double[] r = valuesRe[row[k]];
        double[] i = valuesIm[row[k]];
        for (int l = lowerFrom[k]; l < lowerFrom[k + 1]; l++) {
          int below = lowerRow[l];
          touched[below] = true;
          subtract(re[lower[l]], im[lower[l]], r, i, valuesRe[below], valuesIm[below]);
        }
      }
    }
    for (int k = size - 1; k >= 0; k--) {
      double[] r = valuesRe[row[k]];
      double[] i = valuesIm[row[k]];
      for (int u = upperFrom[k]; u < upperFrom[k + 1]; u++) {
        int c = upperColumn[u];
        subtract(re[upper[u]], im[upper[u]], unknownRe[c], unknownIm[c], r, i);
      }
      double[] xr = unknownRe[column[k]];
      double[] xi = unknownIm[column[k]];
      System.arraycopy(r, 0, xr, 0, count);
      System.arraycopy(i, 0, xi, 0, count);
      scale(xr, xi, inverseRe[k], inverseIm[k]);
    }
    for (int i = 0; i < size; i++) {
      System.arraycopy(unknownRe[i], 0, valuesRe[i], 0, count);
      System.arraycopy(unknownIm[i], 0, valuesIm[i], 0, count);
    }
  }

  private static boolean any(double[] r, double[] i) {
    for (int k = 0; k < r.length; k++) {
      if (r[k] != 0 || i[k] != 0) {
        return true;
      }
    }
    return false;
  }

  private static void invert(double[] r, double[] i, double[] inverseR, double[] inverseI) {
    for (int k = 0; k < r.length; k++) {
      double norm = r[k] * r[k] + i[k] * i[k];
      inverseR[k] = r[k] / norm;
      inverseI[k] = -i[k] / norm;
    }
  }

  private static void scale(double[] r, double[] i, double[] byR, double[] byI) {
    for (int k = 0; k < r.length; k++) {
      double real = r[k] * byR[k] - i[k] * byI[k];
      i[k] = r[k] * byI[k] + i[k] * byR[k];
      r[k] = real;
    }
  }

  static void subtract(double[] fr, double[] fi, double[] pr, double[] pi, double[] r, double[] i) {
    for (int k = 0; k < r.length; k++) {
      r[k] -= fr[k] * pr[k] - fi[k] * pi[k];
      i[k] -= fr[k] * pi[k] + fi[k] * pr[k];
    }
  }
}
