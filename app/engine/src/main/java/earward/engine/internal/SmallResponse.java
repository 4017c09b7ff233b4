package earward.engine.internal;

import earward.block.law.ToneCurve;
import earward.engine.Drive;

/** The response of all unknowns to a small modulation of the carrier. */
final class SmallResponse {
  private static final double LOWEST_HERTZ = 5;
  private static final double HIGHEST_HERTZ = 100e3;
  static final int POINTS = 48;
  private static final int HALVINGS = 12;

  /** Frequencies at which a response is held against the curve wanted. */
  private static final int DEVIATION_POINTS = 24;

  private SmallResponse() {}

  /**
   * Solves at one frequency for modulation of depth 1 of the case's carrier; the result stands in
   * the case's solver.
   */
  static boolean at(CaseWork work, double hertz) {
    Detection detection = work.detection;
    if (detection == null || !work.carrierSolved()) {
      return false;
    }
    double radians = 2 * Math.PI * hertz;
    work.small.fill(detection.around, detection.carrierOnly, work.peakVolts(), radians);
    work.alternating.stage().beginAudio(radians);
    work.alternating.stamp();
    addPorts(work);
    if (!work.alternating.factor()) {
      return false;
    }
    work.alternating.rest();
    for (int j = 0; j < work.network.ports.length; j++) {
      work.alternating.push(
          work.network.ports[j].anode(work.stage()),
          work.network.ports[j].cathode(work.stage()),
          work.small.drivenRe[j],
          work.small.drivenIm[j]);
    }
    work.alternating.solve();
    return true;
  }

  /**
   * Stamps and factors the whole circuit for small audio at one frequency, the carrier-driven
   * devices of a signal case included.
   */
  static boolean stamped(CaseWork work, double hertz) {
    double radians = 2 * Math.PI * hertz;
    Detection detection = work.plan.drive == Drive.SIGNAL ? work.detection : null;
    if (detection != null) {
      if (!work.carrierSolved()) {
        return false;
      }
      work.small.fill(detection.around, detection.carrierOnly, work.peakVolts(), radians);
    }
    work.alternating.stage().beginAudio(radians);
    work.alternating.stamp();
    if (detection != null) {
      addPorts(work);
    }
    return work.alternating.factor();
  }

  /** Adds the small-signal admittances between the ports to the stamped circuit. */
  static void addPorts(CaseWork work) {
    int ports = work.network.ports.length;
    for (int i = 0; i < ports; i++) {
      int from = work.network.ports[i].anode(work.stage());
      int to = work.network.ports[i].cathode(work.stage());
      for (int j = 0; j < ports; j++) {
        int plus = work.network.ports[j].anode(work.stage());
        int minus = work.network.ports[j].cathode(work.stage());
        double real = work.small.admittanceRe[i * ports + j];
        double imaginary = work.small.admittanceIm[i * ports + j];
        work.alternating.stage().transconductance(from, to, plus, real, imaginary);
        work.alternating.stage().transconductance(from, to, minus, -real, -imaginary);
      }
    }
  }

  private static double magnitude(CaseWork work, double hertz, int plus, int minus) {
    return at(work, hertz)
        ? frontEnd(work, hertz)
            * Math.hypot(
                work.alternating.re(plus) - work.alternating.re(minus),
                work.alternating.im(plus) - work.alternating.im(minus))
        : Double.NaN;
  }

  /** What the front end leaves of the sidebands of a tone. */
  static double frontEnd(CaseWork work, double hertz) {
    return work.network.circuit.frontEnd().share(hertz, work.row[work.network.carrierHertz]);
  }

  /**
   * Where the response between the lowest and the highest tone leaves the wanted curve most, both
   * over their values at the test tone: the deviation in dB with its sign, or its frequency in Hz.
   */
  static double deviation(CaseWork work, int plus, int minus, boolean where) {
    double low = work.row[work.network.lowestTone];
    double high = work.row[work.network.highestTone];
    double tone = Math.min(high, Math.max(low, work.row[work.network.tone]));
    ToneCurve curve = work.network.circuit.curve();
    double reference = 20 * Math.log10(magnitude(work, tone, plus, minus)) - curve.decibels(tone);
    double step = Math.pow(high / low, 1.0 / (DEVIATION_POINTS - 1));
    double most = 0;
    double at = tone;
    for (int i = 0; i < DEVIATION_POINTS; i++) {
      double hertz = low * Math.pow(step, i);
      double here = 20 * Math.log10(magnitude(work, hertz, plus, minus)) - curve.decibels(hertz);
      if (!(Math.abs(here - reference) <= Math.abs(most))) {
        most = here - reference;
        at = hertz;
      }
    }
    return where && !Double.isNaN(most) ? at : most;
  }

  /**
   * The frequency at which the response falls 3 dB below its highest, below or above that, in Hz: 0
   * where it reaches down to 5 Hz, NaN where it does not fall up to 100 kHz.
   */
  static double edge(CaseWork work, int plus, int minus, boolean upper) {
    double step = Math.pow(HIGHEST_HERTZ / LOWEST_HERTZ, 1.0 / (POINTS - 1));
    double[] magnitudes = work.magnitudes;
    int best = 0;
    for (int i = 0; i < POINTS; i++) {
      magnitudes[i] = magnitude(work, LOWEST_HERTZ * Math.pow(step, i), plus, minus);
      if (Double.isNaN(magnitudes[i])) {
        return Double.NaN;
      }
      best = magnitudes[i] > magnitudes[best] ? i : best;
    }
    double wanted = magnitudes[best] / Math.sqrt(2);
    int outside = best;
    while (outside >= 0 && outside < POINTS && magnitudes[outside] >= wanted) {
      outside += upper ? 1 : -1;
    }
    if (outside < 0 || outside >= POINTS || magnitudes[best] <= 0) {
      return upper || magnitudes[best] <= 0 ? Double.NaN : 0;
    }
    double out = LOWEST_HERTZ * Math.pow(step, outside);
    double in = upper ? out / step : out * step;
    for (int i = 0; i < HALVINGS; i++) {
      double middle = Math.sqrt(out * in);
      if (magnitude(work, middle, plus, minus) >= wanted) {
        in = middle;
      } else {
        out = middle;
      }
    }
    return Math.sqrt(out * in);
  }
}
