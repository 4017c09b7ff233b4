package earward.engine.internal;

/**
 * One period of what an overdriven output gives its load, over its highest value, clipped hard at
 * two limits that may differ. A bridge drives both ends, each with half the drive. Mutable, for one
 * thread.
 */
final class OutputWave {
  static final int SAMPLES = 128;
  private static final int HALVINGS = 50;

  private final double[] sine = new double[SAMPLES];

  /** The wave, highest value 1. */
  final double[] volts = new double[SAMPLES];

  /** What it draws from the supply, over the current at its highest value. */
  final double[] drawn = new double[SAMPLES];

  /** Mean of what is drawn. */
  double drawnMean;

  /** Mean square of the wave. */
  double meanSquare;

  /** Highest value of the load's voltage over the upper limit of one output. */
  double peakOverLimit;

  private final double[] cosine = new double[SAMPLES];

  /** The last wave: drive, limits and kind; NaN before the first. */
  private double lastOverUp = Double.NaN;

  private double lastDownOverUp;
  private boolean lastBridge;

  OutputWave() {
    for (int s = 0; s < SAMPLES; s++) {
      cosine[s] = Math.cos(2 * Math.PI * s / SAMPLES);
      sine[s] = Math.sin(2 * Math.PI * s / SAMPLES);
    }
  }

  /** The wave at which the harmonics together are this share of the fundamental. */
  void atDistortion(double share, double downOverUp, boolean bridge) {
    double low = Math.min(1, downOverUp);
    double high = 50 * Math.max(1, downOverUp);
    for (int i = 0; i < HALVINGS; i++) {
      double middle = (low + high) / 2;
      drive(middle, downOverUp, bridge);
      if (distortion() < share) {
        low = middle;
      } else {
        high = middle;
      }
    }
  }

  /** The sine that just touches the nearer limit. */
  void atClipping(double downOverUp, boolean bridge) {
    drive(Math.min(1, downOverUp), downOverUp, bridge);
  }

  /**
   * A wave.
   *
   * @param overUp drive of one output over its upper limit
   * @param downOverUp lower limit over the upper one
   */
  private void drive(double overUp, double downOverUp, boolean bridge) {
    if (overUp == lastOverUp && downOverUp == lastDownOverUp && bridge == lastBridge) {
      return;
    }
    lastOverUp = overUp;
    lastDownOverUp = downOverUp;
    lastBridge = bridge;
    double mean = 0;
    for (int s = 0; s < SAMPLES; s++) {
      double one = clipped(overUp * sine[s], downOverUp);
      volts[s] = bridge ? one - clipped(-overUp * sine[s], downOverUp) : one;
      mean += volts[s] / SAMPLES;
    }
    // the output capacitor takes the mean; a bridge has none
    double highest = 0;
    for (int s = 0; s < SAMPLES; s++) {
      volts[s] -= mean;
      highest = Math.max(highest, volts[s]);
    }
    peakOverLimit = highest;
    drawnMean = 0;
    meanSquare = 0;
    for (int s = 0; s < SAMPLES; s++) {
      volts[s] /= highest;
      drawn[s] = bridge ? Math.abs(volts[s]) : Math.max(0, volts[s]);
      drawnMean += drawn[s] / SAMPLES;
      meanSquare += volts[s] * volts[s] / SAMPLES;
    }
  }

  /** Harmonics of what is drawn, peak, complex, from the first on. */
  void drawnHarmonics(int most, double[] re, double[] im) {
    for (int h = 1; h <= most; h++) {
      double real = 0;
      double imaginary = 0;
      for (int s = 0; s < SAMPLES; s++) {
        real += drawn[s] * cosine(h * s);
        imaginary -= drawn[s] * sine(h * s);
      }
      re[h] = 2.0 / SAMPLES * real;
      im[h] = 2.0 / SAMPLES * imaginary;
    }
  }

  /** Cosine of a sample's angle, of any turn. */
  double cosine(int sample) {
    return cosine[sample & (SAMPLES - 1)];
  }

  /** Sine of a sample's angle, of any turn. */
  double sine(int sample) {
    return sine[sample & (SAMPLES - 1)];
  }

  private static double clipped(double drive, double downOverUp) {
    return Math.max(-downOverUp, Math.min(1, drive));
  }

  /** All harmonics over the fundamental. */
  private double distortion() {
    double inPhase = 0;
    for (int s = 0; s < SAMPLES; s++) {
      inPhase += 2.0 / SAMPLES * volts[s] * sine[s];
    }
    double fundamental = inPhase * inPhase / 2;
    return Math.sqrt(Math.max(0, meanSquare - fundamental) / fundamental);
  }
}
