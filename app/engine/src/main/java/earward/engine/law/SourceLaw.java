package earward.engine.law;

/** A battery or an adaptor: an e.m.f. behind a resistance; taken out where nothing is powered. */
public final class SourceLaw extends Law {
  private static final double LEAST_OHMS = 1e-6;

  SourceLaw(Seat seat) {
    super(seat);
  }

  private double siemens(DirectStage stage) {
    return stage.powered() ? 1 / Math.max(LEAST_OHMS, value(stage, 1)) : 0;
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    double siemens = siemens(stage);
    stage.conductance(nodes[0], nodes[1], siemens);
    stage.current(nodes[1], nodes[0], stage.sourceShare() * value(stage, 0) * siemens);
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    stage.admittance(nodes[0], nodes[1], siemens(stage.point()), 0);
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    noise.thermal(nodes[0], nodes[1], siemens(noise.stage().point()));
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double siemens = siemens(stage.point());
    stage.conductance(nodes[0], nodes[1], siemens);
    stage.current(nodes[1], nodes[0], value(stage, 0) * siemens);
  }

  /** Current that it gives, in A. */
  @Override
  public double amperes(DirectStage stage) {
    if (isOpen(stage)) {
      return 0;
    }
    int[] nodes = nodes(stage);
    double across = stage.volts(nodes[0]) - stage.volts(nodes[1]);
    return (value(stage, 0) - across) * siemens(stage);
  }

  /** Heat in its internal resistance, in W. */
  @Override
  public double watts(DirectStage stage) {
    double amperes = amperes(stage);
    return amperes * amperes * value(stage, 1);
  }
}
