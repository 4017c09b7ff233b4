package earward.engine.law;

/**
 * What is curved in the circuit's equations over time: currents (or voltages) that follow smoothly
 * from a few control voltages, at once. One that holds charge has a single control and output, and
 * the current of its charge is added by the stepping. Immutable; the arrays are the caller's.
 */
public interface WaveformDevice {
  /** How many controls. */
  int controls();

  /** How many outputs. */
  int outputs();

  /**
   * Writes outputs and slopes.
   *
   * @param volts controls, from {@code at}
   * @param into outputs, from {@code outputAt}
   * @param slopes derivative of output o by control c at {@code slopeAt + o·controls + c}
   */
  void evaluate(double[] volts, int at, double[] into, int outputAt, double[] slopes, int slopeAt);

  /** Where a Newton step of a control from one value towards another may go. */
  default double limited(int control, double from, double to) {
    return to;
  }

  /** The change of a control over which the outputs bend, in V: the measure of a small step. */
  double kneeVolts();

  /** Whether a charge hangs on the only control. */
  default boolean charged() {
    return false;
  }

  /** That charge, in C. */
  default double charge(double volts) {
    return 0;
  }

  /** Its slope, in F. */
  default double capacitance(double volts) {
    return 0;
  }
}
