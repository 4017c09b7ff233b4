package earward.engine.linear;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Several complex systems of one pattern at once: a circuit at the harmonics of one frequency. One
 * order of elimination is found and replayed for all (Markowitz 1957); every element is a row of
 * numbers, one a system, so that what is looked up is looked up once and the innermost loops run
 * over the systems. Each solution's residual is looked at and bettered once; where that does not
 * make it that of rounding, or an element outside the pattern is written after {@link #freeze}, the
 * caller is told to solve one system after the other.
 *
 * <p>Mutable, for one thread; allocates nothing once its pattern is known.
 */
public final class HarmonicLu {
  private final int size;
  private final int count;
  private final int[] placeOf;
  private final List<Integer> elements = new ArrayList<>();
  private double[][] re = new double[0][];
  private double[][] im = new double[0][];
  private double[][] elementSizes = new double[0][];
  private double[] steadyRe = new double[0];
  private double[] steadyIm = new double[0];
  private @Nullable HarmonicReplay replay;
  private boolean frozen;
  private boolean strange;
  private final double[][] sideRe;
  private final double[][] sideIm;
  private final double[][] offRe;
  private final double[][] offIm;
  private final double[][] scales;
  private final double[][] sizes;
  private final double[] most;

  /**
   * Room for systems.
   *
   * @param size of each
   * @param count how many
   */
  public HarmonicLu(int size, int count) {
    this.size = size;
    this.count = count;
    placeOf = new int[size * size];
    Arrays.fill(placeOf, -1);
    sideRe = new double[size][count];
    sideIm = new double[size][count];
    offRe = new double[size][count];
    offIm = new double[size][count];
    scales = new double[size][count];
    sizes = new double[size][count];
    most = new double[count];
  }

  /** How many systems. */
  public int count() {
    return count;
  }

  /** Sets all elements of all systems to 0. */
  public void clear() {
    strange = false;
    Arrays.fill(steadyRe, 0);
    Arrays.fill(steadyIm, 0);
  }

  /** Adds to one element of all systems; before {@link #spread}. */
  public void addToAll(int row, int column, double real, double imaginary) {
    int place = place(row * size + column);
    if (place >= 0) {
      steadyRe[place] += real;
      steadyIm[place] += imaginary;
    }
  }

  /** Puts into each system what was added to all; what comes after is added to one. */
  public void spread() {
    for (int e = 0; e < steadyRe.length; e++) {
      Arrays.fill(re[e], steadyRe[e]);
      Arrays.fill(im[e], steadyIm[e]);
    }
  }

  /** Adds to one element of one system; after {@link #spread}. */
  public void add(int system, int row, int column, double real, double imaginary) {
    int place = place(row * size + column);
    if (place >= 0) {
      re[place][system] += real;
      im[place][system] += imaginary;
    }
  }

  private int place(int at) {
    int place = placeOf[at];
    if (place < 0) {
      strange = true;
      if (!frozen) {
        return grow(at);
      }
    }
    return place;
  }

  private int grow(int at) {
    int place = elements.size();
    placeOf[at] = place;
    elements.add(at);
    re = Arrays.copyOf(re, place + 1);
    im = Arrays.copyOf(im, place + 1);
    re[place] = new double[count];
    im[place] = new double[count];
    elementSizes = Arrays.copyOf(elementSizes, place + 1);
    elementSizes[place] = new double[count];
    steadyRe = Arrays.copyOf(steadyRe, place + 1);
    steadyIm = Arrays.copyOf(steadyIm, place + 1);
    replay = null;
    return place;
  }

  /** Keeps pattern and order from now on. */
  public void freeze() {
    frozen = true;
  }

  /**
   * Factors all systems.
   *
   * @return false where they must be solved one after the other
   */
  public boolean factor() {
    if (replay == null && !frozen) {
      int[] places = elements.stream().mapToInt(Integer::intValue).toArray();
      replay = HarmonicReplay.of(size, count, places, re, im);
    }
    HarmonicReplay order = replay;
    if (order == null || (frozen && strange)) {
      return false;
    }
    for (int e = 0; e < re.length; e++) {
      magnitudes(re[e], im[e], elementSizes[e]);
    }
    order.factor(re, im);
    return true;
  }

  /**
   * Replaces right sides by their solutions.
   *
   * @param valuesRe a row for each unknown, a number for each system
   * @return false where they must be solved one after the other
   */
  public boolean solve(double[][] valuesRe, double[][] valuesIm) {
    HarmonicReplay order = replay;
    if (order == null) {
      return false;
    }
    copy(valuesRe, sideRe);
    copy(valuesIm, sideIm);
    order.substitute(valuesRe, valuesIm);
    if (good(order, valuesRe, valuesIm)) {
      return true;
    }
    order.substitute(offRe, offIm);
    for (int i = 0; i < size; i++) {
      for (int k = 0; k < count; k++) {
        valuesRe[i][k] += offRe[i][k];
        valuesIm[i][k] += offIm[i][k];
      }
    }
    return good(order, valuesRe, valuesIm);
  }

  private static void copy(double[][] from, double[][] to) {
    for (int i = 0; i < from.length; i++) {
      System.arraycopy(from[i], 0, to[i], 0, to[i].length);
    }
  }

  /** Whether every equation of every system is met but for rounding; fills what is off. */
  private boolean good(HarmonicReplay order, double[][] valuesRe, double[][] valuesIm) {
    Arrays.fill(most, 0);
    for (int column = 0; column < size; column++) {
      magnitudes(valuesRe[column], valuesIm[column], sizes[column]);
    }
    for (int row = 0; row < size; row++) {
      double[] offR = offRe[row];
      double[] offI = offIm[row];
      double[] scale = scales[row];
      System.arraycopy(sideRe[row], 0, offR, 0, count);
      System.arraycopy(sideIm[row], 0, offI, 0, count);
      magnitudes(offR, offI, scale);
      for (int e = order.rowFrom[row]; e < order.rowFrom[row + 1]; e++) {
        int column = order.rowColumn[e];
        int place = order.rowPlace[e];
        HarmonicReplay.subtract(
            re[place], im[place], valuesRe[column], valuesIm[column], offR, offI);
        addProduct(elementSizes[place], sizes[column], scale);
      }
      for (int k = 0; k < scale.length; k++) {
        most[k] = Math.max(most[k], scale[k]);
      }
    }
    boolean good = true;
    for (int row = 0; row < size; row++) {
      good &= good(offRe[row], offIm[row], scales[row], most);
    }
    return good;
  }

  private static void magnitudes(double[] r, double[] i, double[] into) {
    for (int k = 0; k < into.length; k++) {
      into[k] = Math.abs(r[k]) + Math.abs(i[k]);
    }
  }

  private static void addProduct(double[] one, double[] other, double[] into) {
    for (int k = 0; k < into.length; k++) {
      into[k] += one[k] * other[k];
    }
  }

  private static boolean good(double[] offR, double[] offI, double[] scale, double[] most) {
    boolean good = true;
    for (int k = 0; k < scale.length; k++) {
      double wanted = RealLu.GOOD * (scale[k] + RealLu.NOTHING * most[k]);
      good &= Math.abs(offR[k]) + Math.abs(offI[k]) <= wanted;
    }
    return good;
  }
}
