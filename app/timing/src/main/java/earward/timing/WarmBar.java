package earward.timing;

import java.util.Collection;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.options.Options;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;
import org.openjdk.jmh.runner.options.VerboseMode;

/**
 * The mean of a benchmark in a warm JVM of its own.
 *
 * @param name what is timed
 * @param limitSeconds the mean must be at most this; infinite where it is only told
 * @param benchmark {@code Class.method}
 */
record WarmBar(String name, double limitSeconds, String benchmark) implements Bar {
  private static final int WARM_UPS = 5;
  private static final int ITERATIONS = 10;
  private static final long ITERATION_MILLIS = 1000;

  @Override
  public Timed measure(boolean quick) throws Exception {
    TimeValue time =
        TimeValue.milliseconds(quick ? ITERATION_MILLIS / QUICK_SHARE : ITERATION_MILLIS);
    Options options =
        new OptionsBuilder()
            .include("^" + WarmBar.class.getPackageName() + "." + benchmark + "$")
            .mode(Mode.AverageTime)
            .timeUnit(TimeUnit.SECONDS)
            .forks(1)
            .warmupIterations(WARM_UPS)
            .warmupTime(TimeValue.milliseconds(ITERATION_MILLIS))
            .measurementIterations(ITERATIONS)
            .measurementTime(time)
            .jvmArgsAppend("-Dearward.home=" + Program.home())
            .shouldFailOnError(true)
            .verbosity(VerboseMode.SILENT)
            .build();
    Collection<RunResult> results = new Runner(options).run();
    if (results.size() != 1) {
      throw new IllegalStateException(benchmark + " is " + results.size() + " benchmarks");
    }
    RunResult result = results.iterator().next();
    // the quick run is for machines that do other work too: its best iteration counts
    double seconds =
        quick
            ? result.getPrimaryResult().getStatistics().getMin()
            : result.getPrimaryResult().getScore();
    return new Timed(name, seconds, quick ? limitSeconds * QUICK_SLACK : limitSeconds);
  }
}
