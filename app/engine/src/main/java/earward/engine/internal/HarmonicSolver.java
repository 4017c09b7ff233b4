package earward.engine.internal;

import earward.engine.linear.HarmonicLu;
import java.util.Arrays;

/**
 * The linear circuit at several multiples of the tone or of the carrier at once, from the first on:
 * stamped, factored, then solved for any right-hand side that is alike at all of them. Where it
 * says that it did not, one frequency after the other must be solved. Mutable, for one thread.
 */
final class HarmonicSolver {
  private final HarmonicLu systems;

  /** Right-hand side, then solution: a row for each unknown, a number for each multiple. */
  final double[][] re;

  final double[][] im;

  HarmonicSolver(int size, int harmonics) {
    systems = new HarmonicLu(size, harmonics);
    re = new double[size][harmonics];
    im = new double[size][harmonics];
  }

  /** Keeps the order of elimination from now on. */
  void freeze() {
    systems.freeze();
  }

  /** Stamps and factors at the multiples of a frequency in rad/s. */
  boolean factor(AlternatingSolver circuit, double radians, boolean carrier) {
    circuit.stamp(systems, radians, carrier);
    return systems.factor();
  }

  /** Clears the right-hand side. */
  void rest() {
    for (int i = 0; i < re.length; i++) {
      Arrays.fill(re[i], 0);
      Arrays.fill(im[i], 0);
    }
  }

  /** Adds an amount to one row. */
  void side(int row, double amount) {
    if (row >= 0) {
      for (int k = 0; k < re[row].length; k++) {
        re[row][k] += amount;
      }
    }
  }

  /** Adds a current from one node to another, through what is not in the matrix. */
  void push(int from, int to, double amperes) {
    side(from, -amperes);
    side(to, amperes);
  }

  /** Replaces the right-hand side by the solution. */
  boolean solve() {
    return systems.solve(re, im);
  }

  /** Writes all unknowns at one multiple from an offset on. */
  void copy(int harmonic, double[] intoRe, double[] intoIm, int from) {
    for (int i = 0; i < re.length; i++) {
      intoRe[from + i] = re[i][harmonic - 1];
      intoIm[from + i] = im[i][harmonic - 1];
    }
  }

  /** Real part at a node and a multiple. */
  double re(int node, int harmonic) {
    return node < 0 ? 0 : re[node][harmonic - 1];
  }

  /** Imaginary part at a node and a multiple. */
  double im(int node, int harmonic) {
    return node < 0 ? 0 : im[node][harmonic - 1];
  }
}
