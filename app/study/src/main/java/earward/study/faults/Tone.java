package earward.study.faults;

/** What is heard of the test tone. */
public enum Tone {
  SILENT("silent"),
  WEAK("weak"),
  USUAL("usual"),
  LOUD("loud"),
  DISTORTED("distorted");

  /** Share of the usual voltage below which nothing is heard: 40 dB. */
  private static final double SILENT_SHARE = 0.01;

  /** Shares beyond which a listener notices: 8 dB. */
  private static final double WEAK_SHARE = 0.4;

  private static final double LOUD_SHARE = 2.5;

  /** Distortion that anybody hears (common practice). */
  private static final double HEARD_DISTORTION = 0.12;

  private final String key;

  Tone(String key) {
    this.key = key;
  }

  /** As written in CSV and JSON. */
  public String key() {
    return key;
  }

  /**
   * What is heard.
   *
   * @param share of the healthy kit's voltage at the loudspeaker
   * @param distortion there; NaN where there is no tone
   */
  static Tone of(double share, double distortion) {
    if (!(share >= SILENT_SHARE)) {
      return SILENT;
    }
    if (distortion > HEARD_DISTORTION) {
      return DISTORTED;
    }
    return share < WEAK_SHARE ? WEAK : share > LOUD_SHARE ? LOUD : USUAL;
  }
}
