package earward.study.batch;

import java.util.ArrayList;
import java.util.List;

/**
 * Counts one figure over the kits, in the order of their numbers. Bins are laid out after the first
 * kits and never moved. For one thread.
 */
final class Tally {
  private static final int BINS = 1024;

  /** How far the bins reach beyond the first kits' ends, as a share of what lies between these. */
  private static final double MARGIN = 0.5;

  private static final double LEAST_SPAN = 1e-12;

  private final double binStart;
  private final double binWidth;
  private final long[] bins = new long[BINS];
  private long below;
  private long above;
  private long count;
  private double least = Double.POSITIVE_INFINITY;
  private double most = Double.NEGATIVE_INFINITY;
  private double mean;
  private double squares;

  /** A tally with its bins laid out about the first kits' figures. */
  Tally(double[] first) {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (double each : first) {
      if (Double.isFinite(each)) {
        low = Math.min(low, each);
        high = Math.max(high, each);
      }
    }
    if (low > high) {
      low = 0;
      high = 0;
    }
    double span = high - low;
    double margin = Math.max(MARGIN * span, LEAST_SPAN * Math.max(1e-3, Math.abs(high)));
    binStart = low - margin;
    binWidth = (span + 2 * margin) / BINS;
  }

  /** Counts a kit; a figure that does not exist or is infinite is left out. */
  void add(double value) {
    if (!Double.isFinite(value)) {
      return;
    }
    count++;
    least = Math.min(least, value);
    most = Math.max(most, value);
    double off = value - mean;
    mean += off / count; // Welford 1962
    squares += off * (value - mean);
    double at = (value - binStart) / binWidth;
    if (at < 0) {
      below++;
    } else if (at >= BINS) {
      above++;
    } else {
      bins[(int) at]++;
    }
  }

  double standardDeviation() {
    return count < 2 ? 0 : Math.sqrt(squares / (count - 1));
  }

  double mean() {
    return count == 0 ? Double.NaN : mean;
  }

  Distribution distribution() {
    List<Long> counts = new ArrayList<>(BINS);
    for (long each : bins) {
      counts.add(each);
    }
    boolean any = count > 0;
    return new Distribution(
        count,
        any ? least : Double.NaN,
        any ? most : Double.NaN,
        mean(),
        standardDeviation(),
        binStart,
        binWidth,
        counts,
        below,
        above);
  }
}
