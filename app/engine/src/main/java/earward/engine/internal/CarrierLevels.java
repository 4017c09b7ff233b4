package earward.engine.internal;

import earward.engine.detection.CarrierSurroundings;
import earward.engine.detection.EnvelopeSolver;
import earward.engine.law.FeedLaw;

/** Levels at the carrier and its multiples. */
final class CarrierLevels {
  private CarrierLevels() {}

  /**
   * Residue between two nodes at a multiple of the carrier, root mean square over the audio period,
   * in V.
   */
  static double rmsVolts(CaseWork work, int harmonic, int plus, int minus) {
    if (!work.solved() || work.network.feed == null) {
      return Double.NaN;
    }
    Detection detection = work.detection;
    if (detection == null) {
      return harmonic == 1 ? undetected(work, work.network.feed, plus, minus) : 0;
    }
    if (!work.answersAtCarrier()) {
      return Double.NaN;
    }
    EnvelopeSolver solved = detection.modulated;
    int ports = work.network.ports.length;
    int width = (solved.carrierHarmonics() + 1) * ports;
    double sum = 0;
    for (int s = 0; s < solved.audioSamples(); s++) {
      double real = 0;
      double imaginary = 0;
      if (harmonic == 1) {
        double r = difference(work.carrierTable, 1, 0, plus, minus, true);
        double m = difference(work.carrierTable, 1, 0, plus, minus, false);
        real += r * solved.feedReal[s] - m * solved.feedImaginary[s];
        imaginary += r * solved.feedImaginary[s] + m * solved.feedReal[s];
      }
      for (int j = 0; j < ports; j++) {
        double r = difference(work.carrierTable, harmonic, j + 1, plus, minus, true);
        double m = difference(work.carrierTable, harmonic, j + 1, plus, minus, false);
        double ir = solved.carrierReal()[s * width + harmonic * ports + j];
        double ii = solved.carrierImaginary()[s * width + harmonic * ports + j];
        real += r * ir - m * ii;
        imaginary += r * ii + m * ir;
      }
      sum += real * real + imaginary * imaginary;
    }
    return Math.sqrt(sum / solved.audioSamples() / 2);
  }

  private static double difference(
      CarrierTable table, int harmonic, int column, int plus, int minus, boolean real) {
    return real
        ? table.re(harmonic, column, plus) - table.re(harmonic, column, minus)
        : table.im(harmonic, column, plus) - table.im(harmonic, column, minus);
  }

  /** A path without a carrier-driven device: what its linear network makes of the feed. */
  private static double undetected(CaseWork work, FeedLaw feed, int plus, int minus) {
    CarrierSurroundings around = new CarrierSurroundings(0, 1, 1);
    double radians = work.carrierRadians();
    if (!work.carrierTable.fill(work.alternating, work.stage(), feed, radians, around)) {
      return Double.NaN;
    }
    double held = work.peakVolts();
    if (feed.tuned()) {
      double reactive = -2 * around.tankFarads * feed.detuningRadians(work.stage());
      held /= Math.hypot(1 + around.tankOhms * around.loadRealSiemens, around.tankOhms * reactive);
    }
    double modulation = Math.sqrt(1 + work.depth() * work.depth() / 2);
    double r = difference(work.carrierTable, 1, 0, plus, minus, true);
    double m = difference(work.carrierTable, 1, 0, plus, minus, false);
    return held * modulation * Math.hypot(r, m) / Math.sqrt(2);
  }

  /** Fundamental across a port, peak, complex: real part in [0], imaginary in [1]. */
  private static double portVolts(CaseWork work, Detection detection, int port, boolean real) {
    EnvelopeSolver solved = detection.carrierOnly;
    CarrierSurroundings around = detection.around;
    int ports = work.network.ports.length;
    double er = solved.feedReal[0];
    double ei = solved.feedImaginary[0];
    double tr = around.transferReal[port];
    double ti = around.transferImaginary[port];
    double sum = real ? tr * er - ti * ei : tr * ei + ti * er;
    for (int j = 0; j < ports; j++) {
      double zr = around.carrierRealOhms[around.index(1, port, j)];
      double zi = around.carrierImaginaryOhms[around.index(1, port, j)];
      double ir = solved.carrierReal()[ports + j];
      double ii = solved.carrierImaginary()[ports + j];
      sum -= real ? zr * ir - zi * ii : zr * ii + zi * ir;
    }
    return sum;
  }

  /** Peak of the bare carrier across a device, all loads in place, in V. */
  static double portPeakVolts(CaseWork work, int port) {
    Detection detection = work.detection;
    return detection != null && work.carrierSolved()
        ? Math.hypot(
            portVolts(work, detection, port, true), portVolts(work, detection, port, false))
        : Double.NaN;
  }

  /** Rectified DC over the carrier's peak. */
  static double efficiency(CaseWork work, int port) {
    Detection detection = work.detection;
    if (detection == null || !work.carrierSolved()) {
      return Double.NaN;
    }
    double rectified = 0;
    for (int j = 0; j < work.network.ports.length; j++) {
      rectified +=
          detection.around.audioRealOhms[detection.around.index(0, port, j)]
              * detection.carrierOnly.audioReal[j];
    }
    return rectified / portPeakVolts(work, port);
  }

  /** What a device presents to the carrier: |V|² over the real power's V·conj(I), in Ω. */
  static double inputOhms(CaseWork work, int port) {
    Detection detection = work.detection;
    if (detection == null || !work.carrierSolved()) {
      return Double.NaN;
    }
    double vr = portVolts(work, detection, port, true);
    double vi = portVolts(work, detection, port, false);
    int at = work.network.ports.length + port;
    double power =
        vr * detection.carrierOnly.carrierReal()[at]
            + vi * detection.carrierOnly.carrierImaginary()[at];
    return (vr * vr + vi * vi) / power;
  }

  /**
   * Heat of a device on the bare carrier, in W: what it takes from the carrier less what it gives
   * as DC and as harmonics, Σ ½·Re(V·conj(I)) + V0·I0.
   */
  static double heatWatts(CaseWork work, int port) {
    Detection detection = work.detection;
    if (detection == null || !work.carrierSolved()) {
      return Double.NaN;
    }
    CarrierSurroundings around = detection.around;
    EnvelopeSolver solved = detection.carrierOnly;
    int ports = work.network.ports.length;
    double direct = around.openVolts[port];
    for (int j = 0; j < ports; j++) {
      direct -= around.audioRealOhms[around.index(0, port, j)] * solved.audioReal[j];
    }
    double watts = direct * solved.audioReal[port];
    for (int k = 1; k <= solved.carrierHarmonics(); k++) {
      double real = k == 1 ? portVolts(work, detection, port, true) : 0;
      double imaginary = k == 1 ? portVolts(work, detection, port, false) : 0;
      for (int j = 0; j < ports && k > 1; j++) {
        double zr = around.carrierRealOhms[around.index(k, port, j)];
        double zi = around.carrierImaginaryOhms[around.index(k, port, j)];
        double ir = solved.carrierReal()[k * ports + j];
        double ii = solved.carrierImaginary()[k * ports + j];
        real -= zr * ir - zi * ii;
        imaginary -= zr * ii + zi * ir;
      }
      watts +=
          0.5
              * (real * solved.carrierReal()[k * ports + port]
                  + imaginary * solved.carrierImaginary()[k * ports + port]);
    }
    return watts;
  }

  /** Admittance of a device to the bare carrier: real part or imaginary part, in S. */
  static double admittance(CaseWork work, Detection detection, int port, boolean real) {
    double vr = portVolts(work, detection, port, true);
    double vi = portVolts(work, detection, port, false);
    int at = work.network.ports.length + port;
    double ir = detection.carrierOnly.carrierReal()[at];
    double ii = detection.carrierOnly.carrierImaginary()[at];
    double norm = vr * vr + vi * vi;
    return real ? (ir * vr + ii * vi) / norm : (ii * vr - ir * vi) / norm;
  }
}
