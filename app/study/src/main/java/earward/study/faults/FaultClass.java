package earward.study.faults;

/** Families of faults with the share of all faults that they make (judgement, common practice). */
public enum FaultClass {
  /** Dry joints and bridges of solder. */
  JOINT("joint", 0.50),
  /** A wrong value, or two parts exchanged. */
  VALUE("value", 0.18),
  /** Fitted the wrong way round. */
  DIRECTION("direction", 0.12),
  /** Controls, loudspeaker, battery, switch, fuse and their wires. */
  OFF_BOARD("off-board", 0.12),
  /** A part that is dead, and all else. */
  PART("part", 0.08);

  private final String key;
  private final double share;

  FaultClass(String key, double share) {
    this.key = key;
    this.share = share;
  }

  /** As written in JSON. */
  public String key() {
    return key;
  }

  /** Share of all faults. */
  public double share() {
    return share;
  }
}
