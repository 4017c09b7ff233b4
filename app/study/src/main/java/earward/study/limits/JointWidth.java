package earward.study.limits;

import java.util.Arrays;

/**
 * Limits about the middle of several readings, as far out for each in measure of its own spread, so
 * that a wanted number of kits lies within all of them.
 */
final class JointWidth {
  private static final double TAIL = 0.025;

  private final double[] middle;
  private final double[] down;
  private final double[] up;
  private double factor;

  /**
   * Limits that hold so many of the kits.
   *
   * @param columns readings, each over all kits
   * @param rank how many kits must lie within all limits
   */
  JointWidth(double[][] columns, int rank) {
    middle = new double[columns.length];
    down = new double[columns.length];
    up = new double[columns.length];
    int kits = columns.length == 0 ? 0 : columns[0].length;
    for (int i = 0; i < columns.length; i++) {
      double[] sorted = columns[i].clone();
      Arrays.sort(sorted);
      middle[i] = quantile(sorted, 0.5);
      down[i] = middle[i] - quantile(sorted, TAIL);
      up[i] = quantile(sorted, 1 - TAIL) - middle[i];
      double least = 1e-9 * Math.max(1e-3, Math.abs(middle[i]));
      down[i] = Math.max(least, down[i]);
      up[i] = Math.max(least, up[i]);
    }
    double[] farthest = new double[kits];
    for (int kit = 0; kit < kits; kit++) {
      for (int i = 0; i < columns.length; i++) {
        double off = columns[i][kit] - middle[i];
        farthest[kit] = Math.max(farthest[kit], off > 0 ? off / up[i] : -off / down[i]);
      }
    }
    Arrays.sort(farthest);
    factor = kits == 0 ? 0 : farthest[Math.min(kits, rank) - 1];
  }

  private static double quantile(double[] sorted, double share) {
    double at = share * (sorted.length - 1);
    int low = (int) at;
    int high = Math.min(sorted.length - 1, low + 1);
    return sorted[low] + (at - low) * (sorted[high] - sorted[low]);
  }

  double low(int column) {
    return middle[column] - factor * down[column];
  }

  double high(int column) {
    return middle[column] + factor * up[column];
  }
}
