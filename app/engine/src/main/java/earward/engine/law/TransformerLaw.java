package earward.engine.law;

/**
 * An ideal ratio with magnetising inductance and winding resistances; terminals PRIMARY_START,
 * PRIMARY_END, TOP, TAP, BOTTOM. Branches: currents into the primary, the upper and the lower half
 * of the secondary, and the magnetising voltage.
 */
final class TransformerLaw extends Law {
  private static final int PRIMARY_HENRIES = 0;
  private static final int RATIO = 1;
  private static final int PRIMARY_OHMS = 2;
  private static final int SECONDARY_OHMS = 3;

  TransformerLaw(Seat seat) {
    super(seat);
  }

  @Override
  public int branches() {
    return 4;
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    winding(stage, branch(0), nodes[0], nodes[1], value(stage, PRIMARY_OHMS));
    winding(stage, branch(1), nodes[2], nodes[3], value(stage, SECONDARY_OHMS) / 2);
    winding(stage, branch(2), nodes[3], nodes[4], value(stage, SECONDARY_OHMS) / 2);
    stage.term(branch(3), branch(3), 1);
  }

  private static void winding(DirectStage stage, int branch, int from, int to, double ohms) {
    stage.branchCurrent(branch, from, to);
    stage.term(branch, from, 1);
    stage.term(branch, to, -1);
    stage.term(branch, branch, -Math.max(InductorLaw.LEAST_OHMS, ohms));
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    double half = value(stage, RATIO) / 2;
    double secondary = value(stage, SECONDARY_OHMS) / 2;
    winding(stage, branch(0), nodes[0], nodes[1], value(stage, PRIMARY_OHMS), 1);
    winding(stage, branch(1), nodes[2], nodes[3], secondary, half);
    winding(stage, branch(2), nodes[3], nodes[4], secondary, half);
    int magnetising = branch(3);
    stage.add(magnetising, magnetising, 0, -1 / (stage.omega() * value(stage, PRIMARY_HENRIES)));
    stage.add(magnetising, branch(0), -1, 0);
    stage.add(magnetising, branch(1), -half, 0);
    stage.add(magnetising, branch(2), -half, 0);
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    AlternatingStage stage = noise.stage();
    noise.thermalInRow(branch(0), Math.max(InductorLaw.LEAST_OHMS, value(stage, PRIMARY_OHMS)));
    double half = Math.max(InductorLaw.LEAST_OHMS, value(stage, SECONDARY_OHMS) / 2);
    noise.thermalInRow(branch(1), half);
    noise.thermalInRow(branch(2), half);
  }

  private void winding(
      AlternatingStage stage, int branch, int from, int to, double ohms, double turns) {
    stage.branchCurrent(branch, from, to);
    stage.add(branch, from, 1, 0);
    stage.add(branch, to, -1, 0);
    stage.add(branch, branch, -Math.max(InductorLaw.LEAST_OHMS, ohms), 0);
    stage.add(branch, branch(3), -turns, 0);
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double half = value(stage, RATIO) / 2;
    double secondary = value(stage, SECONDARY_OHMS) / 2;
    winding(stage, branch(0), nodes[0], nodes[1], value(stage, PRIMARY_OHMS), 1);
    winding(stage, branch(1), nodes[2], nodes[3], secondary, half);
    winding(stage, branch(2), nodes[3], nodes[4], secondary, half);
    int magnetising = stage.state(0);
    stage.stateTerm(branch(3), magnetising, 1);
    stage.term(branch(3), branch(0), -1);
    stage.term(branch(3), branch(1), -half);
    stage.term(branch(3), branch(2), -half);
    stage.rate(stage.rowOf(magnetising), magnetising, value(stage, PRIMARY_HENRIES));
    stage.term(stage.rowOf(magnetising), branch(3), -1);
  }

  private void winding(
      WaveformStage stage, int branch, int from, int to, double ohms, double turns) {
    stage.branchCurrent(branch, from, to);
    stage.term(branch, from, 1);
    stage.term(branch, to, -1);
    stage.term(branch, branch, -Math.max(InductorLaw.LEAST_OHMS, ohms));
    stage.term(branch, branch(3), -turns);
  }
}
