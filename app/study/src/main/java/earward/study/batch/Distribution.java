package earward.study.batch;

import java.util.ArrayList;
import java.util.List;

/**
 * How a figure is distributed over the kits of a batch: exact ends, mean and deviation, and counts
 * in fixed bins. Its size does not grow with the number of kits.
 *
 * @param count kits that have the figure
 * @param least least of all
 * @param most most of all
 * @param mean mean; NaN without kits
 * @param standardDeviation of the kits (divided by their number less one); 0 for fewer than two
 * @param binStart lower end of the first bin
 * @param binWidth width of a bin, above 0
 * @param bins kits in each bin
 * @param below kits under the first bin
 * @param above kits beyond the last bin
 */
public record Distribution(
    long count,
    double least,
    double most,
    double mean,
    double standardDeviation,
    double binStart,
    double binWidth,
    List<Long> bins,
    long below,
    long above) {
  public Distribution {
    bins = List.copyOf(bins);
  }

  /**
   * The value below which a share of the kits lies, in error by at most {@link #quantileError}
   * where it lies within the bins; NaN without kits.
   *
   * @param share from 0 to 1
   */
  public double quantile(double share) {
    if (count == 0) {
      return Double.NaN;
    }
    double wanted = Math.min(1, Math.max(0, share)) * count;
    double before = below;
    if (wanted <= before) {
      return below == 0 ? least : within(least, binStart, wanted / before);
    }
    for (int i = 0; i < bins.size(); i++) {
      long here = bins.get(i);
      if (here > 0 && wanted <= before + here) {
        double start = binStart + i * binWidth;
        return clipped(start + binWidth * (wanted - before) / here);
      }
      before += here;
    }
    return above == 0
        ? most
        : within(binStart + bins.size() * binWidth, most, (wanted - before) / above);
  }

  /** By how much a quantile within the bins may be off: the width of a bin. */
  public double quantileError() {
    return binWidth;
  }

  private double within(double from, double to, double share) {
    return clipped(from + (to - from) * share);
  }

  private double clipped(double value) {
    return Math.min(most, Math.max(least, value));
  }

  /**
   * Counts in fewer and equal bars between least and most, for a picture; a bin counts whole where
   * its middle lies.
   *
   * @param bars at least 1
   */
  public List<Long> bars(int bars) {
    long[] counts = new long[bars];
    double width = (most - least) / bars;
    counts[0] += below;
    counts[bars - 1] += above;
    for (int i = 0; i < bins.size(); i++) {
      double middle = binStart + (i + 0.5) * binWidth;
      int at = width > 0 ? (int) ((middle - least) / width) : 0;
      counts[Math.min(bars - 1, Math.max(0, at))] += bins.get(i);
    }
    List<Long> list = new ArrayList<>();
    for (long each : counts) {
      list.add(each);
    }
    return list;
  }
}
