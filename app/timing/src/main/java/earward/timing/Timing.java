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
        new RepeatedBar("earward review from a cold start", 3.0, 10, () -> review("hayloft")),
        new WarmBar("all plug-ins loaded", 0.25, "PluginLoading.allPlugins"),
        new WarmBar("a design's blocks described and joined", 0.016, "AfterAnEdit.assembled"),
        new WarmBar("the headline after an edited value", 0.016, "EditedValue.headline"),
        new ThousandKits("hayloft"));
  }

  private static void review(String kit) throws IOException, InterruptedException {
    Program.start("review", StarterKit.file(kit).toString());
  }
}
