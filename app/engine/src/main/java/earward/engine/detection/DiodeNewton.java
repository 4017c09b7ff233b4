package earward.engine.detection;

import java.util.Arrays;

/**
 * The short way for a single diode from a start near by: cycles and audio balance in one Newton
 * iteration, as in {@link JointNewton}. All cycles are linearised; what their linear answers make
 * of the balance is solved by the inverse of the nominal kit's matrix, refined until it fits the
 * kit's own slopes; then all cycles are stepped. So a kit near the nominal one needs no large
 * elimination of its own, and yet each step is Newton's. Where the refinement does not converge
 * quickly the kit's own matrix is made. Gives up rather than damp.
 */
final class DiodeNewton {
  private static final int MOST_ITERATIONS = 14;
  private static final int MOST_REFINEMENTS = 12;

  /** A refinement that shrinks the residual by less than this asks for a matrix of its own. */
  private static final double SLOW = 0.5;

  /** Shares of a residual that a refinement may leave: at most, at least. */
  private static final double COARSE = 0.03;

  private static final double FINE = 1e-7;

  /** Exponent of the junction above which a sample conducts. */
  private static final double CONDUCTS = -4;

  /**
   * A step so small that what it leaves, in V, is what the cycles leave out of the elimination; the
   * share that this is at most, and that it is always taken for.
   */
  private static final double SMALL = 1e-6;

  /** A step that has shrunk to this lets the cycles keep their factors for the next. */
  private static final double QUICK = 0.05;

  private static final double LEFT = 0.02;
  private static final double LEAST = 1e-3;
  private static final int SLOPES = DiodeCycles.ROWS * DiodeCycles.COLUMNS;

  private final EnvelopeSolver owner;
  private final DiodeCycles cycles;
  private final DenseSolver fresh;
  private final double[][] inverse;
  private int keptSize;
  private boolean own;

  /** For how many audio samples there are factors of cycles since the last recall. */
  private int factored;

  /** Of the law's figures that these were made with. */
  private int version = -1;

  private final double[] savedState;
  private final double[] savedJunctions;
  private final double[] step;
  private final double[] trial;
  private final double[] correction;
  private final double[] slopes;
  private final double[] here = new double[SLOPES];
  private final double[] mean;
  private final double[] drawn;
  private final double[] stored;
  private double saturation = Double.NaN;
  private double thermalVolts;
  private double keptSaturation = Double.NaN;
  private double keptThermalVolts;

  DiodeNewton(EnvelopeSolver owner, int unknowns) {
    this.owner = owner;
    cycles = new DiodeCycles(owner.cycle.samples, owner.samples);
    fresh = owner.solver;
    inverse = new double[unknowns][];
    savedState = new double[unknowns];
    savedJunctions = new double[owner.junctions.length];
    step = new double[unknowns];
    trial = new double[unknowns];
    correction = new double[unknowns];
    slopes = new double[owner.samples * SLOPES];
    mean = new double[owner.samples];
    drawn = new double[2 * owner.samples];
    stored = new double[2 * owner.samples];
  }

  /** Keeps the inverse of the balance's matrix at the solution that the owner holds. */
  void keep(CarrierSurroundings around) {
    keptSaturation = saturation;
    keptThermalVolts = thermalVolts;
    owner.balance.assemble(around, owner.slopes, fresh);
    int size = owner.balance.size(around);
    keptSize = fresh.factor() ? size : 0;
    for (int column = 0; column < keptSize; column++) {
      inverse[column] = new double[size];
      inverse[column][column] = 1;
      fresh.solve(inverse[column], 0);
    }
  }

  /** Goes back to the law of the solution that was kept. */
  void recall() {
    factored = 0;
    saturation = keptSaturation;
    thermalVolts = keptThermalVolts;
  }

  /** Puts back what {@link #solve} started from. */
  void undo() {
    System.arraycopy(savedState, 0, owner.state, 0, savedState.length);
    System.arraycopy(savedJunctions, 0, owner.junctions, 0, savedJunctions.length);
  }

  /** Solves from where the owner stands; false where that led nowhere. */
  boolean solve(
      CarrierSurroundings around,
      JunctionLaw law,
      double peakVolts,
      double depth,
      double toneRadians,
      int count,
      double coarseness) {
    System.arraycopy(owner.state, 0, savedState, 0, savedState.length);
    System.arraycopy(owner.junctions, 0, savedJunctions, 0, savedJunctions.length);
    owner.balance.begin(around, peakVolts, depth, toneRadians, count);
    factored = law.version() == version ? factored : 0;
    version = law.version();
    cycles.prepare(around, law, owner.state[0], factored == count);
    factored = factored == count ? count : 0;
    follow(law, count);
    int size = owner.balance.size(around);
    own = size != keptSize || count == 1;
    double enough = coarseness * (1e-11 * peakVolts + 1e-13);
    double former = 0;
    double shrunk = 1;
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      boolean near = factored == count && (former == 0 || shrunk < QUICK);
      if (!(near && follow(around, count)) && !linearise(around, count)) {
        return false;
      }
      if (!balance(around, count, size, law.scaledThermalVolts())) {
        return false;
      }
      double largest = move(around, count, size);
      if (!(largest < 1e3)) {
        return false;
      }
      // the next step would be at most this one times what this one was of the last
      shrunk = former > 0 ? largest / former : largest < SMALL ? LEFT : 1;
      if (largest < enough || (shrunk < 1 && largest * Math.max(shrunk, LEAST) < enough)) {
        return true;
      }
      former = largest;
    }
    return false;
  }

  /** Where the law has changed: what conducts goes on to conduct the same. */
  private void follow(JunctionLaw law, int count) {
    double nowThermal = law.scaledThermalVolts();
    double now = law.saturationAmperes();
    if (!Double.isNaN(saturation) && (now != saturation || nowThermal != thermalVolts)) {
      double shift = nowThermal * Math.log(saturation / now);
      double ratio = nowThermal / thermalVolts;
      for (int i = 0; i < count * cycles.samples; i++) {
        if (owner.junctions[i] > CONDUCTS * thermalVolts) {
          owner.junctions[i] = owner.junctions[i] * ratio + shift;
        }
      }
    }
    saturation = now;
    thermalVolts = nowThermal;
  }

  /** Linearises all cycles near where they were linearised last; false where one is too far. */
  private boolean follow(CarrierSurroundings around, int count) {
    for (int s = 0; s < count; s++) {
      double real = around.tuned ? owner.state[count + s] : owner.balance.envelope[s];
      double imaginary = around.tuned ? owner.state[2 * count + s] : 0;
      int at = s * cycles.samples;
      if (!cycles.follow(s, owner.state[s], real, imaginary, owner.junctions, at)) {
        return false;
      }
      take(s);
    }
    return true;
  }

  private void take(int s) {
    mean[s] = cycles.mean;
    drawn[2 * s] = cycles.drawnRe;
    drawn[2 * s + 1] = cycles.drawnIm;
    stored[2 * s] = cycles.chargeRe;
    stored[2 * s + 1] = cycles.chargeIm;
  }

  private boolean linearise(CarrierSurroundings around, int count) {
    factored = 0;
    for (int s = 0; s < count; s++) {
      double real = around.tuned ? owner.state[count + s] : owner.balance.envelope[s];
      double imaginary = around.tuned ? owner.state[2 * count + s] : 0;
      int at = s * cycles.samples;
      if (!cycles.linearise(s, owner.state[s], real, imaginary, owner.junctions, at, here)) {
        return false;
      }
      System.arraycopy(here, 0, slopes, s * SLOPES, SLOPES);
      System.arraycopy(here, 0, owner.slopes, s * 9, 9);
      take(s);
    }
    factored = count;
    return true;
  }

  /** Finds the step that balances the linearised cycles. */
  private boolean balance(CarrierSurroundings around, int count, int size, double scaleVolts) {
    Arrays.fill(step, 0, size, 0);
    double off = residual(around, count);
    double share = Math.min(COARSE, Math.max(FINE, 0.1 * off / scaleVolts));
    double wanted = off * share;
    boolean made = false;
    for (int i = 0; i < MOST_REFINEMENTS; i++) {
      if (!(off < 1e9)) {
        return false;
      }
      if (own && !made) {
        owner.balance.assemble(around, owner.slopes, fresh);
        if (!fresh.factor()) {
          return false;
        }
        made = true;
      }
      correct(size);
      double former = off;
      off = residual(around, count);
      if (off <= wanted || off < 1e-14) {
        return true;
      }
      if (!(off < SLOW * former)) {
        if (made) {
          return true; // as near as rounding and what the matrix leaves out let it come
        }
        own = true;
      }
    }
    return true;
  }

  /** Takes from the step what the residual asks for, by the inverse or the matrix made last. */
  private void correct(int size) {
    double[] residual = owner.balance.residual;
    if (own) {
      System.arraycopy(residual, 0, correction, 0, size);
      fresh.solve(correction, 0);
      for (int i = 0; i < size; i++) {
        step[i] -= correction[i];
      }
      return;
    }
    for (int j = 0; j < size; j += 4) {
      four(
          inverse[j],
          inverse[j + 1],
          inverse[j + 2],
          inverse[j + 3],
          residual[j],
          residual[j + 1],
          residual[j + 2],
          residual[j + 3],
          step,
          size);
    }
  }

  private static void four(
      double[] a,
      double[] b,
      double[] c,
      double[] d,
      double va,
      double vb,
      double vc,
      double vd,
      double[] into,
      int size) {
    for (int i = 0; i < size; i++) {
      into[i] -= va * a[i] + vb * b[i] + vc * c[i] + vd * d[i];
    }
  }

  /** What the balance lacks with the present step, by the linear answers of all cycles. */
  private double residual(CarrierSurroundings around, int count) {
    double hanging = Math.max(0, around.loadImaginarySiemens) / around.carrierRadians;
    for (int s = 0; s < count; s++) {
      int at = s * SLOPES;
      double byV = step[s];
      double byRe = around.tuned ? step[count + s] : 0;
      double byIm = around.tuned ? step[2 * count + s] : 0;
      trial[s] = owner.state[s] + byV;
      owner.meanAmperes[s] = mean[s] + changed(at, byV, byRe, byIm);
      double real = owner.balance.envelope[s];
      double imaginary = 0;
      if (around.tuned) {
        real = owner.state[count + s] + byRe;
        imaginary = owner.state[2 * count + s] + byIm;
        trial[count + s] = real;
        trial[2 * count + s] = imaginary;
      }
      owner.feedReal[s] = real;
      owner.feedImaginary[s] = imaginary;
      owner.drawn[2 * s] =
          drawn[2 * s]
              + changed(at + 3, byV, byRe, byIm)
              + around.loadRealSiemens * real
              - around.loadImaginarySiemens * imaginary;
      owner.drawn[2 * s + 1] =
          drawn[2 * s + 1]
              + changed(at + 6, byV, byRe, byIm)
              + around.loadRealSiemens * imaginary
              + around.loadImaginarySiemens * real;
      owner.stored[2 * s] = stored[2 * s] + changed(at + 9, byV, byRe, byIm) + hanging * real;
      owner.stored[2 * s + 1] =
          stored[2 * s + 1] + changed(at + 12, byV, byRe, byIm) + hanging * imaginary;
    }
    return owner.balance.residuals(around, trial, owner.meanAmperes, owner.drawn, owner.stored);
  }

  private double changed(int at, double byV, double byRe, double byIm) {
    return slopes[at] * byV + slopes[at + 1] * byRe + slopes[at + 2] * byIm;
  }

  /** Takes the step at every sample; returns the largest change of a voltage. */
  private double move(CarrierSurroundings around, int count, int size) {
    double largest = 0;
    for (int i = 0; i < size; i++) {
      owner.state[i] += step[i];
      largest = Math.max(largest, Math.abs(step[i]));
    }
    for (int s = 0; s < count; s++) {
      double byRe = around.tuned ? step[count + s] : 0;
      double byIm = around.tuned ? step[2 * count + s] : 0;
      double moved = cycles.move(s, step[s], byRe, byIm, owner.junctions, s * cycles.samples);
      largest = Math.max(largest, moved);
    }
    return largest;
  }
}
