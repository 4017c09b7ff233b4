package earward.engine.internal;

import earward.engine.law.SourceLaw;

/**
 * What a source of supply and the path do to one another: ripple that reaches the output, and the
 * loop that closes through the source's internal resistance.
 */
final class RailView {
  private static final double LOWEST_HERTZ = 0.05;
  private static final double HIGHEST_HERTZ = 20e3;
  private static final int POINTS = 72;
  private static final int HALVINGS = 30;

  /** What is asked for. */
  enum Asked {
    REJECTION_DECIBELS,
    HUM_RMS_VOLTS,
    MARGIN_DECIBELS,
    MARGIN_HERTZ
  }

  private RailView() {}

  /** The figure; NaN where the case has no solution or the path no end. */
  static double of(CaseWork work, SourceLaw source, Asked asked) {
    if (!work.solved() || !(source.amperes(work.stage()) >= 0)) {
      return Double.NaN;
    }
    return switch (asked) {
      case REJECTION_DECIBELS -> ripple(work, source, false);
      case HUM_RMS_VOLTS -> ripple(work, source, true);
      case MARGIN_DECIBELS -> margin(work, source, false);
      case MARGIN_HERTZ -> margin(work, source, true);
    };
  }

  /** One volt of e.m.f.: hum at the path's end, or rail over path's end in dB. */
  private static double ripple(CaseWork work, SourceLaw source, boolean hum) {
    if (!push(work, source, source.rippleHertz())) {
      return Double.NaN;
    }
    AlternatingSolver solver = work.alternating;
    int plus = source.plus(work.stage());
    int minus = source.minus(work.stage());
    double rail =
        Math.hypot(solver.re(plus) - solver.re(minus), solver.im(plus) - solver.im(minus));
    int endPlus = work.network.endPlus;
    int endMinus = work.network.endMinus;
    double out =
        Math.hypot(
            solver.re(endPlus) - solver.re(endMinus), solver.im(endPlus) - solver.im(endMinus));
    if (endPlus == endMinus) {
      return Double.NaN;
    }
    double siemens = 1 / source.internalOhms(work.stage());
    return hum ? siemens * out * source.rippleRmsVolts(work.stage()) : 20 * Math.log10(rail / out);
  }

  /** Drives one ampere through the source at a frequency. */
  private static boolean push(CaseWork work, SourceLaw source, double hertz) {
    if (!SmallResponse.stamped(work, hertz)) {
      return false;
    }
    work.alternating.rest();
    work.alternating.push(source.minus(work.stage()), source.plus(work.stage()), 1, 0);
    work.alternating.solve();
    return true;
  }

  /**
   * How many times the internal resistance might be until the loop through it sustains itself, in
   * dB, or the frequency at which it would. The return ratio of the internal resistance R is R·Y,
   * with Y the admittance of all that hangs on the source, its feedback included (Bode 1945); it is
   * −1 where Y is real and −1/R. Infinite (no frequency) where Y is never real and negative.
   */
  private static double margin(CaseWork work, SourceLaw source, boolean where) {
    double step = Math.pow(HIGHEST_HERTZ / LOWEST_HERTZ, 1.0 / (POINTS - 1));
    double ohms = source.internalOhms(work.stage());
    double least = Double.POSITIVE_INFINITY;
    double at = Double.NaN;
    double before = Double.NaN;
    for (int i = 0; i < POINTS; i++) {
      double hertz = LOWEST_HERTZ * Math.pow(step, i);
      double here = admittance(work, source, hertz, false);
      if (Double.isNaN(here)) {
        return Double.NaN;
      }
      if (before * here < 0) {
        double crossing = crossing(work, source, hertz / step, hertz, before);
        double real = admittance(work, source, crossing, true);
        double decibels = -20 * Math.log10(-ohms * real);
        if (real < 0 && decibels < least) {
          least = decibels;
          at = crossing;
        }
      }
      before = here;
    }
    return where ? at : least;
  }

  /** Where the imaginary part passes through 0. */
  private static double crossing(
      CaseWork work, SourceLaw source, double fromHertz, double toHertz, double atFrom) {
    double low = fromHertz;
    double high = toHertz;
    for (int i = 0; i < HALVINGS; i++) {
      double middle = Math.sqrt(low * high);
      if (admittance(work, source, middle, false) * atFrom > 0) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return Math.sqrt(low * high);
  }

  /** Real or imaginary part of what hangs on the source, in S. */
  private static double admittance(
      CaseWork work, SourceLaw source, double hertz, boolean realPart) {
    if (!push(work, source, hertz)) {
      return Double.NaN;
    }
    int plus = source.plus(work.stage());
    int minus = source.minus(work.stage());
    double real = work.alternating.re(plus) - work.alternating.re(minus);
    double imaginary = work.alternating.im(plus) - work.alternating.im(minus);
    double norm = real * real + imaginary * imaginary;
    return realPart ? real / norm - 1 / source.internalOhms(work.stage()) : -imaginary / norm;
  }
}
