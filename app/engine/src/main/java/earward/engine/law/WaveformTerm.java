package earward.engine.law;

/**
 * One term of an equation over time: factor times a quantity.
 *
 * @param row the equation, or the control, that it stands in
 * @param kind what it multiplies
 * @param index which of that kind
 * @param factor by which it is multiplied
 */
public record WaveformTerm(int row, Kind kind, int index, double factor) {
  /** What a term multiplies. */
  public enum Kind {
    /** A node's voltage, a branch or an extra unknown. */
    UNKNOWN,
    /** The rate of a state, per second. */
    RATE,
    /** A state: what is integrated over time. */
    STATE,
    /** An output of a curved device. */
    DEVICE,
    /** An output of a kink, max(0, control). */
    KINK,
    /** One. */
    CONSTANT,
    /** The drive: the modulated carrier at no load, in V. */
    DRIVE
  }
}
