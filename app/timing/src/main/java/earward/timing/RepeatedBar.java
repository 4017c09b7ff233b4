package earward.timing;

import java.util.Arrays;
import java.util.Objects;

/**
 * The median of some runs by the wall clock, for what starts a process of its own.
 *
 * @param name what is timed
 * @param limitSeconds the median must be at most this
 * @param runs how often at full length; one more run comes first and is not counted
 * @param work what is timed
 */
record RepeatedBar(String name, double limitSeconds, int runs, Work work) implements Bar {
  private static final double NANOS = 1e9;

  /** One run of what is timed. */
  @FunctionalInterface
  interface Work {
    /** Does it once; whatever it throws misses the bar. */
    void run() throws Exception;
  }

  RepeatedBar {
    Objects.requireNonNull(work);
    if (runs < 1) {
      throw new IllegalArgumentException("bar '" + name + "' needs at least one run");
    }
  }

  @Override
  public Timed measure(boolean quick) throws Exception {
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
    return new Timed(name, median, quick ? limitSeconds * QUICK_SLACK : limitSeconds);
  }
}
