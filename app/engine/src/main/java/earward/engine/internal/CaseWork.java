package earward.engine.internal;

import earward.engine.Drive;
import earward.engine.detection.CarrierSurroundings;
import earward.engine.law.DirectStage;
import earward.engine.law.FeedLaw;
import earward.engine.law.LoadView;
import org.jspecify.annotations.Nullable;

/**
 * One case being solved: each part of the solution is worked out when a figure first asks for it.
 * Holds all that it needs, allocated once; for one thread.
 */
final class CaseWork {
  private static final int MOST_PASSES = 12;

  /** Rounds of peaking, and the change of tuning over the carrier below which it has settled. */
  private static final int MOST_ROUNDS = 8;

  private static final double SETTLED_CORE = 1e-9;

  /** Coarseness of the first round of peaking, and by how much each is finer than the last. */
  private static final double COARSE_PEAK = 1e5;

  private static final double FINER = 1e3;

  final Network network;
  final CasePlan plan;
  private final Fineness fineness;
  final double[] row;
  final DirectSolver direct;
  final AlternatingSolver alternating;
  final AudioTable audioTable;
  final CarrierTable carrierTable;
  final AudioSignal signal;

  /** A second signal, for what is tried at another depth. */
  final AudioSignal trial;

  final DepthSearch depths = new DepthSearch(this);

  final Outputs outputs;
  final SmallSignal small;
  final ClippingRule clipping;
  final Noise noise;
  final @Nullable Detection detection;

  /** Room for a response over frequency. */
  final double[] magnitudes = new double[SmallResponse.POINTS];

  private final double[] scratch;
  private final double[] former;

  /** Mean currents of the nominal kit, from which every solve starts. */
  private final double[] keptSignal;

  private final double[] keptDriven;

  private enum Part {
    TO_DO,
    DONE,
    FAILED
  }

  private Part point = Part.TO_DO;
  private Part carrier = Part.TO_DO;
  private Part answers = Part.TO_DO;
  private boolean warm;
  private String trouble = "";

  CaseWork(Network network, CasePlan plan, Fineness fineness) {
    this.fineness = fineness;
    this.network = network;
    this.plan = plan;
    row = new double[network.slots.all().size()];
    direct = new DirectSolver(network);
    alternating = new AlternatingSolver(network, direct.stage());
    int harmonics = fineness.audioHarmonics();
    audioTable = new AudioTable(network, harmonics);
    signal = new AudioSignal(harmonics, network.size);
    trial = new AudioSignal(harmonics, network.size);
    outputs = new Outputs(network);
    small = new SmallSignal(network.ports.length);
    clipping = new ClippingRule(this);
    noise = new Noise(plan, network, alternating);
    detection =
        network.ports.length == 0 || network.feed == null
            ? null
            : new Detection(network, direct.stage(), fineness);
    carrierTable =
        new CarrierTable(network, detection == null ? 1 : detection.around.carrierHarmonics());
    scratch = new double[network.size];
    former = new double[network.size];
    keptSignal = new double[network.amplifiers.length];
    keptDriven = new double[network.ports.length];
  }

  /** Takes over a row; everything is to be solved anew, from the solution that was kept. */
  void begin(double[] values) {
    plan.apply(values, row);
    point = Part.TO_DO;
    carrier = Part.TO_DO;
    answers = Part.TO_DO;
    trouble = "";
    signal.clear();
    noise.clear();
    if (warm) {
      direct.recall();
      if (detection != null) {
        detection.recall();
      }
    }
  }

  /** Puts one value in place of what row and case say; right after {@link #begin}. */
  void set(int slot, double value) {
    row[slot] = value;
  }

  /** Makes the present solution the start of all later ones. */
  void keep() {
    direct.keep();
    if (point == Part.DONE) {
      System.arraycopy(stage().signalAmperes(), 0, keptSignal, 0, keptSignal.length);
      System.arraycopy(stage().drivenAmperes(), 0, keptDriven, 0, keptDriven.length);
    }
    stage().matrix().freeze();
    alternating.stage().freeze();
    audioTable.freeze();
    carrierTable.freeze();
    outputs.freeze();
    if (detection != null) {
      detection.keep();
    }
    warm = true;
  }

  /** The fineness that the solved case needs. */
  Fineness wantedFineness() {
    return detection == null || plan.drive != Drive.SIGNAL || point != Part.DONE
        ? fineness
        : fineness.wanted(detection.modulated.aliasing(), detection.modulated.topHarmonic());
  }

  Fineness fineness() {
    return fineness;
  }

  /** What did not converge, empty where all went well. */
  String trouble() {
    return trouble;
  }

  /** Whether a figure asked for the whole state and it was found. */
  boolean done() {
    return point == Part.DONE;
  }

  double peakVolts() {
    return row[network.carrierPeak];
  }

  double depth() {
    return row[network.depth];
  }

  double toneRadians() {
    return 2 * Math.PI * row[network.tone];
  }

  double carrierRadians() {
    return 2 * Math.PI * row[network.carrierHertz];
  }

  DirectStage stage() {
    return direct.stage();
  }

  private boolean fail(String what) {
    trouble = what;
    return false;
  }

  /** The whole state of the case: DC, and with a drive also what it makes of DC. */
  boolean solved() {
    if (point == Part.TO_DO) {
      stage()
          .state(
              row,
              row[network.ambient],
              plan.drive != Drive.UNPOWERED,
              plan.drive == Drive.SIGNAL && detection != null);
      alternating.stage().carrier(carrierRadians());
      System.arraycopy(keptSignal, 0, stage().signalAmperes(), 0, keptSignal.length);
      System.arraycopy(keptDriven, 0, stage().drivenAmperes(), 0, keptDriven.length);
      outputs.begin();
      point = solveDrive() || (warm && solveCold()) ? Part.DONE : Part.FAILED;
    }
    return point == Part.DONE;
  }

  /** Once more from nothing, where the nominal kit's solution is too far away to start from. */
  private boolean solveCold() {
    trouble = "";
    direct.forget();
    if (detection != null) {
      detection.forget();
    }
    java.util.Arrays.fill(stage().signalAmperes(), 0);
    java.util.Arrays.fill(stage().drivenAmperes(), 0);
    return solveDrive();
  }

  private boolean solveDrive() {
    if (!direct.solve()) {
      return fail("no DC solution; it was worst at " + direct.worst());
    }
    return switch (plan.drive) {
      case UNPOWERED, NO_SIGNAL -> {
        outputs.measureHeat(stage());
        yield true;
      }
      case SIGNAL -> signal();
      case CLIPPING ->
          loads(LoadView.RATED)
              && (outputs.atClipping(direct, plan.tenPercent())
                  || fail("no DC solution at the edge of clipping; worst at " + direct.worst()));
      case ANY_DRIVE ->
          loads(LoadView.LEAST)
              && (outputs.atWorstHeat(direct)
                  || fail("no DC solution at the worst drive; worst at " + direct.worst()));
    };
  }

  private boolean loads(LoadView view) {
    alternating.stage().viewLoad(view, 1 - row[network.loadTolerance]);
    boolean factored = alternating.audio(toneRadians());
    alternating.stage().viewLoad(LoadView.AS_IT_IS, 1);
    if (!factored) {
      return fail("the circuit has no solution at the tone");
    }
    outputs.measureLoads(alternating, stage());
    if (plan.drive == Drive.CLIPPING) {
      alternating.stage().viewLoad(view, 1);
      boolean rails = outputs.measureRails(alternating, stage(), toneRadians());
      alternating.stage().viewLoad(LoadView.AS_IT_IS, 1);
      return rails || fail("the circuit has no solution at harmonics of the tone");
    }
    return true;
  }

  /** DC, detection and outputs in turn, until none moves the others. */
  private boolean signal() {
    for (int pass = 0; pass < MOST_PASSES; pass++) {
      System.arraycopy(stage().solution(), 0, former, 0, former.length);
      if (!loads(LoadView.AS_IT_IS)
          || !audioTable.fill(alternating, stage(), toneRadians(), pass > 0)
          || !detect(pass == 0)) {
        return trouble.isEmpty() ? fail("the circuit has no solution at the tone") : false;
      }
      signal.clear();
      if (detection != null) {
        gather(detection, signal);
      }
      if (outputs.nearClipping(signal, stage())
          && !outputs.measureRails(alternating, stage(), toneRadians())) {
        return fail("the circuit has no solution at harmonics of the tone");
      }
      outputs.clip(audioTable, signal, stage());
      outputs.measureSignal(signal, stage());
      if (!direct.solve()) {
        return fail("no DC solution; it was worst at " + direct.worst());
      }
      if (settled()) {
        break;
      }
    }
    outputs.measureHeat(stage());
    return true;
  }

  private boolean settled() {
    double[] now = stage().solution();
    for (int i = 0; i < network.nodes; i++) {
      if (Math.abs(now[i] - former[i]) > 1e-12 + 1e-11 * Math.abs(now[i])) {
        return false;
      }
    }
    return true;
  }

  private boolean detect(boolean first) {
    FeedLaw feed = network.feed;
    if (feed == null) {
      return true;
    }
    if (detection == null) {
      return true;
    }
    detection.direct(direct, scratch);
    detection.audio(audioTable, stage());
    if (first && !tune(detection, feed)) {
      return false;
    }
    if (!first && detection.unmoved()) {
      return true; // what it would find is what it found
    }
    if (!detection.solveModulated(peakVolts(), depth(), toneRadians())) {
      return fail("the cycle did not settle at " + network.drivenNames());
    }
    detection.means(stage().drivenAmperes());
    return true;
  }

  /**
   * Carrier impedances, and the winding peaked at this case's carrier. Its core is turned for that,
   * which moves its impedance at the carrier's multiples a little; once or twice more settles it.
   */
  private boolean tune(Detection parts, FeedLaw feed) {
    CarrierSurroundings around = parts.around;
    double turned = feed.tuned() ? around.detuningRadians : 0;
    alternating.stage().turnCore(turned);
    boolean filled = carrierTable.fill(alternating, stage(), feed, carrierRadians(), around);
    double coarseness = COARSE_PEAK;
    for (int round = 0; filled && feed.tuned() && round < MOST_ROUNDS; round++) {
      double shift = parts.peak(peakVolts(), Math.max(1, coarseness));
      if (Double.isNaN(shift)) {
        return fail(network.drivenNames() + " did not settle while the winding was peaked");
      }
      around.detuningRadians = shift - feed.detuningRadians(stage());
      if (coarseness <= 1
          && Math.abs(around.detuningRadians - turned) < SETTLED_CORE * carrierRadians()) {
        break;
      }
      coarseness /= FINER;
      turned = around.detuningRadians;
      alternating.stage().turnCore(turned);
      filled = carrierTable.turn(alternating, stage(), feed, carrierRadians(), around);
    }
    return filled || fail("the circuit has no solution at the carrier");
  }

  /**
   * Answers to the carrier about the point as it stands at the end: the signal's sag of the rail
   * has moved gains since the table was filled for detection, whose own surroundings stay as they
   * are.
   */
  boolean answersAtCarrier() {
    if (answers == Part.TO_DO) {
      FeedLaw feed = network.feed;
      boolean filled =
          detection != null
              && feed != null
              && solved()
              && carrierTable.fill(alternating, stage(), feed, carrierRadians(), detection.spare());
      answers = filled ? Part.DONE : Part.FAILED;
    }
    return answers == Part.DONE;
  }

  /** Adds what the ports' mean currents make in all unknowns. */
  void gather(Detection parts, AudioSignal into) {
    int ports = network.ports.length;
    for (int h = 1; h <= into.harmonics; h++) {
      for (int j = 0; j < ports; j++) {
        into.add(
            audioTable,
            h,
            j,
            parts.modulated.audioReal[h * ports + j],
            parts.modulated.audioImaginary[h * ports + j]);
      }
    }
  }

  /** The same case with the carrier unmodulated; surroundings as {@link #solved} left them. */
  boolean carrierSolved() {
    if (carrier == Part.TO_DO) {
      carrier = solveCarrier() ? Part.DONE : Part.FAILED;
    }
    return carrier == Part.DONE;
  }

  private boolean solveCarrier() {
    if (detection == null || network.feed == null || plan.drive != Drive.SIGNAL || !ready()) {
      return false;
    }
    return detection.solveCarrier(peakVolts())
        || fail(network.drivenNames() + " did not settle on the bare carrier");
  }

  /**
   * Enough for the unmodulated carrier: the whole state where a figure has asked for it, else DC
   * and carrier alone, which is all that a scan for the clipping depth needs.
   */
  private boolean ready() {
    if (point != Part.TO_DO || detection == null || network.feed == null) {
      return point == Part.DONE;
    }
    stage().state(row, row[network.ambient], true, true);
    alternating.stage().carrier(carrierRadians());
    java.util.Arrays.fill(stage().signalAmperes(), 0);
    java.util.Arrays.fill(stage().drivenAmperes(), 0);
    if (!direct.solve()) {
      return fail("no DC solution; it was worst at " + direct.worst());
    }
    detection.direct(direct, scratch);
    return tune(detection, network.feed);
  }

  /** Share of the feed's level across each port when none of the ports conducts. */
  double[] carrierShares() {
    FeedLaw feed = network.feed;
    double[] shares = new double[network.ports.length];
    if (feed == null || detection == null) {
      return shares;
    }
    stage().state(row, row[network.ambient], true, true);
    alternating.stage().carrier(carrierRadians());
    CarrierSurroundings around = detection.around;
    if (direct.solve() && carrierTable.fill(alternating, stage(), feed, carrierRadians(), around)) {
      double held =
          feed.tuned() ? 1 / (1 + Math.max(0, around.tankOhms * around.loadRealSiemens)) : 1;
      for (int i = 0; i < shares.length; i++) {
        shares[i] = held * Math.hypot(around.transferReal[i], around.transferImaginary[i]);
      }
    }
    return shares;
  }
}
