package earward.engine.internal;

/**
 * How finely detection is sampled: 32 samples of a carrier cycle and 32 of an audio period suffice
 * for most (PHYSICS: 16 do not); stiff devices and hard clipping want more. Chosen once, by what
 * the nominal kit's solution leaves beyond the samples, and then kept for every kit.
 *
 * @param carrierSamples of a cycle, a power of two
 * @param audioSamples of an audio period, a power of two
 */
record Fineness(int carrierSamples, int audioSamples) {
  /** Where every case starts. */
  static final Fineness USUAL = new Fineness(32, 32);

  /** Share of the mean current that may differ between these samples and twice as many. */
  private static final double MOST_ALIASING = 5e-5;

  /** Share of the fundamental that may stand in the highest harmonic of the tone. */
  private static final double MOST_TOP_HARMONIC = 2e-3;

  /** The same share above which it is said: what detection is proven to. */
  private static final double TOLD_ALIASING = 1e-3;

  /**
   * The highest harmonic's share above which it is said: hard clipping has corners that no sampling
   * resolves.
   */
  private static final double TOLD_TOP_HARMONIC = 0.02;

  private static final int MOST_CARRIER_SAMPLES = 128;
  private static final int MOST_AUDIO_SAMPLES = 64;

  /** Harmonics of the tone that are solved. */
  int audioHarmonics() {
    return audioSamples / 2 - 1;
  }

  /** Whether nothing of weight stands beyond the samples of a cycle. */
  static boolean cycleIsMet(double aliasing) {
    return aliasing <= TOLD_ALIASING;
  }

  /** Whether nothing of weight stands beyond the samples of an audio period. */
  static boolean periodIsMet(double topHarmonic) {
    return topHarmonic <= TOLD_TOP_HARMONIC;
  }

  /** What a solved case needs; itself where it is fine enough or nothing finer is to be had. */
  Fineness wanted(double aliasing, double topHarmonic) {
    boolean carrier = aliasing > MOST_ALIASING && carrierSamples < MOST_CARRIER_SAMPLES;
    boolean audio = topHarmonic > MOST_TOP_HARMONIC && audioSamples < MOST_AUDIO_SAMPLES;
    return new Fineness(
        carrier ? 2 * carrierSamples : carrierSamples, audio ? 2 * audioSamples : audioSamples);
  }
}
