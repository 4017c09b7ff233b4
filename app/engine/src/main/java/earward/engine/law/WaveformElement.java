package earward.engine.law;

/**
 * The seat of a device, or of a kink, in the equations over time: what its controls are and where
 * its outputs go. Mutable while the circuit is being stamped.
 */
public final class WaveformElement {
  private final WaveformStage stage;
  private final boolean kink;
  private final int firstControl;
  private final int firstOutput;

  WaveformElement(WaveformStage stage, boolean kink, int firstControl, int firstOutput) {
    this.stage = stage;
    this.kink = kink;
    this.firstControl = firstControl;
    this.firstOutput = firstOutput;
  }

  /** Adds factor times an unknown to a control. */
  public WaveformElement control(int control, int unknown, double factor) {
    if (unknown >= 0) {
      stage.addControl(kink, firstControl + control, WaveformTerm.Kind.UNKNOWN, unknown, factor);
    }
    return this;
  }

  /** Adds factor times a state to a control. */
  public WaveformElement controlState(int control, int state, double factor) {
    stage.addControl(kink, firstControl + control, WaveformTerm.Kind.STATE, state, factor);
    return this;
  }

  /** Adds a constant to a control. */
  public WaveformElement controlConstant(int control, double amount) {
    stage.addControl(kink, firstControl + control, WaveformTerm.Kind.CONSTANT, 0, amount);
    return this;
  }

  /** Adds factor times an output to a row. */
  public WaveformElement output(int output, int row, double factor) {
    if (row >= 0) {
      stage.addTerm(
          row,
          kink ? WaveformTerm.Kind.KINK : WaveformTerm.Kind.DEVICE,
          firstOutput + output,
          factor);
    }
    return this;
  }

  /** Lets an output flow as a current from one node to another. */
  public WaveformElement current(int output, int from, int to, double factor) {
    return output(output, from, factor).output(output, to, -factor);
  }
}
