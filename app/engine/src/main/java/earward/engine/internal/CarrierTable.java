package earward.engine.internal;

import earward.engine.detection.CarrierSurroundings;
import earward.engine.law.DirectStage;
import earward.engine.law.FeedLaw;
import java.util.Arrays;

/**
 * How the circuit answers at the carrier's harmonics: port impedances for the cycle, and at the
 * first three harmonics all unknowns, to the held feed (column 0) and to one ampere through each
 * port (columns from 1).
 */
final class CarrierTable {
  /** Harmonics at which residues are wanted. */
  static final int SHOWN = 3;

  private final Network network;
  private final int size;
  private final int columns;
  private final int ports;
  private final int most;
  private final double[] re;
  private final double[] im;
  private final HarmonicSolver several;

  /** Whether the last fill was made at once, and how far the core was turned then, in rad/s. */
  private boolean atOnce;

  private double turnedRadians;

  /**
   * What the circuit answers to one volt in the winding's branch: all unknowns, and what one ampere
   * through each port makes of that branch's current. A turned core changes one element of the
   * matrix, and so all answers by a product of these (Sherman and Morrison 1950).
   */
  private final double[] coreRe;

  private final double[] coreIm;
  private final double[] backRe;
  private final double[] backIm;

  /** Impedances and shown unknowns as they were filled, before the core was turned on. */
  private final double[] ohmsRe;

  private final double[] ohmsIm;
  private final double[] filledRe;
  private final double[] filledIm;
  private double shareRe;
  private double shareIm;

  CarrierTable(Network network, int harmonics) {
    this.network = network;
    size = network.size;
    ports = network.ports.length;
    columns = ports + 1;
    most = Math.max(SHOWN, harmonics);
    re = new double[(SHOWN + 1) * columns * size];
    im = new double[re.length];
    filledRe = new double[re.length];
    filledIm = new double[re.length];
    coreRe = new double[(most + 1) * size];
    coreIm = new double[coreRe.length];
    backRe = new double[(most + 1) * ports];
    backIm = new double[backRe.length];
    ohmsRe = new double[(most + 1) * ports * ports];
    ohmsIm = new double[ohmsRe.length];
    several = new HarmonicSolver(size, most);
  }

  /** Keeps the order of elimination from now on. */
  void freeze() {
    several.freeze();
  }

  /** Fills itself and the carrier's part of the surroundings, the core turned as the stage says. */
  boolean fill(
      AlternatingSolver solver,
      DirectStage point,
      FeedLaw feed,
      double carrierRadians,
      CarrierSurroundings around) {
    around.carrierRadians = carrierRadians;
    around.tuned = feed.tuned();
    if (feed.tuned()) {
      around.tankOhms = feed.tankOhms(point);
      around.tankFarads = feed.tankFarads(point, carrierRadians);
    }
    turnedRadians = solver.stage().turnedRadians();
    atOnce = fillAtOnce(solver, point, feed, carrierRadians, around);
    return atOnce || fillOneByOne(solver, point, feed, carrierRadians, around);
  }

  /** The same about the same point with the core turned on to what the stage says now. */
  boolean turn(
      AlternatingSolver solver,
      DirectStage point,
      FeedLaw feed,
      double carrierRadians,
      CarrierSurroundings around) {
    if (!atOnce) {
      return fill(solver, point, feed, carrierRadians, around);
    }
    for (int k = 2; k <= most; k++) {
      share(feed, point, k, carrierRadians, solver.stage().turnedRadians());
      if (k <= around.carrierHarmonics()) {
        turnPorts(point, k, around);
      }
      if (k <= SHOWN) {
        turnShown(k);
      }
    }
    return true;
  }

  /** δ/(1 + δ·c) for a change δ of the winding's impedance. */
  private void share(FeedLaw feed, DirectStage point, int k, double carrierRadians, double turned) {
    double real =
        feed.circuitRealOhms(point, k, carrierRadians, turned)
            - feed.circuitRealOhms(point, k, carrierRadians, turnedRadians);
    double imaginary =
        feed.circuitImaginaryOhms(point, k, carrierRadians, turned)
            - feed.circuitImaginaryOhms(point, k, carrierRadians, turnedRadians);
    int branch = k * size + feed.heldBranch();
    double r = 1 + real * coreRe[branch] - imaginary * coreIm[branch];
    double m = real * coreIm[branch] + imaginary * coreRe[branch];
    double norm = r * r + m * m;
    shareRe = (real * r + imaginary * m) / norm;
    shareIm = (imaginary * r - real * m) / norm;
  }

  private void turnPorts(DirectStage point, int k, CarrierSurroundings around) {
    for (int i = 0; i < ports; i++) {
      int anode = network.ports[i].anode(point);
      int cathode = network.ports[i].cathode(point);
      double cr = core(coreRe, k, cathode) - core(coreRe, k, anode);
      double ci = core(coreIm, k, cathode) - core(coreIm, k, anode);
      double fr = cr * shareRe - ci * shareIm;
      double fi = cr * shareIm + ci * shareRe;
      for (int j = 0; j < ports; j++) {
        double br = backRe[k * ports + j];
        double bi = backIm[k * ports + j];
        int entry = around.index(k, i, j);
        around.carrierRealOhms[entry] = ohmsRe[entry] - (fr * br - fi * bi);
        around.carrierImaginaryOhms[entry] = ohmsIm[entry] - (fr * bi + fi * br);
      }
    }
  }

  private double core(double[] part, int k, int unknown) {
    return unknown < 0 ? 0 : part[k * size + unknown];
  }

  private void turnShown(int k) {
    for (int j = 0; j < ports; j++) {
      double br = backRe[k * ports + j];
      double bi = backIm[k * ports + j];
      double fr = br * shareRe - bi * shareIm;
      double fi = br * shareIm + bi * shareRe;
      int at = (k * columns + j + 1) * size;
      for (int i = 0; i < size; i++) {
        double cr = coreRe[k * size + i];
        double ci = coreIm[k * size + i];
        re[at + i] = filledRe[at + i] - (fr * cr - fi * ci);
        im[at + i] = filledIm[at + i] - (fr * ci + fi * cr);
      }
    }
  }

  private boolean fillAtOnce(
      AlternatingSolver solver,
      DirectStage point,
      FeedLaw feed,
      double carrierRadians,
      CarrierSurroundings around) {
    if (!several.factor(solver, carrierRadians, true)) {
      return false;
    }
    Arrays.fill(solver.re, 0);
    feed.hold(solver.re, point);
    several.rest();
    for (int i = 0; i < size; i++) {
      several.side(i, solver.re[i]);
    }
    if (!several.solve()) {
      return false;
    }
    for (int k = 1; k <= most; k++) {
      several.copy(k, coreRe, coreIm, k * size);
    }
    several.copy(1, re, im, columns * size);
    held(point, feed, around);
    for (int j = 0; j < ports; j++) {
      Port port = network.ports[j];
      several.rest();
      several.push(port.anode(point), port.cathode(point), 1);
      if (!several.solve()) {
        return false;
      }
      take(point, feed, j, around);
    }
    System.arraycopy(re, 0, filledRe, 0, re.length);
    System.arraycopy(im, 0, filledIm, 0, im.length);
    return true;
  }

  /** Takes over what one ampere through a port makes. */
  private void take(DirectStage point, FeedLaw feed, int j, CarrierSurroundings around) {
    for (int k = 1; k <= SHOWN; k++) {
      several.copy(k, re, im, (k * columns + j + 1) * size);
    }
    for (int k = 1; k <= most; k++) {
      if (feed.heldBranch() >= 0) {
        backRe[k * ports + j] = several.re(feed.heldBranch(), k);
        backIm[k * ports + j] = several.im(feed.heldBranch(), k);
      }
      for (int i = 0; i < ports && k <= around.carrierHarmonics(); i++) {
        int anode = network.ports[i].anode(point);
        int cathode = network.ports[i].cathode(point);
        int entry = around.index(k, i, j);
        ohmsRe[entry] = several.re(cathode, k) - several.re(anode, k);
        ohmsIm[entry] = several.im(cathode, k) - several.im(anode, k);
        around.carrierRealOhms[entry] = ohmsRe[entry];
        around.carrierImaginaryOhms[entry] = ohmsIm[entry];
      }
    }
  }

  private boolean fillOneByOne(
      AlternatingSolver solver,
      DirectStage point,
      FeedLaw feed,
      double carrierRadians,
      CarrierSurroundings around) {
    Arrays.fill(re, 0);
    Arrays.fill(im, 0);
    for (int k = 1; k <= Math.max(SHOWN, around.carrierHarmonics()); k++) {
      solver.stage().beginCarrier(k, carrierRadians);
      solver.stamp();
      if (!solver.factor()) {
        return false;
      }
      if (k == 1) {
        solver.rest();
        feed.hold(solver.re, point);
        solver.solve();
        store(solver, 1, 0);
        held(point, feed, around);
      }
      ports(solver, point, k, around);
    }
    return true;
  }

  private void held(DirectStage point, FeedLaw feed, CarrierSurroundings around) {
    int branch = feed.heldBranch();
    around.loadRealSiemens = branch < 0 ? 0 : re(1, 0, branch);
    around.loadImaginarySiemens = branch < 0 ? 0 : im(1, 0, branch);
    for (int i = 0; i < ports; i++) {
      int anode = network.ports[i].anode(point);
      int cathode = network.ports[i].cathode(point);
      around.transferReal[i] = re(1, 0, anode) - re(1, 0, cathode);
      around.transferImaginary[i] = im(1, 0, anode) - im(1, 0, cathode);
    }
  }

  private void ports(
      AlternatingSolver solver, DirectStage point, int k, CarrierSurroundings around) {
    for (int j = 0; j < network.ports.length; j++) {
      Port port = network.ports[j];
      solver.rest();
      solver.push(port.anode(point), port.cathode(point), 1, 0);
      solver.solve();
      if (k <= SHOWN) {
        store(solver, k, j + 1);
      }
      for (int i = 0; i < network.ports.length && k <= around.carrierHarmonics(); i++) {
        int anode = network.ports[i].anode(point);
        int cathode = network.ports[i].cathode(point);
        int entry = around.index(k, i, j);
        around.carrierRealOhms[entry] = solver.re(cathode) - solver.re(anode);
        around.carrierImaginaryOhms[entry] = solver.im(cathode) - solver.im(anode);
      }
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
