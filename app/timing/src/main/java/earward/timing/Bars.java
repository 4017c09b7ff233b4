package earward.timing;

import java.io.PrintStream;
import java.util.List;
import java.util.Locale;

/** Holds times against their bars and says with the exit code whether all were kept. */
final class Bars {
  private Bars() {}

  /** Prints one line a bar; returns 0 where all were kept, 1 where one was missed or failed. */
  static int run(List<Bar> bars, boolean quick, PrintStream out) {
    int code = 0;
    for (Bar bar : bars) {
      try {
        Bar.Result result = bar.measure(quick);
        out.printf(
            Locale.ROOT,
            "%-6s %s: %.4g s, at most %.4g s (%.0f %%)%n",
            result.kept() ? "kept" : "MISSED",
            result.name(),
            result.medianSeconds(),
            result.limitSeconds(),
            100 * result.medianSeconds() / result.limitSeconds());
        code = result.kept() ? code : 1;
      } catch (Exception e) {
        out.printf(Locale.ROOT, "FAILED %s: %s%n", bar.name(), e);
        code = 1;
      }
    }
    return code;
  }
}
