package earward.engine.law;

import earward.block.device.DiodeModel;
import earward.block.law.ThermalVoltage;
import earward.engine.detection.JunctionLaw;
import earward.engine.detection.PortLaw;

/**
 * A diode: series resistance, then the junction, with an unknown for the voltage between them. One
 * that the carrier drives stands as a source of its mean current while the carrier is on, and as
 * nothing at all to audio and carrier: its cycle is solved apart.
 */
public final class DiodeLaw extends Law implements CarrierDriven {
  /** What stands for no series resistance, in Ω. */
  private static final double LEAST_OHMS = 1e-3;

  private final DiodeModel model;
  private final int ordinal;
  private final int driven;

  DiodeLaw(Seat seat, DiodeModel model, int ordinal, int driven) {
    super(seat);
    this.model = model;
    this.ordinal = ordinal;
    this.driven = driven;
  }

  @Override
  public int branches() {
    return 1;
  }

  @Override
  public int ports() {
    return 1;
  }

  @Override
  public int driven() {
    return driven;
  }

  /** Its data. */
  public DiodeModel model() {
    return model;
  }

  /** Junction capacitance at no bias, in F. */
  public double junctionFarads(DirectStage stage) {
    return value(stage, 3);
  }

  @Override
  public int anode(DirectStage stage, int port) {
    return anode(stage);
  }

  @Override
  public int cathode(DirectStage stage, int port) {
    return cathode(stage);
  }

  @Override
  public double seriesOhms(DirectStage stage, int port) {
    return seriesOhms(stage);
  }

  @Override
  public PortLaw portLaw(DirectStage stage) {
    return stage.junction(ordinal);
  }

  /** Nothing: its junction is that of DC, and was prepared with it. */
  @Override
  public void fill(DirectStage stage, PortLaw law) {}

  /** Node of the anode as fitted. */
  public int anode(DirectStage stage) {
    return nodes(stage)[0];
  }

  /** Node of the cathode as fitted. */
  public int cathode(DirectStage stage) {
    return nodes(stage)[1];
  }

  /** Series resistance, in Ω. */
  public double seriesOhms(DirectStage stage) {
    return Math.max(LEAST_OHMS, value(stage, 2));
  }

  @Override
  public void prepare(DirectStage stage) {
    double emission = value(stage, 1);
    boolean open = isOpen(stage);
    double ratio = Temperature.saturationRatio(model.material(), emission, stage.celsius());
    stage
        .junction(ordinal)
        .set(
            (open ? 1e-18 : value(stage, 0)) * ratio,
            emission * Temperature.thermalVolts(stage.celsius()),
            open ? 0 : value(stage, 4),
            open ? 0 : value(stage, 3),
            model.builtInVolts(),
            model.gradingExponent(),
            model.breakdownVolts());
  }

  private boolean apart(DirectStage stage) {
    return driven >= 0 && stage.detecting();
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    if (apart(stage)) {
      stage.current(nodes[0], nodes[1], stage.drivenAmperes()[driven]);
      stage.term(branch(0), branch(0), 1);
      return;
    }
    JunctionLaw junction = stage.junction(ordinal);
    double volts = stage.branch(branch(0)) - stage.volts(nodes[1]);
    stage.conductance(nodes[0], branch(0), 1 / seriesOhms(stage));
    stage.current(branch(0), nodes[1], junction.current(volts));
    double slope = junction.conductance(volts);
    stage.currentSlope(branch(0), nodes[1], branch(0), slope);
    stage.currentSlope(branch(0), nodes[1], nodes[1], -slope);
  }

  @Override
  public void limit(DirectStage stage, double[] proposal) {
    if (apart(stage) || isOpen(stage)) {
      return;
    }
    int cathode = cathode(stage);
    double from = stage.branch(branch(0)) - stage.volts(cathode);
    double base = cathode < 0 ? 0 : proposal[cathode];
    proposal[branch(0)] = base + stage.junction(ordinal).limited(from, proposal[branch(0)] - base);
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    DirectStage point = stage.point();
    if (apart(point)) {
      stage.add(branch(0), branch(0), 1, 0);
      return;
    }
    JunctionLaw junction = point.junction(ordinal);
    double volts = point.branch(branch(0)) - point.volts(nodes[1]);
    stage.admittance(nodes[0], branch(0), 1 / seriesOhms(point), 0);
    stage.admittance(
        branch(0),
        nodes[1],
        junction.conductance(volts),
        stage.omega() * junction.capacitance(volts));
  }

  /**
   * Series resistance and junction. One that the carrier drives makes its noise by its solved mean
   * current, which the solver knows.
   */
  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    DirectStage point = noise.stage().point();
    if (apart(point)) {
      return;
    }
    JunctionLaw junction = point.junction(ordinal);
    double volts = point.branch(branch(0)) - point.volts(nodes[1]);
    noise.thermal(nodes[0], branch(0), 1 / seriesOhms(point));
    noise.current(branch(0), nodes[1], portNoise(point, junction.current(volts), volts));
  }

  /**
   * Noise of the junction, 2q(J + 2Is), and 4kTg of its leakage, in A²/Hz.
   *
   * <p>Source: van der Ziel; two opposite currents J + Is and Is, each with its shot noise.
   *
   * @param amperes mean current with the leakage's
   * @param volts mean junction voltage
   */
  @Override
  public double portNoise(DirectStage stage, double amperes, double volts) {
    double leakage = stage.junction(ordinal).leakageSiemens();
    double through = Math.abs(amperes - leakage * volts);
    double thermal = Temperature.thermalVolts(stage.celsius());
    double charge = ThermalVoltage.CHARGE;
    return 2 * charge * (through + 2 * stage.junction(ordinal).saturationAmperes())
        + 4 * charge * thermal * leakage;
  }

  @Override
  public double acrossNoise(DirectStage stage, double amperes) {
    return 0;
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    DirectStage point = stage.point();
    double emission = value(point, 1);
    double ratio = Temperature.saturationRatio(model.material(), emission, point.celsius());
    stage.conductance(nodes[0], branch(0), 1 / seriesOhms(point));
    stage.conductance(branch(0), nodes[1], value(point, 4));
    WaveformJunction junction =
        new WaveformJunction(
            value(point, 0) * ratio,
            emission * Temperature.thermalVolts(point.celsius()),
            value(point, 3),
            model.builtInVolts(),
            model.gradingExponent(),
            model.breakdownVolts());
    stage
        .device(junction)
        .control(0, branch(0), 1)
        .control(0, nodes[1], -1)
        .current(0, branch(0), nodes[1], 1);
  }

  @Override
  public double amperes(DirectStage stage) {
    if (apart(stage)) {
      return stage.drivenAmperes()[driven];
    }
    return isOpen(stage)
        ? 0
        : stage.junction(ordinal).current(stage.branch(branch(0)) - stage.volts(cathode(stage)));
  }
}
