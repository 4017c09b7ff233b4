package earward.timing;

import java.io.PrintStream;
import java.util.List;

/** Holds times against their bars and says with the exit code whether all were kept. */
final class Bars {
  private Bars() {}

  /** Prints one line a bar; returns 0 where all were kept, 1 where one was missed or failed. */
  static int run(List<? extends Bar> bars, boolean quick, PrintStream out) {
    int code = bars.isEmpty() ? 1 : 0;
    for (Bar bar : bars) {
      try {
        Timed timed = bar.measure(quick);
        out.println(timed.line());
        code = timed.kept() ? code : 1;
      } catch (Exception e) {
        out.println("FAILED " + bar.name() + ": " + e);
        code = 1;
      }
    }
    return code;
  }
}
