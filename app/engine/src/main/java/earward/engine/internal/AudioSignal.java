package earward.engine.internal;

import java.util.Arrays;

/** Harmonics of the tone (peak, complex) in all unknowns. Mutable, for one thread. */
final class AudioSignal {
  /** Fundamental below which distortion means nothing, peak, in V. */
  private static final double LEAST_VOLTS = 1e-6;

  final int harmonics;
  private final int size;
  private final double[] re;
  private final double[] im;

  AudioSignal(int harmonics, int size) {
    this.harmonics = harmonics;
    this.size = size;
    re = new double[(harmonics + 1) * size];
    im = new double[re.length];
  }

  void clear() {
    Arrays.fill(re, 0);
    Arrays.fill(im, 0);
  }

  /** Adds a column of the table times a complex factor, at one harmonic. */
  void add(AudioTable table, int harmonic, int column, double real, double imaginary) {
    for (int i = 0; i < size; i++) {
      double r = table.re(harmonic, column, i);
      double m = table.im(harmonic, column, i);
      re[harmonic * size + i] += r * real - m * imaginary;
      im[harmonic * size + i] += r * imaginary + m * real;
    }
  }

  double re(int harmonic, int unknown) {
    return unknown < 0 ? 0 : re[harmonic * size + unknown];
  }

  double im(int harmonic, int unknown) {
    return unknown < 0 ? 0 : im[harmonic * size + unknown];
  }

  /** Peak of one harmonic between two nodes. */
  double peak(int harmonic, int plus, int minus) {
    return Math.hypot(
        re(harmonic, plus) - re(harmonic, minus), im(harmonic, plus) - im(harmonic, minus));
  }

  /** Harmonics 2 to 10 over the fundamental; NaN below a microvolt, where nothing is heard. */
  double distortion(int plus, int minus) {
    double fundamental = peak(1, plus, minus);
    double sum = 0;
    for (int h = 2; h <= Math.min(10, harmonics); h++) {
      double here = peak(h, plus, minus);
      sum += here * here;
    }
    return fundamental > LEAST_VOLTS ? Math.sqrt(sum) / fundamental : Double.NaN;
  }

  /** One harmonic over the fundamental; NaN below a microvolt. */
  double share(int harmonic, int plus, int minus) {
    double fundamental = peak(1, plus, minus);
    return fundamental > LEAST_VOLTS ? peak(harmonic, plus, minus) / fundamental : Double.NaN;
  }

  /** Writes the wave of an unknown; returns the largest magnitude. */
  double wave(int unknown, double[] into) {
    Arrays.fill(into, 0);
    for (int h = 1; h <= harmonics && unknown >= 0; h++) {
      int at = h * size + unknown;
      Turns.add(h, re[at], im[at], into);
    }
    double largest = 0;
    for (double value : into) {
      largest = Math.max(largest, Math.abs(value));
    }
    return largest;
  }

  /** Makes an output follow a wave: each harmonic's change is added through the output's column. */
  void replace(AudioTable table, int column, int node, double[] wave) {
    for (int h = 1; h <= harmonics; h++) {
      double real = Turns.real(h, wave) - re(h, node);
      add(table, h, column, real, Turns.imaginary(h, wave) - im(h, node));
    }
  }
}
