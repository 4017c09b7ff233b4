package earward.engine.law;

/** An inductor with winding resistance. */
final class InductorLaw extends Law {
  /** What stands for a winding without resistance, in Ω. */
  static final double LEAST_OHMS = 1e-3;

  InductorLaw(Seat seat) {
    super(seat);
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    stage.conductance(nodes[0], nodes[1], 1 / Math.max(LEAST_OHMS, value(stage, 1)));
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    double ohms = Math.max(LEAST_OHMS, value(stage, 1));
    stage.impedance(nodes[0], nodes[1], ohms, stage.omega() * value(stage, 0));
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    AlternatingStage stage = noise.stage();
    double ohms = Math.max(LEAST_OHMS, value(stage, 1));
    noise.thermalOfImpedance(nodes[0], nodes[1], ohms, stage.omega() * value(stage, 0));
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double ohms = Math.max(LEAST_OHMS, value(stage, 1));
    double start = stage.startVolts(nodes[0], nodes[1]) / ohms;
    stage.inductor(nodes[0], nodes[1], value(stage, 0), ohms, start);
  }

  @Override
  public double amperes(DirectStage stage) {
    return isOpen(stage)
        ? 0
        : (stage.volts(node(0)) - stage.volts(node(1))) / Math.max(LEAST_OHMS, value(stage, 1));
  }
}
