package earward.engine.law;

import earward.block.device.AmplifierModel;
import earward.block.device.AudioAmplifier;
import earward.block.device.ControlPoint;
import earward.block.device.Terminal;
import earward.block.law.ThermalChain;
import java.util.EnumMap;
import java.util.List;

/**
 * An audio amplifier IC. Each output is a source of voltage: at rest a share of the supply, to
 * audio its input times the gain that its pins and their parts leave it, with one pole. Supply
 * current is that of rest, that of the signal (written by the solver), and that of a DC load.
 *
 * <p>Inside the IC stand 10 kΩ from SUPPLY to RIPPLE and 1 kΩ from SUPPLY to BOOTSTRAP (common
 * practice, from memory): so an open or shorted capacitor there does what it does in life.
 */
public final class AmplifierLaw extends Law {
  static final int GAIN = 0;
  static final int FEEDBACK_OHMS = 1;
  static final int QUIESCENT = 2;
  static final int REST_FRACTION = 3;
  static final int INPUT_OHMS = 4;
  static final int BIAS = 5;
  private static final int HEAT_SINK = 6;

  /** Keeps the equations regular where an output is shorted or an IC stands the wrong way round. */
  static final double OUTPUT_OHMS = 1e-3;

  /** Band over which data sheets give the input noise: 22 Hz to 22 kHz. */
  private static final double NOISE_BAND_HERTZ = 22e3 - 22;

  static final double RIPPLE_SIEMENS = 1e-4;
  static final double BOOTSTRAP_SIEMENS = 1e-3;

  private final AmplifierModel model;
  private final int ordinal;

  /** Place of each terminal that the type has among the nodes. */
  private final EnumMap<Terminal, Integer> places = new EnumMap<>(Terminal.class);

  /** What of a volt of ripple reaches an output over the gain, with RIPPLE held and without. */
  private final double heldRipple;

  private final double bareRipple;
  private final CapacitorLaw[] compensation;
  private final CapacitorLaw[] bootstrap;

  /**
   * The law.
   *
   * @param ordinal place among all amplifiers
   * @param compensation capacitors between COMPENSATION and OUTPUT
   * @param bootstrap capacitors between BOOTSTRAP and OUTPUT
   */
  AmplifierLaw(
      Seat seat,
      AudioAmplifier amplifier,
      int ordinal,
      List<CapacitorLaw> compensation,
      List<CapacitorLaw> bootstrap) {
    super(seat);
    this.model = amplifier.model();
    this.ordinal = ordinal;
    List<Terminal> terminals = amplifier.terminals();
    for (int i = 0; i < terminals.size(); i++) {
      places.put(terminals.get(i), i);
    }
    heldRipple = Math.pow(10, -model.rippleRejectionDecibels() / 20);
    bareRipple = Math.pow(10, -model.rippleRejectionBareDecibels() / 20);
    this.compensation = compensation.toArray(CapacitorLaw[]::new);
    this.bootstrap = bootstrap.toArray(CapacitorLaw[]::new);
  }

  @Override
  public int branches() {
    return model.bridge() ? 2 : 1;
  }

  /** Its data. */
  public AmplifierModel model() {
    return model;
  }

  /** Place among all amplifiers. */
  public int ordinal() {
    return ordinal;
  }

  /** Index of the branch whose current flows out of an output: 0, or 1 for OUTPUT_TWO. */
  public int outputBranch(int output) {
    return branch(output);
  }

  /** Node of an output as fitted: 0 for OUTPUT, 1 for OUTPUT_TWO. */
  public int outputNode(DirectStage stage, int output) {
    return at(nodes(stage), output == 0 ? Terminal.OUTPUT : Terminal.OUTPUT_TWO);
  }

  /** Voltage between SUPPLY and GROUND, in V. */
  public double supplyVolts(DirectStage stage) {
    int[] nodes = nodes(stage);
    return stage.volts(at(nodes, Terminal.SUPPLY)) - stage.volts(at(nodes, Terminal.GROUND));
  }

  /** Node of SUPPLY as fitted. */
  public int supplyNode(DirectStage stage) {
    return at(nodes(stage), Terminal.SUPPLY);
  }

  /** Node of GROUND as fitted. */
  public int groundNode(DirectStage stage) {
    return at(nodes(stage), Terminal.GROUND);
  }

  /** Node whose voltage the outputs' rest is a share of: RIPPLE where the type has it. */
  public int restNode(DirectStage stage) {
    return at(nodes(stage), has(Terminal.RIPPLE) ? Terminal.RIPPLE : Terminal.SUPPLY);
  }

  /** That share. */
  public double restShare(DirectStage stage) {
    return value(stage, REST_FRACTION);
  }

  /** DC voltage of an output over GROUND, in V. */
  public double restVolts(DirectStage stage, int output) {
    return stage.volts(outputNode(stage, output)) - stage.volts(at(nodes(stage), Terminal.GROUND));
  }

  /** How far an output may swing up from rest at a peak current, in V. */
  public double swingUpVolts(DirectStage stage, int output, double peakAmperes) {
    double lost = model.swing().lostUpVolts() + model.swing().lostUpOhms() * peakAmperes;
    if (!bootstrapped(stage)) {
      lost += model.swing().lostWithoutBootstrapVolts();
    }
    return Math.max(0, supplyVolts(stage) - restVolts(stage, output) - lost);
  }

  /** How far an output may swing down from rest at a peak current, in V. */
  public double swingDownVolts(DirectStage stage, int output, double peakAmperes) {
    double lost = model.swing().lostDownVolts() + model.swing().lostDownOhms() * peakAmperes;
    return Math.max(0, restVolts(stage, output) - lost);
  }

  boolean bootstrapped(DirectStage stage) {
    if (!has(Terminal.BOOTSTRAP)) {
      return true;
    }
    for (CapacitorLaw capacitor : bootstrap) {
      if (capacitor.farads(stage) > 0) {
        return true;
      }
    }
    return false;
  }

  /** Current at rest, in A, which fades out below half of the lowest supply. */
  public double quiescentAmperes(DirectStage stage) {
    return isOpen(stage) ? 0 : value(stage, QUIESCENT) * on(supplyVolts(stage));
  }

  /** Junction to air with the heat sink that is fitted, in K/W. */
  public double junctionToAir(DirectStage stage) {
    return ThermalChain.withHeatSink(
        model.ratings().junctionToAirKelvinPerWatt(),
        model.ratings().junctionToCaseKelvinPerWatt(),
        value(stage, HEAT_SINK));
  }

  /**
   * From the surface that a finger finds to the air, in K/W: the sink, or the bare package less its
   * way to the case.
   */
  public double surfaceToAir(DirectStage stage) {
    double toCase = model.ratings().junctionToCaseKelvinPerWatt();
    return Math.max(0, junctionToAir(stage) - toCase);
  }

  double on(double supplyVolts) {
    return Math.min(1, Math.max(0, 2 * supplyVolts / model.ratings().leastVolts()));
  }

  int at(int[] nodes, Terminal terminal) {
    Integer place = places.get(terminal);
    return place == null ? -1 : nodes[place];
  }

  boolean has(Terminal terminal) {
    return places.containsKey(terminal);
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    int supply = at(nodes, Terminal.SUPPLY);
    int ground = at(nodes, Terminal.GROUND);
    int input = at(nodes, Terminal.INPUT);
    double supplyVolts = stage.volts(supply) - stage.volts(ground);
    double on = on(supplyVolts);
    double slope = on > 0 && on < 1 ? 2 / model.ratings().leastVolts() : 0;
    stage.current(
        supply, ground, on * value(stage, QUIESCENT) + on * stage.signalAmperes()[ordinal]);
    between(stage, supply, ground, slope * value(stage, QUIESCENT));
    stage.conductance(input, ground, 1 / value(stage, INPUT_OHMS));
    stage.current(ground, input, on * value(stage, BIAS));
    insidePins(stage, nodes);
    for (int k = 0; k < branches(); k++) {
      output(stage, nodes, k, on, slope);
    }
  }

  private static void between(DirectStage stage, int supply, int ground, double siemens) {
    stage.currentSlope(supply, ground, supply, siemens);
    stage.currentSlope(supply, ground, ground, -siemens);
  }

  private void insidePins(DirectStage stage, int[] nodes) {
    int supply = at(nodes, Terminal.SUPPLY);
    if (has(Terminal.RIPPLE)) {
      stage.conductance(supply, at(nodes, Terminal.RIPPLE), RIPPLE_SIEMENS);
    }
    if (has(Terminal.BOOTSTRAP)) {
      stage.conductance(supply, at(nodes, Terminal.BOOTSTRAP), BOOTSTRAP_SIEMENS);
    }
    double inputSiemens = 1 / value(stage, INPUT_OHMS);
    if (has(Terminal.INVERTING)) {
      stage.conductance(at(nodes, Terminal.INVERTING), at(nodes, Terminal.GROUND), inputSiemens);
    }
    if (has(Terminal.INVERTING_TWO)) {
      stage.conductance(
          at(nodes, Terminal.INVERTING_TWO), at(nodes, Terminal.GROUND), inputSiemens);
    }
    if (model.gain().setFromOutside()) {
      stage.conductance(
          at(nodes, Terminal.OUTPUT), at(nodes, Terminal.GAIN), 1 / value(stage, FEEDBACK_OHMS));
    }
  }

  private void output(DirectStage stage, int[] nodes, int k, double on, double slope) {
    int supply = at(nodes, Terminal.SUPPLY);
    int ground = at(nodes, Terminal.GROUND);
    int node = at(nodes, k == 0 ? Terminal.OUTPUT : Terminal.OUTPUT_TWO);
    int branch = branch(k);
    stage.branchCurrent(branch, stage.branch(branch) >= 0 ? supply : ground, node);
    int reference = has(Terminal.RIPPLE) ? at(nodes, Terminal.RIPPLE) : supply;
    double fraction = value(stage, REST_FRACTION);
    stage.term(branch, node, 1);
    stage.term(branch, branch, OUTPUT_OHMS);
    stage.term(branch, ground, -1 + fraction);
    stage.term(branch, reference, -fraction);
    stage.leaves(branch, -on * model.restVolts(), Math.abs(model.restVolts()));
    stage.slope(branch, supply, -slope * model.restVolts());
    stage.slope(branch, ground, slope * model.restVolts());
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    int supply = at(nodes, Terminal.SUPPLY);
    int ground = at(nodes, Terminal.GROUND);
    stage.admittance(at(nodes, Terminal.INPUT), ground, 1 / value(stage, INPUT_OHMS), 0);
    if (has(Terminal.RIPPLE)) {
      stage.admittance(supply, at(nodes, Terminal.RIPPLE), RIPPLE_SIEMENS, 0);
    }
    if (has(Terminal.BOOTSTRAP)) {
      stage.admittance(supply, at(nodes, Terminal.BOOTSTRAP), BOOTSTRAP_SIEMENS, 0);
    }
    double inputSiemens = 1 / value(stage, INPUT_OHMS);
    if (has(Terminal.INVERTING)) {
      stage.admittance(at(nodes, Terminal.INVERTING), ground, inputSiemens, 0);
    }
    if (has(Terminal.INVERTING_TWO)) {
      stage.admittance(at(nodes, Terminal.INVERTING_TWO), ground, inputSiemens, 0);
    }
    if (model.gain().setFromOutside()) {
      stage.admittance(
          at(nodes, Terminal.OUTPUT), at(nodes, Terminal.GAIN), 1 / value(stage, FEEDBACK_OHMS), 0);
    }
    for (int k = 0; k < branches(); k++) {
      outputAlternating(stage, nodes, k);
    }
  }

  /**
   * Input noise, the shot noise of the bias current, and the thermal noise of the resistances that
   * stand inside. What the data sheet gives over 22 Hz to 22 kHz is taken as even over frequency.
   */
  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    AlternatingStage stage = noise.stage();
    int supply = at(nodes, Terminal.SUPPLY);
    int ground = at(nodes, Terminal.GROUND);
    double inputSiemens = 1 / value(stage, INPUT_OHMS);
    noise.thermal(at(nodes, Terminal.INPUT), ground, inputSiemens);
    noise.shot(at(nodes, Terminal.INPUT), ground, value(stage, BIAS));
    if (has(Terminal.RIPPLE)) {
      noise.thermal(supply, at(nodes, Terminal.RIPPLE), RIPPLE_SIEMENS);
    }
    if (has(Terminal.BOOTSTRAP)) {
      noise.thermal(supply, at(nodes, Terminal.BOOTSTRAP), BOOTSTRAP_SIEMENS);
    }
    if (has(Terminal.INVERTING)) {
      noise.thermal(at(nodes, Terminal.INVERTING), ground, inputSiemens);
    }
    if (model.gain().setFromOutside()) {
      double siemens = 1 / value(stage, FEEDBACK_OHMS);
      noise.thermal(at(nodes, Terminal.OUTPUT), at(nodes, Terminal.GAIN), siemens);
    }
    double density = model.noiseVolts() * model.noiseVolts() / NOISE_BAND_HERTZ;
    double gain = inputGain(stage, nodes);
    double off = stage.omega() / (2 * Math.PI) / edgeHertz(stage.point());
    double real = gain / (1 + off * off);
    int second = branches() == 2 ? branch(1) : -1;
    noise.inRows(density, branch(0), real, -off * real, second, -real, off * real);
  }

  /**
   * From the input to an output's own row, at low frequency; a bridge's other output has −1 times.
   */
  private double inputGain(AlternatingStage stage, int[] nodes) {
    double on = on(supplyVolts(stage.point()));
    return model.gain().setFromOutside()
        ? on * model.gain().openLoopGain()
        : on / branches() * value(stage, GAIN) * control(stage.point(), nodes);
  }

  /** An output takes each half wave of its current from the supply: half of it to first order. */
  private void outputAlternating(AlternatingStage stage, int[] nodes, int k) {
    int branch = branch(k);
    int node = at(nodes, k == 0 ? Terminal.OUTPUT : Terminal.OUTPUT_TWO);
    int ground = at(nodes, Terminal.GROUND);
    stage.add(node, branch, -1, 0);
    stage.add(at(nodes, Terminal.SUPPLY), branch, 0.5, 0);
    stage.add(ground, branch, 0.5, 0);
    stage.add(branch, node, 1, 0);
    stage.add(branch, branch, OUTPUT_OHMS, 0);
    stage.add(branch, ground, -1, 0);
    double on = on(supplyVolts(stage.point()));
    if (model.gain().setFromOutside()) {
      feedback(stage, nodes, branch, on);
    } else {
      fixed(stage, nodes, branch, k, on);
    }
  }

  private void fixed(AlternatingStage stage, int[] nodes, int branch, int k, double on) {
    double share = model.bridge() ? 0.5 : 1;
    double sign = k == 0 ? 1 : -1;
    double gain = on * sign * share * value(stage, GAIN) * control(stage.point(), nodes);
    double off = stage.omega() / (2 * Math.PI) / edgeHertz(stage.point());
    double real = gain / (1 + off * off);
    double imaginary = -off * real;
    int from = at(nodes, Terminal.INPUT);
    int against =
        has(Terminal.INVERTING) ? at(nodes, Terminal.INVERTING) : at(nodes, Terminal.GROUND);
    stage.add(branch, from, -real, -imaginary);
    stage.add(branch, against, real, imaginary);
    // what appears across a bridge's load, half of it at either end; what moves both ends is not
    // heard
    ripple(stage, nodes, branch, on * sign * share);
  }

  private void feedback(AlternatingStage stage, int[] nodes, int branch, double on) {
    double gain = on * model.gain().openLoopGain();
    double off = stage.omega() / (2 * Math.PI) / edgeHertz(stage.point());
    double real = gain / (1 + off * off);
    double imaginary = -off * real;
    stage.add(branch, at(nodes, Terminal.INPUT), -real, -imaginary);
    stage.add(branch, at(nodes, Terminal.GROUND), real - gain, imaginary);
    stage.add(branch, at(nodes, Terminal.GAIN), gain, 0);
    ripple(stage, nodes, branch, on * gain / model.gain().fixedGain());
  }

  private void ripple(AlternatingStage stage, int[] nodes, int branch, double scale) {
    double held = scale * heldRipple;
    double bare = scale * bareRipple;
    int supply = at(nodes, Terminal.SUPPLY);
    int ground = at(nodes, Terminal.GROUND);
    if (has(Terminal.RIPPLE)) {
      stage.add(branch, supply, -held, 0);
      stage.add(branch, at(nodes, Terminal.RIPPLE), held - bare, 0);
    } else {
      stage.add(branch, supply, -bare, 0);
    }
    stage.add(branch, ground, bare, 0);
  }

  double edgeHertz(DirectStage point) {
    double farads = 0;
    for (CapacitorLaw capacitor : compensation) {
      farads += capacitor.farads(point);
    }
    double product = model.gain().compensationHertzFarad();
    return farads > 0 && product > 0
        ? Math.min(model.gain().bandwidthHertz(), product / farads)
        : model.gain().bandwidthHertz();
  }

  /** What the control pin leaves of the gain: 1 where there is none. */
  double control(DirectStage point, int[] nodes) {
    List<ControlPoint> curve = model.gain().control();
    if (!has(Terminal.CONTROL) || curve.isEmpty()) {
      return 1;
    }
    double volts =
        point.volts(at(nodes, Terminal.CONTROL)) - point.volts(at(nodes, Terminal.GROUND));
    ControlPoint below = curve.get(0);
    double decibels = curve.get(curve.size() - 1).gainDecibels();
    if (volts <= below.controlVolts()) {
      decibels = below.gainDecibels();
    }
    for (int i = 1; i < curve.size(); i++) {
      ControlPoint above = curve.get(i);
      if (volts > below.controlVolts() && volts <= above.controlVolts()) {
        double share =
            (volts - below.controlVolts()) / (above.controlVolts() - below.controlVolts());
        decibels = below.gainDecibels() + share * (above.gainDecibels() - below.gainDecibels());
      }
      below = above;
    }
    return Math.pow(10, decibels / 20);
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    new AmplifierWaveform(this, stage, nodes).stamp();
  }

  /** Supply current, in A. */
  @Override
  public double amperes(DirectStage stage) {
    double load = 0;
    for (int k = 0; k < branches(); k++) {
      load += Math.max(0, stage.branch(branch(k)));
    }
    return isOpen(stage)
        ? 0
        : quiescentAmperes(stage) + on(supplyVolts(stage)) * stage.signalAmperes()[ordinal] + load;
  }

  /** Heat at DC, in W: what the supply gives less what a DC load takes. */
  @Override
  public double watts(DirectStage stage) {
    double load = 0;
    for (int k = 0; k < branches(); k++) {
      load += stage.branch(branch(k)) * restVolts(stage, k);
    }
    return isOpen(stage) ? 0 : amperes(stage) * supplyVolts(stage) - load;
  }
}
