package earward.block;

/** What a block is for, and so where it may stand and which ports its wiring has. */
public enum Role {
  /** First in the path, stands for the front end: an exit and no entry. */
  FEED,
  /** Carrier in, audio out: entry and exit. */
  DETECTOR,
  /** Entry and exit. */
  AUDIO_FILTER,
  /** Entry and exit. */
  VOLUME,
  /** Entry and exit. */
  PREAMPLIFIER,
  /** Entry and exit, the latter with or without the loudspeaker in the block. */
  POWER,
  /** Last in the path: an entry and no exit. */
  LOAD,
  /** Beside the path: offers rails, has neither entry nor exit. */
  SUPPLY,
  /** Beside the path: hangs on a node of it by its entry, a single wire; no exit. */
  TAKE_OFF;

  /** Whether a block of this role stands in the signal path rather than beside it. */
  public boolean inPath() {
    return this != SUPPLY && this != TAKE_OFF;
  }
}
