package earward.engine.law;

/**
 * Drive current into Rp ∥ L ∥ C across TOP and BOTTOM, with an ideal tap; C = Q/(ωc·Rp), L =
 * Rp/(ωc·Q). At audio and DC only the winding counts. The primary ends are not joined to anything.
 *
 * <p>Branches: current out of the resonant circuit into TOP, and out of the tap.
 */
final class TunedFeedLaw extends FeedLaw {
  private static final int TOP = 2;
  private static final int TAP = 3;
  private static final int BOTTOM = 4;

  private static final int PARALLEL_OHMS = 0;
  private static final int QUALITY = 1;
  private static final int DETUNING = 2;
  private static final int TAP_FRACTION = 3;
  private static final int WINDING_OHMS = 4;

  /** Share of all loss at the carrier that the winding's resistance may be without a short. */
  private static final double MOST_LOSS = 0.6;

  /** Resistance of a large winding resistance over the reactance of what shorts it. */
  private static final double SHORTING = 60;

  TunedFeedLaw(Seat seat) {
    super(seat);
  }

  @Override
  public int branches() {
    return 2;
  }

  @Override
  public boolean tuned() {
    return true;
  }

  @Override
  public void hold(double[] sideRe, DirectStage point) {
    if (!isOpen(point)) {
      sideRe[branch(0)] += 1;
    }
  }

  @Override
  public int heldBranch() {
    return branch(0);
  }

  @Override
  public double tankOhms(DirectStage point) {
    return value(point, PARALLEL_OHMS);
  }

  @Override
  public double tankFarads(DirectStage point, double carrierRadians) {
    return value(point, QUALITY) / (carrierRadians * value(point, PARALLEL_OHMS));
  }

  @Override
  public double detuningRadians(DirectStage point) {
    return 2 * Math.PI * value(point, DETUNING);
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    double ohms = Math.max(InductorLaw.LEAST_OHMS, value(stage, WINDING_OHMS));
    double fraction = value(stage, TAP_FRACTION);
    stage.term(branch(0), branch(0), 1);
    stage.term(branch(1), branch(1), 1);
    // the share of the winding below the tap; nothing is left of it where the tap is at an end
    double below = Math.max(InductorLaw.LEAST_OHMS, ohms * fraction);
    double above = Math.max(InductorLaw.LEAST_OHMS, ohms * (1 - fraction));
    stage.conductance(nodes[TOP], nodes[TAP], 1 / above);
    stage.conductance(nodes[TAP], nodes[BOTTOM], 1 / below);
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    if (stage.carrierHarmonic() == 0) {
      audio(stage, nodes);
      return;
    }
    double fraction = value(stage, TAP_FRACTION);
    stage.branchCurrent(branch(0), -1, nodes[TOP]);
    stage.branchCurrent(branch(0), nodes[BOTTOM], -1);
    stage.branchCurrent(branch(1), -1, nodes[TAP]);
    stage.add(nodes[TOP], branch(1), fraction, 0);
    stage.add(nodes[BOTTOM], branch(1), 1 - fraction, 0);
    stage.add(branch(0), nodes[TOP], 1, 0);
    stage.add(branch(0), nodes[BOTTOM], -1, 0);
    stage.add(branch(1), nodes[TAP], 1, 0);
    stage.add(branch(1), nodes[BOTTOM], fraction - 1, 0);
    stage.add(branch(1), nodes[TOP], -fraction, 0);
    if (stage.carrierHarmonic() > 1 || stage.feedFree()) {
      tank(stage);
    }
  }

  /**
   * The voltage that the circuit's own impedance takes from the current that it gives. C stays, L
   * is turned by the core: 1/(ωc·L) = ωc·C − 2C·(ωc − ω0).
   */
  private void tank(AlternatingStage stage) {
    int harmonic = stage.carrierHarmonic();
    double carrier = stage.carrierOmega();
    double turned = stage.turnedRadians();
    stage.add(
        branch(0),
        branch(0),
        circuitRealOhms(stage.point(), harmonic, carrier, turned),
        circuitImaginaryOhms(stage.point(), harmonic, carrier, turned));
  }

  @Override
  public double circuitRealOhms(
      DirectStage point, int harmonic, double carrierRadians, double turnedRadians) {
    double conductance = 1 / value(point, PARALLEL_OHMS);
    double susceptance = susceptance(point, harmonic, turnedRadians / carrierRadians);
    return conductance / (conductance * conductance + susceptance * susceptance);
  }

  @Override
  public double circuitImaginaryOhms(
      DirectStage point, int harmonic, double carrierRadians, double turnedRadians) {
    double conductance = 1 / value(point, PARALLEL_OHMS);
    double susceptance = susceptance(point, harmonic, turnedRadians / carrierRadians);
    return -susceptance / (conductance * conductance + susceptance * susceptance);
  }

  private double susceptance(DirectStage point, double harmonic, double turned) {
    double reactive = value(point, QUALITY) / value(point, PARALLEL_OHMS);
    return reactive * (harmonic - 1 / harmonic) + 2 * reactive * turned / harmonic;
  }

  private void audio(AlternatingStage stage, int[] nodes) {
    double henries = value(stage, PARALLEL_OHMS) / (stage.carrierOmega() * value(stage, QUALITY));
    double ohms = Math.max(InductorLaw.LEAST_OHMS, value(stage, WINDING_OHMS));
    double reactance = stage.omega() * henries;
    double fraction = value(stage, TAP_FRACTION);
    stage.add(branch(0), branch(0), 1, 0);
    stage.add(branch(1), branch(1), 1, 0);
    double below = Math.max(InductorLaw.LEAST_OHMS, ohms * fraction);
    double above = Math.max(InductorLaw.LEAST_OHMS, ohms * (1 - fraction));
    stage.impedance(nodes[TOP], nodes[TAP], above, reactance * (1 - fraction));
    stage.impedance(nodes[TAP], nodes[BOTTOM], below, reactance * fraction);
  }

  /**
   * C as it is, the core turned for the wanted tuning, and the winding's resistance in series with
   * L where audio and DC flow. At the carrier its loss belongs to Rp already, so Rp and L are moved
   * until the circuit is Rp ∥ L ∥ C there; a resistance too large for that is shorted to the
   * carrier by a capacitor of a sixtieth of it in reactance.
   */
  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    double omega = stage.carrierRadians();
    double rp = value(stage, PARALLEL_OHMS);
    double farads = value(stage, QUALITY) / (omega * rp);
    double reactance = 1 / (omega * farads - 2 * farads * stage.tuningRadians());
    double ohms = Math.max(InductorLaw.LEAST_OHMS, value(stage, WINDING_OHMS));
    boolean shorted = ohms * rp > MOST_LOSS * reactance * reactance;
    double real = shorted ? ohms / (1 + SHORTING * SHORTING) : ohms;
    double own = shorted ? -SHORTING * real : 0;
    double whole = (reactance + Math.sqrt(reactance * reactance - 4 * real * real)) / 2;
    double loss = real / (real * real + whole * whole);
    stage.conductance(nodes[TOP], nodes[BOTTOM], Math.max(0, 1 / rp - loss));
    stage.capacitor(nodes[TOP], nodes[BOTTOM], farads, 0);
    double start = stage.startVolts(nodes[TOP], nodes[BOTTOM]) / ohms;
    if (shorted) {
      int between = stage.unknown();
      stage.conductance(between, nodes[BOTTOM], 1 / ohms);
      shorting(stage, between, nodes[BOTTOM], SHORTING / (omega * ohms), start * ohms);
      stage.inductor(nodes[TOP], between, (whole - own) / omega, 0, start);
    } else {
      stage.inductor(nodes[TOP], nodes[BOTTOM], whole / omega, ohms, start);
    }
    stage.drive(nodes[TOP], -1 / rp);
    stage.drive(nodes[BOTTOM], 1 / rp);
    stage.powerOf(nodes[TOP], 1 / rp);
    stage.powerOf(nodes[BOTTOM], -1 / rp);
    stage.term(branch(0), branch(0), 1);
    tap(stage, nodes, ohms);
  }

  private static void shorting(
      WaveformStage stage, int a, int b, double farads, double startVolts) {
    int charge = stage.state(farads * startVolts);
    stage.rate(a, charge, 1);
    stage.rate(b, charge, -1);
    stage.term(stage.rowOf(charge), a, 1);
    stage.term(stage.rowOf(charge), b, -1);
    stage.stateTerm(stage.rowOf(charge), charge, -1 / farads);
  }

  /** An ideal tap, behind what the winding's resistance is to direct current there. */
  private void tap(WaveformStage stage, int[] nodes, double ohms) {
    double fraction = value(stage, TAP_FRACTION);
    stage.term(nodes[TAP], branch(1), -1);
    stage.term(nodes[TOP], branch(1), fraction);
    stage.term(nodes[BOTTOM], branch(1), 1 - fraction);
    stage.term(branch(1), nodes[TAP], 1);
    stage.term(branch(1), nodes[TOP], -fraction);
    stage.term(branch(1), nodes[BOTTOM], fraction - 1);
    stage.term(branch(1), branch(1), ohms * fraction * (1 - fraction));
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    AlternatingStage stage = noise.stage();
    double ohms = Math.max(InductorLaw.LEAST_OHMS, value(stage, WINDING_OHMS));
    double reactance =
        stage.omega()
            * value(stage, PARALLEL_OHMS)
            / (stage.carrierOmega() * value(stage, QUALITY));
    double fraction = value(stage, TAP_FRACTION);
    double below = Math.max(InductorLaw.LEAST_OHMS, ohms * fraction);
    double above = Math.max(InductorLaw.LEAST_OHMS, ohms * (1 - fraction));
    noise.thermalOfImpedance(nodes[TOP], nodes[TAP], above, reactance * (1 - fraction));
    noise.thermalOfImpedance(nodes[TAP], nodes[BOTTOM], below, reactance * fraction);
  }

  @Override
  public double sidebandOhms(DirectStage point) {
    return isOpen(point) ? 0 : value(point, PARALLEL_OHMS);
  }

  @Override
  public double amperes(DirectStage stage) {
    double ohms = Math.max(InductorLaw.LEAST_OHMS, value(stage, WINDING_OHMS));
    return (stage.volts(node(TOP)) - stage.volts(node(BOTTOM))) / ohms;
  }
}
