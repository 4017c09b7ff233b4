package earward.engine.waveform;

import java.util.Arrays;

/**
 * Measures places over one audio period. Within a cycle it sums states and outputs, plain, rising
 * and times the carrier's first three harmonics; audio is read from triangles two cycles wide,
 * whose zeros lie on the carrier's multiples, carrier from single cycles less their ramp. Mutable,
 * for one thread; allocates nothing while it measures.
 */
final class Gauge {
  static final int CARRIERS = 3;
  static final int HARMONICS = 10;
  private static final int SUMS = 2 + 2 * CARRIERS;

  private final double[][] rows;
  private final double[] power;
  private final boolean squaring;
  private final int length;
  private final int steps;
  private final int cycles;
  private final double[] factors;
  private final double[] rampReal = new double[CARRIERS];
  private final double[] rampImaginary = new double[CARRIERS];
  private final double[] sums;
  private final double[] now;
  private final double[][] means;
  private final double[][] rising;
  private final double[] ends;
  private final double[] firstCycle;
  private final double[] firstEnds;
  private final double[] carrierSquares;
  private final double[] squares;
  private double feedSum;

  Gauge(double[][] rows, double[] power, boolean squaring, int steps, int cycles) {
    this.rows = rows;
    this.power = power;
    this.squaring = squaring;
    this.steps = steps;
    this.cycles = cycles;
    length = power.length;
    factors = new double[(steps + 1) * SUMS];
    for (int n = 1; n <= steps; n++) {
      factors[n * SUMS] = 1.0 / steps;
      factors[n * SUMS + 1] = (double) n / steps / steps;
      for (int k = 1; k <= CARRIERS; k++) {
        double turn = 2 * Math.PI * k * n / steps;
        double cosine = 2.0 / steps * Math.cos(turn);
        double sine = -2.0 / steps * Math.sin(turn);
        factors[n * SUMS + 2 * k] = cosine;
        factors[n * SUMS + 2 * k + 1] = sine;
        rampReal[k - 1] += cosine * n / steps;
        rampImaginary[k - 1] += sine * n / steps;
      }
    }
    sums = new double[SUMS * length];
    now = new double[length];
    means = new double[rows.length][cycles];
    rising = new double[rows.length][cycles];
    ends = new double[rows.length];
    firstCycle = new double[rows.length * 2 * CARRIERS];
    firstEnds = new double[rows.length];
    carrierSquares = new double[rows.length * CARRIERS];
    squares = new double[rows.length];
  }

  void begin() {
    Arrays.fill(carrierSquares, 0);
    Arrays.fill(squares, 0);
    Arrays.fill(sums, 0);
    feedSum = 0;
  }

  /** Takes in the end of step n, from 1, of a cycle. */
  void add(Stepper stepper, int n, double drive) {
    stepper.read(drive, now);
    for (int q = 0; q < SUMS; q++) {
      double factor = factors[n * SUMS + q];
      int at = q * length;
      for (int i = 0; i < length; i++) {
        sums[at + i] += factor * now[i];
      }
    }
    feedSum += drive * dot(power, now, 0);
    for (int p = 0; squaring && p < rows.length; p++) {
      double volts = dot(rows[p], now, 0);
      squares[p] += volts * volts;
    }
  }

  void endCycle(int cycle) {
    for (int p = 0; p < rows.length; p++) {
      means[p][cycle] = dot(rows[p], sums, 0);
      rising[p][cycle] = dot(rows[p], sums, length);
      double end = dot(rows[p], now, 0);
      double ramp = end - ends[p];
      for (int k = 0; k < CARRIERS; k++) {
        double real = dot(rows[p], sums, (2 + 2 * k) * length);
        double imaginary = dot(rows[p], sums, (3 + 2 * k) * length);
        if (cycle == 0) {
          firstCycle[2 * (p * CARRIERS + k)] = real;
          firstCycle[2 * (p * CARRIERS + k) + 1] = imaginary;
        } else {
          addCarrier(p, k, real, imaginary, ramp);
        }
      }
      if (cycle == 0) {
        firstEnds[p] = end;
      }
      ends[p] = end;
    }
    Arrays.fill(sums, 0);
  }

  /** The first cycle's ramp is known at the period's end. */
  void finish() {
    for (int p = 0; p < rows.length; p++) {
      double ramp = firstEnds[p] - ends[p];
      for (int k = 0; k < CARRIERS; k++) {
        int at = 2 * (p * CARRIERS + k);
        addCarrier(p, k, firstCycle[at], firstCycle[at + 1], ramp);
      }
    }
  }

  /** Mean over the period, in V. */
  double mean(int place) {
    double sum = 0;
    for (double each : means[place]) {
      sum += each;
    }
    return sum / cycles;
  }

  /** Peak of a harmonic of the tone, in V. */
  double peak(int place, int harmonic) {
    double real = 0;
    double imaginary = 0;
    for (int c = 0; c < cycles; c++) {
      double triangle =
          rising[place][(c + cycles - 1) % cycles] + means[place][c] - rising[place][c];
      double turn = 2 * Math.PI * ((long) harmonic * c % cycles) / cycles;
      real += triangle * Math.cos(turn);
      imaginary -= triangle * Math.sin(turn);
    }
    double angle = Math.PI * harmonic / cycles;
    double box = Math.sin(angle) / (steps * Math.sin(angle / steps));
    return 2.0 / cycles * Math.hypot(real, imaginary) / (box * box);
  }

  /** Root mean square over the period of a multiple of the carrier, from 1, in V. */
  double carrierRms(int place, int multiple) {
    return Math.sqrt(carrierSquares[place * CARRIERS + multiple - 1] / cycles / 2);
  }

  /** Real part of the carrier's own fundamental in the first cycle, peak, in V. */
  double carrierReal(int place) {
    return firstCycle[2 * place * CARRIERS];
  }

  /** Imaginary part of the same. */
  double carrierImaginary(int place) {
    return firstCycle[2 * place * CARRIERS + 1];
  }

  /** Mean square of all that stands there, where squares were asked for, in V². */
  double meanSquare(int place) {
    return squaring ? squares[place] / cycles / steps : Double.NaN;
  }

  /** Power that the feed delivers, in W. */
  double feedWatts() {
    return feedSum / cycles / steps;
  }

  private void addCarrier(int p, int k, double real, double imaginary, double ramp) {
    double re = real - ramp * rampReal[k];
    double im = imaginary - ramp * rampImaginary[k];
    carrierSquares[p * CARRIERS + k] += re * re + im * im;
  }

  private static double dot(double[] row, double[] vector, int at) {
    double sum = 0;
    for (int i = 0; i < row.length; i++) {
      sum += row[i] * vector[at + i];
    }
    return sum;
  }
}
