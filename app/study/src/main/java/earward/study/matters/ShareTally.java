package earward.study.matters;

/**
 * Estimates the first-order shares of a figure's variance: Var(E[y | x])/Var(y) for each input x,
 * by the correlation ratio over bins of the input, corrected for their number. Inputs must be
 * independent of each other. For one thread; its size does not grow with the kits.
 *
 * <p>Source: Pearson 1905 (correlation ratio); first-order index as in Sobol' 1993; correction for
 * the number of classes: Kelley 1935.
 */
final class ShareTally {
  private static final int BINS = 16;

  private final long[][] counts;
  private final double[][] sums;
  private long kits;
  private double mean;
  private double squares;

  /** A tally for so many inputs. */
  ShareTally(int inputs) {
    counts = new long[inputs][BINS];
    sums = new double[inputs][BINS];
  }

  /**
   * Counts a kit; a figure that does not exist is left out.
   *
   * @param draws of the inputs, from −1 to 1
   * @param figure what came out
   */
  void add(double[] draws, double figure) {
    if (!Double.isFinite(figure)) {
      return;
    }
    kits++;
    double off = figure - mean;
    mean += off / kits;
    squares += off * (figure - mean);
    for (int i = 0; i < counts.length; i++) {
      int bin = Math.max(0, Math.min(BINS - 1, (int) ((draws[i] + 1) / 2 * BINS)));
      counts[i][bin]++;
      sums[i][bin] += figure;
    }
  }

  /** The share of an input, from 0 to 1; 0 for a figure that does not move. */
  double share(int input) {
    if (kits < 2 || squares <= 0) {
      return 0;
    }
    double between = 0;
    int used = 0;
    for (int bin = 0; bin < BINS; bin++) {
      long here = counts[input][bin];
      if (here > 0) {
        double off = sums[input][bin] / here - mean;
        between += here * off * off;
        used++;
      }
    }
    double ratio = Math.min(1, between / squares);
    double corrected = 1 - (1 - ratio) * (kits - 1) / Math.max(1, kits - used);
    return Math.max(0, Math.min(1, corrected));
  }
}
