package earward.block;

/** What a block is for, and so where it may stand. */
public enum Role {
  FEED,
  DETECTOR,
  AUDIO_FILTER,
  VOLUME,
  PREAMPLIFIER,
  POWER,
  LOAD,
  /** Beside the path: offers rails. */
  SUPPLY,
  /** Beside the path: hangs on a node of it. */
  TAKE_OFF;

  /** Whether a block of this role stands in the signal path rather than beside it. */
  public boolean inPath() {
    return this != SUPPLY && this != TAKE_OFF;
  }
}
