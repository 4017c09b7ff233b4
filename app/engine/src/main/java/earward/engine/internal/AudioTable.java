package earward.engine.internal;

import earward.engine.law.AmplifierLaw;
import earward.engine.law.DirectStage;

/**
 * How all unknowns answer to one ampere through each port, to one volt at each amplifier output,
 * and to one ampere from each amplifier's SUPPLY to its GROUND, at each harmonic of the tone.
 * Column order: ports, outputs, supplies.
 */
final class AudioTable {
  final int harmonics;
  final int columns;
  private final Network network;
  private final int size;
  private final double[] re;
  private final double[] im;
  private final double[] lastRe;
  private final double[] lastIm;
  private final HarmonicSolver several;

  AudioTable(Network network, int harmonics) {
    this.network = network;
    this.harmonics = harmonics;
    size = network.size;
    columns = network.ports.length + Outputs.count(network) + network.amplifiers.length;
    re = new double[(harmonics + 1) * columns * size];
    im = new double[re.length];
    lastRe = new double[size * size];
    lastIm = new double[size * size];
    several = new HarmonicSolver(size, harmonics);
  }

  /**
   * Fills harmonics 1 and up about the DC point of the stage.
   *
   * @param solver factored at the tone
   * @param again whether only a circuit that differs from that of the last time needs to be solved
   */
  boolean fill(AlternatingSolver solver, DirectStage point, double toneRadians, boolean again) {
    boolean repeated = solver.stage().matrix().repeats(lastRe, lastIm);
    return (again && repeated)
        || fillAtOnce(solver, point, toneRadians)
        || fillOneByOne(solver, point, toneRadians);
  }

  /** Keeps the order of elimination from now on. */
  void freeze() {
    several.freeze();
  }

  private boolean fillAtOnce(AlternatingSolver solver, DirectStage point, double toneRadians) {
    if (!several.factor(solver, toneRadians, false)) {
      return false;
    }
    int column = 0;
    for (Port port : network.ports) {
      several.rest();
      several.push(port.anode(point), port.cathode(point), 1);
      if (!several.solve()) {
        return false;
      }
      store(column++, -1);
    }
    for (AmplifierLaw amplifier : network.amplifiers) {
      for (int k = 0; k < amplifier.branches(); k++) {
        several.rest();
        several.side(amplifier.outputBranch(k), 1);
        if (!several.solve()) {
          return false;
        }
        store(column++, amplifier.outputNode(point, k));
      }
    }
    for (AmplifierLaw amplifier : network.amplifiers) {
      several.rest();
      several.push(amplifier.supplyNode(point), amplifier.groundNode(point), 1);
      if (!several.solve()) {
        return false;
      }
      store(column++, -1);
    }
    return true;
  }

  /** Stores a column, at a node (none: −1) scaled to one volt there. */
  private void store(int column, int node) {
    for (int h = 1; h <= harmonics; h++) {
      double real = node < 0 ? 1 : several.re(node, h);
      double imaginary = node < 0 ? 0 : several.im(node, h);
      double norm = real * real + imaginary * imaginary;
      double byRe = norm == 0 ? 1 : real / norm;
      double byIm = norm == 0 ? 0 : -imaginary / norm;
      int at = (h * columns + column) * size;
      for (int i = 0; i < size; i++) {
        double r = several.re[i][h - 1];
        double m = several.im[i][h - 1];
        re[at + i] = r * byRe - m * byIm;
        im[at + i] = m * byRe + r * byIm;
      }
    }
  }

  private boolean fillOneByOne(AlternatingSolver solver, DirectStage point, double toneRadians) {
    for (int h = 1; h <= harmonics; h++) {
      if (!solver.audio(h * toneRadians)) {
        return false;
      }
      int column = 0;
      for (Port port : network.ports) {
        solver.rest();
        solver.push(port.anode(point), port.cathode(point), 1, 0);
        solver.solve();
        store(solver, h, column++);
      }
      for (AmplifierLaw amplifier : network.amplifiers) {
        for (int k = 0; k < amplifier.branches(); k++) {
          solver.rest();
          solver.re[amplifier.outputBranch(k)] = 1;
          solver.solve();
          normalise(solver, amplifier.outputNode(point, k));
          store(solver, h, column++);
        }
      }
      for (AmplifierLaw amplifier : network.amplifiers) {
        solver.rest();
        solver.push(amplifier.supplyNode(point), amplifier.groundNode(point), 1, 0);
        solver.solve();
        store(solver, h, column++);
      }
    }
    return true;
  }

  /** Scales so that the output itself moves by one volt: then it is a source, whatever drove it. */
  static void normalise(AlternatingSolver solver, int node) {
    double real = solver.re(node);
    double imaginary = solver.im(node);
    double norm = real * real + imaginary * imaginary;
    if (norm == 0) {
      return;
    }
    for (int i = 0; i < solver.re.length; i++) {
      double r = solver.re[i];
      double m = solver.im[i];
      solver.re[i] = (r * real + m * imaginary) / norm;
      solver.im[i] = (m * real - r * imaginary) / norm;
    }
  }

  private void store(AlternatingSolver solver, int harmonic, int column) {
    int at = (harmonic * columns + column) * size;
    System.arraycopy(solver.re, 0, re, at, size);
    System.arraycopy(solver.im, 0, im, at, size);
  }

  double re(int harmonic, int column, int unknown) {
    return unknown < 0 ? 0 : re[(harmonic * columns + column) * size + unknown];
  }

  double im(int harmonic, int column, int unknown) {
    return unknown < 0 ? 0 : im[(harmonic * columns + column) * size + unknown];
  }
}
