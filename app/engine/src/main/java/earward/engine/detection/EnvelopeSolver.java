package earward.engine.detection;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * Finds the periodic solution of N carrier-driven devices under one tone of modulation.
 *
 * <p>Audio-rate port voltages obey v_i(t) = open_i − Σ_h Z_ij(h·ωm)·J_j(h)·e^{jhωm·t}; a tuned feed
 * obeys 2C·dE/dt = I − E/Rp − K − j·2C·(ωc − ω0)·E with I = (E0/Rp)·(1 + m·cos ωm·t). J and K come
 * from one {@link CarrierCycle} per audio sample. All is solved at once by Newton on the samples of
 * one audio period (harmonic balance), damped, with continuation from a weak carrier on a cold
 * start. Source: generalised averaging, Sanders et al. 1991.
 *
 * <p>One a thread. Allocates nothing in {@link #solve}. Results stand in public rows until the next
 * solve.
 */
public final class EnvelopeSolver {
  private static final int MOST_ITERATIONS = 40;
  private static final int MOST_HALVINGS = 8;

  /** Harmonics of the carrier that are kept where not all are wanted. */
  public static final int SHOWN = 3;

  private final int devices;
  final int samples;
  private final int blocks;
  private final boolean exact;
  final CarrierCycle cycle;
  final AudioBalance balance;
  final DenseSolver solver;

  final double[] state;
  private final JointNewton joint;

  /** The short way for a single diode; null where there are more devices. */
  private final @Nullable DiodeNewton single;

  private final double[] trial;
  final double[] junctions;
  private final double[] savedJunctions;
  final double[] slopes;
  final double[] drawn;
  final double[] stored;
  private final double[] keptState;
  private final double[] keptJunctions;
  private boolean keptWarm;
  private int keptSamples;
  private boolean warm;
  private double gentleVolts;
  private boolean refined;
  private @Nullable CarrierSurroundings last;
  private int warmSamples;

  /** Mean current of each device at each audio sample, index device·samples + sample. */
  public final double[] meanAmperes;

  /** Harmonics of the mean current, index h·devices + device; h = 0 is its DC. */
  public final double[] audioReal;

  public final double[] audioImaginary;

  /** See {@link #carrierReal()}; worked out when they are first asked for. */
  private final double[] carrierRe;

  private final double[] carrierIm;
  private boolean shown = true;
  private boolean prepared;
  private double coarseness = 1;
  private PortLaw[] devicesLaws = new PortLaw[0];

  /** Envelope at the held node at each sample: e.m.f. or tuned node. */
  public final double[] feedReal;

  public final double[] feedImaginary;

  /** Highest reverse voltage of each junction. */
  public final double[] reversePeakVolts;

  /**
   * Room for a number of devices.
   *
   * @param devices N, at least 1
   * @param carrierSamples of a cycle: 32, 64, 128 ...
   * @param audioSamples of an audio period: 32, 64 ...
   * @param exact whether all carrier harmonics are wanted; else the first {@link #SHOWN} are kept
   */
  public EnvelopeSolver(int devices, int carrierSamples, int audioSamples, boolean exact) {
    this.devices = devices;
    this.samples = audioSamples;
    this.blocks = devices + 2;
    this.exact = exact;
    cycle = new CarrierCycle(devices, carrierSamples);
    balance = new AudioBalance(devices, audioSamples);
    solver = new DenseSolver(blocks * audioSamples);
    state = new double[blocks * audioSamples];
    trial = new double[blocks * audioSamples];
    junctions = new double[audioSamples * devices * carrierSamples];
    savedJunctions = new double[junctions.length];
    keptState = new double[state.length];
    keptJunctions = new double[junctions.length];
    slopes = new double[audioSamples * blocks * blocks];
    drawn = new double[2 * audioSamples];
    stored = new double[2 * audioSamples];
    meanAmperes = new double[devices * audioSamples];
    audioReal = new double[audioSamples / 2 * devices];
    audioImaginary = new double[audioSamples / 2 * devices];
    carrierRe = new double[audioSamples * (cycle.harmonics + 1) * devices];
    carrierIm = new double[carrierRe.length];
    feedReal = new double[audioSamples];
    feedImaginary = new double[audioSamples];
    reversePeakVolts = new double[devices];
    joint = new JointNewton(this, blocks * audioSamples);
    single = devices == 1 ? new DiodeNewton(this, blocks * audioSamples) : null;
  }

  /**
   * Slope of a mean current (rows 0..) or of what is drawn from the feed (real, imaginary) to a
   * port voltage (columns 0..) or to the held quantity (real, imaginary), at one audio sample.
   */
  public double slope(int sample, int row, int column) {
    if (!refined) {
      refine();
    }
    return slopes[(sample * blocks + row) * blocks + column];
  }

  /** Carrier harmonics of the current at each sample, index (sample·(K+1) + k)·devices + device. */
  public double[] carrierReal() {
    show();
    return carrierRe;
  }

  /** The same, imaginary parts. */
  public double[] carrierImaginary() {
    show();
    return carrierIm;
  }

  private void show() {
    CarrierSurroundings around = last;
    if (shown || around == null) {
      return;
    }
    shown = true;
    prepare(around);
    int width = (cycle.harmonics + 1) * devices;
    int row = devices * cycle.samples;
    for (int s = 0; s < warmSamples; s++) {
      cycle.harmonics(around, junctions, s * row, exact ? cycle.harmonics : SHOWN);
      System.arraycopy(cycle.harmonicReal, 0, carrierRe, s * width, width);
      System.arraycopy(cycle.harmonicImaginary, 0, carrierIm, s * width, width);
    }
    for (int s = warmSamples; s < samples; s++) {
      System.arraycopy(carrierRe, 0, carrierRe, s * width, width);
      System.arraycopy(carrierIm, 0, carrierIm, s * width, width);
    }
  }

  /** Makes the general cycle ready; the short way needs none. */
  private void prepare(CarrierSurroundings around) {
    if (!prepared) {
      cycle.prepare(around, devicesLaws);
      prepared = true;
    }
  }

  private void refine() {
    CarrierSurroundings around = last;
    if (around != null) {
      prepare(around);
    }
    for (int s = 0; s < warmSamples && around != null; s++) {
      if (cycle.exactSlopes(around, junctions, s * devices * cycle.samples)) {
        System.arraycopy(cycle.slopes, 0, slopes, s * blocks * blocks, blocks * blocks);
      }
    }
    refined = true;
  }

  /**
   * Largest share, over the audio period, by which a mean current differs between the samples of a
   * cycle and as many between them: what finer samples of the carrier would change.
   */
  public double aliasing() {
    double off = 0;
    double most = 0;
    if (last != null) {
      prepare(last);
    }
    for (int s = 0; s < warmSamples; s += Math.max(1, warmSamples / 8)) {
      off = Math.max(off, cycle.aliasing(junctions, s * devices * cycle.samples));
    }
    for (double amperes : meanAmperes) {
      most = Math.max(most, Math.abs(amperes));
    }
    return most > 0 ? off / most : 0;
  }

  /** Largest share of the highest harmonic of the tone in the fundamental of a mean current. */
  public double topHarmonic() {
    int top = audioHarmonics() * devices;
    double share = 0;
    for (int d = 0; d < devices; d++) {
      double fundamental = Math.hypot(audioReal[devices + d], audioImaginary[devices + d]);
      double highest = Math.hypot(audioReal[top + d], audioImaginary[top + d]);
      share = Math.max(share, fundamental > 0 ? highest / fundamental : 0);
    }
    return share;
  }

  /** Samples of a carrier cycle. */
  public int carrierSamples() {
    return cycle.samples;
  }

  /** Voltage across a port's junction at a sample of the first audio sample's cycle, in V. */
  public double junctionVolts(int port, int carrierSample) {
    return junctions[port * cycle.samples + carrierSample];
  }

  /** Mean over the audio period of the voltage across a port's junction, in V. */
  public double meanVolts(int port) {
    double sum = 0;
    for (int s = 0; s < warmSamples; s++) {
      sum += state[port * warmSamples + s];
    }
    return sum / warmSamples;
  }

  /** What the held node gives at one audio sample, in A, real part. */
  public double drawnReal(int sample) {
    return drawn[2 * sample];
  }

  /** What the held node gives at one audio sample, in A, imaginary part. */
  public double drawnImaginary(int sample) {
    return drawn[2 * sample + 1];
  }

  /** Remembers the present solution as the start of later solves. */
  public void keep() {
    System.arraycopy(state, 0, keptState, 0, state.length);
    System.arraycopy(junctions, 0, keptJunctions, 0, junctions.length);
    if (warm && warmSamples > 1 && last != null) {
      joint.keep(last);
      if (single != null) {
        single.keep(last);
      }
    }
    keptWarm = warm;
    keptSamples = warmSamples;
  }

  /** Goes back to the solution that was kept, so that no former solve leaves a trace. */
  public void recall() {
    if (single != null) {
      single.recall();
    }
    System.arraycopy(keptState, 0, state, 0, state.length);
    System.arraycopy(keptJunctions, 0, junctions, 0, junctions.length);
    warm = keptWarm;
    warmSamples = keptSamples;
  }

  /**
   * Sets how many times the error of rounding the short way for a single diode may leave from now
   * on; 1 is the start.
   */
  public void coarser(double times) {
    coarseness = times;
  }

  /** Number of carrier harmonics, K: what the surroundings must hold. */
  public int carrierHarmonics() {
    return cycle.harmonics;
  }

  /** Number of audio harmonics, H: what the surroundings must hold. */
  public int audioHarmonics() {
    return samples / 2 - 1;
  }

  /** Number of audio samples. */
  public int audioSamples() {
    return samples;
  }

  /** Forgets the former solution, so that the next solve starts cold. */
  public void forget() {
    warm = false;
  }

  /**
   * Solves.
   *
   * @param peakVolts no-load carrier peak, above 0
   * @param depth from 0 to 1; at 0 one sample is solved and all samples are alike
   * @param toneRadians ωm, above 0 unless depth is 0
   * @return whether it converged
   */
  public boolean solve(
      CarrierSurroundings around,
      PortLaw[] laws,
      double peakVolts,
      double depth,
      double toneRadians) {
    devicesLaws = laws;
    prepared = false;
    shown = false;
    gentleVolts = laws[0].gentleVolts();
    last = around;
    refined = false;
    int wanted = depth == 0 ? 1 : samples;
    boolean solved = false;
    if (warm && warmSamples == wanted && single != null && laws[0] instanceof JunctionLaw law) {
      solved = single.solve(around, law, peakVolts, depth, toneRadians, wanted, coarseness);
      if (!solved) {
        single.undo();
      }
    }
    if (!solved) {
      prepare(around);
    }
    if (!solved && warm && warmSamples == wanted) {
      solved = joint.solve(around, peakVolts, depth, toneRadians, wanted);
      if (!solved) {
        joint.undo();
        solved = newton(around, peakVolts, depth, toneRadians, wanted);
      }
    }
    if (!solved) {
      solved =
          coldCarrier(around, peakVolts)
              && (wanted == 1 || spread(around, peakVolts, depth, toneRadians));
      if (solved && !joint.solve(around, peakVolts, depth, toneRadians, wanted)) {
        joint.undo(); // near enough as it is
        solved = newton(around, peakVolts, depth, toneRadians, wanted);
      }
    }
    warm = solved;
    warmSamples = wanted;
    if (solved) {
      collect(wanted);
    }
    return solved;
  }

  /** The carrier alone, walked up from where every diode is nearly a resistor. */
  private boolean coldCarrier(CarrierSurroundings around, double peakVolts) {
    Arrays.fill(state, 0);
    Arrays.fill(junctions, 0);
    for (int d = 0; d < devices; d++) {
      state[d] = around.openVolts[d];
    }
    double level = Math.min(peakVolts, gentleVolts);
    if (around.tuned) {
      state[devices] = 0.5 * level;
    }
    double growth = 2;
    double reached = 0;
    for (int tries = 0; tries < 60; tries++) {
      if (newton(around, level, 0, 0, 1)) {
        if (level == peakVolts) {
          return true;
        }
        double next = Math.min(peakVolts, level * growth);
        predict(around, next / level);
        reached = level;
        level = next;
        growth = Math.min(3, growth * 1.3);
      } else {
        if (reached == 0) {
          return false;
        }
        growth = 1 + (growth - 1) / 3;
        Arrays.fill(junctions, 0, devices * cycle.samples, 0);
        level = Math.min(peakVolts, reached * growth);
      }
    }
    return false;
  }

  private void predict(CarrierSurroundings around, double ratio) {
    for (int d = 0; d < devices; d++) {
      state[d] = around.openVolts[d] + (state[d] - around.openVolts[d]) * ratio;
    }
    state[devices] *= ratio;
    state[devices + 1] *= ratio;
  }

  /** From the carrier's solution to the modulated one. */
  private boolean spread(
      CarrierSurroundings around, double peakVolts, double depth, double toneRadians) {
    for (int b = blocks - 1; b >= 0; b--) {
      double value = state[b];
      double open = b < devices ? around.openVolts[b] : 0;
      for (int s = samples - 1; s >= 0; s--) {
        double now = 1 + 0.9 * depth * Math.cos(2 * Math.PI * s / samples);
        trial[b * samples + s] = open + (value - open) * now;
      }
    }
    System.arraycopy(trial, 0, state, 0, blocks * samples);
    int row = devices * cycle.samples;
    for (int s = 1; s < samples; s++) {
      System.arraycopy(junctions, 0, junctions, s * row, row);
    }
    if (newton(around, peakVolts, depth, toneRadians, samples)) {
      return true;
    }
    return byDepth(around, peakVolts, depth, toneRadians);
  }

  private boolean byDepth(
      CarrierSurroundings around, double peakVolts, double depth, double toneRadians) {
    if (!coldCarrier(around, peakVolts)) {
      return false;
    }
    int row = devices * cycle.samples;
    for (int b = blocks - 1; b >= 0; b--) {
      Arrays.fill(trial, b * samples, (b + 1) * samples, state[b]);
    }
    System.arraycopy(trial, 0, state, 0, blocks * samples);
    for (int s = 1; s < samples; s++) {
      System.arraycopy(junctions, 0, junctions, s * row, row);
    }
    int steps = 12;
    for (int i = 1; i <= steps; i++) {
      if (!newton(around, peakVolts, depth * i / steps, toneRadians, samples)) {
        return false;
      }
    }
    return true;
  }

  private boolean newton(
      CarrierSurroundings around, double peakVolts, double depth, double toneRadians, int count) {
    balance.begin(around, peakVolts, depth, toneRadians, count);
    int size = balance.size(around);
    double norm = evaluate(around, state, count);
    double wanted = 1e-9 * peakVolts + 1e-12;
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      if (!(norm < Double.POSITIVE_INFINITY)) {
        return false;
      }
      if (norm < wanted) {
        return true;
      }
      balance.assemble(around, slopes, solver);
      if (!solver.factor()) {
        return false;
      }
      System.arraycopy(balance.residual, 0, trial, 0, size);
      solver.solve(trial, 0);
      double former = norm;
      norm = advance(around, size, count, former);
      if (norm >= former && norm < 30 * wanted) {
        return true; // as near as rounding lets it come
      }
    }
    return false;
  }

  /** Takes the step in {@link #trial}, halved until the residual falls. */
  private double advance(CarrierSurroundings around, int size, int count, double former) {
    System.arraycopy(junctions, 0, savedJunctions, 0, count * devices * cycle.samples);
    double taken = 0;
    double part = 1;
    double norm = Double.POSITIVE_INFINITY;
    for (int halving = 0; halving < MOST_HALVINGS; halving++) {
      for (int i = 0; i < size; i++) {
        state[i] -= (part - taken) * trial[i];
      }
      taken = part;
      norm = evaluate(around, state, count);
      if (norm < former) {
        return norm;
      }
      System.arraycopy(savedJunctions, 0, junctions, 0, count * devices * cycle.samples);
      part /= 2;
    }
    return norm;
  }

  /** Solves every cycle and fills the residual; returns its largest entry, in volts. */
  private double evaluate(CarrierSurroundings around, double[] x, int count) {
    int row = devices * cycle.samples;
    for (int s = 0; s < count; s++) {
      double real = around.tuned ? x[devices * count + s] : balance.envelope[s];
      double imaginary = around.tuned ? x[(devices + 1) * count + s] : 0;
      if (!cycle.solve(around, x, s, count, real, imaginary, junctions, s * row)) {
        Arrays.fill(junctions, s * row, (s + 1) * row, 0);
        if (!cycle.solve(around, x, s, count, real, imaginary, junctions, s * row)) {
          return Double.POSITIVE_INFINITY;
        }
      }
      keep(around, s, count, real, imaginary);
    }
    return balance.residuals(around, x, meanAmperes, drawn, stored);
  }

  void keep(CarrierSurroundings around, int s, int count, double real, double imaginary) {
    for (int d = 0; d < devices; d++) {
      meanAmperes[d * count + s] = cycle.mean[d];
    }
    System.arraycopy(cycle.slopes, 0, slopes, s * blocks * blocks, blocks * blocks);
    feedReal[s] = real;
    feedImaginary[s] = imaginary;
    double hanging = Math.max(0, around.loadImaginarySiemens) / around.carrierRadians;
    stored[2 * s] = cycle.storedReal + hanging * real;
    stored[2 * s + 1] = cycle.storedImaginary + hanging * imaginary;
    drawn[2 * s] =
        cycle.drawnReal + around.loadRealSiemens * real - around.loadImaginarySiemens * imaginary;
    drawn[2 * s + 1] =
        cycle.drawnImaginary
            + around.loadRealSiemens * imaginary
            + around.loadImaginarySiemens * real;
  }

  private void collect(int count) {
    if (count == 1) {
      repeatFirst();
    }
    for (int h = 0; h < samples / 2; h++) {
      for (int d = 0; d < devices; d++) {
        audioReal[h * devices + d] = balance.harmonic(meanAmperes, d * samples, h, true);
        audioImaginary[h * devices + d] = balance.harmonic(meanAmperes, d * samples, h, false);
      }
    }
    Arrays.fill(reversePeakVolts, 0);
    for (int s = 0; s < count; s++) {
      for (int d = 0; d < devices; d++) {
        for (int p = 0; p < cycle.samples; p++) {
          double volts = -junctions[(s * devices + d) * cycle.samples + p];
          reversePeakVolts[d] = Math.max(reversePeakVolts[d], volts);
        }
      }
    }
  }

  /** With the carrier alone every sample of the audio is alike. */
  private void repeatFirst() {
    for (int d = devices - 1; d >= 0; d--) {
      Arrays.fill(meanAmperes, d * samples, (d + 1) * samples, meanAmperes[d]);
    }
    Arrays.fill(feedReal, feedReal[0]);
    Arrays.fill(feedImaginary, feedImaginary[0]);
  }
}
