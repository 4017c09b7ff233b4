package earward.engine.law;

/** Ohm's law: resistors, switches, fuses, meter movements. */
final class ResistiveLaw extends Law {
  ResistiveLaw(Seat seat) {
    super(seat);
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    stage.conductance(nodes[0], nodes[1], 1 / value(stage, 0));
  }

  @Override
  public boolean steady() {
    return true;
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    stage.admittance(nodes[0], nodes[1], 1 / value(stage, 0), 0);
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    noise.thermal(nodes[0], nodes[1], 1 / value(noise.stage(), 0));
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    stage.conductance(nodes[0], nodes[1], 1 / value(stage, 0));
  }

  @Override
  public double amperes(DirectStage stage) {
    return isOpen(stage) ? 0 : (stage.volts(node(0)) - stage.volts(node(1))) / value(stage, 0);
  }

  @Override
  public double loadSiemens(DirectStage stage) {
    return isOpen(stage) ? 0 : 1 / value(stage, 0);
  }
}
