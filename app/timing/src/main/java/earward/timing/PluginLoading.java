package earward.timing;

import earward.host.PluginSet;
import earward.host.Plugins;
import java.io.IOException;
import org.openjdk.jmh.annotations.Benchmark;

/** How long all plug-ins of ours take to load. */
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
