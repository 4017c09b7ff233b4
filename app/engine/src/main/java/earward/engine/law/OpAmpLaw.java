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
