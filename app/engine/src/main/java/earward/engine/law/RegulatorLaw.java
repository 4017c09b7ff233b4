package earward.engine.law;

import earward.block.device.RegulatorModel;

/**
 * A three-ended series regulator: its output aims at the smaller of its voltage and what its input
 * leaves it, behind its output resistance, and gives current only; terminals INPUT, GROUND, OUTPUT.
 */
public final class RegulatorLaw extends Law implements Heated {
  private static final double KNEE_VOLTS = 0.02;
  private static final double KNEE_AMPERES = 1e-4;

  private final RegulatorModel model;

  RegulatorLaw(Seat seat, RegulatorModel model) {
    super(seat);
    this.model = model;
  }

  @Override
  public double junctionToAirKelvinPerWatt() {
    return model.junctionToAirKelvinPerWatt();
  }

  private double lack(DirectStage stage, int[] nodes) {
    double input = stage.volts(nodes[0]) - stage.volts(nodes[1]);
    return (value(stage, 0) - input + value(stage, 1)) / KNEE_VOLTS;
  }

  private double push(DirectStage stage, int[] nodes) {
    double target = value(stage, 0) - KNEE_VOLTS * Soft.plus(lack(stage, nodes));
    double output = stage.volts(nodes[2]) - stage.volts(nodes[1]);
    return (target - output) / (model.outputOhms() * KNEE_AMPERES);
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    double push = push(stage, nodes);
    stage.current(nodes[0], nodes[2], KNEE_AMPERES * Soft.plus(push));
    double slope = Soft.plusSlope(push) / model.outputOhms();
    double byInput = slope * Soft.plusSlope(lack(stage, nodes));
    stage.currentSlope(nodes[0], nodes[2], nodes[0], byInput);
    stage.currentSlope(nodes[0], nodes[2], nodes[2], -slope);
    stage.currentSlope(nodes[0], nodes[2], nodes[1], slope - byInput);
    double input = stage.volts(nodes[0]) - stage.volts(nodes[1]);
    double on = Math.min(1, Math.max(0, input));
    stage.current(nodes[0], nodes[1], on * value(stage, 2));
    if (on > 0 && on < 1) {
      stage.currentSlope(nodes[0], nodes[1], nodes[0], value(stage, 2));
      stage.currentSlope(nodes[0], nodes[1], nodes[1], -value(stage, 2));
    }
  }

  @Override
  public boolean steady() {
    return true;
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    DirectStage point = stage.point();
    double slope = Soft.plusSlope(push(point, nodes)) / model.outputOhms();
    double byInput = slope * Soft.plusSlope(lack(point, nodes));
    stage.transconductance(nodes[0], nodes[2], nodes[0], byInput, 0);
    stage.transconductance(nodes[0], nodes[2], nodes[2], -slope, 0);
    stage.transconductance(nodes[0], nodes[2], nodes[1], slope - byInput, 0);
  }

  @Override
  public double amperes(DirectStage stage) {
    return isOpen(stage) ? 0 : KNEE_AMPERES * Soft.plus(push(stage, nodes(stage)));
  }

  @Override
  public double watts(DirectStage stage) {
    int[] nodes = nodes(stage);
    double input = stage.volts(nodes[0]) - stage.volts(nodes[1]);
    return amperes(stage) * (stage.volts(nodes[0]) - stage.volts(nodes[2]))
        + input * value(stage, 2);
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double on = Math.min(1, Math.max(0, stage.startVolts(nodes[0], nodes[1])));
    stage.current(nodes[0], nodes[1], on * value(stage, 2));
    stage
        .device(new Pass(value(stage, 0), value(stage, 1), model.outputOhms()))
        .control(0, nodes[0], 1)
        .control(0, nodes[1], -1)
        .control(1, nodes[2], 1)
        .control(1, nodes[1], -1)
        .current(0, nodes[0], nodes[2], 1);
  }

  /** The pass element over time. Controls: input, output, both over ground. */
  private record Pass(double wantedVolts, double dropVolts, double ohms) implements WaveformDevice {
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
      double lack = (wantedVolts - volts[at] + dropVolts) / KNEE_VOLTS;
      double target = wantedVolts - KNEE_VOLTS * Soft.plus(lack);
      double push = (target - volts[at + 1]) / (ohms * KNEE_AMPERES);
      double slope = Soft.plusSlope(push) / ohms;
      into[outputAt] = KNEE_AMPERES * Soft.plus(push);
      slopes[slopeAt] = slope * Soft.plusSlope(lack);
      slopes[slopeAt + 1] = -slope;
    }

    @Override
    public double kneeVolts() {
      return ohms * KNEE_AMPERES;
    }
  }
}
