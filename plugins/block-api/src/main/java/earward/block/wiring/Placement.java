package earward.block.wiring;

/** The one word by which a part says where it stands, so that the drawing comes by itself. */
public enum Placement {
  /** Along the signal, from left to right. */
  RUN,
  /** From the signal down to ground, alone or as a chain. */
  DOWN,
  /** From the signal up to a rail, alone or as a chain. */
  UP,
  /** In a chain from rail to ground beside the signal: a push-pull pair. */
  COLUMN,
  /** A symbol that the signal goes through: can, potentiometer, IC. */
  BODY,
  /** Over or under what stands between its ends: feedback, bootstrap. */
  BRIDGE
}
