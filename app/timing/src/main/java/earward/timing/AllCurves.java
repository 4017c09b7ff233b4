package earward.timing;

import earward.kit.path.Assembly;
import earward.kit.path.KitCurves;
import java.io.IOException;
import java.util.Arrays;

/**
 * All curves of the Design desk of a starter kit, warm: response, depth, level, tone and knobs,
 * side by side; by the wall clock.
 *
 * @param kit the starter kit
 */
record AllCurves(String kit) implements Bar {
  private static final double LIMIT_SECONDS = 0.15;

  /** On a machine with other work caches are not its own: a quick run may take four times that. */
  private static final double SLACK = 4;

  private static final int RUNS = 25;
  private static final double NANOS = 1e9;

  @Override
  public String name() {
    return "all curves of " + kit;
  }

  @Override
  public Timed measure(boolean quick) throws IOException {
    try (StarterKit opened = StarterKit.open(kit)) {
      Assembly assembly = opened.assembled();
      double[] seconds = new double[quick ? RUNS / QUICK_SHARE : RUNS];
      for (int i = -RUNS; i < seconds.length; i++) {
        long start = System.nanoTime();
        if (KitCurves.of(assembly).isEmpty()) {
          throw new IllegalStateException("the curves of " + kit + " were not solved");
        }
        seconds[Math.max(0, i)] = (System.nanoTime() - start) / NANOS;
      }
      Arrays.sort(seconds);
      double median = seconds[seconds.length / 2];
      return new Timed(name(), median, quick ? LIMIT_SECONDS * SLACK : LIMIT_SECONDS);
    }
  }
}
