package earward.engine.internal;

import earward.block.law.ThermalVoltage;
import earward.engine.detection.CycleNoise;
import earward.engine.detection.JunctionLaw;
import earward.engine.law.CarrierDriven;
import earward.engine.law.FeedLaw;
import earward.engine.law.NoiseStage;
import org.jspecify.annotations.Nullable;

/**
 * The noise of what the carrier drives, and of the feed's own resistance beside the carrier. Where
 * all of it are diodes, each instant of the carrier's cycle counts; transistors and field-effect
 * transistors make noise by their solved mean currents. Mutable, for one thread.
 */
final class PortNoise {
  private final int ports;
  private final double[] columnRe;
  private final double[] columnIm;
  private final double[] answerRe;
  private final double[] answerIm;
  private @Nullable CycleNoise cycle;
  private boolean known;
  private boolean byCycle;

  PortNoise(int ports) {
    this.ports = ports;
    columnRe = new double[ports];
    columnIm = new double[ports];
    answerRe = new double[ports + 2];
    answerIm = new double[ports + 2];
  }

  /** Everything is to be worked out anew. */
  void clear() {
    known = false;
  }

  /** Adds what a place hears of it; the adjoint solution stands in the sum. */
  void add(CaseWork work, Detection detection, NoiseStage sum) {
    FeedLaw feed = work.network.feed;
    boolean tuned = feed != null && feed.tuned();
    double sourceOhms = feed == null ? 0 : feed.sidebandOhms(work.stage());
    if (!known) {
      known = true;
      byCycle = solveCycle(work, detection, tuned ? 0 : sourceOhms);
    }
    for (int j = 0; j < ports; j++) {
      for (int i = 0; i < ports; i++) {
        columnRe[i] = work.small.admittanceRe[i * ports + j];
        columnIm[i] = work.small.admittanceIm[i * ports + j];
      }
      answer(work, sum, 0);
      double volts = sum.fourKelvinJoules() * detection.around.seriesOhms[j];
      sum.known(volts, answerRe[0], answerIm[0]);
    }
    if (byCycle && cycle != null) {
      ofCycle(work, cycle, sum);
    } else {
      ofMeans(work, detection, sum);
    }
    if (tuned || !byCycle) {
      // both sidebands fold onto one another: 2 · 4kTR of in-phase drive (Rice 1945)
      double depth = 2 * sum.fourKelvinJoules() * sourceOhms;
      System.arraycopy(work.small.drivenRe, 0, columnRe, 0, ports);
      System.arraycopy(work.small.drivenIm, 0, columnIm, 0, ports);
      answer(work, sum, 0);
      sum.known(depth / (work.peakVolts() * work.peakVolts()), answerRe[0], answerIm[0]);
    }
  }

  private boolean solveCycle(CaseWork work, Detection detection, double sourceOhms) {
    int samples = detection.carrierOnly.carrierSamples();
    if (cycle == null) {
      cycle = new CycleNoise(ports, samples, detection.carrierOnly.carrierHarmonics());
    }
    double kelvin = work.stage().celsius() + ThermalVoltage.ZERO_CELSIUS;
    double joules = 4 * ThermalVoltage.BOLTZMANN * kelvin;
    for (int j = 0; j < ports; j++) {
      CarrierDriven part = work.network.ports[j].law();
      if (part.ports() > 1 || !(part.portLaw(work.stage()) instanceof JunctionLaw law)) {
        return false;
      }
      for (int s = 0; s < samples; s++) {
        double volts = detection.carrierOnly.junctionVolts(j, s);
        cycle.set(j, s, law, volts, joules);
      }
    }
    return cycle.solve(detection.around, joules, sourceOhms);
  }

  /** All results of the cycle with their correlations. */
  private void ofCycle(CaseWork work, CycleNoise noise, NoiseStage sum) {
    for (int i = 0; i < ports; i++) {
      work.small.junctionColumn(i, 0, columnRe, columnIm);
      answer(work, sum, i);
    }
    for (int e = 0; e < 2; e++) {
      double real = 0;
      double imaginary = 0;
      for (int i = 0; i < ports; i++) {
        double r = work.small.drawnRe[e * ports + i];
        double m = work.small.drawnIm[e * ports + i];
        real += r * answerRe[i] - m * answerIm[i];
        imaginary += r * answerIm[i] + m * answerRe[i];
      }
      answerRe[ports + e] = real;
      answerIm[ports + e] = imaginary;
    }
    double square = 0;
    for (int a = 0; a < ports + 2; a++) {
      for (int b = 0; b < ports + 2; b++) {
        double together = answerRe[a] * answerRe[b] + answerIm[a] * answerIm[b];
        square += together * noise.correlation(a, b);
      }
    }
    sum.known(square, 1, 0);
  }

  private void ofMeans(CaseWork work, Detection detection, NoiseStage sum) {
    for (int j = 0; j < ports; j++) {
      Port port = work.network.ports[j];
      if (port.which() > 0) {
        continue;
      }
      double amperes = detection.carrierOnly.audioReal[j];
      if (port.law().ports() > 1) {
        double across = -detection.carrierOnly.audioReal[j + 1];
        amperes -= across;
        work.small.junctionColumn(j, 1, columnRe, columnIm);
        answer(work, sum, 0);
        sum.known(port.law().acrossNoise(work.stage(), across), answerRe[0], answerIm[0]);
      }
      double volts = detection.carrierOnly.meanVolts(j);
      work.small.junctionColumn(j, 0, columnRe, columnIm);
      answer(work, sum, 0);
      sum.known(port.law().portNoise(work.stage(), amperes, volts), answerRe[0], answerIm[0]);
    }
  }

  /** What the place hears of the currents in the column, into one entry of the answers. */
  private void answer(CaseWork work, NoiseStage sum, int into) {
    double real = 0;
    double imaginary = 0;
    for (int i = 0; i < ports; i++) {
      int anode = work.network.ports[i].anode(work.stage());
      int cathode = work.network.ports[i].cathode(work.stage());
      double r = sum.answerRe(anode, cathode);
      double m = sum.answerIm(anode, cathode);
      real += r * columnRe[i] - m * columnIm[i];
      imaginary += r * columnIm[i] + m * columnRe[i];
    }
    answerRe[into] = real;
    answerIm[into] = imaginary;
  }
}
