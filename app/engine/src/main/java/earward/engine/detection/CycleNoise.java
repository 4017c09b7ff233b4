package earward.engine.detection;

import earward.block.law.ThermalVoltage;

/**
 * Noise of carrier-driven diodes over one cycle of the bare carrier. Each instant's shot noise,
 * 2q(i + 2Is), is damped by what its own current meets in the network before the next instant; so a
 * pulse through a large source makes far less noise than 2q times its mean. How the mean currents
 * and what is drawn from the feed answer to noise at each sample comes from one adjoint solve of
 * the cycle's linearised equations each.
 *
 * <p>Source: noise of a periodically driven diode, Held and Kerr 1978, here for audio far below the
 * carrier. Thermal noise of series and source resistance enters beside every multiple of the
 * carrier; that at audio itself is not in it. Junction charge is left out. One a thread; allocates
 * nothing after construction.
 */
public final class CycleNoise {
  private final int ports;
  private final int samples;
  private final int harmonics;
  private final int rows;
  private final double[] siemens;
  private final double[] shot;
  private final double[] weights;
  private final double[] correlation;
  private final double[] kernel;
  private final DenseSolver solver;

  /**
   * Room for a cycle.
   *
   * @param ports N
   * @param samples of a cycle
   * @param harmonics of the carrier that the surroundings have
   */
  public CycleNoise(int ports, int samples, int harmonics) {
    this.ports = ports;
    this.samples = samples;
    this.harmonics = harmonics;
    rows = ports + 2;
    siemens = new double[ports * samples];
    shot = new double[ports * samples];
    weights = new double[rows * ports * samples];
    correlation = new double[rows * rows];
    kernel = new double[samples];
    solver = new DenseSolver(ports * samples);
  }

  /**
   * Noise of two results of the cycle together, in A²/Hz: rows 0 up are the ports' mean currents,
   * the last two what is drawn from the held feed, real and imaginary.
   */
  public double correlation(int one, int other) {
    return correlation[one * rows + other];
  }

  /** Takes over one junction at one sample. */
  public void set(int port, int sample, JunctionLaw law, double volts, double fourKelvinJoules) {
    int at = port * samples + sample;
    double leakage = law.leakageSiemens();
    double amperes = Math.abs(law.current(volts) - leakage * volts);
    siemens[at] = law.conductance(volts);
    shot[at] =
        2 * ThermalVoltage.CHARGE * (amperes + 2 * law.saturationAmperes())
            + fourKelvinJoules * leakage;
  }

  /**
   * Solves, after every junction was {@link #set}.
   *
   * @param sourceOhms resistance of an untuned feed, 0 for a tuned one
   * @return whether the cycle's equations have a solution
   */
  public boolean solve(CarrierSurroundings around, double fourKelvinJoules, double sourceOhms) {
    fill(around);
    if (!solver.factor()) {
      return false;
    }
    for (int row = 0; row < rows; row++) {
      side(around, row);
      solver.solve(weights, row * ports * samples);
    }
    for (int a = 0; a < rows; a++) {
      for (int b = a; b < rows; b++) {
        double sum = ofShot(a, b);
        for (int j = 0; j < ports; j++) {
          sum += fourKelvinJoules * around.seriesOhms[j] * ofVoltage(around, a, b, j);
        }
        sum += fourKelvinJoules * sourceOhms * ofVoltage(around, a, b, -1);
        correlation[a * rows + b] = sum;
        correlation[b * rows + a] = sum;
      }
    }
    return true;
  }

  /** The transposed equations: δi = g·δu + n, δu = −Z·δi with the mean left out. */
  private void fill(CarrierSurroundings around) {
    int size = ports * samples;
    solver.begin(size);
    for (int i = 0; i < ports; i++) {
      for (int j = 0; j < ports; j++) {
        respond(around, i, j);
        for (int s = 0; s < samples; s++) {
          double slope = siemens[i * samples + s];
          for (int r = 0; r < samples; r++) {
            double own = i == j && s == r ? 1 : 0;
            solver.matrix[(j * samples + r) * size + i * samples + s] =
                own + slope * kernel[Math.floorMod(s - r, samples)];
          }
        }
      }
    }
  }

  /** The impulse response between two ports over the cycle, in Ω a sample. */
  private void respond(CarrierSurroundings around, int i, int j) {
    double own = i == j ? around.seriesOhms[i] : 0;
    for (int q = 0; q < samples; q++) {
      double sum = 0;
      for (int k = 1; k <= harmonics; k++) {
        int entry = around.index(k, i, j);
        double angle = 2 * Math.PI * ((k * q) % samples) / samples;
        sum +=
            (around.carrierRealOhms[entry] + own) * Math.cos(angle)
                - around.carrierImaginaryOhms[entry] * Math.sin(angle);
      }
      kernel[q] = 2 * sum / samples;
    }
  }

  private void side(CarrierSurroundings around, int row) {
    for (int j = 0; j < ports; j++) {
      double real = around.transferReal[j];
      double imaginary = around.transferImaginary[j];
      for (int s = 0; s < samples; s++) {
        double angle = 2 * Math.PI * s / samples;
        double c = Math.cos(angle);
        double n = Math.sin(angle);
        double value = row == j ? 1 : 0;
        if (row == ports) {
          value = 2 * (real * c + imaginary * n);
        } else if (row > ports) {
          value = 2 * (imaginary * c - real * n);
        }
        weights[(row * ports + j) * samples + s] = value;
      }
    }
  }

  private double ofShot(int a, int b) {
    double sum = 0;
    int size = ports * samples;
    for (int at = 0; at < size; at++) {
      sum += shot[at] * weights[a * size + at] * weights[b * size + at] / samples;
    }
    return sum;
  }

  /** Of one volt of noise at a port, or at an untuned feed's e.m.f. (−1), beside the carrier. */
  private double ofVoltage(CarrierSurroundings around, int a, int b, int port) {
    double sum = 0;
    double meanA = 0;
    double meanB = 0;
    for (int s = 0; s < samples; s++) {
      double ofA = 0;
      double ofB = 0;
      for (int j = 0; j < ports; j++) {
        double share = port < 0 ? around.transferReal[j] : port == j ? 1 : 0;
        double slope = share * siemens[j * samples + s];
        ofA += slope * weights[(a * ports + j) * samples + s];
        ofB += slope * weights[(b * ports + j) * samples + s];
      }
      sum += ofA * ofB / samples;
      meanA += ofA / samples;
      meanB += ofB / samples;
    }
    return sum - meanA * meanB;
  }
}
