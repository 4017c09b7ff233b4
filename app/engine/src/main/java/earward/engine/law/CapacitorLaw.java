package earward.engine.law;

/**
 * A capacitor with series resistance and leakage. A polarised one that is fitted the wrong way
 * round conducts beyond about 1.5 V through some 150 Ω (common practice: 1 to 2 V, 50 to 500 Ω).
 */
public final class CapacitorLaw extends Law {
  private static final double REVERSE_VOLTS = 1.5;
  private static final double REVERSE_SIEMENS = 1 / 150.0;

  /** Softness of the reverse knee, in V. */
  private static final double KNEE_VOLTS = 0.1;

  /** Within so many softnesses of the knee at DC it counts as reversed over time too. */
  private static final double REVERSED = -5;

  private final boolean polarised;

  CapacitorLaw(Seat seat, boolean polarised) {
    super(seat);
    this.polarised = polarised;
  }

  /** Capacitance as fitted, in F: 0 when it is open. */
  public double farads(DirectStage stage) {
    return isOpen(stage) ? 0 : value(stage, 0);
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    stage.conductance(nodes[0], nodes[1], value(stage, 2));
    if (polarised) {
      double over = (stage.volts(nodes[1]) - stage.volts(nodes[0]) - REVERSE_VOLTS) / KNEE_VOLTS;
      if (over > -30) {
        stage.current(nodes[1], nodes[0], REVERSE_SIEMENS * KNEE_VOLTS * Soft.plus(over));
        double slope = REVERSE_SIEMENS * Soft.plusSlope(over);
        stage.currentSlope(nodes[1], nodes[0], nodes[1], slope);
        stage.currentSlope(nodes[1], nodes[0], nodes[0], -slope);
      }
    }
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    stage.admittance(nodes[0], nodes[1], value(stage, 2), 0);
    double farads = value(stage, 0);
    if (!stage.leftOut(farads)) {
      stage.impedance(nodes[0], nodes[1], value(stage, 1), -1 / (stage.omega() * farads));
    }
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    AlternatingStage stage = noise.stage();
    noise.thermal(nodes[0], nodes[1], value(stage, 2));
    noise.thermalOfImpedance(
        nodes[0], nodes[1], value(stage, 1), 1 / (stage.omega() * value(stage, 0)));
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    stage.conductance(nodes[0], nodes[1], value(stage, 2));
    stage.capacitor(nodes[0], nodes[1], value(stage, 0), value(stage, 1));
    double over = (stage.startVolts(nodes[1], nodes[0]) - REVERSE_VOLTS) / KNEE_VOLTS;
    if (polarised && over > REVERSED) {
      stage
          .kink()
          .control(0, nodes[1], REVERSE_SIEMENS)
          .control(0, nodes[0], -REVERSE_SIEMENS)
          .controlConstant(0, -REVERSE_VOLTS * REVERSE_SIEMENS)
          .current(0, nodes[1], nodes[0], 1);
    }
  }

  @Override
  public double amperes(DirectStage stage) {
    return isOpen(stage) ? 0 : (stage.volts(node(0)) - stage.volts(node(1))) * value(stage, 2);
  }
}
