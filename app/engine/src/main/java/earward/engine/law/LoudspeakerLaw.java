package earward.engine.law;

/**
 * A loudspeaker: Z = Re + jωLe + Rm/(1 + jQms(f/fs − fs/f)), Rm = Re·Qms/Qes.
 *
 * <p>Source: Thiele and Small (Small 1972, direct-radiator loudspeaker system analysis).
 */
final class LoudspeakerLaw extends Law {
  private static final int DC_OHMS = 0;
  private static final int VOICE_COIL_HENRIES = 1;
  private static final int RESONANCE_HERTZ = 2;
  private static final int MECHANICAL_Q = 3;
  private static final int ELECTRICAL_Q = 4;

  /** What stands for a voice coil without inductance over time, in H. */
  private static final double LEAST_HENRIES = 1e-9;

  private final double ratedOhms;

  LoudspeakerLaw(Seat seat, double ratedOhms) {
    super(seat);
    this.ratedOhms = ratedOhms;
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    stage.conductance(nodes[0], nodes[1], 1 / value(stage, DC_OHMS));
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    double dcOhms = value(stage, DC_OHMS);
    switch (stage.load()) {
      case RATED -> stage.admittance(nodes[0], nodes[1], 1 / ratedOhms, 0);
      case LEAST -> stage.admittance(nodes[0], nodes[1], 1 / (dcOhms * stage.leastLoadShare()), 0);
      case AS_IT_IS -> stage.impedance(nodes[0], nodes[1], realOhms(stage), imaginaryOhms(stage));
    }
  }

  /** Noise of the voice coil and of what damps its movement: that of the real part as a whole. */
  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    AlternatingStage stage = noise.stage();
    noise.thermalOfImpedance(nodes[0], nodes[1], realOhms(stage), imaginaryOhms(stage));
  }

  private double off(AlternatingStage stage) {
    double hertz = stage.omega() / (2 * Math.PI);
    double resonance = value(stage, RESONANCE_HERTZ);
    return value(stage, MECHANICAL_Q) * (hertz / resonance - resonance / hertz);
  }

  private double motionalOhms(AlternatingStage stage) {
    double off = off(stage);
    double most = value(stage, DC_OHMS) * value(stage, MECHANICAL_Q) / value(stage, ELECTRICAL_Q);
    return most / (1 + off * off);
  }

  private double realOhms(AlternatingStage stage) {
    return value(stage, DC_OHMS) + motionalOhms(stage);
  }

  private double imaginaryOhms(AlternatingStage stage) {
    double coil = stage.omega() * value(stage, VOICE_COIL_HENRIES);
    return coil - motionalOhms(stage) * off(stage);
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double dcOhms = value(stage, DC_OHMS);
    double resonance = 2 * Math.PI * value(stage, RESONANCE_HERTZ);
    double mechanicalQ = value(stage, MECHANICAL_Q);
    double motional = dcOhms * mechanicalQ / value(stage, ELECTRICAL_Q);
    int between = stage.unknown();
    double start = stage.startVolts(nodes[0], nodes[1]) / dcOhms;
    double henries = Math.max(LEAST_HENRIES, value(stage, VOICE_COIL_HENRIES));
    stage.inductor(nodes[0], between, henries, dcOhms, start);
    stage.conductance(between, nodes[1], 1 / motional);
    int charge = stage.state(0);
    stage.rate(between, charge, 1);
    stage.rate(nodes[1], charge, -1);
    double farads = mechanicalQ / (resonance * motional);
    stage.term(stage.rowOf(charge), between, 1);
    stage.term(stage.rowOf(charge), nodes[1], -1);
    stage.stateTerm(stage.rowOf(charge), charge, -1 / farads);
    int spring = stage.state(start);
    stage.stateTerm(between, spring, 1);
    stage.stateTerm(nodes[1], spring, -1);
    stage.term(stage.rowOf(spring), between, 1);
    stage.term(stage.rowOf(spring), nodes[1], -1);
    stage.rate(stage.rowOf(spring), spring, -motional / (mechanicalQ * resonance));
  }

  @Override
  public double amperes(DirectStage stage) {
    return isOpen(stage)
        ? 0
        : (stage.volts(node(0)) - stage.volts(node(1))) / value(stage, DC_OHMS);
  }

  @Override
  public double loadSiemens(DirectStage stage) {
    return isOpen(stage) ? 0 : 1 / ratedOhms;
  }
}
