package earward.study.limits;

/** Why an instrument cannot read an audio voltage. */
public enum AudioTrouble {
  /** It reads no audio at all. */
  NO_AUDIO("no-audio"),
  /** The test tone lies outside of its band. */
  OUT_OF_BAND("out-of-band"),
  /** Fewer than ten steps of its display. */
  TOO_SMALL("too-small");

  private final String key;

  AudioTrouble(String key) {
    this.key = key;
  }

  /** The reason as written in JSON. */
  public String key() {
    return key;
  }
}
