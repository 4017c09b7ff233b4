package earward.timing;

import java.io.IOException;
import java.util.List;
import org.openjdk.jmh.Main;

/**
 * Starts the timings. {@code bars [--quick]} holds times against their bars and ends with 1 where
 * one was missed; anything else goes to JMH.
 */
public final class Timing {
  private Timing() {}

  /**
   * Runs the bars, or the benchmarks that the arguments name.
   *
   * @param arguments {@code bars [--quick]}, or JMH's own
   * @throws IOException where the results cannot be written
   */
  public static void main(String[] arguments) throws IOException {
    if (arguments.length > 0 && arguments[0].equals("bars")) {
      boolean quick = arguments.length > 1 && arguments[1].equals("--quick");
      System.exit(Bars.run(bars(), quick, System.out));
    }
    Main.main(arguments);
  }

  private static List<Bar> bars() {
    return List.of(
        new RepeatedBar("earward blocks from a cold start", 1.0, 10, () -> Program.start("blocks")),
        new WarmBar("all plug-ins loaded", 0.25, "PluginLoading.allPlugins"));
  }
}
