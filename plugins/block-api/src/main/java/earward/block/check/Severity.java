package earward.block.check;

/** How much a finding weighs. */
public enum Severity {
  /** Do not build this. */
  STOP,
  /** A judgement to make. */
  WEIGH,
  /** Worth knowing. */
  NOTE
}
