package earward.engine.internal;

import earward.engine.detection.CarrierSurroundings;
import earward.engine.detection.EnvelopeSolver;
import earward.engine.linear.ComplexLu;
import java.util.Arrays;

/**
 * What the carrier-driven devices are to small audio about an unmodulated carrier: admittances
 * between their ports, and the currents that a small modulation of the drive makes in shorted
 * ports. Both follow from the slopes of the carrier cycle; a tuned feed's own dynamics are in them.
 */
final class SmallSignal {
  private final int ports;
  final double[] admittanceRe;
  final double[] admittanceIm;
  final double[] drivenRe;
  final double[] drivenIm;

  /** Currents in shorted ports for one ampere drawn from a tuned feed: real, then imaginary. */
  final double[] drawnRe;

  final double[] drawnIm;
  private final double[] heldRe;
  private final double[] heldIm;
  private final ComplexLu series;
  private final double[] columnRe;
  private final double[] columnIm;

  SmallSignal(int ports) {
    this.ports = ports;
    admittanceRe = new double[ports * ports];
    admittanceIm = new double[ports * ports];
    drivenRe = new double[ports];
    drivenIm = new double[ports];
    drawnRe = new double[2 * ports];
    drawnIm = new double[2 * ports];
    heldRe = new double[2 * (ports + 3)];
    heldIm = new double[2 * (ports + 3)];
    series = new ComplexLu(ports);
    columnRe = new double[ports];
    columnIm = new double[ports];
  }

  /**
   * Fills admittances and driven currents.
   *
   * @param solved at depth 0
   * @param peakVolts the drive; driven currents are for modulation of depth 1
   * @param radians audio frequency
   */
  void fill(CarrierSurroundings around, EnvelopeSolver solved, double peakVolts, double radians) {
    held(around, solved, peakVolts, radians);
    for (int i = 0; i < ports; i++) {
      for (int j = 0; j < ports + 3; j++) {
        double real = j < ports ? solved.slope(0, i, j) : 0;
        double imaginary = 0;
        for (int e = 0; e < 2; e++) {
          double slope = solved.slope(0, i, ports + e);
          real += slope * heldRe[e * (ports + 3) + j];
          imaginary += slope * heldIm[e * (ports + 3) + j];
        }
        if (j < ports) {
          admittanceRe[i * ports + j] = real;
          admittanceIm[i * ports + j] = imaginary;
        } else if (j == ports) {
          drivenRe[i] = real;
          drivenIm[i] = imaginary;
        } else {
          drawnRe[(j - ports - 1) * ports + i] = real;
          drawnIm[(j - ports - 1) * ports + i] = imaginary;
        }
      }
    }
    addSeries(around);
  }

  /**
   * How the held quantity (real, imaginary) answers to each port voltage, to the drive and to what
   * is drawn from it.
   */
  private void held(
      CarrierSurroundings around, EnvelopeSolver solved, double peakVolts, double radians) {
    Arrays.fill(heldRe, 0);
    Arrays.fill(heldIm, 0);
    if (!around.tuned) {
      heldRe[ports] = peakVolts;
      return;
    }
    double ohms = around.tankOhms;
    double storing = 2 * around.tankFarads * ohms;
    double turn = storing * around.detuningRadians;
    double a = 1 + ohms * (around.loadRealSiemens + solved.slope(0, ports, ports));
    double b = -turn + ohms * (solved.slope(0, ports, ports + 1) - around.loadImaginarySiemens);
    double c = turn + ohms * (around.loadImaginarySiemens + solved.slope(0, ports + 1, ports));
    double d = 1 + ohms * (around.loadRealSiemens + solved.slope(0, ports + 1, ports + 1));
    double rate = storing * radians;
    // (a + jr)(d + jr) − bc
    double detRe = a * d - rate * rate - b * c;
    double detIm = rate * (a + d);
    double norm = detRe * detRe + detIm * detIm;
    for (int j = 0; j < ports + 3; j++) {
      double first = j < ports ? -ohms * solved.slope(0, ports, j) : 0;
      double second = j < ports ? -ohms * solved.slope(0, ports + 1, j) : 0;
      if (j >= ports) {
        first = j == ports ? peakVolts : j == ports + 1 ? -ohms : 0;
        second = j == ports + 2 ? -ohms : 0;
      }
      double topRe = d * first - b * second;
      double topIm = rate * first;
      double lowRe = a * second - c * first;
      double lowIm = rate * second;
      heldRe[j] = (topRe * detRe + topIm * detIm) / norm;
      heldIm[j] = (topIm * detRe - topRe * detIm) / norm;
      heldRe[ports + 3 + j] = (lowRe * detRe + lowIm * detIm) / norm;
      heldIm[ports + 3 + j] = (lowIm * detRe - lowRe * detIm) / norm;
    }
  }

  /**
   * What one ampere of noise beside a junction drives through all ports that are shorted; after
   * {@link #fill}.
   *
   * @param back how much of it comes back through the next port
   */
  void junctionColumn(int port, double back, double[] intoRe, double[] intoIm) {
    Arrays.fill(intoRe, 0);
    Arrays.fill(intoIm, 0);
    intoRe[port] = 1;
    if (back != 0) {
      intoRe[port + 1] = -back;
    }
    series.solve(intoRe, intoIm);
  }

  /** Puts the series resistances between the junctions and the terminals. */
  private void addSeries(CarrierSurroundings around) {
    series.clear();
    for (int i = 0; i < ports; i++) {
      series.add(i, i, 1, 0);
      for (int j = 0; j < ports; j++) {
        double ohms = around.seriesOhms[j];
        series.add(i, j, ohms * admittanceRe[i * ports + j], ohms * admittanceIm[i * ports + j]);
      }
    }
    if (!series.factor()) {
      return;
    }
    series.solve(drivenRe, drivenIm);
    for (int j = 0; j < ports; j++) {
      for (int i = 0; i < ports; i++) {
        columnRe[i] = admittanceRe[i * ports + j];
        columnIm[i] = admittanceIm[i * ports + j];
      }
      series.solve(columnRe, columnIm);
      for (int i = 0; i < ports; i++) {
        admittanceRe[i * ports + j] = columnRe[i];
        admittanceIm[i * ports + j] = columnIm[i];
      }
    }
  }
}
