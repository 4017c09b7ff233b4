package earward.engine.law;

/** A battery or an adaptor: an e.m.f. behind a resistance; taken out where nothing is powered. */
public final class SourceLaw extends Law {
  private static final double LEAST_OHMS = 1e-6;

  private final double rippleHertz;
  private final double ripplePeakToPeakVolts;
  private final double rippleAtAmperes;

  /**
   * The law.
   *
   * @param rippleHertz frequency of the ripple; of a battery, that at which it is asked for
   * @param ripplePeakToPeakVolts ripple, 0 for a battery
   * @param rippleAtAmperes current for which that holds; 0 where the ripple is the same at all
   */
  SourceLaw(Seat seat, double rippleHertz, double ripplePeakToPeakVolts, double rippleAtAmperes) {
    super(seat);
    this.rippleHertz = rippleHertz;
    this.ripplePeakToPeakVolts = ripplePeakToPeakVolts;
    this.rippleAtAmperes = rippleAtAmperes;
  }

  /** Frequency of its ripple, in Hz. */
  public double rippleHertz() {
    return rippleHertz;
  }

  /**
   * Fundamental of its ripple as an e.m.f., rms in V: that of a sawtooth, peak to peak over π√2,
   * which grows with the current where nothing regulates.
   */
  public double rippleRmsVolts(DirectStage stage) {
    double share = rippleAtAmperes > 0 ? Math.max(0, amperes(stage)) / rippleAtAmperes : 1;
    return share * ripplePeakToPeakVolts / (Math.PI * Math.sqrt(2));
  }

  /** Internal resistance, in Ω. */
  public double internalOhms(DirectStage stage) {
    return Math.max(LEAST_OHMS, value(stage, 1));
  }

  /** Node of the plus terminal as fitted. */
  public int plus(DirectStage stage) {
    return nodes(stage)[0];
  }

  /** Node of the minus terminal as fitted. */
  public int minus(DirectStage stage) {
    return nodes(stage)[1];
  }

  private double siemens(DirectStage stage) {
    return stage.powered() ? 1 / Math.max(LEAST_OHMS, value(stage, 1)) : 0;
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    double siemens = siemens(stage);
    stage.conductance(nodes[0], nodes[1], siemens);
    stage.current(nodes[1], nodes[0], stage.sourceShare() * value(stage, 0) * siemens);
  }

  @Override
  public boolean steady() {
    return true;
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    stage.admittance(nodes[0], nodes[1], siemens(stage.point()), 0);
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    noise.thermal(nodes[0], nodes[1], siemens(noise.stage().point()));
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double siemens = siemens(stage.point());
    stage.conductance(nodes[0], nodes[1], siemens);
    stage.current(nodes[1], nodes[0], value(stage, 0) * siemens);
  }

  /** Current that it gives, in A. */
  @Override
  public double amperes(DirectStage stage) {
    if (isOpen(stage)) {
      return 0;
    }
    int[] nodes = nodes(stage);
    double across = stage.volts(nodes[0]) - stage.volts(nodes[1]);
    return (value(stage, 0) - across) * siemens(stage);
  }

  /** Heat in its internal resistance, in W. */
  @Override
  public double watts(DirectStage stage) {
    double amperes = amperes(stage);
    return amperes * amperes * value(stage, 1);
  }
}
