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
  private final double[] re;
  private final double[] im;

  CarrierTable(Network network) {
    this.network = network;
    size = network.size;
    columns = network.ports.length + 1;
    re = new double[(SHOWN + 1) * columns * size];
    im = new double[re.length];
  }

  /** Fills itself and the carrier's part of the surroundings. */
  boolean fill(
      AlternatingSolver solver,
      DirectStage point,
      FeedLaw feed,
      double carrierRadians,
      CarrierSurroundings around) {
    Arrays.fill(re, 0);
    Arrays.fill(im, 0);
    around.carrierRadians = carrierRadians;
    around.tuned = feed.tuned();
    int most = Math.max(SHOWN, around.carrierHarmonics());
    for (int k = 1; k <= most; k++) {
      solver.stage().beginCarrier(k, carrierRadians);
      solver.stamp();
      if (!solver.factor()) {
        return false;
      }
      if (k == 1) {
        held(solver, point, feed, around);
      }
      ports(solver, point, k, around);
    }
    if (feed.tuned()) {
      around.tankOhms = feed.tankOhms(point);
      around.tankFarads = feed.tankFarads(point, carrierRadians);
    }
    return true;
  }

  private void held(
      AlternatingSolver solver, DirectStage point, FeedLaw feed, CarrierSurroundings around) {
    solver.rest();
    feed.hold(solver.re, point);
    solver.solve();
    store(solver, 1, 0);
    int branch = feed.heldBranch();
    around.loadRealSiemens = branch < 0 ? 0 : solver.re[branch];
    around.loadImaginarySiemens = branch < 0 ? 0 : solver.im[branch];
    for (int i = 0; i < network.ports.length; i++) {
      Port port = network.ports[i];
      int anode = port.anode(point);
      int cathode = port.cathode(point);
      around.transferReal[i] = solver.re(anode) - solver.re(cathode);
      around.transferImaginary[i] = solver.im(anode) - solver.im(cathode);
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
