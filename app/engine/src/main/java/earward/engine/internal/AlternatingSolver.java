package earward.engine.internal;

import earward.engine.law.AlternatingStage;
import earward.engine.law.DirectStage;
import earward.engine.law.Law;
import earward.engine.linear.HarmonicLu;
import java.util.Arrays;

/** The linear circuit at one frequency: stamped, factored, then solved for any right-hand side. */
final class AlternatingSolver {
  private final Network network;
  private final AlternatingStage stage;
  final double[] re;
  final double[] im;

  AlternatingSolver(Network network, DirectStage point) {
    this.network = network;
    stage = new AlternatingStage(network.nodes, network.size, point);
    re = new double[network.size];
    im = new double[network.size];
  }

  AlternatingStage stage() {
    return stage;
  }

  /** Stamps everything; a frequency must have begun. */
  void stamp() {
    stamp(network.laws);
    frame();
  }

  private void stamp(Law[] laws) {
    for (Law law : laws) {
      law.alternating(stage);
    }
  }

  /** Stamps meters and seams. */
  private void frame() {
    for (int i = 0; i < network.probePlus.length; i++) {
      double siemens = stage.value(network.probeMeter[i]);
      stage.admittance(network.probePlus[i], network.probeMinus[i], siemens, 0);
    }
    for (int i = 0; i < network.seamBefore.length; i++) {
      int branch = network.firstSeamBranch + i;
      stage.branchCurrent(branch, network.seamBefore[i], network.seamAfter[i]);
      stage.add(branch, network.seamBefore[i], 1, 0);
      stage.add(branch, network.seamAfter[i], -1, 0);
    }
  }

  /**
   * Stamps the circuit into several systems at once, at the multiples of the tone or of the carrier
   * from the first on.
   */
  void stamp(HarmonicLu systems, double radians, boolean carrier) {
    stage.beginSeveral(systems);
    stamp(network.steadyLaws);
    frame();
    systems.spread();
    double carrierRadians = carrier ? radians : stage.carrierOmega();
    for (int h = 1; h <= systems.count(); h++) {
      stage.beginSystem(h - 1, h * radians, carrier ? h : 0, carrierRadians);
      stamp(network.swingingLaws);
    }
    stage.endSeveral();
  }

  /** Factors what was stamped. */
  boolean factor() {
    return stage.matrix().factor();
  }

  /** Stamps and factors at an audio frequency, in rad/s. */
  boolean audio(double radians) {
    stage.beginAudio(radians);
    stamp();
    return factor();
  }

  /** Clears the right-hand side. */
  void rest() {
    Arrays.fill(re, 0);
    Arrays.fill(im, 0);
  }

  /** Adds a current from one node to another, through what is not in the matrix. */
  void push(int from, int to, double real, double imaginary) {
    if (from >= 0) {
      re[from] -= real;
      im[from] -= imaginary;
    }
    if (to >= 0) {
      re[to] += real;
      im[to] += imaginary;
    }
  }

  /** Replaces the right-hand side by the solution. */
  void solve() {
    stage.matrix().solve(re, im);
  }

  /**
   * Replaces what stands in the right-hand side, one at the output, by how that output answers to a
   * source in each row.
   */
  void solveTransposed() {
    stage.matrix().solveTransposed(re, im);
  }

  double re(int node) {
    return node < 0 ? 0 : re[node];
  }

  double im(int node) {
    return node < 0 ? 0 : im[node];
  }
}
