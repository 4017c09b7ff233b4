package earward.timing;

import java.util.Arrays;
import java.util.Objects;

/**
 * A time that must be kept: the median of some runs against a limit.
 *
 * @param name what is timed
 * @param limitSeconds the median must be at most this
 * @param runs how often at full length; one more run comes first and is not counted
 * @param work what is timed
 */
record Bar(String name, double limitSeconds, int runs, Work work) {
  private static final int QUICK_SHARE = 5;
  private static final double QUICK_SLACK = 2;
  private static final double NANOS = 1e9;

  /** One run of what is timed. */
  @FunctionalInterface
  interface Work {
    /** Does it once; whatever it throws misses the bar. */
    void run() throws Exception;
  }

  /**
   * What was measured.
   *
   * @param name what was timed
   * @param medianSeconds of the counted runs
   * @param limitSeconds that it was held against
   */
  record Result(String name, double medianSeconds, double limitSeconds) {
    boolean kept() {
      return medianSeconds <= limitSeconds;
    }
  }

  Bar {
    Objects.requireNonNull(work);
    if (!(limitSeconds > 0) || runs < 1) {
      throw new IllegalArgumentException("bar '" + name + "' needs a limit above 0 s and a run");
    }
  }

  /**
   * Runs it.
   *
   * @param quick a fifth of the length against twice the time, for a busy machine
   */
  Result measure(boolean quick) throws Exception {
    int count = quick ? Math.max(1, runs / QUICK_SHARE) : runs;
    work.run();
    double[] seconds = new double[count];
    for (int run = 0; run < count; run++) {
      long start = System.nanoTime();
      work.run();
      seconds[run] = (System.nanoTime() - start) / NANOS;
    }
    Arrays.sort(seconds);
    double median = (seconds[(count - 1) / 2] + seconds[count / 2]) / 2;
    return new Result(name, median, quick ? limitSeconds * QUICK_SLACK : limitSeconds);
  }
}
