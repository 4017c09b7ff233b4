package earward.engine.detection;

/**
 * The carrier cycles of one junction at all samples of an audio period, by the equations of {@link
 * CarrierCycle}: the short way for a single diode near a solution that is known. Newton's step is
 * eliminated among the samples that conduct; it is found for all changes of voltage and feed at
 * once, and taken when the audio balance has said what these are. Mutable, for one thread.
 */
final class DiodeCycles {
  /** What a sample may add, in volts per volt, and yet be left out of the elimination. */
  private static final double FAINT = 1e-3;

  private static final double FAINT_CHARGE = 0.01;

  /** Volts that no residual shows. */
  private static final double NOTHING = 1e-15;

  /** Exponent below which an exponential adds nothing to its own saturation current. */
  private static final double NO_EXPONENT = -42;

  /** Right-hand sides: the residual, and one volt of v, of E real and of E imaginary. */
  private static final int SIDES = 4;

  /** Rows of the slopes: mean, drawn real and imaginary, stored real and imaginary. */
  static final int ROWS = 5;

  static final int COLUMNS = 3;

  final int samples;
  private final DiodeKernel kernel;
  private JunctionLaw law = new JunctionLaw();
  private double radians;
  private double throughRe;
  private double throughIm;
  private boolean charged;

  private final double[] current;
  private final double[] slope;
  private final double[] charge;
  private final double[] capacitance;
  private final double[] work;
  private final int[] all;
  private final int[] some;
  private final double[] amounts;
  private final double[] chargeAmounts;

  /** What one sample of the audio leaves for its step. */
  private final double[][] residuals;

  private final int[][] active;
  private final int[] actives;
  private final double[][] activeSlope;
  private final double[][] activeFarads;
  private final double[][][] answers;

  /** The matrix with its right-hand sides beside it. */
  private final double[][] rows;

  private double phasorRe;
  private double phasorIm;
  private double storedRe;
  private double storedIm;

  /** Mean current and slopes of the sample that was linearised last; and what it draws. */
  double mean;

  double drawnRe;
  double drawnIm;
  double chargeRe;
  double chargeIm;

  DiodeCycles(int samples, int audioSamples) {
    this.samples = samples;
    kernel = new DiodeKernel(samples, samples / 2 - 1);
    current = new double[samples];
    slope = new double[samples];
    charge = new double[samples];
    capacitance = new double[samples];
    work = new double[samples];
    all = new int[samples];
    for (int s = 0; s < samples; s++) {
      all[s] = s;
    }
    some = new int[samples];
    amounts = new double[samples];
    chargeAmounts = new double[samples];
    residuals = new double[audioSamples][samples];
    active = new int[audioSamples][samples];
    actives = new int[audioSamples];
    activeSlope = new double[audioSamples][samples];
    activeFarads = new double[audioSamples][samples];
    answers = new double[audioSamples][SIDES][samples];
    rows = new double[samples][samples + SIDES];
  }

  /**
   * Takes in surroundings and law.
   *
   * @param volts mean voltage across the junction, about which its capacitance is taken over
   */
  void prepare(CarrierSurroundings around, JunctionLaw junction, double volts) {
    law = junction;
    charged = law.charged();
    radians = around.carrierRadians;
    throughRe = around.transferReal[0];
    throughIm = around.transferImaginary[0];
    kernel.prepare(around, law.leakageSiemens(), charged ? law.capacitance(volts) : 0);
  }

  /**
   * Linearises one cycle about where it stands. Afterwards means and phasors are those that the
   * step would leave, to first order, with v and E as they are.
   *
   * @param into takes {@link #ROWS} slopes to v, E real and E imaginary each
   * @return false where this way is not good enough
   */
  boolean linearise(
      int s, double v, double feedRe, double feedIm, double[] u, int at, double[] into) {
    if (!evaluate(u, at)) {
      return false;
    }
    double[] off = residuals[s];
    double real = kernel.transferRe * feedRe - kernel.transferIm * feedIm;
    double imaginary = kernel.transferRe * feedIm + kernel.transferIm * feedRe;
    drive(u, at, v, real, imaginary, off);
    int conducting = 0;
    for (int k = 0; k < samples; k++) {
      if (current[k] * kernel.currentReach > NOTHING) {
        some[conducting] = k;
        amounts[conducting++] = current[k];
      }
    }
    kernel.addCurrents(some, amounts, conducting, off);
    if (charged) {
      kernel.addCharges(all, charge, samples, off);
    }
    choose(s);
    if (!eliminate(s)) {
      return false;
    }
    base(s, conducting, v, real, imaginary);
    for (int c = 0; c < COLUMNS; c++) {
      column(s, c, into);
    }
    return true;
  }

  /** Currents, charges and their slopes, less what the kernel has taken over. */
  private boolean evaluate(double[] u, int at) {
    double inverse = 1 / law.scaledThermalVolts();
    double saturation = law.saturationAmperes();
    double lowest = law.leastVolts();
    for (int k = 0; k < samples; k++) {
      double volts = u[at + k];
      double exponent = volts * inverse;
      if (!(exponent < PortLaw.MOST_EXPONENT) || volts < lowest) {
        return false;
      }
      double grown = exponent < NO_EXPONENT ? 0 : saturation * Math.exp(exponent);
      current[k] = grown;
      slope[k] = grown * inverse;
    }
    if (charged) {
      double taken = kernel.farads;
      for (int k = 0; k < samples; k++) {
        double volts = u[at + k];
        law.charges(volts);
        charge[k] = law.coulombs - taken * volts;
        capacitance[k] = law.farads - taken;
      }
    }
    return true;
  }

  private void drive(double[] u, int at, double v, double real, double imaginary, double[] into) {
    double[] cosine = kernel.cosine();
    double[] sine = kernel.sine();
    System.arraycopy(u, at, into, 0, samples);
    for (int k = 0; k < into.length; k++) {
      into[k] += imaginary * sine[k] - real * cosine[k] - v;
    }
  }

  /** The samples that are eliminated. */
  private void choose(int s) {
    int count = 0;
    for (int k = 0; k < samples; k++) {
      if (slope[k] * kernel.currentReach > FAINT
          || (charged && Math.abs(capacitance[k]) * kernel.chargeReach > FAINT_CHARGE)) {
        active[s][count] = k;
        activeSlope[s][count] = slope[k];
        activeFarads[s][count++] = charged ? capacitance[k] : 0;
      }
    }
    actives[s] = count;
  }

  /**
   * Solves (1 + Z′·g)·d = side for all sides. The network is passive and the slopes are above 0, so
   * that the pivots need no search.
   */
  private boolean eliminate(int s) {
    int n = actives[s];
    int[] at = active[s];
    double[] g = activeSlope[s];
    double[] c = activeFarads[s];
    double[] cosine = kernel.cosine();
    double[] sine = kernel.sine();
    double tr = kernel.transferRe;
    double ti = kernel.transferIm;
    for (int q = 0; q < n; q++) {
      double[] answer = kernel.toCurrent(at[q]);
      double[] stored = kernel.toCharge(at[q]);
      for (int p = 0; p < n; p++) {
        rows[p][q] = g[q] * answer[at[p]] + c[q] * stored[at[p]];
      }
    }
    for (int p = 0; p < n; p++) {
      double[] row = rows[p];
      row[p] += 1;
      row[n] = residuals[s][at[p]];
      row[n + 1] = 1;
      row[n + 2] = tr * cosine[at[p]] - ti * sine[at[p]];
      row[n + 3] = -ti * cosine[at[p]] - tr * sine[at[p]];
    }
    int width = n + SIDES;
    for (int k = 0; k < n; k++) {
      double[] pivotRow = rows[k];
      double pivot = pivotRow[k];
      if (!(Math.abs(pivot) > 1e-9)) {
        return false;
      }
      double inverse = 1 / pivot;
      for (int p = k + 1; p < n; p++) {
        subtract(rows[p], pivotRow, rows[p][k] * inverse, k + 1, width);
      }
    }
    back(s, n);
    return true;
  }

  private static void subtract(double[] row, double[] pivot, double factor, int from, int to) {
    for (int j = from; j < to; j++) {
      row[j] -= factor * pivot[j];
    }
  }

  private void back(int s, int n) {
    double[] first = answers[s][0];
    double[] second = answers[s][1];
    double[] third = answers[s][2];
    double[] fourth = answers[s][3];
    for (int p = n - 1; p >= 0; p--) {
      double[] row = rows[p];
      double a = row[n];
      double b = row[n + 1];
      double c = row[n + 2];
      double d = row[n + 3];
      for (int j = p + 1; j < n; j++) {
        double here = row[j];
        a -= here * first[j];
        b -= here * second[j];
        c -= here * third[j];
        d -= here * fourth[j];
      }
      double inverse = 1 / row[p];
      first[p] = a * inverse;
      second[p] = b * inverse;
      third[p] = c * inverse;
      fourth[p] = d * inverse;
    }
  }

  /** Means and phasors as the step leaves them; {@code some} holds the samples that conduct. */
  private void base(int s, int conducting, double v, double real, double imaginary) {
    double[] cosine = kernel.cosine();
    double[] sine = kernel.sine();
    double sum = 0;
    double ir = 0;
    double ii = 0;
    for (int k = 0; k < conducting; k++) {
      double amperes = amounts[k];
      sum += amperes;
      ir += amperes * cosine[some[k]];
      ii -= amperes * sine[some[k]];
    }
    double qr = 0;
    double qi = 0;
    if (charged) {
      for (int k = 0; k < samples; k++) {
        qr += charge[k] * cosine[k];
        qi -= charge[k] * sine[k];
      }
    }
    double scale = 2.0 / samples;
    sums(s, 0);
    mean = (sum - stepSum) / samples - law.saturationAmperes() + kernel.siemens * v;
    phasors(
        scale * (ir - stepRe),
        scale * (ii - stepIm),
        scale * (qr - stepQr),
        scale * (qi - stepQi),
        real,
        imaginary);
    drawnRe = phasorRe;
    drawnIm = phasorIm;
    chargeRe = storedRe;
    chargeIm = storedIm;
  }

  private double stepSum;
  private double stepRe;
  private double stepIm;
  private double stepQr;
  private double stepQi;

  /** Sums over the cycle of what one answer changes in current and charge. */
  private void sums(int s, int side) {
    double[] d = answers[s][side];
    double[] g = activeSlope[s];
    double[] c = activeFarads[s];
    double[] cosine = kernel.cosine();
    double[] sine = kernel.sine();
    stepSum = 0;
    stepRe = 0;
    stepIm = 0;
    stepQr = 0;
    stepQi = 0;
    for (int p = 0; p < actives[s]; p++) {
      double amperes = g[p] * d[p];
      double coulombs = c[p] * d[p];
      double cos = cosine[active[s][p]];
      double sin = sine[active[s][p]];
      stepSum += amperes;
      stepRe += amperes * cos;
      stepIm -= amperes * sin;
      stepQr += coulombs * cos;
      stepQi -= coulombs * sin;
    }
  }

  /**
   * What the feed sees: the fundamental of the whole current, what the kernel has taken over
   * included, and that of the charge.
   *
   * @param ir fundamental of the current that is left, qr of the charge that is left
   * @param real fundamental of the drive
   */
  private void phasors(double ir, double ii, double qr, double qi, double real, double imaginary) {
    double wr = ir - radians * qi;
    double wi = ii + radians * qr;
    double ur = real - (kernel.ohmsRe * wr - kernel.ohmsIm * wi);
    double ui = imaginary - (kernel.ohmsRe * wi + kernel.ohmsIm * wr);
    double sus = radians * kernel.farads;
    double totalRe = wr + kernel.siemens * ur - sus * ui;
    double totalIm = wi + kernel.siemens * ui + sus * ur;
    double chargeR = qr + kernel.farads * ur;
    double chargeI = qi + kernel.farads * ui;
    phasorRe = throughRe * totalRe - throughIm * totalIm;
    phasorIm = throughRe * totalIm + throughIm * totalRe;
    storedRe = throughRe * chargeR - throughIm * chargeI;
    storedIm = throughRe * chargeI + throughIm * chargeR;
  }

  /** Slopes to v, E real or E imaginary. */
  private void column(int s, int c, double[] into) {
    sums(s, c + 1);
    double scale = 2.0 / samples;
    double real = c == 0 ? 0 : c == 1 ? kernel.transferRe : -kernel.transferIm;
    double imaginary = c == 0 ? 0 : c == 1 ? kernel.transferIm : kernel.transferRe;
    phasors(scale * stepRe, scale * stepIm, scale * stepQr, scale * stepQi, real, imaginary);
    into[c] = stepSum / samples + (c == 0 ? kernel.siemens : 0);
    into[COLUMNS + c] = phasorRe;
    into[2 * COLUMNS + c] = phasorIm;
    into[3 * COLUMNS + c] = storedRe;
    into[4 * COLUMNS + c] = storedIm;
  }

  /**
   * Takes the step that {@link #linearise} found, with changes of v and E.
   *
   * @return the largest change of a voltage
   */
  double move(int s, double byV, double byRe, double byIm, double[] u, int at) {
    double[] cosine = kernel.cosine();
    double[] sine = kernel.sine();
    double[] off = residuals[s];
    double real = kernel.transferRe * byRe - kernel.transferIm * byIm;
    double imaginary = kernel.transferRe * byIm + kernel.transferIm * byRe;
    for (int k = 0; k < work.length; k++) {
      work[k] = off[k] + imaginary * sine[k] - real * cosine[k] - byV;
    }
    double[][] answer = answers[s];
    for (int p = 0; p < actives[s]; p++) {
      double d = answer[0][p] - byV * answer[1][p] - byRe * answer[2][p] - byIm * answer[3][p];
      amounts[p] = -activeSlope[s][p] * d;
      chargeAmounts[p] = -activeFarads[s][p] * d;
    }
    kernel.addCurrents(active[s], amounts, actives[s], work);
    if (charged) {
      kernel.addCharges(active[s], chargeAmounts, actives[s], work);
    }
    double largest = 0;
    for (int k = 0; k < samples; k++) {
      double from = u[at + k];
      double to = law.limited(from, from - work[k]);
      u[at + k] = to;
      largest = Math.max(largest, Math.abs(to - from));
    }
    return largest;
  }
}
