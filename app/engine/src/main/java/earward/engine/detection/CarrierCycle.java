package earward.engine.detection;

/**
 * One carrier cycle of the devices' N ports at one instant of the audio:
 *
 * <pre>u(θ) = Re{ T·E·e^jθ − Σ_{k≥1} Z(k·ωc)·i_k·e^jkθ } + v,  i = Id(u) + ωc·dQ(u)/dθ</pre>
 *
 * <p>solved by Newton on equally spaced samples of the cycle. A device that is cut off adds nothing
 * to the equations but its residual, so only the columns of samples that conduct are eliminated.
 * Gives mean currents J, the fundamental drawn from the feed, and both's slopes to v and E by the
 * implicit function theorem. Source: generalised averaging, Sanders et al. 1991; mean and
 * fundamental of an exponential diode, Clarke and Hess 1971. One a thread; allocates nothing after
 * construction.
 */
final class CarrierCycle {
  private static final int MOST_ITERATIONS = 80;

  /** Iterations after which every column is eliminated, whatever it adds. */
  private static final int PATIENCE = 14;

  /** What a column may add, in volts per volt, and yet be left out of the elimination. */
  private static final double FAINT = 3e-3;

  private static final double FAINT_CHARGE = 0.05;
  private static final double NOTHING = 1e-11;

  final int ports;
  final int samples;
  final int harmonics;
  private final int unknowns;
  private final CarrierKernel kernel;
  private PortLaw[] laws = new PortLaw[0];

  /** The other port of a port's device, −1 for a device of one port. */
  private final int[] partner;

  private final double[] current;

  /** Slope of a port's current by its own voltage, and of its partner's current by it. */
  private final double[] own;

  private final double[] across;
  private final double[] charge;
  private final double[] capacitance;
  private final double[] drive;
  private final double[] step;
  private final double[] side;
  private final double[] changed;
  private final double[] moved;
  private final int[] active;
  private final double[] reduced;

  /** What each active column adds to all rows, column after column. */
  private final double[] answers;

  private int actives;
  private final DenseSolver solver;
  private boolean charged;

  /** Mean current of each port. */
  final double[] mean;

  /** Harmonics k ≥ 1 of each port's current, index k·ports + port. */
  final double[] harmonicReal;

  final double[] harmonicImaginary;

  /** Fundamental drawn from the feed by the devices. */
  double drawnReal;

  double drawnImaginary;

  /** Fundamental of the devices' charges as the feed sees it, in C. */
  double storedReal;

  double storedImaginary;

  /**
   * Slopes of (mean 0.., drawn real, drawn imaginary) to (v 0.., E real, E imaginary), row after
   * row with N + 2 columns.
   */
  final double[] slopes;

  /**
   * Room for a cycle.
   *
   * @param samples a power of two
   */
  CarrierCycle(int ports, int samples) {
    this.ports = ports;
    this.samples = samples;
    this.harmonics = samples / 2 - 1;
    this.unknowns = ports * samples;
    kernel = new CarrierKernel(ports, samples, harmonics);
    partner = new int[ports];
    current = new double[unknowns];
    own = new double[unknowns];
    across = new double[unknowns];
    charge = new double[unknowns];
    capacitance = new double[unknowns];
    drive = new double[unknowns];
    step = new double[unknowns];
    side = new double[unknowns];
    changed = new double[unknowns];
    moved = new double[unknowns];
    active = new int[unknowns];
    reduced = new double[unknowns];
    answers = new double[unknowns * unknowns];
    solver = new DenseSolver(unknowns);
    mean = new double[ports];
    harmonicReal = new double[(harmonics + 1) * ports];
    harmonicImaginary = new double[(harmonics + 1) * ports];
    slopes = new double[(ports + 2) * (ports + 2)];
  }

  /** Takes in surroundings whose carrier matrices have changed. */
  void prepare(CarrierSurroundings around, PortLaw[] devices) {
    laws = devices;
    charged = false;
    int port = 0;
    for (PortLaw law : laws) {
      charged |= law.charged();
      partner[port] = law.ports() == 2 ? port + 1 : -1;
      if (law.ports() == 2) {
        partner[port + 1] = port;
      }
      port += law.ports();
    }
    kernel.prepare(around);
  }

  /**
   * Solves one cycle.
   *
   * @param v audio-rate port voltages, from an offset with a stride
   * @param u port voltages in and out, from an offset: the start and the solution
   * @return whether it converged
   */
  boolean solve(
      CarrierSurroundings around,
      double[] v,
      int offset,
      int stride,
      double feedReal,
      double feedImaginary,
      double[] u,
      int at) {
    setDrive(around, v, offset, stride, feedReal, feedImaginary);
    double enough = 1e-10 + 1e-9 * Math.hypot(feedReal, feedImaginary);
    boolean done = false;
    for (int iteration = 0; iteration < MOST_ITERATIONS && !done; iteration++) {
      evaluate(u, at);
      residual(u, at);
      assemble(iteration > PATIENCE);
      if (!solver.factor()) {
        return false;
      }
      reduce(step);
      double largest = take(u, at, step);
      if (!(largest < 1e6)) {
        return false;
      }
      done = largest < enough;
    }
    if (done) {
      evaluate(u, at);
      results(around);
      slopes(around, side, 0, false);
    }
    return done;
  }

  /**
   * One step of Newton's method, found but not taken: means, fundamental and slopes as the step
   * would leave them, to first order. What the step is, and what each of v 0.., E real and E
   * imaginary adds to it, goes into rows of the caller's, to be taken by {@link #move}.
   *
   * @return whether the step exists
   */
  boolean linearise(
      CarrierSurroundings around,
      double[] v,
      int offset,
      int stride,
      double feedReal,
      double feedImaginary,
      double[] u,
      int at,
      double[] rows,
      int row) {
    setDrive(around, v, offset, stride, feedReal, feedImaginary);
    evaluate(u, at);
    residual(u, at);
    assemble(false);
    if (!solver.factor()) {
      return false;
    }
    reduce(step);
    System.arraycopy(step, 0, rows, row, unknowns);
    answer(step);
    for (int i = 0; i < unknowns; i++) {
      current[i] -= changed[i];
      charge[i] -= moved[i];
    }
    results(around);
    slopes(around, rows, row + unknowns, true);
    return true;
  }

  /** How many numbers {@link #linearise} leaves for one sample. */
  int rowLength() {
    return (ports + 3) * unknowns;
  }

  /**
   * Takes a step that {@link #linearise} left, with the changes of v and E that belong to it; all
   * steps are downhill, to be subtracted.
   *
   * @return the largest change of a voltage
   */
  double move(double[] u, int at, double[] rows, int row, double[] changes, int of, int stride) {
    System.arraycopy(rows, row, step, 0, unknowns);
    for (int c = 0; c < ports + 2; c++) {
      double change = of + c * stride < changes.length ? changes[of + c * stride] : 0;
      int from = row + (c + 1) * unknowns;
      for (int i = 0; i < unknowns && change != 0; i++) {
        step[i] += rows[from + i] * change;
      }
    }
    return take(u, at, step);
  }

  /** Fills the slopes at a solved cycle with every column in place. */
  boolean exactSlopes(CarrierSurroundings around, double[] u, int at) {
    evaluate(u, at);
    assemble(true);
    if (!solver.factor()) {
      return false;
    }
    slopes(around, side, 0, false);
    return true;
  }

  private void setDrive(
      CarrierSurroundings around,
      double[] v,
      int offset,
      int stride,
      double feedReal,
      double feedImaginary) {
    for (int p = 0; p < ports; p++) {
      double real = around.transferReal[p] * feedReal - around.transferImaginary[p] * feedImaginary;
      double imaginary =
          around.transferReal[p] * feedImaginary + around.transferImaginary[p] * feedReal;
      double port = v[offset + p * stride];
      for (int s = 0; s < samples; s++) {
        drive[p * samples + s] = real * kernel.cosine(s) - imaginary * kernel.sine(s) + port;
      }
    }
  }

  private void evaluate(double[] u, int at) {
    int first = 0;
    for (PortLaw law : laws) {
      if (law.ports() == 1) {
        one(law, u, at, first * samples);
      } else {
        two(law, u, at, first * samples);
      }
      first += law.ports();
    }
  }

  private void one(PortLaw law, double[] u, int at, int from) {
    boolean stores = law.charged();
    for (int i = from; i < from + samples; i++) {
      law.currents(u[at + i], 0);
      current[i] = law.firstAmperes;
      own[i] = law.firstByFirst;
      if (stores) {
        law.charges(u[at + i]);
        charge[i] = law.coulombs;
        capacitance[i] = law.farads;
      }
    }
  }

  private void two(PortLaw law, double[] u, int at, int from) {
    for (int i = from; i < from + samples; i++) {
      int other = i + samples;
      law.currents(u[at + i], u[at + other]);
      current[i] = law.firstAmperes;
      current[other] = law.secondAmperes;
      own[i] = law.firstByFirst;
      own[other] = law.secondBySecond;
      across[i] = law.secondByFirst;
      across[other] = law.firstBySecond;
    }
  }

  private void residual(double[] u, int at) {
    for (int i = 0; i < unknowns; i++) {
      step[i] = u[at + i] - drive[i];
    }
    kernel.addCurrents(current, step, 1);
    if (charged) {
      kernel.addCharges(charge, step, 1);
    }
  }

  /** The matrix of Newton's step, of the columns that add anything. */
  private void assemble(boolean every) {
    double faint = every ? NOTHING : FAINT;
    double faintCharge = every ? NOTHING : FAINT_CHARGE;
    actives = 0;
    for (int p = 0; p < ports; p++) {
      double most = kernel.currentReach(p);
      double other = partner[p] < 0 ? 0 : kernel.currentReach(partner[p]);
      for (int i = p * samples; i < (p + 1) * samples; i++) {
        if (Math.abs(own[i]) * most + Math.abs(across[i]) * other > faint
            || (charged && capacitance[i] * kernel.chargeReach(p) > faintCharge)) {
          active[actives++] = i;
        }
      }
    }
    solver.begin(actives);
    for (int c = 0; c < actives; c++) {
      column(c, active[c]);
    }
  }

  private void column(int c, int column) {
    int j = column / samples;
    int r = column - j * samples;
    int other = partner[j];
    double direct = own[column];
    double crossed = other < 0 ? 0 : across[column];
    double stored = charged ? capacitance[column] : 0;
    for (int i = 0; i < ports; i++) {
      kernel.column(i, j, r, direct, stored, answers, c * unknowns + i * samples, true);
      if (other >= 0) {
        kernel.column(i, other, r, crossed, 0, answers, c * unknowns + i * samples, false);
      }
    }
    for (int k = 0; k < actives; k++) {
      solver.matrix[k * actives + c] = answers[c * unknowns + active[k]];
    }
    solver.matrix[c * actives + c] += 1;
  }

  /**
   * Replaces a right side by its solution: the active samples first, the others by what they do.
   */
  private void reduce(double[] values) {
    for (int k = 0; k < actives; k++) {
      reduced[k] = values[active[k]];
    }
    solver.solve(reduced, 0);
    if (actives < unknowns) {
      for (int k = 0; k < actives; k++) {
        double volts = reduced[k];
        int from = k * unknowns;
        for (int i = 0; i < unknowns; i++) {
          values[i] -= answers[from + i] * volts;
        }
      }
    }
    for (int k = 0; k < actives; k++) {
      values[active[k]] = reduced[k];
    }
  }

  /** Takes a step; returns the largest change. */
  private double take(double[] u, int at, double[] by) {
    double largest = 0;
    int port = 0;
    for (PortLaw law : laws) {
      for (int k = 0; k < law.ports(); k++) {
        for (int i = port * samples; i < (port + 1) * samples; i++) {
          double from = u[at + i];
          double to = law.limited(k, from, from - by[i]);
          u[at + i] = to;
          largest = Math.max(largest, Math.abs(to - from));
        }
        port++;
      }
    }
    return largest;
  }

  private void results(CarrierSurroundings around) {
    drawnReal = 0;
    drawnImaginary = 0;
    storedReal = 0;
    storedImaginary = 0;
    for (int p = 0; p < ports; p++) {
      if (charged) {
        double re = 2.0 / samples * component(charge, p, 1, true);
        double im = 2.0 / samples * component(charge, p, 1, false);
        storedReal += around.transferReal[p] * re - around.transferImaginary[p] * im;
        storedImaginary += around.transferReal[p] * im + around.transferImaginary[p] * re;
      }
      mean[p] = transform(current, charge, p, 0, 0, true);
      double real = transform(current, charge, p, 1, around.carrierRadians, true);
      double imaginary = transform(current, charge, p, 1, around.carrierRadians, false);
      drawnReal += around.transferReal[p] * real - around.transferImaginary[p] * imaginary;
      drawnImaginary += around.transferReal[p] * imaginary + around.transferImaginary[p] * real;
    }
  }

  /** Fills the harmonics of the currents at a solved cycle, up to one of them. */
  void harmonics(CarrierSurroundings around, double[] u, int at, int most) {
    evaluate(u, at);
    for (int k = 1; k <= Math.min(most, harmonics); k++) {
      for (int p = 0; p < ports; p++) {
        int entry = k * ports + p;
        harmonicReal[entry] = transform(current, charge, p, k, around.carrierRadians, true);
        harmonicImaginary[entry] = transform(current, charge, p, k, around.carrierRadians, false);
      }
    }
  }

  /**
   * The largest difference of a port's mean current between the samples of a solved cycle and the
   * points half-way between them, in A. The voltages hold no harmonic that the samples do not
   * resolve, so that they are known between them too.
   */
  double aliasing(double[] u, int at) {
    evaluate(u, at);
    for (int p = 0; p < ports; p++) {
      mean[p] = component(current, p, 0, true) / samples;
      between(u, at, p);
    }
    evaluate(step, 0);
    double largest = 0;
    for (int p = 0; p < ports; p++) {
      double half = component(current, p, 0, true) / samples;
      largest = Math.max(largest, Math.abs(half - mean[p]) / 2);
    }
    return largest;
  }

  /** A port's voltages half-way between the samples, into {@link #step}. */
  private void between(double[] u, int at, int p) {
    int mask = samples - 1;
    int from = p * samples;
    double half = Math.PI / samples;
    java.util.Arrays.fill(step, from, from + samples, 0);
    for (int k = 0; k <= harmonics; k++) {
      double re = 0;
      double im = 0;
      for (int s = 0; s < samples; s++) {
        re += u[at + from + s] * kernel.cosine((k * s) & mask);
        im -= u[at + from + s] * kernel.sine((k * s) & mask);
      }
      double scale = (k == 0 ? 1.0 : 2.0) / samples;
      double turnedRe = scale * (re * Math.cos(k * half) - im * Math.sin(k * half));
      double turnedIm = scale * (re * Math.sin(k * half) + im * Math.cos(k * half));
      for (int s = 0; s < samples; s++) {
        step[from + s] +=
            turnedRe * kernel.cosine((k * s) & mask) - turnedIm * kernel.sine((k * s) & mask);
      }
    }
  }

  /**
   * The slopes: one more right-hand side for each of v 0.., E real, E imaginary.
   *
   * @param rows takes the answers of all voltages, one after the other if they are kept
   */
  private void slopes(CarrierSurroundings around, double[] rows, int first, boolean kept) {
    int columns = ports + 2;
    for (int column = 0; column < columns; column++) {
      for (int p = 0; p < ports; p++) {
        for (int s = 0; s < samples; s++) {
          side[p * samples + s] = push(around, column, p, s);
        }
      }
      reduce(side);
      answer(side);
      if (kept) {
        System.arraycopy(side, 0, rows, first + column * unknowns, unknowns);
      }
      double real = 0;
      double imaginary = 0;
      for (int p = 0; p < ports; p++) {
        slopes[p * columns + column] = transform(changed, moved, p, 0, 0, true);
        double re = transform(changed, moved, p, 1, around.carrierRadians, true);
        double im = transform(changed, moved, p, 1, around.carrierRadians, false);
        real += around.transferReal[p] * re - around.transferImaginary[p] * im;
        imaginary += around.transferReal[p] * im + around.transferImaginary[p] * re;
      }
      slopes[ports * columns + column] = real;
      slopes[(ports + 1) * columns + column] = imaginary;
    }
  }

  /** What changes of all voltages change in currents and charges. */
  private void answer(double[] volts) {
    for (int p = 0; p < ports; p++) {
      int other = partner[p];
      for (int s = 0; s < samples; s++) {
        int i = p * samples + s;
        changed[i] = own[i] * volts[i];
        if (other >= 0) {
          changed[i] += across[other * samples + s] * volts[other * samples + s];
        }
        moved[i] = charged ? capacitance[i] * volts[i] : 0;
      }
    }
  }

  private double push(CarrierSurroundings around, int column, int p, int s) {
    if (column < ports) {
      return column == p ? 1 : 0;
    }
    double real = around.transferReal[p];
    double imaginary = around.transferImaginary[p];
    return column == ports
        ? real * kernel.cosine(s) - imaginary * kernel.sine(s)
        : -imaginary * kernel.cosine(s) - real * kernel.sine(s);
  }

  /** Harmonic k of a port's current: of its conduction, and j·k·ωc times that of its charge. */
  private double transform(
      double[] conduction, double[] stored, int p, int k, double radians, boolean real) {
    double value = component(conduction, p, k, real);
    if (charged && k > 0) {
      double turned = component(stored, p, k, !real);
      value += (real ? -1 : 1) * k * radians * turned;
    }
    return (k == 0 ? 1.0 : 2.0) / samples * value;
  }

  private double component(double[] values, int p, int k, boolean real) {
    int mask = samples - 1;
    int from = p * samples;
    double sum = 0;
    for (int s = 0; s < samples; s++) {
      int turn = (k * s) & mask;
      sum += values[from + s] * (real ? kernel.cosine(turn) : -kernel.sine(turn));
    }
    return sum;
  }
}
