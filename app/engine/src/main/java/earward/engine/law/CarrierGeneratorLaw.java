package earward.engine.law;

/** An e.m.f. behind a resistance; terminals TOP, BOTTOM. */
final class CarrierGeneratorLaw extends FeedLaw {
  CarrierGeneratorLaw(Seat seat) {
    super(seat);
  }

  @Override
  public boolean tuned() {
    return false;
  }

  @Override
  public void hold(double[] sideRe, DirectStage point) {
    if (isOpen(point)) {
      return;
    }
    int[] nodes = nodes(point);
    double amperes = 1 / value(point, 0);
    if (nodes[0] >= 0) {
      sideRe[nodes[0]] += amperes;
    }
    if (nodes[1] >= 0) {
      sideRe[nodes[1]] -= amperes;
    }
  }

  @Override
  public int heldBranch() {
    return -1;
  }

  @Override
  public double tankOhms(DirectStage point) {
    return Double.NaN;
  }

  @Override
  public double tankFarads(DirectStage point, double carrierRadians) {
    return Double.NaN;
  }

  @Override
  public double detuningRadians(DirectStage point) {
    return 0;
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    stage.conductance(nodes[0], nodes[1], 1 / value(stage, 0));
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
  public double sidebandOhms(DirectStage point) {
    return isOpen(point) ? 0 : value(point, 0);
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double siemens = 1 / value(stage, 0);
    stage.conductance(nodes[0], nodes[1], siemens);
    stage.drive(nodes[0], -siemens);
    stage.drive(nodes[1], siemens);
    stage.powerOfDrive(siemens);
    stage.powerOf(nodes[0], -siemens);
    stage.powerOf(nodes[1], siemens);
  }

  @Override
  public double amperes(DirectStage stage) {
    return (stage.volts(node(0)) - stage.volts(node(1))) / value(stage, 0);
  }
}
