package earward.timing;

import java.util.Locale;

/**
 * What was measured.
 *
 * @param name what was timed
 * @param seconds that one took
 * @param limitSeconds that it was held against; infinite where it is only told
 */
record Timed(String name, double seconds, double limitSeconds) {
  private static final double MILLIS = 1e3;

  Timed {
    if (!(limitSeconds > 0)) {
      throw new IllegalArgumentException("bar '" + name + "' needs a limit above 0 s");
    }
  }

  boolean kept() {
    return seconds <= limitSeconds;
  }

  /** One line: whether it was kept, the time, the limit, the ratio of the two, and the rate. */
  String line() {
    String rate =
        String.format(Locale.ROOT, "%.4g ms, %.4g a second", MILLIS * seconds, 1 / seconds);
    if (Double.isInfinite(limitSeconds)) {
      return "told   " + name + ": " + rate;
    }
    return String.format(
        Locale.ROOT,
        "%-6s %s: %s; at most %.4g ms; %.2f of the limit",
        kept() ? "kept" : "MISSED",
        name,
        rate,
        MILLIS * limitSeconds,
        seconds / limitSeconds);
  }
}
