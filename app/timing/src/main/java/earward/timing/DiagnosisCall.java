package earward.timing;

import earward.timing.diagnosis.TrialCall;
import java.io.IOException;
import java.io.PrintStream;

/** Reads what is asked of the trial of diagnoses, and runs it. */
final class DiagnosisCall {
  private static final int TRIALS = 1000;

  private DiagnosisCall() {}

  /** Runs it; returns the exit code, 2 for a call that makes no sense. */
  static int run(String[] arguments, PrintStream out, PrintStream messages) throws IOException {
    String kit = "hayloft";
    int trials = TRIALS;
    long seed = 1;
    try {
      for (int i = 1; i < arguments.length; i += 2) {
        String value = i + 1 < arguments.length ? arguments[i + 1] : "";
        switch (arguments[i]) {
          case "--kit" -> kit = value;
          case "--trials" -> trials = Integer.parseInt(value);
          case "--seed" -> seed = Long.parseLong(value);
          default ->
              throw new IllegalArgumentException(
                  "'" + arguments[i] + "'; wanted are --kit, --trials and --seed");
        }
      }
      if (!StarterKit.NAMES.contains(kit) || trials < 1) {
        throw new IllegalArgumentException(
            "kit '" + kit + "' and " + trials + " trials; wanted one of " + StarterKit.NAMES);
      }
    } catch (NumberFormatException e) {
      messages.println("diagnosis: a whole number is wanted: " + e.getMessage());
      return 2;
    } catch (IllegalArgumentException e) {
      messages.println("diagnosis: found " + e.getMessage());
      return 2;
    }
    try (StarterKit starter = StarterKit.open(kit)) {
      return TrialCall.run(kit, starter.assembled(), trials, seed, out);
    }
  }
}
