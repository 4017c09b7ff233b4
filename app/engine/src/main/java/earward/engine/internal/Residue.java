package earward.engine.internal;

import earward.engine.Drive;
import java.util.Locale;

/**
 * Whether the highest harmonics of a solved case have died away. Detection is sampled as finely as
 * the nominal kit wants, up to a limit; what that still cuts off is said.
 */
final class Residue {
  private Residue() {}

  /** What was cut off in a solved case, as a sentence without its end; empty where nothing was. */
  static String left(CaseWork work) {
    Detection detection = work.detection;
    if (detection == null || work.plan.drive != Drive.SIGNAL || !work.done()) {
      return "";
    }
    double aliasing = detection.modulated.aliasing();
    if (!Fineness.cycleIsMet(aliasing)) {
      return say(
          work,
          "the pulses at %s are narrower than the finest samples of a carrier cycle; twice as many"
              + " would move the mean current by %.2g of itself",
          aliasing);
    }
    double top = detection.modulated.topHarmonic();
    return Fineness.periodIsMet(top)
        ? ""
        : say(work, "at %s the highest harmonic of the tone is %.2g of its fundamental", top);
  }

  private static String say(CaseWork work, String sentence, double share) {
    return String.format(Locale.ROOT, sentence, work.network.drivenNames(), share);
  }
}
