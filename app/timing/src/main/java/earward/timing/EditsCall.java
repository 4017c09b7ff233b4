package earward.timing;

import earward.block.check.Finding;
import earward.desktop.model.Workshop;
import earward.desktop.view.EditTiming;
import earward.host.PluginSet;
import earward.host.Plugins;
import earward.kit.file.PartsFiles;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Types five hundred values into the desktop's window, as fast as their figures are painted, and
 * holds the times against their bar: median 16 ms, 99 of 100 within 60 ms from the keystroke to the
 * painted headline figures. Wants a display.
 */
final class EditsCall {
  private static final int EDITS = 500;
  private static final int WARM_UP = 60;
  private static final double MEDIAN_SECONDS = 0.016;
  private static final double MOST_SECONDS = 0.060;
  private static final double NANOS = 1e9;

  private EditsCall() {}

  /** Runs them; returns 0 where the bar was kept, 1 where it was missed or nothing was measured. */
  static int run(PrintStream out) {
    try (PluginSet types = Plugins.load(Program.plugins())) {
      Workshop workshop =
          new Workshop(
              types,
              PartsFiles.read(Program.home().resolve("templates/parts")),
              List.of(),
              types.refusals().stream().map(Finding::sentence).toList());
      Path user = Files.createTempDirectory("earward-timing");
      List<String> words = new ArrayList<>();
      for (int i = 0; i < WARM_UP + EDITS; i++) {
        words.add((1000 + i) + " pF");
      }
      EditTiming.Times times =
          EditTiming.of(workshop, user, StarterKit.file("lantern"), "detector.c1", words);
      return said(times, out);
    } catch (Exception e) {
      out.println("FAILED edits: " + e);
      return 1;
    }
  }

  private static int said(EditTiming.Times times, PrintStream out) {
    List<Long> sorted =
        times.keystrokes().subList(WARM_UP, times.keystrokes().size()).stream().sorted().toList();
    double median = sorted.get(sorted.size() / 2) / NANOS;
    double most = sorted.get(sorted.size() * 99 / 100) / NANOS;
    out.printf(
        Locale.ROOT,
        "%d edits, keystroke to painted headline: median %.1f ms (bar %.0f ms, %.2f of it),"
            + " 99 of 100 within %.1f ms (bar %.0f ms, %.2f of it);"
            + " longest hold of the event thread by a keystroke %.1f ms%n",
        sorted.size(),
        median * 1e3,
        MEDIAN_SECONDS * 1e3,
        median / MEDIAN_SECONDS,
        most * 1e3,
        MOST_SECONDS * 1e3,
        most / MOST_SECONDS,
        times.longestOnEventThread() / 1e6);
    return median <= MEDIAN_SECONDS && most <= MOST_SECONDS ? 0 : 1;
  }
}
