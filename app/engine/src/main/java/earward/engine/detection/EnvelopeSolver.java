package earward.engine.detection;

import java.util.Arrays;

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
  private final int samples;
  private final int blocks;
  private final boolean exact;
  private final CarrierCycle cycle;
  private final DenseSolver solver;

  private final double[] state;
  private final double[] trial;
  private final double[] residual;
  private final double[] junctions;
  private final double[] savedJunctions;
  private final double[] slopes;
  private final double[] audioKernel;
  private final double[] rateKernel;
  private final double[] envelope;
  private final double[] drawn;
  private final double[] keptState;
  private final double[] keptJunctions;
  private boolean keptWarm;
  private int keptSamples;
  private boolean warm;
  private double gentleVolts;
  private int warmSamples;

  /** Mean current of each device at each audio sample, index device·samples + sample. */
  public final double[] meanAmperes;

  /** Harmonics of the mean current, index h·devices + device; h = 0 is its DC. */
  public final double[] audioReal;

  public final double[] audioImaginary;

  /** Carrier harmonics of the current at each sample, index (sample·(K+1) + k)·devices + device. */
  public final double[] carrierReal;

  public final double[] carrierImaginary;

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
   * @param exact whether slopes and all carrier harmonics are wanted as results; else slopes only
   *     lead Newton on, and the first {@link #SHOWN} harmonics are kept: much quicker
   */
  public EnvelopeSolver(int devices, int carrierSamples, int audioSamples, boolean exact) {
    this.devices = devices;
    this.samples = audioSamples;
    this.blocks = devices + 2;
    this.exact = exact;
    cycle = new CarrierCycle(devices, carrierSamples, exact);
    solver = new DenseSolver(blocks * audioSamples);
    state = new double[blocks * audioSamples];
    trial = new double[blocks * audioSamples];
    residual = new double[blocks * audioSamples];
    junctions = new double[audioSamples * devices * carrierSamples];
    savedJunctions = new double[junctions.length];
    keptState = new double[state.length];
    keptJunctions = new double[junctions.length];
    slopes = new double[audioSamples * blocks * blocks];
    audioKernel = new double[devices * devices * 2 * audioSamples];
    rateKernel = new double[2 * audioSamples];
    envelope = new double[audioSamples];
    drawn = new double[2 * audioSamples];
    meanAmperes = new double[devices * audioSamples];
    audioReal = new double[audioSamples / 2 * devices];
    audioImaginary = new double[audioSamples / 2 * devices];
    carrierReal = new double[audioSamples * (cycle.harmonics + 1) * devices];
    carrierImaginary = new double[carrierReal.length];
    feedReal = new double[audioSamples];
    feedImaginary = new double[audioSamples];
    reversePeakVolts = new double[devices];
  }

  /**
   * Slope of a mean current (rows 0..) or of what is drawn from the feed (real, imaginary) to a
   * port voltage (columns 0..) or to the held quantity (real, imaginary), at one audio sample.
   */
  public double slope(int sample, int row, int column) {
    return slopes[(sample * blocks + row) * blocks + column];
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
    keptWarm = warm;
    keptSamples = warmSamples;
  }

  /** Goes back to the solution that was kept, so that no former solve leaves a trace. */
  public void recall() {
    System.arraycopy(keptState, 0, state, 0, state.length);
    System.arraycopy(keptJunctions, 0, junctions, 0, junctions.length);
    warm = keptWarm;
    warmSamples = keptSamples;
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
    cycle.prepare(around, laws);
    gentleVolts = laws[0].gentleVolts();
    int wanted = depth == 0 ? 1 : samples;
    boolean solved = false;
    if (warm && warmSamples == wanted) {
      solved = newton(around, peakVolts, depth, toneRadians, wanted);
    }
    if (!solved) {
      solved =
          coldCarrier(around, peakVolts)
              && (wanted == 1 || spread(around, peakVolts, depth, toneRadians));
    }
    warm = solved;
    warmSamples = wanted;
    if (solved) {
      collect(around, wanted);
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
    kernels(around, toneRadians, count);
    for (int s = 0; s < count; s++) {
      envelope[s] = peakVolts * (1 + depth * Math.cos(2 * Math.PI * s / count));
    }
    int size = (around.tuned ? blocks : devices) * count;
    double norm = evaluate(around, state, count);
    double wanted = 1e-9 * peakVolts + 1e-12;
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      if (!(norm < Double.POSITIVE_INFINITY)) {
        return false;
      }
      if (norm < wanted) {
        return true;
      }
      assemble(around, count);
      if (!solver.factor()) {
        return false;
      }
      System.arraycopy(residual, 0, trial, 0, size);
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

  private void kernels(CarrierSurroundings around, double toneRadians, int count) {
    int top = count == 1 ? 0 : count / 2 - 1;
    for (int q = 0; q < count; q++) {
      double rate = 0;
      for (int h = 1; h <= top; h++) {
        rate -= 2.0 / count * h * toneRadians * Math.sin(2 * Math.PI * h * q / count);
      }
      rateKernel[q] = rate;
      rateKernel[count + q] = rate;
      for (int i = 0; i < devices; i++) {
        for (int j = 0; j < devices; j++) {
          int at = (i * devices + j) * 2 * count;
          audioKernel[at + q] = audioOhms(around, i, j, q, count, top);
          audioKernel[at + count + q] = audioKernel[at + q];
        }
      }
    }
  }

  private static double audioOhms(
      CarrierSurroundings around, int i, int j, int q, int count, int top) {
    double own = i == j && q == 0 ? around.seriesOhms[i] : 0;
    double ohms = around.audioRealOhms[around.index(0, i, j)];
    for (int h = 1; h <= top; h++) {
      double angle = 2 * Math.PI * h * q / count;
      int entry = around.index(h, i, j);
      ohms +=
          2
              * (around.audioRealOhms[entry] * Math.cos(angle)
                  - around.audioImaginaryOhms[entry] * Math.sin(angle));
    }
    return ohms / count + own;
  }

  /** Solves every cycle and fills the residual; returns its largest entry, in volts. */
  private double evaluate(CarrierSurroundings around, double[] x, int count) {
    int row = devices * cycle.samples;
    for (int s = 0; s < count; s++) {
      double real = around.tuned ? x[devices * count + s] : envelope[s];
      double imaginary = around.tuned ? x[(devices + 1) * count + s] : 0;
      if (!cycle.solve(around, x, s, count, real, imaginary, junctions, s * row)) {
        Arrays.fill(junctions, s * row, (s + 1) * row, 0);
        if (!cycle.solve(around, x, s, count, real, imaginary, junctions, s * row)) {
          return Double.POSITIVE_INFINITY;
        }
      }
      keep(around, s, count, real, imaginary);
    }
    double largest = audioResidual(around, x, count);
    return around.tuned ? Math.max(largest, tankResidual(around, x, count)) : largest;
  }

  private void keep(CarrierSurroundings around, int s, int count, double real, double imaginary) {
    for (int d = 0; d < devices; d++) {
      meanAmperes[d * count + s] = cycle.mean[d];
    }
    System.arraycopy(cycle.slopes, 0, slopes, s * blocks * blocks, blocks * blocks);
    feedReal[s] = real;
    feedImaginary[s] = imaginary;
    drawn[2 * s] =
        cycle.drawnReal + around.loadRealSiemens * real - around.loadImaginarySiemens * imaginary;
    drawn[2 * s + 1] =
        cycle.drawnImaginary
            + around.loadRealSiemens * imaginary
            + around.loadImaginarySiemens * real;
  }

  private double audioResidual(CarrierSurroundings around, double[] x, int count) {
    double largest = 0;
    for (int i = 0; i < devices; i++) {
      for (int s = 0; s < count; s++) {
        double sum = x[i * count + s] - around.openVolts[i];
        for (int j = 0; j < devices; j++) {
          int kernel = (i * devices + j) * 2 * count + count + s;
          for (int r = 0; r < count; r++) {
            sum += audioKernel[kernel - r] * meanAmperes[j * count + r];
          }
        }
        residual[i * count + s] = sum;
        largest = Math.max(largest, Math.abs(sum));
      }
    }
    return largest;
  }

  /** The tuned feed's balance, times Rp so that it stands in volts. */
  private double tankResidual(CarrierSurroundings around, double[] x, int count) {
    double largest = 0;
    double turn = 2 * around.tankFarads * around.detuningRadians;
    for (int s = 0; s < count; s++) {
      double rateReal = 0;
      double rateImaginary = 0;
      for (int r = 0; r < count; r++) {
        rateReal += rateKernel[count + s - r] * x[devices * count + r];
        rateImaginary += rateKernel[count + s - r] * x[(devices + 1) * count + r];
      }
      double real = x[devices * count + s];
      double imaginary = x[(devices + 1) * count + s];
      double first =
          real
              - envelope[s]
              + around.tankOhms
                  * (2 * around.tankFarads * rateReal + drawn[2 * s] - turn * imaginary);
      double second =
          imaginary
              + around.tankOhms
                  * (2 * around.tankFarads * rateImaginary + drawn[2 * s + 1] + turn * real);
      residual[devices * count + s] = first;
      residual[(devices + 1) * count + s] = second;
      largest = Math.max(largest, Math.max(Math.abs(first), Math.abs(second)));
    }
    return largest;
  }

  private void assemble(CarrierSurroundings around, int count) {
    int used = around.tuned ? blocks : devices;
    int size = used * count;
    solver.begin(size);
    double[] a = solver.matrix;
    for (int i = 0; i < devices; i++) {
      for (int s = 0; s < count; s++) {
        int row = (i * count + s) * size;
        for (int b = 0; b < used; b++) {
          for (int r = 0; r < count; r++) {
            double entry = 0;
            for (int j = 0; j < devices; j++) {
              entry +=
                  audioKernel[(i * devices + j) * 2 * count + count + s - r]
                      * slopes[(r * blocks + j) * blocks + b];
            }
            a[row + b * count + r] = entry;
          }
        }
        a[row + i * count + s] += 1;
      }
    }
    if (around.tuned) {
      assembleTank(around, count, size);
    }
  }

  private void assembleTank(CarrierSurroundings around, int count, int size) {
    double[] a = solver.matrix;
    double storing = 2 * around.tankFarads * around.tankOhms;
    double turn = storing * around.detuningRadians;
    double ohms = around.tankOhms;
    int realAt = devices * count;
    int imaginaryAt = (devices + 1) * count;
    for (int s = 0; s < count; s++) {
      int real = (realAt + s) * size;
      int imaginary = (imaginaryAt + s) * size;
      Arrays.fill(a, real, real + size, 0);
      Arrays.fill(a, imaginary, imaginary + size, 0);
      for (int r = 0; r < count; r++) {
        a[real + realAt + r] += storing * rateKernel[count + s - r];
        a[imaginary + imaginaryAt + r] += storing * rateKernel[count + s - r];
      }
      for (int b = 0; b < blocks; b++) {
        a[real + b * count + s] += ohms * slopes[(s * blocks + devices) * blocks + b];
        a[imaginary + b * count + s] += ohms * slopes[(s * blocks + devices + 1) * blocks + b];
      }
      a[real + realAt + s] += 1 + ohms * around.loadRealSiemens;
      a[real + imaginaryAt + s] += -turn - ohms * around.loadImaginarySiemens;
      a[imaginary + imaginaryAt + s] += 1 + ohms * around.loadRealSiemens;
      a[imaginary + realAt + s] += turn + ohms * around.loadImaginarySiemens;
    }
  }

  private void collect(CarrierSurroundings around, int count) {
    int width = (cycle.harmonics + 1) * devices;
    int row = devices * cycle.samples;
    for (int s = 0; s < count; s++) {
      cycle.harmonics(around, junctions, s * row, exact ? cycle.harmonics : SHOWN);
      System.arraycopy(cycle.harmonicReal, 0, carrierReal, s * width, width);
      System.arraycopy(cycle.harmonicImaginary, 0, carrierImaginary, s * width, width);
    }
    if (count == 1) {
      repeatFirst();
    }
    for (int h = 0; h < samples / 2; h++) {
      for (int d = 0; d < devices; d++) {
        double real = 0;
        double imaginary = 0;
        for (int s = 0; s < samples; s++) {
          double angle = 2 * Math.PI * ((h * s) % samples) / samples;
          real += meanAmperes[d * samples + s] * Math.cos(angle);
          imaginary -= meanAmperes[d * samples + s] * Math.sin(angle);
        }
        double scale = (h == 0 ? 1.0 : 2.0) / samples;
        audioReal[h * devices + d] = scale * real;
        audioImaginary[h * devices + d] = scale * imaginary;
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
    int width = (cycle.harmonics + 1) * devices;
    for (int s = 1; s < samples; s++) {
      System.arraycopy(carrierReal, 0, carrierReal, s * width, width);
      System.arraycopy(carrierImaginary, 0, carrierImaginary, s * width, width);
    }
    Arrays.fill(feedReal, feedReal[0]);
    Arrays.fill(feedImaginary, feedImaginary[0]);
  }
}
