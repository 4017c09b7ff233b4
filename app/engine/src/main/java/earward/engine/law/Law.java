package earward.engine.law;

/**
 * What one part adds to the equations of the circuit. Immutable; the values of its slots come with
 * the stage.
 */
public abstract class Law {
  /** Conductance of a short, in S: a milliohm. */
  private static final double SHORT_SIEMENS = 1e3;

  private final Seat seat;

  Law(Seat seat) {
    this.seat = seat;
  }

  /** Where this part sits. */
  public final Seat seat() {
    return seat;
  }

  /** How many branch unknowns it has. */
  public int branches() {
    return 0;
  }

  /** Whether what {@link #alternating} adds about one DC point is the same at all frequencies. */
  public boolean steady() {
    return false;
  }

  /** Takes over the values of a case before its first step. */
  public void prepare(DirectStage stage) {}

  /** Shortens a Newton step that would blow up an exponential; the proposal is changed in place. */
  public void limit(DirectStage stage, double[] proposal) {}

  /** Adds currents and derivatives at DC. */
  public final void direct(DirectStage stage) {
    if (isOpen(stage)) {
      for (int k = 0; k < branches(); k++) {
        stage.term(branch(k), branch(k), 1);
      }
      return;
    }
    if (isShort(stage)) {
      int[] nodes = seat.nodes();
      for (int k = 1; k < nodes.length; k++) {
        stage.conductance(nodes[k - 1], nodes[k], SHORT_SIEMENS);
      }
    }
    stampDirect(stage, nodes(stage));
  }

  /** Adds the linearised admittances at one frequency. */
  public final void alternating(AlternatingStage stage) {
    if (isOpen(stage.point())) {
      for (int k = 0; k < branches(); k++) {
        stage.add(branch(k), branch(k), 1, 0);
      }
      return;
    }
    if (isShort(stage.point())) {
      int[] nodes = seat.nodes();
      for (int k = 1; k < nodes.length; k++) {
        stage.admittance(nodes[k - 1], nodes[k], SHORT_SIEMENS, 0);
      }
    }
    stampAlternating(stage, nodes(stage.point()));
  }

  /** Adds the noise that the part makes at one frequency. */
  public final void noise(NoiseStage noise) {
    if (!isOpen(noise.stage().point())) {
      addNoise(noise, nodes(noise.stage().point()));
    }
  }

  /** What the part makes of noise; nothing unless its law says so. */
  void addNoise(NoiseStage noise, int[] nodes) {}

  /** Adds the equations over time, at the carrier's own rate. */
  public final void waveform(WaveformStage stage) {
    DirectStage point = stage.point();
    if (isOpen(point)) {
      for (int k = 0; k < branches(); k++) {
        stage.term(branch(k), branch(k), 1);
      }
      return;
    }
    if (isShort(point)) {
      int[] nodes = seat.nodes();
      for (int k = 1; k < nodes.length; k++) {
        stage.conductance(nodes[k - 1], nodes[k], SHORT_SIEMENS);
      }
    }
    stampWaveform(stage, nodes(point));
  }

  abstract void stampDirect(DirectStage stage, int[] nodes);

  abstract void stampAlternating(AlternatingStage stage, int[] nodes);

  abstract void stampWaveform(WaveformStage stage, int[] nodes);

  /** DC current through the part in its drawing direction, in A; NaN where it has none. */
  public double amperes(DirectStage stage) {
    return Double.NaN;
  }

  /** DC voltage from the first terminal to the last, in V. */
  public final double dropVolts(DirectStage stage) {
    int[] nodes = seat.nodes();
    return stage.volts(nodes[0]) - stage.volts(nodes[nodes.length - 1]);
  }

  /** DC power that the part turns into heat, in W. */
  public double watts(DirectStage stage) {
    int[] nodes = seat.nodes();
    return isOpen(stage)
        ? 0
        : amperes(stage) * (stage.volts(nodes[0]) - stage.volts(nodes[nodes.length - 1]));
  }

  /** Conductance of what stands for a load where output power is stated, in S; 0 for no load. */
  public double loadSiemens(DirectStage stage) {
    return 0;
  }

  final boolean isOpen(DirectStage stage) {
    return stage.value(seat.openSlot()) > 0.5;
  }

  final boolean isShort(DirectStage stage) {
    return stage.value(seat.openSlot() + 1) > 0.5;
  }

  /** Nodes of the terminals as the part is fitted: its own way or reversed. */
  final int[] nodes(DirectStage stage) {
    return stage.value(seat.openSlot() + 2) > 0.5 ? seat.reversed() : seat.nodes();
  }

  final int branch(int k) {
    return seat.firstBranch() + k;
  }

  final double value(DirectStage stage, int parameter) {
    return stage.value(seat.firstSlot() + parameter);
  }

  /** Node of a terminal by its place in the device's order, −1 for ground. */
  public final int node(int terminal) {
    return seat.nodes()[terminal];
  }

  final double value(WaveformStage stage, int parameter) {
    return value(stage.point(), parameter);
  }

  final double value(AlternatingStage stage, int parameter) {
    return stage.value(seat.firstSlot() + parameter);
  }
}
