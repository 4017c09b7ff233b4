package earward.timing;

import earward.timing.accuracy.AccuracyRun;
import java.io.PrintStream;

/** The command line of the accuracy run: {@code accuracy [--from N] [--count N] [--seed S]}. */
final class AccuracyCall {
  private AccuracyCall() {}

  /** Runs it; returns the exit code, 2 for a call that makes no sense. */
  static int run(String[] arguments, PrintStream out, PrintStream messages) {
    long seed = AccuracyRun.SEED;
    int from = 0;
    int count = AccuracyRun.ALL;
    try {
      for (int i = 1; i < arguments.length; i += 2) {
        String value = i + 1 < arguments.length ? arguments[i + 1] : "";
        switch (arguments[i]) {
          case "--from" -> from = Integer.parseInt(value);
          case "--count" -> count = Integer.parseInt(value);
          case "--seed" -> seed = Long.parseLong(value);
          default ->
              throw new IllegalArgumentException(
                  "'" + arguments[i] + "'; wanted are --from, --count and --seed");
        }
      }
      return new AccuracyRun(seed, from, count).run(out);
    } catch (NumberFormatException e) {
      messages.println("accuracy: a whole number is wanted: " + e.getMessage());
      return 2;
    } catch (IllegalArgumentException e) {
      messages.println("accuracy: found " + e.getMessage());
      return 2;
    }
  }
}
