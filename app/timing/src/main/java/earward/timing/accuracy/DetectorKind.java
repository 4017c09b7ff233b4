package earward.timing.accuracy;

/** What detects in a random design. */
public enum DetectorKind {
  UNTUNED_DIODE,
  TUNED_DIODE,
  DOUBLER,
  FULL_WAVE,
  BIASED_DIODE,
  TRANSISTOR_FOLLOWER,
  FIELD_EFFECT_FOLLOWER;

  /** The kind of a design's number: all kinds come equally often. */
  static DetectorKind of(int number) {
    return values()[number % values().length];
  }
}
