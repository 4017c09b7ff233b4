package earward.engine.law;

import earward.block.device.FieldEffectModel;
import earward.block.law.ThermalVoltage;
import earward.engine.detection.ChannelLaw;
import earward.engine.detection.PortLaw;

/**
 * A junction field-effect transistor by the square law (Shockley 1952), below pinch-off too;
 * terminals DRAIN, GATE, SOURCE. No current flows in the gate.
 */
final class FieldEffectLaw extends Law implements Heated, CarrierDriven {
  /** Share of the transconductance that a saturated channel's noise is of. */
  private static final double CHANNEL_SHARE = 2 / 3.0;

  private final double sign;
  private final int driven;
  private final double toAirKelvinPerWatt;

  FieldEffectLaw(Seat seat, FieldEffectModel model, int driven) {
    super(seat);
    this.driven = driven;
    this.sign = model.pChannel() ? -1 : 1;
    this.toAirKelvinPerWatt = model.junctionToAirKelvinPerWatt();
  }

  @Override
  public double junctionToAirKelvinPerWatt() {
    return toAirKelvinPerWatt;
  }

  @Override
  public int ports() {
    return 2;
  }

  @Override
  public int driven() {
    return driven;
  }

  /** Where a port leaves the gate: at the source, then at the drain. */
  private int outer(DirectStage stage, int port) {
    return nodes(stage)[port == 0 ? 2 : 0];
  }

  @Override
  public int anode(DirectStage stage, int port) {
    return sign > 0 ? nodes(stage)[1] : outer(stage, port);
  }

  @Override
  public int cathode(DirectStage stage, int port) {
    return sign > 0 ? outer(stage, port) : nodes(stage)[1];
  }

  @Override
  public double seriesOhms(DirectStage stage, int port) {
    return 0;
  }

  @Override
  public PortLaw portLaw(DirectStage stage) {
    return new ChannelLaw();
  }

  @Override
  public void fill(DirectStage stage, PortLaw law) {
    if (law instanceof ChannelLaw own) {
      own.set(isOpen(stage) ? 1e-30 : value(stage, 0), value(stage, 1));
    }
  }

  private boolean apart(DirectStage stage) {
    return driven >= 0 && stage.detecting();
  }

  /** Drain current and its slopes for given voltages, all in n-channel sense. */
  private record Channel(double amperes, double byGate, double byDrain) {}

  private Channel channel(DirectStage stage, int drain, int gate, int source) {
    double saturated = value(stage, 0);
    double pinch = value(stage, 1);
    double open = 1 + sign * (stage.volts(gate) - stage.volts(source)) / pinch;
    double across = sign * (stage.volts(drain) - stage.volts(source)) / pinch;
    if (open <= 0) {
      return new Channel(0, 0, 0);
    }
    if (across >= open) {
      return new Channel(saturated * open * open, 2 * saturated * open / pinch, 0);
    }
    return new Channel(
        saturated * across * (2 * open - across),
        2 * saturated * across / pinch,
        2 * saturated * (open - across) / pinch);
  }

  /** Whether source and drain have changed parts. */
  private boolean turned(DirectStage stage, int[] nodes) {
    return sign * (stage.volts(nodes[0]) - stage.volts(nodes[2])) < 0;
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    if (apart(stage)) {
      for (int port = 0; port < 2; port++) {
        double amperes = stage.drivenAmperes()[driven + port];
        stage.current(anode(stage, port), cathode(stage, port), amperes);
      }
      return;
    }
    boolean turned = turned(stage, nodes);
    int drain = turned ? nodes[2] : nodes[0];
    int source = turned ? nodes[0] : nodes[2];
    Channel channel = channel(stage, drain, nodes[1], source);
    stage.current(drain, source, sign * channel.amperes());
    stage.currentSlope(drain, source, nodes[1], channel.byGate());
    stage.currentSlope(drain, source, drain, channel.byDrain());
    stage.currentSlope(drain, source, source, -channel.byGate() - channel.byDrain());
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    DirectStage point = stage.point();
    if (apart(point)) {
      return;
    }
    boolean turned = turned(point, nodes);
    int drain = turned ? nodes[2] : nodes[0];
    int source = turned ? nodes[0] : nodes[2];
    Channel channel = channel(point, drain, nodes[1], source);
    stage.transconductance(drain, source, nodes[1], channel.byGate(), 0);
    stage.transconductance(drain, source, drain, channel.byDrain(), 0);
    stage.transconductance(drain, source, source, -channel.byGate() - channel.byDrain(), 0);
  }

  /** Thermal noise of the channel, 4kT·(2/3)·gm at saturation (van der Ziel 1962). */
  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    DirectStage point = noise.stage().point();
    if (apart(point)) {
      return;
    }
    boolean turned = turned(point, nodes);
    int drain = turned ? nodes[2] : nodes[0];
    int source = turned ? nodes[0] : nodes[2];
    Channel channel = channel(point, drain, nodes[1], source);
    double siemens = Math.max(channel.byDrain(), CHANNEL_SHARE * channel.byGate());
    noise.thermal(drain, source, siemens);
  }

  /** The same, of the transconductance at the mean current: gm = 2·√(Idss·i)/Vp. */
  @Override
  public double acrossNoise(DirectStage stage, double amperes) {
    double siemens = 2 * Math.sqrt(value(stage, 0) * Math.abs(amperes)) / value(stage, 1);
    double kelvinJoules = ThermalVoltage.CHARGE * ThermalVoltage.volts(stage.celsius());
    return 4 * kelvinJoules * CHANNEL_SHARE * siemens;
  }

  @Override
  public double portNoise(DirectStage stage, double amperes, double volts) {
    return 0;
  }

  @Override
  public double amperes(DirectStage stage) {
    if (isOpen(stage)) {
      return 0;
    }
    if (apart(stage)) {
      return sign * stage.drivenAmperes()[driven];
    }
    int[] nodes = nodes(stage);
    boolean turned = turned(stage, nodes);
    Channel channel =
        channel(stage, turned ? nodes[2] : nodes[0], nodes[1], turned ? nodes[0] : nodes[2]);
    return (turned ? -sign : sign) * channel.amperes();
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    stage
        .device(new Square(value(stage, 0), value(stage, 1)))
        .control(0, nodes[1], sign)
        .control(0, nodes[2], -sign)
        .control(1, nodes[0], sign)
        .control(1, nodes[2], -sign)
        .current(0, nodes[0], nodes[2], sign);
  }

  /** The channel over time. Controls: gate over source, drain over source; output: its current. */
  private record Square(double saturated, double pinch) implements WaveformDevice {
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
      boolean turned = volts[at + 1] < 0;
      double across = Math.abs(volts[at + 1]) / pinch;
      double gate = turned ? volts[at] - volts[at + 1] : volts[at];
      double open = 1 + gate / pinch;
      double amperes = 0;
      double byGate = 0;
      double byDrain = 0;
      if (open > 0 && across >= open) {
        amperes = saturated * open * open;
        byGate = 2 * saturated * open / pinch;
      } else if (open > 0) {
        amperes = saturated * across * (2 * open - across);
        byGate = 2 * saturated * across / pinch;
        byDrain = 2 * saturated * (open - across) / pinch;
      }
      into[outputAt] = turned ? -amperes : amperes;
      slopes[slopeAt] = turned ? -byGate : byGate;
      slopes[slopeAt + 1] = turned ? byGate + byDrain : byDrain;
    }

    @Override
    public double kneeVolts() {
      return pinch;
    }
  }
}
