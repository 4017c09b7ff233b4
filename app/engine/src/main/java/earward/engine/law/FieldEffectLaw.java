package earward.engine.law;

import earward.block.device.FieldEffectModel;

/**
 * A junction field-effect transistor by the square law (Shockley 1952), below pinch-off too;
 * terminals DRAIN, GATE, SOURCE. No current flows in the gate.
 */
final class FieldEffectLaw extends Law implements Heated {
  /** Share of the transconductance that a saturated channel's noise is of. */
  private static final double CHANNEL_SHARE = 2 / 3.0;

  private final double sign;
  private final double toAirKelvinPerWatt;

  FieldEffectLaw(Seat seat, FieldEffectModel model) {
    super(seat);
    this.sign = model.pChannel() ? -1 : 1;
    this.toAirKelvinPerWatt = model.junctionToAirKelvinPerWatt();
  }

  @Override
  public double junctionToAirKelvinPerWatt() {
    return toAirKelvinPerWatt;
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
    boolean turned = turned(point, nodes);
    int drain = turned ? nodes[2] : nodes[0];
    int source = turned ? nodes[0] : nodes[2];
    Channel channel = channel(point, drain, nodes[1], source);
    double siemens = Math.max(channel.byDrain(), CHANNEL_SHARE * channel.byGate());
    noise.thermal(drain, source, siemens);
  }

  @Override
  public double amperes(DirectStage stage) {
    if (isOpen(stage)) {
      return 0;
    }
    int[] nodes = nodes(stage);
    boolean turned = turned(stage, nodes);
    Channel channel =
        channel(stage, turned ? nodes[2] : nodes[0], nodes[1], turned ? nodes[0] : nodes[2]);
    return (turned ? -sign : sign) * channel.amperes();
  }
}
