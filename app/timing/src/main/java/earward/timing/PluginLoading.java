package earward.timing;

import earward.host.PluginSet;
import earward.host.Plugins;
import java.io.IOException;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Warmup;

/** How long all plug-ins of ours take to load. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class PluginLoading {

  /** Loads and closes them; returns how many types there were. */
  @Benchmark
  public int allPlugins() throws IOException {
    try (PluginSet set = Plugins.load(Program.plugins())) {
      if (!set.refusals().isEmpty()) {
        throw new IOException(set.refusals().get(0).sentence());
      }
      return set.all().size();
    }
  }
}
