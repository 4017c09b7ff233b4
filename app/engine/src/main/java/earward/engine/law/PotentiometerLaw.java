package earward.engine.law;

import earward.block.device.Taper;

/** A track with a wiper; terminals TOP, WIPER, BOTTOM. */
final class PotentiometerLaw extends Law {
  PotentiometerLaw(Seat seat) {
    super(seat);
  }

  private double upperOhms(double track, double atHalf, double end, double position) {
    double below = Taper.fractionBelowWiper(Math.min(1, Math.max(0, position)), atHalf);
    return Math.max(end, track * (1 - below));
  }

  private double lowerOhms(double track, double atHalf, double end, double position) {
    double below = Taper.fractionBelowWiper(Math.min(1, Math.max(0, position)), atHalf);
    return Math.max(end, track * below);
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    double end = Math.max(InductorLaw.LEAST_OHMS, value(stage, 2));
    double upper = upperOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    double lower = lowerOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    stage.conductance(nodes[0], nodes[1], 1 / upper);
    stage.conductance(nodes[1], nodes[2], 1 / lower);
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    double end = Math.max(InductorLaw.LEAST_OHMS, value(stage, 2));
    double upper = upperOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    double lower = lowerOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    stage.admittance(nodes[0], nodes[1], 1 / upper, 0);
    stage.admittance(nodes[1], nodes[2], 1 / lower, 0);
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    AlternatingStage stage = noise.stage();
    double end = Math.max(InductorLaw.LEAST_OHMS, value(stage, 2));
    double upper = upperOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    double lower = lowerOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    noise.thermal(nodes[0], nodes[1], 1 / upper);
    noise.thermal(nodes[1], nodes[2], 1 / lower);
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double end = Math.max(InductorLaw.LEAST_OHMS, value(stage, 2));
    double upper = upperOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    double lower = lowerOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    stage.conductance(nodes[0], nodes[1], 1 / upper);
    stage.conductance(nodes[1], nodes[2], 1 / lower);
  }

  @Override
  public double watts(DirectStage stage) {
    if (isOpen(stage)) {
      return 0;
    }
    double end = Math.max(InductorLaw.LEAST_OHMS, value(stage, 2));
    double upper = upperOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    double lower = lowerOhms(value(stage, 0), value(stage, 1), end, value(stage, 3));
    double above = stage.volts(node(0)) - stage.volts(node(1));
    double below = stage.volts(node(1)) - stage.volts(node(2));
    return above * above / upper + below * below / lower;
  }
}
