package earward.engine.law;

import earward.block.device.DiodeMaterial;
import earward.block.device.TransistorModel;
import earward.block.law.ThermalVoltage;
import earward.engine.detection.PortLaw;
import earward.engine.detection.TransistorLaw;

/**
 * A bipolar transistor by Ebers and Moll (1954), transport form, with Early's factor; terminals
 * COLLECTOR, BASE, EMITTER. The base resistance stands between base lead and inner base, whose
 * voltage is an unknown of its own.
 */
final class BipolarLaw extends Law implements Heated, CarrierDriven {
  /** Beyond this exponent the law goes on along its tangent. */
  private static final double MOST_EXPONENT = 60;

  private final TransistorModel model;
  private final double sign;
  private final int driven;

  BipolarLaw(Seat seat, TransistorModel model, int driven) {
    super(seat);
    this.model = model;
    this.driven = driven;
    this.sign = model.pnp() ? -1 : 1;
  }

  @Override
  public int branches() {
    return 1;
  }

  @Override
  public double junctionToAirKelvinPerWatt() {
    return model.junctionToAirKelvinPerWatt();
  }

  @Override
  public int ports() {
    return 2;
  }

  @Override
  public int driven() {
    return driven;
  }

  /** Where a port leaves the inner base: at the emitter, then at the collector. */
  private int outer(DirectStage stage, int port) {
    return nodes(stage)[port == 0 ? 2 : 0];
  }

  @Override
  public int anode(DirectStage stage, int port) {
    return model.pnp() ? outer(stage, port) : branch(0);
  }

  @Override
  public int cathode(DirectStage stage, int port) {
    return model.pnp() ? branch(0) : outer(stage, port);
  }

  @Override
  public double seriesOhms(DirectStage stage, int port) {
    return 0;
  }

  @Override
  public PortLaw portLaw(DirectStage stage) {
    return new TransistorLaw();
  }

  @Override
  public void fill(DirectStage stage, PortLaw law) {
    if (law instanceof TransistorLaw own) {
      own.set(
          isOpen(stage) ? 1e-30 : saturation(stage),
          Temperature.thermalVolts(stage.celsius()),
          value(stage, 1),
          model.reverseGain(),
          model.earlyVolts());
    }
  }

  private boolean apart(DirectStage stage) {
    return driven >= 0 && stage.detecting();
  }

  private double saturation(DirectStage stage) {
    return value(stage, 0) * Temperature.saturationRatio(DiodeMaterial.SILICON, 1, stage.celsius());
  }

  private static double exponential(double exponent) {
    return exponent <= MOST_EXPONENT
        ? Math.exp(exponent)
        : Math.exp(MOST_EXPONENT) * (1 + exponent - MOST_EXPONENT);
  }

  private double forward(DirectStage stage, int[] nodes) {
    return sign * (stage.branch(branch(0)) - stage.volts(nodes[2]));
  }

  private double backward(DirectStage stage, int[] nodes) {
    return sign * (stage.branch(branch(0)) - stage.volts(nodes[0]));
  }

  /** Early's factor 1 + vce/Va, not below a tenth. */
  private double early(DirectStage stage, int[] nodes) {
    double across = sign * (stage.volts(nodes[0]) - stage.volts(nodes[2]));
    return Math.max(0.1, 1 + across / model.earlyVolts());
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    if (apart(stage)) {
      stage.conductance(nodes[1], branch(0), 1 / model.baseOhms());
      for (int port = 0; port < 2; port++) {
        double amperes = stage.drivenAmperes()[driven + port];
        stage.current(anode(stage, port), cathode(stage, port), amperes);
      }
      return;
    }
    double thermal = Temperature.thermalVolts(stage.celsius());
    double saturation = saturation(stage);
    double gain = value(stage, 1);
    double early = early(stage, nodes);
    int base = branch(0);
    double towards = saturation * (exponential(forward(stage, nodes) / thermal) - 1);
    double back = saturation * (exponential(backward(stage, nodes) / thermal) - 1);
    stage.conductance(nodes[1], base, 1 / model.baseOhms());
    stage.current(base, nodes[2], sign * towards / gain);
    stage.current(base, nodes[0], sign * back / model.reverseGain());
    stage.current(nodes[0], nodes[2], sign * (towards - back) * early);
    double byForward = forwardSlope(saturation, stage, nodes, thermal);
    double byBackward = backwardSlope(saturation, stage, nodes, thermal);
    slope(stage, base, nodes[2], base, nodes[2], byForward / gain);
    slope(stage, base, nodes[0], base, nodes[0], byBackward / model.reverseGain());
    slope(stage, nodes[0], nodes[2], base, nodes[2], byForward * early);
    slope(stage, nodes[0], nodes[2], base, nodes[0], -byBackward * early);
    slope(stage, nodes[0], nodes[2], nodes[0], nodes[2], (towards - back) / model.earlyVolts());
  }

  private double forwardSlope(double saturation, DirectStage stage, int[] nodes, double thermal) {
    double exponent = Math.min(MOST_EXPONENT, forward(stage, nodes) / thermal);
    return saturation / thermal * Math.exp(exponent);
  }

  private double backwardSlope(double saturation, DirectStage stage, int[] nodes, double thermal) {
    double exponent = Math.min(MOST_EXPONENT, backward(stage, nodes) / thermal);
    return saturation / thermal * Math.exp(exponent);
  }

  private static void slope(
      DirectStage stage, int from, int to, int plus, int minus, double siemens) {
    stage.currentSlope(from, to, plus, siemens);
    stage.currentSlope(from, to, minus, -siemens);
  }

  @Override
  public void limit(DirectStage stage, double[] proposal) {
    if (apart(stage)) {
      return;
    }
    int[] nodes = nodes(stage);
    double emitter = nodes[2] < 0 ? 0 : proposal[nodes[2]];
    double thermal = Temperature.thermalVolts(stage.celsius());
    double from = forward(stage, nodes);
    double to = sign * (proposal[branch(0)] - emitter);
    double knee = thermal * Math.log(thermal / saturation(stage));
    if (to > knee && to - from > 2 * thermal) {
      double start = Math.max(from, knee);
      double limited = start + thermal * Math.log1p((to - start) / thermal);
      proposal[branch(0)] = emitter + sign * limited;
    }
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    DirectStage point = stage.point();
    if (apart(point)) {
      stage.admittance(nodes[1], branch(0), 1 / model.baseOhms(), 0);
      return;
    }
    double thermal = Temperature.thermalVolts(point.celsius());
    double saturation = saturation(point);
    double early = early(point, nodes);
    int base = branch(0);
    double byForward = forwardSlope(saturation, point, nodes, thermal);
    double byBackward = backwardSlope(saturation, point, nodes, thermal);
    double output = amperes(point) * sign / early / model.earlyVolts();
    stage.admittance(nodes[1], base, 1 / model.baseOhms(), 0);
    stage.admittance(base, nodes[2], byForward / value(point, 1), 0);
    stage.admittance(base, nodes[0], byBackward / model.reverseGain(), 0);
    stage.transconductance(nodes[0], nodes[2], base, (byForward - byBackward) * early, 0);
    stage.transconductance(nodes[0], nodes[2], nodes[2], -byForward * early - output, 0);
    stage.transconductance(nodes[0], nodes[2], nodes[0], byBackward * early + output, 0);
  }

  /** Shot noise of collector and base current, thermal noise of the base resistance. */
  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    DirectStage point = noise.stage().point();
    noise.thermal(nodes[1], branch(0), 1 / model.baseOhms());
    if (apart(point)) {
      return;
    }
    double collector = amperes(point);
    noise.shot(nodes[0], nodes[2], collector);
    double base = (point.volts(nodes[1]) - point.branch(branch(0))) / model.baseOhms();
    noise.shot(branch(0), nodes[2], base);
  }

  @Override
  public double acrossNoise(DirectStage stage, double amperes) {
    return 2 * ThermalVoltage.CHARGE * Math.abs(amperes);
  }

  @Override
  public double portNoise(DirectStage stage, double amperes, double volts) {
    return 2 * ThermalVoltage.CHARGE * Math.abs(amperes);
  }

  /** Current from collector to emitter, without the base's. */
  @Override
  public double amperes(DirectStage stage) {
    if (isOpen(stage)) {
      return 0;
    }
    if (apart(stage)) {
      return -sign * stage.drivenAmperes()[driven + 1];
    }
    int[] nodes = nodes(stage);
    double thermal = Temperature.thermalVolts(stage.celsius());
    double saturation = saturation(stage);
    double towards = exponential(forward(stage, nodes) / thermal);
    double back = exponential(backward(stage, nodes) / thermal);
    return sign * saturation * (towards - back) * early(stage, nodes);
  }

  /** Heat, in W: what enters by collector and by base, each against the emitter. */
  @Override
  public double watts(DirectStage stage) {
    if (isOpen(stage)) {
      return 0;
    }
    int[] nodes = nodes(stage);
    double emitter = stage.volts(nodes[2]);
    double base = (stage.volts(nodes[1]) - stage.branch(branch(0))) / model.baseOhms();
    double back = 0;
    if (!apart(stage)) {
      double thermal = Temperature.thermalVolts(stage.celsius());
      double exponent = backward(stage, nodes) / thermal;
      back = sign * saturation(stage) * (exponential(exponent) - 1) / model.reverseGain();
    }
    return (amperes(stage) - back) * (stage.volts(nodes[0]) - emitter)
        + base * (stage.volts(nodes[1]) - emitter);
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    DirectStage point = stage.point();
    int base = branch(0);
    stage.conductance(nodes[1], base, 1 / model.baseOhms());
    Junctions junctions =
        new Junctions(
            saturation(point),
            Temperature.thermalVolts(point.celsius()),
            1 / value(point, 1),
            1 / model.reverseGain(),
            1 / model.earlyVolts());
    stage
        .device(junctions)
        .control(0, base, sign)
        .control(0, nodes[2], -sign)
        .control(1, base, sign)
        .control(1, nodes[0], -sign)
        .current(0, base, nodes[2], sign)
        .current(1, base, nodes[0], sign)
        .current(2, nodes[0], nodes[2], sign);
  }

  /**
   * Both junctions over time. Controls: base over emitter, base over collector. Outputs: currents
   * base to emitter, base to collector, collector to emitter.
   */
  private record Junctions(
      double saturation, double thermal, double perGain, double perReverse, double perEarly)
      implements WaveformDevice {
    @Override
    public int controls() {
      return 2;
    }

    @Override
    public int outputs() {
      return 3;
    }

    @Override
    public void evaluate(
        double[] volts, int at, double[] into, int outputAt, double[] slopes, int slopeAt) {
      double forward = volts[at] / thermal;
      double backward = volts[at + 1] / thermal;
      double towards = saturation * (exponential(forward) - 1);
      double back = saturation * (exponential(backward) - 1);
      double byForward = saturation / thermal * Math.exp(Math.min(MOST_EXPONENT, forward));
      double byBackward = saturation / thermal * Math.exp(Math.min(MOST_EXPONENT, backward));
      double plain = 1 + (volts[at] - volts[at + 1]) * perEarly;
      double early = Math.max(0.1, plain);
      double earlySlope = plain > 0.1 ? perEarly : 0;
      into[outputAt] = towards * perGain;
      into[outputAt + 1] = back * perReverse;
      into[outputAt + 2] = (towards - back) * early;
      slopes[slopeAt] = byForward * perGain;
      slopes[slopeAt + 1] = 0;
      slopes[slopeAt + 2] = 0;
      slopes[slopeAt + 3] = byBackward * perReverse;
      slopes[slopeAt + 4] = byForward * early + (towards - back) * earlySlope;
      slopes[slopeAt + 5] = -byBackward * early - (towards - back) * earlySlope;
    }

    @Override
    public double limited(int control, double from, double to) {
      double knee = thermal * Math.log(thermal / saturation);
      if (to <= knee || to - from <= 2 * thermal) {
        return to;
      }
      double start = Math.max(from, knee);
      return start + thermal * Math.log1p((to - start) / thermal);
    }

    @Override
    public double kneeVolts() {
      return thermal;
    }
  }
}
