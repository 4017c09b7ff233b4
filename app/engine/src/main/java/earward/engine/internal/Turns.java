package earward.engine.internal;

/**
 * Waves of one audio period by their harmonics, and back: 128 samples, harmonics up to the 31st.
 * Cosines and sines stand in a row for each harmonic, shared by all.
 */
final class Turns {
  static final int SAMPLES = 128;

  private static final int HARMONICS = 31;
  private static final double[][] COSINE = new double[HARMONICS + 1][SAMPLES];
  private static final double[][] SINE = new double[HARMONICS + 1][SAMPLES];

  static {
    for (int h = 0; h <= HARMONICS; h++) {
      for (int s = 0; s < SAMPLES; s++) {
        double angle = 2 * Math.PI * ((h * s) % SAMPLES) / SAMPLES;
        COSINE[h][s] = Math.cos(angle);
        SINE[h][s] = Math.sin(angle);
      }
    }
  }

  private Turns() {}

  /** Adds a harmonic (peak, complex) to a wave. */
  static void add(int harmonic, double real, double imaginary, double[] wave) {
    add(real, imaginary, COSINE[harmonic], SINE[harmonic], wave);
  }

  private static void add(
      double real, double imaginary, double[] cosine, double[] sine, double[] wave) {
    for (int s = 0; s < wave.length; s++) {
      wave[s] += real * cosine[s] - imaginary * sine[s];
    }
  }

  /** Real part of a harmonic of a wave, peak. */
  static double real(int harmonic, double[] wave) {
    return 2.0 / SAMPLES * product(wave, COSINE[harmonic]);
  }

  /** Imaginary part of a harmonic of a wave, peak. */
  static double imaginary(int harmonic, double[] wave) {
    return -2.0 / SAMPLES * product(wave, SINE[harmonic]);
  }

  /** Four sums side by side, so that none waits for the other. */
  private static double product(double[] one, double[] other) {
    double a = 0;
    double b = 0;
    double c = 0;
    double d = 0;
    for (int s = 0; s < SAMPLES; s += 4) {
      a += one[s] * other[s];
      b += one[s + 1] * other[s + 1];
      c += one[s + 2] * other[s + 2];
      d += one[s + 3] * other[s + 3];
    }
    return (a + b) + (c + d);
  }
}
