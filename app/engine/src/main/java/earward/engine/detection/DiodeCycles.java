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

  /** Change of a voltage over n·Vt up to which a series is as good as the law. */
  private static final double SERIES = 1e-3;

  private static final double LEAST_PIVOT = 1e-9;

  /** Right-hand sides: the residual, and one volt of v, of E real and of E imaginary. */
  private static final int SIDES = 4;

  /** An untuned feed holds E. */
  private static final int SIDES_OF_UNTUNED = 2;

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
  private boolean tuned;

  /**
   * Voltages where all was worked out in full, and what stood there: current, charge, capacitance
   * and its first two derivatives, the charge and capacitance less what the kernel has taken over.
   */
  private final double[][] volts;

  private final double[][] current;
  private final double[][] charge;
  private final double[][] capacitance;
  private final double[][] bend;
  private final double[][] curve;

  /** Currents and charges where the cycle stands now. */
  private final double[] nowCurrent;

  private final double[] nowCharge;
  private final double[] work;
  private final int[] all;
  private final int[][] some;
  private final int[] conducting;
  private final double[] amounts;
  private final double[] chargeAmounts;

  /** What one sample of the audio leaves for its step. */
  private final double[][] residuals;

  private final int[][] active;
  private final int[] actives;
  private final double[][] activeSlope;
  private final double[][] activeFarads;
  private final double[][][] answers;

  /** The factors of each sample's matrix, its right-hand sides beside it. */
  private final double[][][] factors;

  private double driveRe;
  private double driveIm;
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
    volts = new double[audioSamples][samples];
    current = new double[audioSamples][samples];
    charge = new double[audioSamples][samples];
    capacitance = new double[audioSamples][samples];
    bend = new double[audioSamples][samples];
    curve = new double[audioSamples][samples];
    nowCurrent = new double[samples];
    nowCharge = new double[samples];
    work = new double[samples];
    all = new int[samples];
    for (int s = 0; s < samples; s++) {
      all[s] = s;
    }
    some = new int[audioSamples][samples];
    conducting = new int[audioSamples];
    amounts = new double[samples];
    chargeAmounts = new double[samples];
    residuals = new double[audioSamples][samples];
    active = new int[audioSamples][samples];
    actives = new int[audioSamples];
    activeSlope = new double[audioSamples][samples];
    activeFarads = new double[audioSamples][samples];
    answers = new double[audioSamples][SIDES][samples];
    factors = new double[audioSamples][samples][samples + SIDES];
  }

  /**
   * Takes in surroundings and law.
   *
   * @param mean voltage across the junction, about which its capacitance is taken over
   * @param again whether the law and what was linearised are those of the last time
   */
  void prepare(CarrierSurroundings around, JunctionLaw junction, double mean, boolean again) {
    law = junction;
    charged = law.charged();
    tuned = around.tuned;
    radians = around.carrierRadians;
    throughRe = around.transferReal[0];
    throughIm = around.transferImaginary[0];
    double taken = charged ? law.capacitance(mean) : 0;
    kernel.prepare(around, law.leakageSiemens(), again ? kernel.farads : taken);
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
    if (!evaluate(s, u, at)) {
      return false;
    }
    residual(s, v, feedRe, feedIm, u, at);
    choose(s);
    if (!eliminate(s)) {
      return false;
    }
    base(s, v);
    for (int c = 0; c < (tuned ? COLUMNS : 1); c++) {
      column(s, c, into);
    }
    return true;
  }

  /**
   * The same near where the cycle was last linearised: currents and charges by their series, the
   * step by the factors of that time; all slopes stay.
   *
   * @return false where it is too far away for that
   */
  boolean follow(int s, double v, double feedRe, double feedIm, double[] u, int at) {
    if (!series(s, u, at)) {
      return false;
    }
    residual(s, v, feedRe, feedIm, u, at);
    substitute(s);
    base(s, v);
    return true;
  }

  private void residual(int s, double v, double feedRe, double feedIm, double[] u, int at) {
    double[] off = residuals[s];
    driveRe = kernel.transferRe * feedRe - kernel.transferIm * feedIm;
    driveIm = kernel.transferRe * feedIm + kernel.transferIm * feedRe;
    drive(u, at, v, driveRe, driveIm, off);
    int[] which = some[s];
    for (int k = 0; k < conducting[s]; k++) {
      amounts[k] = nowCurrent[which[k]];
    }
    kernel.addCurrents(which, amounts, conducting[s], off);
    if (charged) {
      kernel.addCharges(all, nowCharge, samples, off);
    }
  }

  /** Currents, charges and their slopes, less what the kernel has taken over. */
  private boolean evaluate(int s, double[] u, int at) {
    double inverse = 1 / law.scaledThermalVolts();
    double saturation = law.saturationAmperes();
    double lowest = law.leastVolts();
    double[] amperes = current[s];
    int count = 0;
    System.arraycopy(u, at, volts[s], 0, samples);
    for (int k = 0; k < samples; k++) {
      double exponent = u[at + k] * inverse;
      if (!(exponent < PortLaw.MOST_EXPONENT) || u[at + k] < lowest) {
        return false;
      }
      double grown = exponent < NO_EXPONENT ? 0 : saturation * Math.exp(exponent);
      amperes[k] = grown;
      nowCurrent[k] = grown;
      if (grown * kernel.currentReach > NOTHING) {
        some[s][count++] = k;
      }
    }
    conducting[s] = count;
    if (charged) {
      double taken = kernel.farads;
      for (int k = 0; k < samples; k++) {
        double here = u[at + k];
        law.charges(here);
        charge[s][k] = law.coulombs - taken * here;
        nowCharge[k] = charge[s][k];
        capacitance[s][k] = law.farads - taken;
        bend[s][k] = law.faradsByVolt(here);
        curve[s][k] = law.faradsByVoltSquared(here, bend[s][k]);
      }
    }
    return true;
  }

  /** Currents and charges by their series about the last evaluation, to the fourth order. */
  private boolean series(int s, double[] u, int at) {
    double inverse = 1 / law.scaledThermalVolts();
    double[] from = volts[s];
    double most = 0;
    for (int k = 0; k < from.length; k++) {
      work[k] = u[at + k] - from[k];
    }
    for (int k = 0; k < from.length; k++) {
      most = Math.max(most, Math.abs(work[k]));
    }
    if (!(most < SERIES * law.scaledThermalVolts())) {
      return false;
    }
    byExponent(work, inverse, current[s], nowCurrent);
    if (charged) {
      byCharge(work, charge[s], capacitance[s], bend[s], curve[s], nowCharge);
    }
    return true;
  }

  private static void byExponent(double[] by, double inverse, double[] from, double[] into) {
    for (int k = 0; k < into.length; k++) {
      double d = by[k] * inverse;
      into[k] = from[k] + from[k] * d * (1 + d * (1.0 / 2 + d * (1.0 / 6 + d * (1.0 / 24))));
    }
  }

  private static void byCharge(
      double[] by, double[] from, double[] first, double[] second, double[] third, double[] into) {
    for (int k = 0; k < into.length; k++) {
      double d = by[k];
      into[k] = from[k] + d * (first[k] + d * (second[k] / 2 + d * third[k] / 6));
    }
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
    double inverse = 1 / law.scaledThermalVolts();
    int count = 0;
    for (int k = 0; k < samples; k++) {
      double slope = current[s][k] * inverse;
      double rest = charged ? capacitance[s][k] : 0;
      if (slope * kernel.currentReach > FAINT
          || Math.abs(rest) * kernel.chargeReach > FAINT_CHARGE) {
        active[s][count] = k;
        activeSlope[s][count] = slope;
        activeFarads[s][count++] = rest;
      }
    }
    actives[s] = count;
  }

  /**
   * Solves (1 + Z′·g)·d = side for all sides. The network is passive and the slopes are above 0, so
   * that the pivots need no search.
   */
  private boolean eliminate(int s) {
    fill(s);
    int n = actives[s];
    int width = n + (tuned ? SIDES : SIDES_OF_UNTUNED);
    double[][] rows = factors[s];
    for (int k = 0; k < n; k += 2) {
      double[] first = rows[k];
      if (!(Math.abs(first[k]) > LEAST_PIVOT)) {
        return false;
      }
      double inverse = 1 / first[k];
      if (k + 1 == n) {
        break;
      }
      double[] second = rows[k + 1];
      second[k] *= inverse;
      subtract(second, first, second[k], k + 1, width);
      if (!(Math.abs(second[k + 1]) > LEAST_PIVOT)) {
        return false;
      }
      double inverseOfNext = 1 / second[k + 1];
      for (int p = k + 2; p < n; p++) {
        double[] row = rows[p];
        double one = row[k] * inverse;
        double other = (row[k + 1] - one * first[k + 1]) * inverseOfNext;
        row[k] = one;
        row[k + 1] = other;
        subtract(row, first, one, second, other, k + 2, width);
      }
    }
    back(s, n);
    return true;
  }

  private void fill(int s) {
    int n = actives[s];
    int[] at = active[s];
    double[] g = activeSlope[s];
    double[] c = activeFarads[s];
    double[] cosine = kernel.cosine();
    double[] sine = kernel.sine();
    double tr = kernel.transferRe;
    double ti = kernel.transferIm;
    double[][] rows = factors[s];
    boolean stores = false;
    for (int q = 0; q < n; q++) {
      stores |= c[q] != 0;
    }
    for (int p = 0; p < n; p++) {
      kernel.answers(at, n, at[p], g, rows[p]);
      if (stores) {
        kernel.addChargeAnswers(at, n, at[p], c, rows[p]);
      }
    }
    for (int p = 0; p < n; p++) {
      double[] row = rows[p];
      row[p] += 1;
      row[n] = residuals[s][at[p]];
      row[n + 1] = 1;
      if (tuned) {
        row[n + 2] = tr * cosine[at[p]] - ti * sine[at[p]];
        row[n + 3] = -ti * cosine[at[p]] - tr * sine[at[p]];
      }
    }
  }

  /** The answer to the residual alone, by the factors that stand. */
  private void substitute(int s) {
    int n = actives[s];
    double[] d = answers[s][0];
    double[][] rows = factors[s];
    for (int p = 0; p < n; p++) {
      double[] row = rows[p];
      double sum = residuals[s][active[s][p]];
      for (int j = 0; j < p; j++) {
        sum -= row[j] * d[j];
      }
      d[p] = sum;
    }
    for (int p = n - 1; p >= 0; p--) {
      double[] row = rows[p];
      double sum = d[p];
      for (int j = p + 1; j < n; j++) {
        sum -= row[j] * d[j];
      }
      d[p] = sum / row[p];
    }
  }

  private static void subtract(double[] row, double[] pivot, double factor, int from, int to) {
    for (int j = from; j < to; j++) {
      row[j] -= factor * pivot[j];
    }
  }

  private static void subtract(
      double[] row,
      double[] first,
      double byFirst,
      double[] second,
      double bySecond,
      int from,
      int to) {
    for (int j = from; j < to; j++) {
      row[j] -= byFirst * first[j] + bySecond * second[j];
    }
  }

  private void back(int s, int n) {
    if (!tuned) {
      backOfUntuned(s, n);
      return;
    }
    double[] first = answers[s][0];
    double[] second = answers[s][1];
    double[] third = answers[s][2];
    double[] fourth = answers[s][3];
    for (int p = n - 1; p >= 0; p--) {
      double[] row = factors[s][p];
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

  private void backOfUntuned(int s, int n) {
    double[] first = answers[s][0];
    double[] second = answers[s][1];
    for (int p = n - 1; p >= 0; p--) {
      double[] row = factors[s][p];
      double a = row[n];
      double b = row[n + 1];
      for (int j = p + 1; j < n; j++) {
        a -= row[j] * first[j];
        b -= row[j] * second[j];
      }
      double inverse = 1 / row[p];
      first[p] = a * inverse;
      second[p] = b * inverse;
    }
  }

  /** Means and phasors as the step leaves them; {@code amounts} holds what conducts. */
  private void base(int s, double v) {
    double[] cosine = kernel.cosine();
    double[] sine = kernel.sine();
    double sum = 0;
    double ir = 0;
    double ii = 0;
    for (int k = 0; k < conducting[s]; k++) {
      double amperes = amounts[k];
      sum += amperes;
      ir += amperes * cosine[some[s][k]];
      ii -= amperes * sine[some[s][k]];
    }
    double qr = 0;
    double qi = 0;
    if (charged) {
      for (int k = 0; k < samples; k++) {
        qr += nowCharge[k] * cosine[k];
        qi -= nowCharge[k] * sine[k];
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
        driveRe,
        driveIm);
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
    double knee = law.gentleVolts();
    for (int k = 0; k < samples; k++) {
      double from = u[at + k];
      double to = from - work[k];
      if (to - from > knee) {
        to = law.limited(from, to);
      }
      u[at + k] = to;
      largest = Math.max(largest, Math.abs(to - from));
    }
    return largest;
  }
}
