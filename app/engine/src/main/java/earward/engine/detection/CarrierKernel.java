package earward.engine.detection;

/**
 * What the network answers to currents and charges sampled over one carrier cycle: circular
 * convolution with its impulse responses between all ports, the mean left out.
 */
final class CarrierKernel {
  /** Volts that no residual shows. */
  private static final double NOTHING = 1e-15;

  private final int ports;
  private final int samples;
  private final int harmonics;
  private final double[] cosine;
  private final double[] sine;

  /** Impulse responses (ohms) to current and to charge, 2·samples long per pair of ports. */
  private final double[] toCurrent;

  private final double[] toCharge;

  /** The largest response at any port to a current or a charge at one. */
  private final double[] currentReach;

  private final double[] chargeReach;

  CarrierKernel(int ports, int samples, int harmonics) {
    this.ports = ports;
    this.samples = samples;
    this.harmonics = harmonics;
    cosine = new double[samples];
    sine = new double[samples];
    for (int s = 0; s < samples; s++) {
      cosine[s] = Math.cos(2 * Math.PI * s / samples);
      sine[s] = Math.sin(2 * Math.PI * s / samples);
    }
    toCurrent = new double[ports * ports * 2 * samples];
    toCharge = new double[ports * ports * 2 * samples];
    currentReach = new double[ports];
    chargeReach = new double[ports];
  }

  double cosine(int sample) {
    return cosine[sample];
  }

  double sine(int sample) {
    return sine[sample];
  }

  /** Takes in surroundings whose carrier matrices have changed. */
  void prepare(CarrierSurroundings around) {
    for (int j = 0; j < ports; j++) {
      currentReach[j] = 0;
      chargeReach[j] = 0;
      for (int i = 0; i < ports; i++) {
        prepare(around, i, j);
      }
    }
  }

  private void prepare(CarrierSurroundings around, int i, int j) {
    double own = i == j ? around.seriesOhms[i] : 0;
    int base = (i * ports + j) * 2 * samples;
    int mask = samples - 1;
    for (int q = 0; q < samples; q++) {
      double ohms = 0;
      double ohmsPerSecond = 0;
      for (int k = 1; k <= harmonics; k++) {
        int entry = around.index(k, i, j);
        double real = around.carrierRealOhms[entry] + own;
        double imaginary = around.carrierImaginaryOhms[entry];
        double c = cosine[(k * q) & mask];
        double s = sine[(k * q) & mask];
        ohms += real * c - imaginary * s;
        ohmsPerSecond += k * around.carrierRadians * (-imaginary * c - real * s);
      }
      toCurrent[base + q] = 2 * ohms / samples;
      toCharge[base + q] = 2 * ohmsPerSecond / samples;
      toCurrent[base + samples + q] = toCurrent[base + q];
      toCharge[base + samples + q] = toCharge[base + q];
      currentReach[j] = Math.max(currentReach[j], Math.abs(toCurrent[base + q]));
      chargeReach[j] = Math.max(chargeReach[j], Math.abs(toCharge[base + q]));
    }
  }

  double currentReach(int port) {
    return currentReach[port];
  }

  double chargeReach(int port) {
    return chargeReach[port];
  }

  /**
   * What all samples of port i answer to a current and a charge at port j, sample r.
   *
   * @param into from an offset
   * @param first whether to write rather than to add
   */
  void column(
      int i, int j, int r, double amperes, double coulombs, double[] into, int to, boolean first) {
    int from = (i * ports + j) * 2 * samples + samples - r;
    if (first) {
      for (int s = 0; s < samples; s++) {
        into[to + s] = toCurrent[from + s] * amperes;
      }
    } else {
      for (int s = 0; s < samples; s++) {
        into[to + s] += toCurrent[from + s] * amperes;
      }
    }
    if (coulombs != 0) {
      for (int s = 0; s < samples; s++) {
        into[to + s] += toCharge[from + s] * coulombs;
      }
    }
  }

  /** Adds the answer to currents; what is constant over the cycle has none and is left out. */
  void addCurrents(double[] amperes, double[] into, double sign) {
    add(toCurrent, currentReach, amperes, into, sign);
  }

  /** Adds the answer to charges. */
  void addCharges(double[] coulombs, double[] into, double sign) {
    add(toCharge, chargeReach, coulombs, into, sign);
  }

  private void add(double[] kernel, double[] reach, double[] values, double[] into, double sign) {
    for (int j = 0; j < ports; j++) {
      double rest = values[j * samples + samples / 2];
      for (int r = 0; r < samples; r++) {
        double value = sign * (values[j * samples + r] - rest);
        if (Math.abs(value) * reach[j] > NOTHING) {
          for (int i = 0; i < ports; i++) {
            int from = (i * ports + j) * 2 * samples + samples - r;
            int to = i * samples;
            for (int s = 0; s < samples; s++) {
              into[to + s] += kernel[from + s] * value;
            }
          }
        }
      }
    }
  }
}
