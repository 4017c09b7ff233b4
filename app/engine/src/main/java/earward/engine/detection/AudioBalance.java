package earward.engine.detection;

import java.util.Arrays;

/**
 * The equations of the audio rate on the samples of one audio period: what the ports' mean currents
 * make of the voltages across them, and what the devices draw from a tuned feed makes of its
 * envelope. Unknowns stand one after the other: v of each port, then E real and E imaginary, each
 * {@code count} samples long.
 *
 * <p>The mean of a port between floating capacitors has next to no conductance to anywhere: its
 * impedance at DC is without bounds, and a residual in volts would say nothing. So the balance of
 * the means is multiplied by (1 + Z(0)·g)⁻¹ with a conductance g of the size of a detector's: in
 * volts where the load is a load, in currents over g where there is none.
 */
final class AudioBalance {
  /** g, in siemens. */
  private static final double SCALE_SIEMENS = 1e-5;

  private final int devices;
  private final int blocks;
  private final int samples;
  private final double[] cosine;
  private final double[] sine;
  private final double[] audioKernel;
  private final double[] rateKernel;

  /** The same with a row for each sample that answers, of each pair of devices. */
  private final double[][][] audioRows;

  private final double[][] rateRows;
  private final double[] answer;
  private final double[] heldReal;
  private final double[] heldImaginary;
  private final double[] rateReal;
  private final double[] rateImaginary;

  /** (1 + Z(0)·g)⁻¹ − 1, row after row, and that inverse times Z(0). */
  private final double[] scaling;

  private final double[] scaledOhms;
  private final double[] column;
  private final double[] meanOff;
  private final DenseSolver scaler;
  private int count = 1;

  /** What is left of each equation, in volts. */
  final double[] residual;

  /** The tuned feed's or generator's own envelope. */
  final double[] envelope;

  AudioBalance(int devices, int samples) {
    this.devices = devices;
    this.blocks = devices + 2;
    this.samples = samples;
    cosine = new double[samples];
    sine = new double[samples];
    for (int s = 0; s < samples; s++) {
      cosine[s] = Math.cos(2 * Math.PI * s / samples);
      sine[s] = Math.sin(2 * Math.PI * s / samples);
    }
    audioKernel = new double[devices * devices * 2 * samples];
    rateKernel = new double[2 * samples];
    audioRows = new double[devices * devices][samples][samples];
    rateRows = new double[samples][samples];
    answer = new double[samples];
    heldReal = new double[samples];
    heldImaginary = new double[samples];
    rateReal = new double[samples];
    rateImaginary = new double[samples];
    scaling = new double[devices * devices];
    scaledOhms = new double[devices * devices];
    column = new double[devices];
    meanOff = new double[devices];
    scaler = new DenseSolver(devices);
    residual = new double[blocks * samples];
    envelope = new double[samples];
  }

  /** Takes over surroundings, tone and drive for one sample or all of them. */
  void begin(
      CarrierSurroundings around, double peakVolts, double depth, double toneRadians, int wanted) {
    count = wanted;
    scale(around);
    int top = count == 1 ? 0 : count / 2 - 1;
    int mask = count - 1;
    for (int s = 0; s < count; s++) {
      envelope[s] = peakVolts * (1 + (count == 1 ? depth : depth * cosine[s]));
      double rate = 0;
      for (int h = 1; h <= top; h++) {
        rate -= 2.0 / count * h * toneRadians * sine[(h * s) & mask];
      }
      rateKernel[s] = rate;
      rateKernel[count + s] = rate;
      for (int i = 0; i < devices; i++) {
        for (int j = 0; j < devices; j++) {
          int at = (i * devices + j) * 2 * count;
          audioKernel[at + s] = audioOhms(around, i, j, s, top);
          audioKernel[at + count + s] = audioKernel[at + s];
        }
      }
    }
    spread(rateKernel, 0, rateRows);
    for (int pair = 0; pair < devices * devices; pair++) {
      spread(audioKernel, pair * 2 * count, audioRows[pair]);
    }
  }

  /** Turns an impulse response, twice as long as the period, into a row for each sample. */
  private void spread(double[] kernel, int from, double[][] rows) {
    for (int r = 0; r < count; r++) {
      System.arraycopy(kernel, from + count - r, rows[r], 0, count);
    }
  }

  private void scale(CarrierSurroundings around) {
    scaler.begin(devices);
    for (int i = 0; i < devices; i++) {
      for (int j = 0; j < devices; j++) {
        double ohms = directOhms(around, i, j);
        scaler.matrix[i * devices + j] = (i == j ? 1 : 0) + SCALE_SIEMENS * ohms;
      }
    }
    boolean regular = scaler.factor();
    for (int j = 0; j < devices; j++) {
      for (int i = 0; i < devices; i++) {
        column[i] = directOhms(around, i, j);
      }
      if (regular) {
        scaler.solve(column, 0);
      }
      for (int i = 0; i < devices; i++) {
        scaledOhms[i * devices + j] = column[i];
        // (1 + gZ)⁻¹ − 1 = −g·(1 + gZ)⁻¹·Z
        scaling[i * devices + j] = regular ? -SCALE_SIEMENS * column[i] : 0;
      }
    }
  }

  private static double directOhms(CarrierSurroundings around, int i, int j) {
    return around.audioRealOhms[around.index(0, i, j)] + (i == j ? around.seriesOhms[i] : 0);
  }

  private double audioOhms(CarrierSurroundings around, int i, int j, int q, int top) {
    int mask = count - 1;
    double series = i == j ? around.seriesOhms[i] : 0;
    double own = q == 0 ? series - series / count : -series / count;
    double ohms = scaledOhms[i * devices + j];
    for (int h = 1; h <= top; h++) {
      int turn = (h * q) & mask;
      int entry = around.index(h, i, j);
      ohms +=
          2
              * (around.audioRealOhms[entry] * cosine[turn]
                  - around.audioImaginaryOhms[entry] * sine[turn]);
    }
    return ohms / count + own;
  }

  /**
   * Fills the residuals.
   *
   * @param x the unknowns
   * @param amperes mean currents, index port·count + sample
   * @param drawn from the held node at each sample, real and imaginary in turn
   * @param stored charge on what hangs on the held node, likewise: as the envelope moves, its
   *     fundamental takes a current beside jωc·Q
   * @return the largest, in volts
   */
  double residuals(
      CarrierSurroundings around, double[] x, double[] amperes, double[] drawn, double[] stored) {
    double largest = audio(around, x, amperes);
    return around.tuned ? Math.max(largest, tank(around, x, drawn, stored)) : largest;
  }

  private double audio(CarrierSurroundings around, double[] x, double[] amperes) {
    for (int i = 0; i < devices; i++) {
      double sum = 0;
      for (int s = 0; s < count; s++) {
        residual[i * count + s] = x[i * count + s] - around.openVolts[i];
        sum += residual[i * count + s];
      }
      meanOff[i] = sum / count;
    }
    double largest = 0;
    for (int i = 0; i < devices; i++) {
      double shift = 0;
      Arrays.fill(answer, 0);
      for (int j = 0; j < devices; j++) {
        shift += scaling[i * devices + j] * meanOff[j];
        add(audioRows[i * devices + j], amperes, j * count, answer);
      }
      for (int s = 0; s < count; s++) {
        residual[i * count + s] += shift + answer[s];
        largest = Math.max(largest, Math.abs(residual[i * count + s]));
      }
    }
    return largest;
  }

  /** Adds the answers to values at all samples, four at a time: rows run along the answer. */
  private void add(double[][] rows, double[] values, int from, double[] into) {
    if (count == 1) {
      into[0] += rows[0][0] * values[from];
      return;
    }
    for (int r = 0; r < count; r += 4) {
      add(
          rows[r],
          values[from + r],
          rows[r + 1],
          values[from + r + 1],
          rows[r + 2],
          values[from + r + 2],
          rows[r + 3],
          values[from + r + 3],
          into);
    }
  }

  private static void add(
      double[] a,
      double byA,
      double[] b,
      double byB,
      double[] c,
      double byC,
      double[] d,
      double byD,
      double[] into) {
    for (int s = 0; s < into.length; s++) {
      into[s] += byA * a[s] + byB * b[s] + byC * c[s] + byD * d[s];
    }
  }

  /** The tuned feed's balance, times Rp so that it stands in volts. */
  private double tank(CarrierSurroundings around, double[] x, double[] drawn, double[] stored) {
    double largest = 0;
    double farads = 2 * around.tankFarads;
    double turn = around.peaking ? 0 : farads * around.detuningRadians;
    for (int s = 0; s < count; s++) {
      heldReal[s] = farads * x[devices * count + s] + stored[2 * s];
      heldImaginary[s] = farads * x[(devices + 1) * count + s] + stored[2 * s + 1];
    }
    Arrays.fill(rateReal, 0);
    Arrays.fill(rateImaginary, 0);
    if (count > 1) {
      add(rateRows, heldReal, 0, rateReal);
      add(rateRows, heldImaginary, 0, rateImaginary);
    }
    for (int s = 0; s < count; s++) {
      double real = x[devices * count + s];
      double imaginary = x[(devices + 1) * count + s];
      double first =
          real - envelope[s] + around.tankOhms * (rateReal[s] + drawn[2 * s] - turn * imaginary);
      double second =
          around.peaking
              ? imaginary
              : imaginary + around.tankOhms * (rateImaginary[s] + drawn[2 * s + 1] + turn * real);
      residual[devices * count + s] = first;
      residual[(devices + 1) * count + s] = second;
      largest = Math.max(largest, Math.max(Math.abs(first), Math.abs(second)));
    }
    return largest;
  }

  /** How many unknowns there are. */
  int size(CarrierSurroundings around) {
    return (around.tuned ? blocks : devices) * count;
  }

  /**
   * Fills the matrix of Newton's step.
   *
   * @param slopes of the cycle at each sample, {@code blocks × blocks} each
   */
  void assemble(CarrierSurroundings around, double[] slopes, DenseSolver solver) {
    int used = around.tuned ? blocks : devices;
    int size = used * count;
    solver.begin(size);
    double[] a = solver.matrix;
    for (int i = 0; i < devices; i++) {
      for (int s = 0; s < count; s++) {
        int row = (i * count + s) * size;
        for (int b = 0; b < used; b++) {
          double scaled = b < devices ? scaling[i * devices + b] / count : 0;
          Arrays.fill(a, row + b * count, row + (b + 1) * count, scaled);
          for (int j = 0; j < devices; j++) {
            int kernel = (i * devices + j) * 2 * count + count + s;
            for (int r = 0; r < count; r++) {
              a[row + b * count + r] +=
                  audioKernel[kernel - r] * slopes[(r * blocks + j) * blocks + b];
            }
          }
        }
        a[row + i * count + s] += 1;
      }
    }
    if (around.tuned) {
      assembleTank(around, slopes, solver, size);
    }
  }

  private void assembleTank(
      CarrierSurroundings around, double[] slopes, DenseSolver solver, int size) {
    double[] a = solver.matrix;
    double storing = 2 * around.tankFarads * around.tankOhms;
    double turn = around.peaking ? 0 : storing * around.detuningRadians;
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
      }
      for (int b = 0; b < blocks; b++) {
        a[real + b * count + s] += ohms * slopes[(s * blocks + devices) * blocks + b];
      }
      a[real + realAt + s] += 1 + ohms * around.loadRealSiemens;
      a[real + imaginaryAt + s] += -turn - ohms * around.loadImaginarySiemens;
      if (around.peaking) {
        a[imaginary + imaginaryAt + s] = 1;
        continue;
      }
      for (int r = 0; r < count; r++) {
        a[imaginary + imaginaryAt + r] += storing * rateKernel[count + s - r];
      }
      for (int b = 0; b < blocks; b++) {
        a[imaginary + b * count + s] += ohms * slopes[(s * blocks + devices + 1) * blocks + b];
      }
      a[imaginary + imaginaryAt + s] += 1 + ohms * around.loadRealSiemens;
      a[imaginary + realAt + s] += turn + ohms * around.loadImaginarySiemens;
    }
  }

  /** Harmonic h of samples that stand from an offset, real or imaginary part. */
  double harmonic(double[] values, int from, int h, boolean real) {
    double sum = 0;
    int mask = samples - 1;
    for (int s = 0; s < samples; s++) {
      int turn = (h * s) & mask;
      sum += values[from + s] * (real ? cosine[turn] : -sine[turn]);
    }
    return (h == 0 ? 1.0 : 2.0) / samples * sum;
  }
}
