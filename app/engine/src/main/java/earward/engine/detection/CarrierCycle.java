package earward.engine.detection;

/**
 * One carrier cycle of N devices at one instant of the audio:
 *
 * <pre>u(θ) = Re{ T·E·e^jθ − Σ_{k≥1} Z(k·ωc)·i_k·e^jkθ } + v,  i = Id(u) + ωc·dQ(u)/dθ</pre>
 *
 * <p>solved by Newton on equally spaced samples of the cycle. On samples the sum over harmonics is
 * a circular convolution of the currents with the network's impulse response. Gives mean currents
 * J, the fundamental drawn from the feed, and both's slopes to v and E by the implicit function
 * theorem. Source: generalised averaging, Sanders et al. 1991; mean and fundamental of an
 * exponential diode, Clarke and Hess 1971. One a thread; allocates nothing after construction.
 */
final class CarrierCycle {
  private static final int MOST_ITERATIONS = 80;

  final int devices;
  final int samples;
  final int harmonics;
  private final int unknowns;

  private final double[] cosine;
  private final double[] sine;

  /** Impulse responses (ohms) to current and to charge, 2·samples long per pair of devices. */
  private final double[] toCurrent;

  private final double[] toCharge;

  private final double[] current;
  private final double[] conductance;
  private final double[] charge;
  private final double[] capacitance;
  private final double[] drive;
  private final double[] step;
  private final double[] sensitivity;
  private final DenseSolver solver;
  private boolean charged;

  /** Mean current of each device. */
  final double[] mean;

  /** Harmonics k ≥ 1 of each device's current, index k·devices + device. */
  final double[] harmonicReal;

  final double[] harmonicImaginary;

  /** Fundamental drawn from the feed, load of the linear network included. */
  double drawnReal;

  double drawnImaginary;

  /**
   * Slopes of (mean 0.., drawn real, drawn imaginary) to (v 0.., E real, E imaginary), row after
   * row with N + 2 columns.
   */
  final double[] slopes;

  CarrierCycle(int devices, int samples) {
    this.devices = devices;
    this.samples = samples;
    this.harmonics = samples / 2 - 1;
    this.unknowns = devices * samples;
    cosine = new double[samples];
    sine = new double[samples];
    for (int s = 0; s < samples; s++) {
      cosine[s] = Math.cos(2 * Math.PI * s / samples);
      sine[s] = Math.sin(2 * Math.PI * s / samples);
    }
    toCurrent = new double[devices * devices * 2 * samples];
    toCharge = new double[devices * devices * 2 * samples];
    current = new double[unknowns];
    conductance = new double[unknowns];
    charge = new double[unknowns];
    capacitance = new double[unknowns];
    drive = new double[unknowns];
    step = new double[unknowns];
    sensitivity = new double[(devices + 2) * unknowns];
    solver = new DenseSolver(unknowns);
    mean = new double[devices];
    harmonicReal = new double[(harmonics + 1) * devices];
    harmonicImaginary = new double[(harmonics + 1) * devices];
    slopes = new double[(devices + 2) * (devices + 2)];
  }

  /** Takes in surroundings whose carrier matrices have changed. */
  void prepare(CarrierSurroundings around, JunctionLaw[] laws) {
    charged = false;
    for (JunctionLaw law : laws) {
      charged |= law.charged();
    }
    for (int i = 0; i < devices; i++) {
      for (int j = 0; j < devices; j++) {
        prepare(around, i, j);
      }
    }
  }

  private void prepare(CarrierSurroundings around, int i, int j) {
    double own = i == j ? around.seriesOhms[i] : 0;
    int base = (i * devices + j) * 2 * samples;
    for (int q = 0; q < samples; q++) {
      double ohms = 0;
      double ohmsPerSecond = 0;
      for (int k = 1; k <= harmonics; k++) {
        int entry = around.index(k, i, j);
        double real = around.carrierRealOhms[entry] + own;
        double imaginary = around.carrierImaginaryOhms[entry];
        double c = cosine[(k * q) % samples];
        double s = sine[(k * q) % samples];
        ohms += real * c - imaginary * s;
        ohmsPerSecond += k * around.carrierRadians * (-imaginary * c - real * s);
      }
      toCurrent[base + q] = 2 * ohms / samples;
      toCharge[base + q] = 2 * ohmsPerSecond / samples;
      toCurrent[base + samples + q] = toCurrent[base + q];
      toCharge[base + samples + q] = toCharge[base + q];
    }
  }

  /**
   * Solves one cycle.
   *
   * @param v audio-rate port voltages, from an offset with a stride
   * @param u junction voltages in and out, from an offset: the start and the solution
   * @return whether it converged
   */
  boolean solve(
      CarrierSurroundings around,
      JunctionLaw[] laws,
      double[] v,
      int offset,
      int stride,
      double feedReal,
      double feedImaginary,
      double[] u,
      int at) {
    setDrive(around, v, offset, stride, feedReal, feedImaginary);
    double size = Math.hypot(feedReal, feedImaginary);
    boolean done = false;
    for (int iteration = 0; iteration < MOST_ITERATIONS && !done; iteration++) {
      evaluate(laws, u, at);
      residual(u, at);
      assemble();
      if (!solver.factor()) {
        return false;
      }
      solver.solve(step, 0);
      double largest = 0;
      for (int d = 0; d < devices; d++) {
        for (int s = d * samples; s < (d + 1) * samples; s++) {
          double from = u[at + s];
          double to = laws[d].limited(from, from - step[s]);
          u[at + s] = to;
          largest = Math.max(largest, Math.abs(to - from));
        }
      }
      if (!(largest < 1e6)) {
        return false;
      }
      done = largest < 1e-9 + 1e-8 * size;
    }
    if (done) {
      evaluate(laws, u, at);
      results(around);
    }
    return done;
  }

  private void setDrive(
      CarrierSurroundings around,
      double[] v,
      int offset,
      int stride,
      double feedReal,
      double feedImaginary) {
    for (int d = 0; d < devices; d++) {
      double real = around.transferReal[d] * feedReal - around.transferImaginary[d] * feedImaginary;
      double imaginary =
          around.transferReal[d] * feedImaginary + around.transferImaginary[d] * feedReal;
      double port = v[offset + d * stride];
      for (int s = 0; s < samples; s++) {
        drive[d * samples + s] = real * cosine[s] - imaginary * sine[s] + port;
      }
    }
  }

  private void evaluate(JunctionLaw[] laws, double[] u, int at) {
    for (int d = 0; d < devices; d++) {
      JunctionLaw law = laws[d];
      for (int s = d * samples; s < (d + 1) * samples; s++) {
        double volts = u[at + s];
        current[s] = law.current(volts);
        conductance[s] = law.conductance(volts);
        if (charged) {
          charge[s] = law.charge(volts);
          capacitance[s] = law.capacitance(volts);
        }
      }
    }
  }

  private void residual(double[] u, int at) {
    for (int i = 0; i < devices; i++) {
      for (int s = 0; s < samples; s++) {
        double sum = u[at + i * samples + s] - drive[i * samples + s];
        for (int j = 0; j < devices; j++) {
          int kernel = (i * devices + j) * 2 * samples + samples + s;
          int first = j * samples;
          for (int r = 0; r < samples; r++) {
            sum += toCurrent[kernel - r] * current[first + r];
          }
          if (charged) {
            for (int r = 0; r < samples; r++) {
              sum += toCharge[kernel - r] * charge[first + r];
            }
          }
        }
        step[i * samples + s] = sum;
      }
    }
  }

  private void assemble() {
    solver.begin(unknowns);
    double[] matrix = solver.matrix;
    for (int i = 0; i < devices; i++) {
      for (int s = 0; s < samples; s++) {
        int row = i * samples + s;
        for (int j = 0; j < devices; j++) {
          int kernel = (i * devices + j) * 2 * samples + samples + s;
          int first = j * samples;
          for (int r = 0; r < samples; r++) {
            double entry = toCurrent[kernel - r] * conductance[first + r];
            if (charged) {
              entry += toCharge[kernel - r] * capacitance[first + r];
            }
            matrix[row * unknowns + first + r] = entry;
          }
        }
        matrix[row * unknowns + row] += 1;
      }
    }
  }

  private void results(CarrierSurroundings around) {
    for (int d = 0; d < devices; d++) {
      mean[d] = transform(current, charge, d, 0, around.carrierRadians, true);
      for (int k = 1; k <= harmonics; k++) {
        harmonicReal[k * devices + d] =
            transform(current, charge, d, k, around.carrierRadians, true);
        harmonicImaginary[k * devices + d] =
            transform(current, charge, d, k, around.carrierRadians, false);
      }
    }
    slopes(around);
    drawnReal = 0;
    drawnImaginary = 0;
    for (int d = 0; d < devices; d++) {
      double real = harmonicReal[devices + d];
      double imaginary = harmonicImaginary[devices + d];
      drawnReal += around.transferReal[d] * real - around.transferImaginary[d] * imaginary;
      drawnImaginary += around.transferReal[d] * imaginary + around.transferImaginary[d] * real;
    }
  }

  /** The slopes: one more right-hand side for each of v 0.., E real, E imaginary. */
  private void slopes(CarrierSurroundings around) {
    int columns = devices + 2;
    for (int column = 0; column < columns; column++) {
      int base = column * unknowns;
      for (int d = 0; d < devices; d++) {
        for (int s = 0; s < samples; s++) {
          sensitivity[base + d * samples + s] = push(around, column, d, s);
        }
      }
      solver.solve(sensitivity, base);
      double real = 0;
      double imaginary = 0;
      for (int d = 0; d < devices; d++) {
        for (int s = d * samples; s < (d + 1) * samples; s++) {
          double volts = sensitivity[base + s];
          step[s] = conductance[s] * volts;
          drive[s] = charged ? capacitance[s] * volts : 0;
        }
        slopes[d * columns + column] = transform(step, drive, d, 0, 0, true);
        double re = transform(step, drive, d, 1, around.carrierRadians, true);
        double im = transform(step, drive, d, 1, around.carrierRadians, false);
        real += around.transferReal[d] * re - around.transferImaginary[d] * im;
        imaginary += around.transferReal[d] * im + around.transferImaginary[d] * re;
      }
      slopes[devices * columns + column] = real;
      slopes[(devices + 1) * columns + column] = imaginary;
    }
  }

  private double push(CarrierSurroundings around, int column, int d, int s) {
    if (column < devices) {
      return column == d ? 1 : 0;
    }
    double real = around.transferReal[d];
    double imaginary = around.transferImaginary[d];
    return column == devices
        ? real * cosine[s] - imaginary * sine[s]
        : -imaginary * cosine[s] - real * sine[s];
  }

  /** Harmonic k of a device's current: of its conduction, and j·k·ωc times that of its charge. */
  private double transform(
      double[] conduction, double[] stored, int d, int k, double radians, boolean real) {
    double re = 0;
    double im = 0;
    double storedRe = 0;
    double storedIm = 0;
    for (int s = 0; s < samples; s++) {
      double c = cosine[(k * s) % samples];
      double w = sine[(k * s) % samples];
      re += conduction[d * samples + s] * c;
      im -= conduction[d * samples + s] * w;
      if (charged && k > 0) {
        storedRe += stored[d * samples + s] * c;
        storedIm -= stored[d * samples + s] * w;
      }
    }
    double scale = (k == 0 ? 1.0 : 2.0) / samples;
    double value = real ? re - k * radians * storedIm : im + k * radians * storedRe;
    return scale * value;
  }
}
