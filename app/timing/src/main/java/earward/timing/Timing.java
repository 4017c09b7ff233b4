package earward.timing;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.openjdk.jmh.Main;

/**
 * Starts the timings. {@code bars [--quick]} holds times against their bars and ends with 1 where
 * one was missed; {@code accuracy [--from N] [--count N] [--seed S]} holds random designs against
 * their full waveform; {@code diagnosis [--kit NAME] [--trials N] [--seed S]} has kits with known
 * faults diagnosed and ends with 1 where too few were right; {@code cost} prints what a solve costs
 * against nodes, devices and harmonics; {@code edits} types five hundred values into the desktop's
 * window; anything else goes to JMH.
 */
public final class Timing {
  private Timing() {}

  /**
   * Runs the bars, the accuracy run, the table of costs, or the benchmarks that the arguments name.
   *
   * @param arguments {@code bars [--quick]}, {@code accuracy ...}, {@code diagnosis ...}, or as the
   *     class says, or JMH's own
   * @throws IOException where the results cannot be written
   */
  public static void main(String[] arguments) throws IOException {
    if (arguments.length > 0 && arguments[0].equals("bars")) {
      boolean quick = arguments.length > 1 && arguments[1].equals("--quick");
      System.exit(Bars.run(bars(), quick, System.out));
    }
    if (arguments.length > 0 && arguments[0].equals("accuracy")) {
      System.exit(AccuracyCall.run(arguments, System.out, System.err));
    }
    if (arguments.length > 0 && arguments[0].equals("diagnosis")) {
      System.exit(DiagnosisCall.run(arguments, System.out, System.err));
    }
    if (arguments.length > 0 && arguments[0].equals("cost")) {
      System.exit(CostTable.print(System.out));
    }
    if (arguments.length > 0 && arguments[0].equals("edits")) {
      System.exit(EditsCall.run(System.out));
    }
    Main.main(arguments);
  }

  private static List<Bar> bars() {
    List<Bar> bars = new ArrayList<>();
    for (String kit : StarterKit.NAMES) {
      bars.add(new RepeatedBar("earward sheet " + kit + " from a cold start", 3, 10, sheet(kit)));
    }
    bars.add(new WarmBar("all plug-ins loaded", 0.25, "PluginLoading.allPlugins"));
    bars.add(new WarmBar("blocks described and joined", 0.016, "AfterAnEdit.assembled"));
    bars.add(new WarmBar("the headline after an edited value", 0.016, "EditedValue.headline"));
    for (String kit : StarterKit.NAMES) {
      bars.add(new OneKit(kit));
    }
    bars.add(new ThousandKits("hayloft", true));
    for (String kit : StarterKit.NAMES) {
      bars.add(new AllCurves(kit));
    }
    bars.add(new AgainstWaveform("lantern"));
    for (String kit : StarterKit.NAMES) {
      bars.add(new WaveformSteps(kit));
    }
    return bars;
  }

  private static RepeatedBar.Work sheet(String kit) {
    return () -> {
      Path folder = Files.createTempDirectory("earward-timing");
      Path sheet = folder.resolve("sheet.pdf");
      try {
        Program.start("sheet", StarterKit.file(kit).toString(), "-o", sheet.toString());
      } finally {
        Files.deleteIfExists(sheet);
        Files.delete(folder);
      }
    };
  }
}
