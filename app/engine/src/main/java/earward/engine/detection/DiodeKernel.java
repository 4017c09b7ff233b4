package earward.engine.detection;

import java.util.Arrays;

/**
 * What the network answers to one diode's current and charge sampled over a carrier cycle: as
 * {@link CarrierKernel}, with the diode's leakage and a constant part of its capacitance taken over
 * into the network, Z′ = Z/(1 + Z·(g + jkωc·C)). So a cut-off diode has next to nothing left that
 * Newton's method would have to know of. Rows stand one for each sample that answers, so that the
 * innermost loops run along two rows at the same place. Mutable, for one thread.
 */
final class DiodeKernel {
  private final int samples;
  private final int harmonics;
  private final double[] cosine;
  private final double[] sine;
  private final double[] first;
  private final double[] second;
  private final double[][] toCurrent;
  private final double[][] toCharge;

  /** What was taken over, in S and F. */
  double siemens;

  double farads;

  /** The open-circuit transfer with that in place. */
  double transferRe;

  double transferIm;

  /** The network's impedance at the carrier with that in place. */
  double ohmsRe;

  double ohmsIm;

  /** The largest answer to one ampere and to one coulomb. */
  double currentReach;

  double chargeReach;

  DiodeKernel(int samples, int harmonics) {
    this.samples = samples;
    this.harmonics = harmonics;
    cosine = new double[samples];
    sine = new double[samples];
    for (int s = 0; s < samples; s++) {
      cosine[s] = Math.cos(2 * Math.PI * s / samples);
      sine[s] = Math.sin(2 * Math.PI * s / samples);
    }
    first = new double[samples];
    second = new double[samples];
    toCurrent = new double[samples][samples];
    toCharge = new double[samples][samples];
  }

  /** Takes in surroundings; the diode is their only device. */
  void prepare(CarrierSurroundings around, double takenSiemens, double takenFarads) {
    siemens = takenSiemens;
    farads = takenFarads;
    Arrays.fill(first, 0);
    Arrays.fill(second, 0);
    int mask = samples - 1;
    for (int k = 1; k <= harmonics; k++) {
      double zr = around.carrierRealOhms[k] + around.seriesOhms[0];
      double zi = around.carrierImaginaryOhms[k];
      double omega = k * around.carrierRadians;
      double dr = 1 + zr * siemens - zi * omega * farads;
      double di = zi * siemens + zr * omega * farads;
      double norm = dr * dr + di * di;
      double real = (zr * dr + zi * di) / norm;
      double imaginary = (zi * dr - zr * di) / norm;
      if (k == 1) {
        ohmsRe = real;
        ohmsIm = imaginary;
        transferRe = (around.transferReal[0] * dr + around.transferImaginary[0] * di) / norm;
        transferIm = (around.transferImaginary[0] * dr - around.transferReal[0] * di) / norm;
      }
      for (int q = 0; q < samples; q++) {
        double c = cosine[(k * q) & mask];
        double s = sine[(k * q) & mask];
        first[q] += real * c - imaginary * s;
        second[q] -= omega * (imaginary * c + real * s);
      }
    }
    currentReach = spread(first, toCurrent);
    chargeReach = spread(second, toCharge);
  }

  /** Writes a response into a row for each sample, later ones turned; returns its largest part. */
  private double spread(double[] response, double[][] rows) {
    double most = 0;
    for (int q = 0; q < samples; q++) {
      response[q] *= 2.0 / samples;
      most = Math.max(most, Math.abs(response[q]));
    }
    for (int r = 0; r < samples; r++) {
      System.arraycopy(response, 0, rows[r], r, samples - r);
      System.arraycopy(response, samples - r, rows[r], 0, r);
    }
    return most;
  }

  double[] cosine() {
    return cosine;
  }

  double[] sine() {
    return sine;
  }

  /** What one sample answers to so many amperes at each of some samples. */
  void answers(int[] at, int count, int sample, double[] amperes, double[] into) {
    for (int q = 0; q < count; q++) {
      into[q] = amperes[q] * first[(sample - at[q]) & (samples - 1)];
    }
  }

  /** Adds what one sample answers to so many coulombs at each of some samples. */
  void addChargeAnswers(int[] at, int count, int sample, double[] coulombs, double[] into) {
    for (int q = 0; q < count; q++) {
      into[q] += coulombs[q] * second[(sample - at[q]) & (samples - 1)];
    }
  }

  /** Adds the answers to currents at some samples, two at a time. */
  void addCurrents(int[] at, double[] amperes, int count, double[] into) {
    add(toCurrent, at, amperes, count, into);
  }

  /** Adds the answers to charges at some samples. */
  void addCharges(int[] at, double[] coulombs, int count, double[] into) {
    add(toCharge, at, coulombs, count, into);
  }

  private static void add(double[][] rows, int[] at, double[] values, int count, double[] into) {
    int k = 0;
    for (; k + 3 < count; k += 4) {
      four(
          rows[at[k]],
          rows[at[k + 1]],
          rows[at[k + 2]],
          rows[at[k + 3]],
          values[k],
          values[k + 1],
          values[k + 2],
          values[k + 3],
          into);
    }
    for (; k < count; k++) {
      one(rows[at[k]], values[k], into);
    }
  }

  private static void four(
      double[] a,
      double[] b,
      double[] c,
      double[] d,
      double va,
      double vb,
      double vc,
      double vd,
      double[] into) {
    for (int s = 0; s < into.length; s++) {
      into[s] += va * a[s] + vb * b[s] + vc * c[s] + vd * d[s];
    }
  }

  private static void one(double[] row, double value, double[] into) {
    for (int s = 0; s < into.length; s++) {
      into[s] += value * row[s];
    }
  }
}
