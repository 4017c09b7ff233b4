package earward.engine.internal;

import earward.block.law.ClippedSine;
import earward.engine.law.AmplifierLaw;
import earward.engine.law.DirectStage;
import java.util.Arrays;

/**
 * What the amplifiers' outputs do in one case: clipping of a given signal, or the edge of clipping
 * and the worst heat whatever drives them. Mutable, for one thread.
 */
final class Outputs {
  /** How near swing and sag must come where the figure counts, and where a scan looks for it. */
  private static final double EXACT = 1e-9;

  private static final double ROUGH = 1e-4;

  private static final int SAMPLES = Turns.SAMPLES;
  private static final double TEN_PERCENT = 0.10;

  /** Share of its limit above which a signal is near to it. */
  private static final double NEAR = 0.3;

  private static final int MOST_SHAPES = 6;

  /** Shares of the clipped sine's range that are tried for the worst heat, then overdrives. */
  private static final int SINES = 20;

  private static final double[] OVERDRIVES = {1.15, 1.3, 1.6, 2, 3, 5, 10, 1e3};

  private final Network network;
  private final OutputWave wave = new OutputWave();
  private final RailDips dips;
  private final HalfWaves halfWaves;
  private final PeakSearch search;

  /** Whether the wave is what the outputs give, in place of a sine that clips evenly. */
  private boolean byWave;

  private final double[] volts = new double[SAMPLES];
  private final double[] amperes = new double[SAMPLES];

  /** The sine that heats each amplifier most, of the last case and of the nominal kit; −1: none. */
  private final int[] bestSine;

  private final int[] likelySine;

  /** The most heat so far, in W, and the drive that makes it. */
  private double mostWatts;

  private int mostAt;

  /** Power that leaves each amplifier, in W. */
  final double[] outWatts;

  /** Into the load, in W. */
  final double[] clipWatts;

  final double[] tenPercentWatts;
  final double[] peakAmperes;
  final double[] overloadDecibels;

  /** Impedance that each output (both of a bridge together) works into. */
  final double[] loadRe;

  final double[] loadIm;

  /** Share of the power that leaves each amplifier which reaches the load at the path's end. */
  private final double[] loadShare;

  /** Heat of each amplifier, in W. */
  final double[] heatWatts;

  Outputs(Network network) {
    this.network = network;
    int count = network.amplifiers.length;
    dips = new RailDips(count, network.size);
    search = new PeakSearch(network.size);
    halfWaves = new HalfWaves(network);
    bestSine = new int[count];
    likelySine = new int[count];
    Arrays.fill(bestSine, -1);
    Arrays.fill(likelySine, -1);
    outWatts = new double[count];
    clipWatts = new double[count];
    tenPercentWatts = new double[count];
    peakAmperes = new double[count];
    overloadDecibels = new double[count];
    loadRe = new double[count];
    loadIm = new double[count];
    heatWatts = new double[count];
    loadShare = new double[count];
  }

  /** Keeps the orders of elimination and the sine that heats most from now on. */
  void freeze() {
    System.arraycopy(bestSine, 0, likelySine, 0, bestSine.length);
    dips.freeze();
  }

  /** Begins a case: nothing leaves the outputs, no rail dips. */
  void begin() {
    Arrays.fill(outWatts, 0);
    dips.clear();
    byWave = false;
  }

  /**
   * Allows for the dip of each rail at a sine's peaks from now on.
   *
   * @return whether the circuit has a solution at the harmonics of the tone
   */
  boolean measureRails(AlternatingSolver solver, DirectStage point, double toneRadians) {
    if (network.amplifiers.length == 0) {
      return true;
    }
    if (!dips.measure(network, solver, point, toneRadians)) {
      return false;
    }
    for (AmplifierLaw amplifier : network.amplifiers) {
      wave.atClipping(1, amplifier.branches() == 2);
      dips.follow(amplifier, wave);
    }
    return true;
  }

  /** Whether a signal comes so near to a limit that the dip of the rail may matter. */
  boolean nearClipping(AudioSignal signal, DirectStage point) {
    boolean near = false;
    for (AmplifierLaw amplifier : network.amplifiers) {
      double ohms = Math.hypot(loadRe[amplifier.ordinal()], loadIm[amplifier.ordinal()]);
      for (int k = 0; k < amplifier.branches(); k++) {
        double peak = signal.wave(amplifier.outputNode(point, k), volts);
        double up = limited(amplifier, point, k, ohms, true);
        near |= peak > NEAR * Math.min(up, limited(amplifier, point, k, ohms, false));
      }
    }
    return near && !dips.known();
  }

  /** How many outputs all amplifiers have together. */
  static int count(Network network) {
    return Arrays.stream(network.amplifiers).mapToInt(AmplifierLaw::branches).sum();
  }

  /** Impedances at the outputs, from a solver that is factored at the tone. */
  void measureLoads(AlternatingSolver solver, DirectStage point) {
    for (AmplifierLaw amplifier : network.amplifiers) {
      int a = amplifier.ordinal();
      solver.rest();
      solver.re[amplifier.outputBranch(0)] = 1;
      boolean bridge = amplifier.branches() == 2;
      if (bridge) {
        solver.re[amplifier.outputBranch(1)] = -1;
      }
      solver.solve();
      int plus = amplifier.outputNode(point, 0);
      int minus = bridge ? amplifier.outputNode(point, 1) : -1;
      double vr = solver.re(plus) - solver.re(minus);
      double vi = solver.im(plus) - solver.im(minus);
      double ir = solver.re(amplifier.outputBranch(0));
      double ii = solver.im(amplifier.outputBranch(0));
      double norm = ir * ir + ii * ii;
      loadRe[a] = norm == 0 ? Double.POSITIVE_INFINITY : (vr * ir + vi * ii) / norm;
      loadIm[a] = norm == 0 ? 0 : (vi * ir - vr * ii) / norm;
      loadShare[a] = shareOfLoad(solver, point, norm * loadRe[a]);
    }
  }

  /** All of it where nothing at the path's end is a load. */
  private double shareOfLoad(AlternatingSolver solver, DirectStage point, double wholeWatts) {
    double siemens = 0;
    for (int load : network.loads) {
      siemens += network.laws[load].loadSiemens(point);
    }
    double vr = solver.re(network.endPlus) - solver.re(network.endMinus);
    double vi = solver.im(network.endPlus) - solver.im(network.endMinus);
    double watts = siemens * (vr * vr + vi * vi);
    return watts > 0 && watts < wholeWatts ? watts / wholeWatts : 1;
  }

  /**
   * Clips a signal at each output and adds what clipping does to the unknowns' harmonics, and what
   * the half waves that the outputs take do to their rails.
   *
   * @param signal harmonics of all unknowns, changed in place
   */
  void clip(AudioTable table, AudioSignal signal, DirectStage point) {
    int column = network.ports.length;
    for (AmplifierLaw amplifier : network.amplifiers) {
      int a = amplifier.ordinal();
      double ohms = Math.hypot(loadRe[a], loadIm[a]);
      double wanted = 0;
      double limit = Double.POSITIVE_INFINITY;
      for (int k = 0; k < amplifier.branches(); k++) {
        int node = amplifier.outputNode(point, k);
        double up = limited(amplifier, point, k, ohms, true);
        double down = limited(amplifier, point, k, ohms, false);
        double peak = signal.wave(node, volts);
        wanted = Math.max(wanted, peak);
        limit = Math.min(limit, Math.min(up, down));
        if (peak > Math.min(up, down)) {
          clipWave(up, down);
          signal.replace(table, column + k, node, volts);
        }
      }
      overloadDecibels[a] = 20 * Math.log10(wanted / limit);
      column += amplifier.branches();
    }
    halfWaves.add(table, column, signal);
  }

  private void clipWave(double up, double down) {
    for (int s = 0; s < SAMPLES; s++) {
      volts[s] = Math.max(-down, Math.min(up, volts[s]));
    }
  }

  /** The limit L of one output that allows for its own current: L = swing(L/|Z|). */
  private double limited(
      AmplifierLaw amplifier, DirectStage point, int k, double ohms, boolean up) {
    double differential = amplifier.branches();
    double none = swing(amplifier, point, k, 0, up);
    double perAmpere = none - swing(amplifier, point, k, 1e-3, up);
    return none / (1 + perAmpere / 1e-3 * differential / ohms);
  }

  private double swing(
      AmplifierLaw amplifier, DirectStage point, int k, double peakAmperes, boolean up) {
    int a = amplifier.ordinal();
    double held =
        up
            ? amplifier.swingUpVolts(point, k, peakAmperes)
            : amplifier.swingDownVolts(point, k, peakAmperes);
    return Math.max(0, held - peakAmperes * (up ? dips.upOhms(a) : dips.downOhms(a)));
  }

  /** What the signal takes from the supply, and what leaves, from the harmonics of the unknowns. */
  void measureSignal(AudioSignal signal, DirectStage point) {
    for (AmplifierLaw amplifier : network.amplifiers) {
      int a = amplifier.ordinal();
      double drawn = 0;
      double leaving = 0;
      double peak = 0;
      for (int k = 0; k < amplifier.branches(); k++) {
        peak = Math.max(peak, signal.wave(amplifier.outputBranch(k), amperes));
        double unused = signal.wave(amplifier.outputNode(point, k), volts);
        for (int s = 0; s < SAMPLES; s++) {
          drawn += Math.max(0, amperes[s]) / SAMPLES;
          leaving += volts[s] * amperes[s] / SAMPLES;
        }
        assert unused >= 0;
      }
      point.signalAmperes()[a] = drawn;
      outWatts[a] = leaving;
      peakAmperes[a] = peak;
    }
  }

  /** Heat of all amplifiers at the present point. */
  void measureHeat(DirectStage point) {
    for (AmplifierLaw amplifier : network.amplifiers) {
      heatWatts[amplifier.ordinal()] = amplifier.watts(point) - outWatts[amplifier.ordinal()];
    }
  }

  /**
   * A sine at the edge of clipping, with its sag; and the power at 10 % distortion where it is
   * wanted.
   */
  boolean atClipping(DirectSolver direct, boolean tenPercent) {
    for (AmplifierLaw amplifier : network.amplifiers) {
      int a = amplifier.ordinal();
      if (tenPercent && !atTenPercent(direct, amplifier)) {
        return false;
      }
      tenPercentWatts[a] = tenPercent ? loadShare[a] * outWatts[a] : Double.NaN;
      wave.atClipping(1, amplifier.branches() == 2);
      if (dips.known()) {
        dips.follow(amplifier, wave);
      }
      double peak = settle(direct, amplifier, 1, 1, EXACT);
      if (Double.isNaN(peak)) {
        return false;
      }
      clipWatts[a] = loadShare[a] * outWatts[a];
      peakAmperes[a] = peak;
    }
    measureHeat(direct.stage());
    return true;
  }

  /** The drive of 10 % distortion, its two limits as supply, sag and dip leave them. */
  private boolean atTenPercent(DirectSolver direct, AmplifierLaw amplifier) {
    boolean bridge = amplifier.branches() == 2;
    double ratio = downOverUp(amplifier, direct.stage(), 0);
    for (int i = 0; i < MOST_SHAPES; i++) {
      wave.atDistortion(TEN_PERCENT, ratio, bridge);
      if (dips.known()) {
        dips.follow(amplifier, wave);
      }
      byWave = true;
      double peak = settle(direct, amplifier, 1, 1, EXACT);
      byWave = false;
      if (Double.isNaN(peak)) {
        return false;
      }
      double next = downOverUp(amplifier, direct.stage(), peak);
      if (Math.abs(next - ratio) < 1e-6) {
        break;
      }
      ratio = next;
    }
    return true;
  }

  private double downOverUp(AmplifierLaw amplifier, DirectStage point, double peakAmperes) {
    double up = swing(amplifier, point, 0, peakAmperes, true);
    double down = swing(amplifier, point, 0, peakAmperes, false);
    return up > 0 && down > 0 ? down / up : 1;
  }

  /**
   * The drive that heats most, from a small sine to a square wave; leaves the point there.
   *
   * <p>Of the sines all are tried for the nominal kit. What the supply gives is a concave function
   * of the current, and what leaves a convex one, so that their difference has one summit: for
   * other kits it is climbed from where the nominal kit has it.
   */
  boolean atWorstHeat(DirectSolver direct) {
    for (AmplifierLaw amplifier : network.amplifiers) {
      int a = amplifier.ordinal();
      mostWatts = -1;
      if (likelySine[a] < 0) {
        for (int i = 0; i <= SINES; i++) {
          tryDrive(direct, amplifier, i);
        }
      } else {
        tryDrive(direct, amplifier, likelySine[a]);
        int up = likelySine[a] + 1;
        while (up <= SINES && tryDrive(direct, amplifier, up)) {
          up++;
        }
        int down = likelySine[a] - 1;
        while (up == likelySine[a] + 1 && down >= 0 && tryDrive(direct, amplifier, down)) {
          down--;
        }
      }
      bestSine[a] = mostAt;
      for (int i = SINES + 1; i <= SINES + OVERDRIVES.length; i++) {
        tryDrive(direct, amplifier, i);
      }
      if (mostWatts < 0
          || Double.isNaN(settle(direct, amplifier, share(mostAt), overdrive(mostAt), EXACT))) {
        return false;
      }
    }
    measureHeat(direct.stage());
    return true;
  }

  private static double share(int drive) {
    return Math.min(1, drive / (double) SINES);
  }

  private static double overdrive(int drive) {
    return drive <= SINES ? 1 : OVERDRIVES[drive - SINES - 1];
  }

  /** Tries a sine or an overdrive; whether it heats more than all that were tried before. */
  private boolean tryDrive(DirectSolver direct, AmplifierLaw amplifier, int drive) {
    if (Double.isNaN(settle(direct, amplifier, share(drive), overdrive(drive), ROUGH))) {
      return false;
    }
    double heat = amplifier.watts(direct.stage()) - outWatts[amplifier.ordinal()];
    if (!(heat > mostWatts)) {
      return false;
    }
    mostWatts = heat;
    mostAt = drive;
    return true;
  }

  /**
   * Finds the output current at which swing and sag agree. What the bypass lets the rail dip within
   * a cycle is in the swing.
   *
   * @param share of the range between rest and clipping
   * @param overdrive drive over clip level; 1 for a sine
   * @param exact how near swing and sag must come, as a share
   * @return peak current in A, NaN where DC has no solution
   */
  private double settle(
      DirectSolver direct, AmplifierLaw amplifier, double share, double overdrive, double exact) {
    int a = amplifier.ordinal();
    double ohms = Math.hypot(loadRe[a], loadIm[a]);
    double drawnMean = byWave ? wave.drawnMean : amplifier.branches() * halfWaveMean(overdrive);
    double peak =
        Double.isInfinite(ohms)
            ? Double.NaN
            : search.find(
                direct, this, amplifier, share, drawnMean, ohms, exact == ROUGH ? ROUGH : 0);
    if (Double.isNaN(peak)) {
      peak = settleSlowly(direct, amplifier, share, overdrive, exact);
    }
    double meanSquare =
        byWave ? wave.meanSquare : ClippedSine.powerRatio(Math.max(1, overdrive)) / 2;
    outWatts[a] = Double.isInfinite(ohms) ? 0 : meanSquare * peak * peak * loadRe[a];
    return peak;
  }

  /** By false position between nothing and what a stiff supply would give, DC solved each time. */
  private double settleSlowly(
      DirectSolver direct, AmplifierLaw amplifier, double share, double overdrive, double exact) {
    int a = amplifier.ordinal();
    double ohms = Math.hypot(loadRe[a], loadIm[a]);
    double low = 0;
    double excessLow = excess(direct, amplifier, 0, share, overdrive, ohms);
    if (Double.isNaN(excessLow) || Double.isInfinite(ohms)) {
      return excessLow;
    }
    double high = share * peakVolts(amplifier, direct.stage(), 0) / ohms;
    double excessHigh = excess(direct, amplifier, high, share, overdrive, ohms);
    double peak = high;
    for (int i = 0; i < 40 && high - low > exact * high; i++) {
      if (Double.isNaN(excessHigh)) {
        return Double.NaN;
      }
      peak = low + (high - low) * excessLow / (excessLow - excessHigh);
      double here = excess(direct, amplifier, peak, share, overdrive, ohms);
      if (Math.abs(here) < exact * (1 + excessLow)) {
        break;
      }
      if (here > 0) {
        low = peak;
        excessLow = here;
        excessHigh /= 2;
      } else {
        high = peak;
        excessHigh = here;
        excessLow /= 2;
      }
    }
    return peak;
  }

  /** Swing that the supply allows at a current, less what the current makes of the load, in V. */
  private double excess(
      DirectSolver direct,
      AmplifierLaw amplifier,
      double peak,
      double share,
      double overdrive,
      double ohms) {
    DirectStage stage = direct.stage();
    stage.signalAmperes()[amplifier.ordinal()] =
        peak * (byWave ? wave.drawnMean : amplifier.branches() * halfWaveMean(overdrive));
    if (!direct.solve()) {
      return Double.NaN;
    }
    return share * peakVolts(amplifier, stage, peak) - peak * ohms;
  }

  /** Mean of one half wave of a clipped sine over the whole cycle, over the clip level. */
  private static double halfWaveMean(double overdrive) {
    double angle = Math.asin(1 / overdrive);
    return (overdrive * (1 - Math.cos(angle)) + Math.PI / 2 - angle) / Math.PI;
  }

  /** Peak across the load at the edge of clipping, or of the wave, in V. */
  double peakVolts(AmplifierLaw amplifier, DirectStage stage, double peak) {
    if (byWave) {
      return wave.peakOverLimit * swing(amplifier, stage, 0, peak, true);
    }
    double least = Double.POSITIVE_INFINITY;
    for (int k = 0; k < amplifier.branches(); k++) {
      least = Math.min(least, swing(amplifier, stage, k, peak, true));
      least = Math.min(least, swing(amplifier, stage, k, peak, false));
    }
    return least * amplifier.branches();
  }
}
