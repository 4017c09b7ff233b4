package earward.engine.law;

import earward.block.device.OpAmpModel;

/**
 * An operational amplifier: one pole, an output that stops short of its supply, one supply;
 * terminals INPUT, INVERTING, OUTPUT, SUPPLY, GROUND. The branch is its output current.
 */
final class OpAmpLaw extends Law {
  private static final int SUPPLY = 3;
  private static final int GROUND = 4;

  private final OpAmpModel model;

  OpAmpLaw(Seat seat, OpAmpModel model) {
    super(seat);
    this.model = model;
  }

  @Override
  public int branches() {
    return 1;
  }

  private double halfSwing(DirectStage stage, int[] nodes) {
    double supply = stage.volts(nodes[SUPPLY]) - stage.volts(nodes[GROUND]);
    return Math.max(1e-3, (supply - model.lostVoltsUp() - model.lostVoltsDown()) / 2);
  }

  private double drive(DirectStage stage, int[] nodes) {
    double apart = stage.volts(nodes[0]) - stage.volts(nodes[1]);
    return value(stage, 0) * apart / halfSwing(stage, nodes);
  }

  private double on(DirectStage stage, int[] nodes) {
    double supply = stage.volts(nodes[SUPPLY]) - stage.volts(nodes[GROUND]);
    return Math.min(1, Math.max(0, 2 * supply / model.leastVolts()));
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    stage.conductance(nodes[0], nodes[1], 1 / model.inputOhms());
    double on = on(stage, nodes);
    stage.current(nodes[0], nodes[GROUND], on * model.biasAmperes());
    stage.current(nodes[1], nodes[GROUND], on * model.biasAmperes());
    stage.current(nodes[SUPPLY], nodes[GROUND], on * value(stage, 2));
    if (on > 0 && on < 1) {
      double slope = value(stage, 2) * 2 / model.leastVolts();
      stage.currentSlope(nodes[SUPPLY], nodes[GROUND], nodes[SUPPLY], slope);
      stage.currentSlope(nodes[SUPPLY], nodes[GROUND], nodes[GROUND], -slope);
    }
    int branch = branch(0);
    int rail = stage.branch(branch) >= 0 ? nodes[SUPPLY] : nodes[GROUND];
    stage.branchCurrent(branch, rail, nodes[2]);
    double half = halfSwing(stage, nodes);
    double tanh = Math.tanh(drive(stage, nodes));
    double middle = stage.volts(nodes[GROUND]) + model.lostVoltsDown() + half;
    stage.term(branch, nodes[2], 1);
    stage.term(branch, branch, model.outputOhms());
    stage.leaves(branch, -middle - half * tanh, middle);
    double gain = value(stage, 0) * (1 - tanh * tanh);
    stage.slope(branch, nodes[0], -gain);
    stage.slope(branch, nodes[1], gain);
    stage.slope(branch, nodes[SUPPLY], -0.5);
    stage.slope(branch, nodes[GROUND], -0.5);
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    DirectStage point = stage.point();
    stage.admittance(nodes[0], nodes[1], 1 / model.inputOhms(), 0);
    int branch = branch(0);
    int rail = point.branch(branch) >= 0 ? nodes[SUPPLY] : nodes[GROUND];
    stage.branchCurrent(branch, rail, nodes[2]);
    double tanh = Math.tanh(drive(point, nodes));
    double gain = value(point, 0) * (1 - tanh * tanh);
    double off = stage.omega() / (2 * Math.PI) * value(point, 0) / value(point, 1);
    double real = gain / (1 + off * off);
    double imaginary = -off * real;
    stage.add(branch, nodes[2], 1, 0);
    stage.add(branch, branch, model.outputOhms(), 0);
    stage.add(branch, nodes[0], -real, -imaginary);
    stage.add(branch, nodes[1], real, imaginary);
  }

  /** Input noise voltage, and the shot noise of the bias current at each input. */
  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    DirectStage point = noise.stage().point();
    double tanh = Math.tanh(drive(point, nodes));
    double gain = value(point, 0) * (1 - tanh * tanh);
    double off = noise.stage().omega() / (2 * Math.PI) * value(point, 0) / value(point, 1);
    double real = gain / (1 + off * off);
    double density = model.noiseVoltsPerRootHertz() * model.noiseVoltsPerRootHertz();
    noise.inRows(density, branch(0), real, -off * real, -1, 0, 0);
    noise.shot(nodes[0], -1, model.biasAmperes());
    noise.shot(nodes[1], -1, model.biasAmperes());
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    DirectStage point = stage.point();
    stage.conductance(nodes[0], nodes[1], 1 / model.inputOhms());
    stage.current(nodes[SUPPLY], nodes[GROUND], on(point, nodes) * value(point, 2));
    int branch = branch(0);
    stage.branchCurrent(branch, nodes[GROUND], nodes[2]);
    stage.kink().control(0, branch, 1).current(0, nodes[SUPPLY], nodes[GROUND], 1);
    double gain = value(point, 0);
    double seconds = gain / (2 * Math.PI * value(point, 1));
    double half = halfSwing(point, nodes);
    int apart = stage.state(stage.startVolts(nodes[0], nodes[1]));
    int row = stage.rowOf(apart);
    stage.rate(row, apart, seconds);
    stage.stateTerm(row, apart, 1);
    stage.term(row, nodes[0], -1);
    stage.term(row, nodes[1], 1);
    stage.term(branch, nodes[2], 1);
    stage.term(branch, branch, model.outputOhms());
    stage.term(branch, nodes[SUPPLY], -0.5);
    stage.term(branch, nodes[GROUND], -0.5);
    stage.constant(branch, (model.lostVoltsUp() - model.lostVoltsDown()) / 2);
    stage
        .device(new Swing(gain, model.lostVoltsUp() + model.lostVoltsDown(), half))
        .controlState(0, apart, 1)
        .control(1, nodes[SUPPLY], 1)
        .control(1, nodes[GROUND], -1)
        .output(0, branch, -1);
  }

  /** The swing about its middle over time. Controls: filtered input, supply. */
  private record Swing(double gain, double lostVolts, double restHalf) implements WaveformDevice {
    @Override
    public int controls() {
      return 2;
    }

    @Override
    public int outputs() {
      return 1;
    }

    @Override
    public void evaluate(
        double[] volts, int at, double[] into, int outputAt, double[] slopes, int slopeAt) {
      double plain = (volts[at + 1] - lostVolts) / 2;
      double half = Math.max(1e-3, plain);
      double drive = gain * volts[at] / half;
      double tanh = Math.tanh(drive);
      into[outputAt] = half * tanh;
      slopes[slopeAt] = gain * (1 - tanh * tanh);
      slopes[slopeAt + 1] = plain > 1e-3 ? 0.5 * (tanh - drive * (1 - tanh * tanh)) : 0;
    }

    @Override
    public double kneeVolts() {
      return restHalf / gain;
    }
  }

  @Override
  public double amperes(DirectStage stage) {
    return isOpen(stage) ? 0 : stage.branch(branch(0));
  }

  @Override
  public double watts(DirectStage stage) {
    int[] nodes = nodes(stage);
    double supply = stage.volts(nodes[SUPPLY]) - stage.volts(nodes[GROUND]);
    return isOpen(stage) ? 0 : supply * value(stage, 2) * on(stage, nodes);
  }
}
