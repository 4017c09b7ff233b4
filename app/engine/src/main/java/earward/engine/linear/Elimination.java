package earward.engine.linear;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/**
 * The order in which a sparse system is eliminated, found once and replayed: which element is the
 * pivot of each step, which rows lie under it and which columns beside it, fill-in included.
 *
 * <p>Pivots are chosen by the least product of Markowitz 1957 among those of at least a tenth of
 * their column's largest magnitude. Elements stand at {@code row * size + column}. Immutable.
 */
final class Elimination {
  /** A pivot's least share of the largest magnitude in its column. */
  private static final double LEAST_SHARE = 0.1;

  final int size;

  /** Step by step: the pivot's place, its row, its column. */
  final int[] pivot;

  final int[] row;
  final int[] column;

  /** Rows under the pivot of step k: from {@code lowerFrom[k]} to {@code lowerFrom[k + 1]}. */
  final int[] lowerFrom;

  final int[] lowerRow;

  /** Columns beside the pivot of step k: from {@code upperFrom[k]} to {@code upperFrom[k + 1]}. */
  final int[] upperFrom;

  final int[] upperColumn;

  /** Elements that may differ from 0 before elimination, and those that may after it. */
  final int[] entries;

  final int[] entryRow;
  final int[] entryColumn;
  final int[] filled;

  private Elimination(
      int size, int[] rows, int[] columns, int[][] lower, int[][] upper, int[] entries) {
    this.size = size;
    row = rows;
    column = columns;
    pivot = IntStream.range(0, size).map(k -> rows[k] * size + columns[k]).toArray();
    lowerFrom = starts(lower);
    lowerRow = Arrays.stream(lower).flatMapToInt(Arrays::stream).toArray();
    upperFrom = starts(upper);
    upperColumn = Arrays.stream(upper).flatMapToInt(Arrays::stream).toArray();
    this.entries = entries;
    entryRow = Arrays.stream(entries).map(at -> at / size).toArray();
    entryColumn = Arrays.stream(entries).map(at -> at % size).toArray();
    boolean[] used = new boolean[size * size];
    Arrays.stream(entries).forEach(at -> used[at] = true);
    for (int k = 0; k < size; k++) {
      used[pivot[k]] = true;
      for (int c : upper[k]) {
        used[rows[k] * size + c] = true;
      }
      for (int r : lower[k]) {
        used[r * size + columns[k]] = true;
        for (int c : upper[k]) {
          used[r * size + c] = true;
        }
      }
    }
    filled = IntStream.range(0, used.length).filter(at -> used[at]).toArray();
  }

  private static int[] starts(int[][] lists) {
    int[] from = new int[lists.length + 1];
    for (int k = 0; k < lists.length; k++) {
      from[k + 1] = from[k] + lists[k].length;
    }
    return from;
  }

  /**
   * Finds an order for a pattern with representative magnitudes.
   *
   * @param used which elements may differ from 0
   * @param real real parts, not changed
   * @param imaginary imaginary parts, not changed
   * @return null where some step has no pivot other than 0
   */
  static @Nullable Elimination of(int size, boolean[] used, double[] real, double[] imaginary) {
    Search search = new Search(size, used, real, imaginary);
    for (int k = 0; k < size; k++) {
      if (!search.step(k)) {
        return null;
      }
    }
    int[] entries = IntStream.range(0, used.length).filter(at -> used[at]).toArray();
    return new Elimination(size, search.rows, search.columns, search.lower, search.upper, entries);
  }

  /** A working copy that is eliminated while the order is found. */
  private static final class Search {
    final int size;
    final int[] rows;
    final int[] columns;
    final int[][] lower;
    final int[][] upper;
    private final boolean[] used;
    private final double[] re;
    private final double[] im;
    private final boolean[] rowDone;
    private final boolean[] columnDone;

    Search(int size, boolean[] used, double[] real, double[] imaginary) {
      this.size = size;
      rows = new int[size];
      columns = new int[size];
      lower = new int[size][];
      upper = new int[size][];
      this.used = used.clone();
      re = real.clone();
      im = imaginary.clone();
      rowDone = new boolean[size];
      columnDone = new boolean[size];
    }

    boolean step(int k) {
      int best = choose();
      if (best < 0) {
        return false;
      }
      int row = best / size;
      int column = best % size;
      rowDone[row] = true;
      columnDone[column] = true;
      rows[k] = row;
      columns[k] = column;
      lower[k] = under(column);
      upper[k] = beside(row);
      for (int r : lower[k]) {
        eliminate(best, r * size + column, row * size, r * size, upper[k]);
      }
      return true;
    }

    private int choose() {
      int best = -1;
      long leastProduct = Long.MAX_VALUE;
      double mostSquared = 0;
      for (int c = 0; c < size; c++) {
        if (columnDone[c]) {
          continue;
        }
        int[] under = under(c);
        double largest = 0;
        for (int r : under) {
          largest = Math.max(largest, squared(r * size + c));
        }
        for (int r : under) {
          double here = squared(r * size + c);
          if (here > 0 && here >= LEAST_SHARE * LEAST_SHARE * largest) {
            long product = (long) (under.length - 1) * (beside(r).length - 1);
            if (product < leastProduct || (product == leastProduct && here > mostSquared)) {
              best = r * size + c;
              leastProduct = product;
              mostSquared = here;
            }
          }
        }
      }
      return best;
    }

    private void eliminate(int pivot, int at, int from, int to, int[] beside) {
      double norm = squared(pivot);
      double fr = (re[at] * re[pivot] + im[at] * im[pivot]) / norm;
      double fi = (im[at] * re[pivot] - re[at] * im[pivot]) / norm;
      for (int c : beside) {
        re[to + c] -= fr * re[from + c] - fi * im[from + c];
        im[to + c] -= fr * im[from + c] + fi * re[from + c];
        used[to + c] = true;
      }
    }

    private double squared(int at) {
      return re[at] * re[at] + im[at] * im[at];
    }

    private int[] under(int column) {
      return IntStream.range(0, size).filter(r -> !rowDone[r] && used[r * size + column]).toArray();
    }

    private int[] beside(int row) {
      return IntStream.range(0, size).filter(c -> !columnDone[c] && used[row * size + c]).toArray();
    }
  }
}
