package earward.engine.internal;

import earward.engine.detection.CarrierSurroundings;
import earward.engine.linear.ComplexLu;

/**
 * The one rule for the depth at which a detector lets go, with all that its devices drive as the
 * circuit has it: the mean current of a port follows the envelope until its swing is as large as
 * its DC.
 *
 * <p>With the port admittances Y of the solved cycle (at DC) and the network's impedances Z between
 * the ports, the currents that the envelope drives are (1 + Y·Z)⁻¹·s; the depth is |i(0)|/|i(ωm)|.
 * For one port that is |Z(ωm) + Rs′|/(Z(0) + Rs′) with Rs′ = 1/Y, for a tuned feed near 2η²Rp. With
 * several ports their common load, the capacitor between two of them, and a transistor's current
 * gain are in it. One a thread.
 */
final class ClippingRule {
  /** A capacitor with ωm·C·Z(0) above this couples; one below it stores (our own dividing line). */
  private static final double COUPLES = 10;

  /** What is taken away before the rule is applied. */
  enum Without {
    NOTHING,
    CAPACITOR,
    COUPLING
  }

  private final CaseWork work;
  private final int ports;
  private final ComplexLu balance;
  private final double[] ohmsRe;
  private final double[] ohmsIm;
  private final double[] currentRe;
  private final double[] currentIm;

  ClippingRule(CaseWork work) {
    this.work = work;
    ports = work.network.ports.length;
    balance = new ComplexLu(ports);
    ohmsRe = new double[ports * ports];
    ohmsIm = new double[ports * ports];
    currentRe = new double[ports];
    currentIm = new double[ports];
  }

  /** The depth, from 0 to 1; NaN where the case has no carrier or did not settle. */
  double depth(int port, Without without) {
    Detection detection = work.detection;
    if (detection == null || !work.carrierSolved()) {
      return Double.NaN;
    }
    CarrierSurroundings around = detection.around;
    work.small.fill(around, detection.carrierOnly, work.peakVolts(), 0);
    for (int i = 0; i < ports; i++) {
      for (int j = 0; j < ports; j++) {
        ohmsRe[i * ports + j] = around.audioRealOhms[around.index(0, i, j)];
        ohmsIm[i * ports + j] = 0;
      }
    }
    if (!balanced()) {
      return Double.NaN;
    }
    double direct = Math.hypot(currentRe[port], currentIm[port]);
    if (!impedances(COUPLES / (work.toneRadians() * directOhms(port)), without) || !balanced()) {
      return Double.NaN;
    }
    return Math.min(1, direct / Math.hypot(currentRe[port], currentIm[port]));
  }

  /** What the port drives at DC, the other ports' currents included. */
  private double directOhms(int port) {
    double volts = 0;
    for (int j = 0; j < ports; j++) {
      volts += ohmsRe[port * ports + j] * currentRe[j];
    }
    return Math.abs(volts / currentRe[port]);
  }

  /** Fills the impedances between the ports at the tone, some capacitors left out. */
  private boolean impedances(double dividingFarads, Without without) {
    AlternatingSolver solver = work.alternating;
    switch (without) {
      case NOTHING -> solver.stage().leaveOut(0, Double.POSITIVE_INFINITY);
      case CAPACITOR -> solver.stage().leaveOut(dividingFarads, Double.POSITIVE_INFINITY);
      case COUPLING -> solver.stage().leaveOut(0, dividingFarads);
    }
    boolean factored = solver.audio(work.toneRadians());
    solver.stage().leaveOut(0, Double.POSITIVE_INFINITY);
    if (!factored) {
      return false;
    }
    for (int j = 0; j < ports; j++) {
      Port from = work.network.ports[j];
      solver.rest();
      solver.push(from.anode(work.stage()), from.cathode(work.stage()), 1, 0);
      solver.solve();
      for (int i = 0; i < ports; i++) {
        int anode = work.network.ports[i].anode(work.stage());
        int cathode = work.network.ports[i].cathode(work.stage());
        ohmsRe[i * ports + j] = solver.re(cathode) - solver.re(anode);
        ohmsIm[i * ports + j] = solver.im(cathode) - solver.im(anode);
      }
    }
    return true;
  }

  /** Solves (1 + Y·Z)·i = s for the impedances as they stand. */
  private boolean balanced() {
    balance.clear();
    for (int i = 0; i < ports; i++) {
      balance.add(i, i, 1, 0);
      for (int k = 0; k < ports; k++) {
        double siemens = work.small.admittanceRe[i * ports + k];
        for (int j = 0; j < ports; j++) {
          int entry = k * ports + j;
          balance.add(i, j, siemens * ohmsRe[entry], siemens * ohmsIm[entry]);
        }
      }
      currentRe[i] = work.small.drivenRe[i];
      currentIm[i] = 0;
    }
    if (!balance.factor()) {
      return false;
    }
    balance.solve(currentRe, currentIm);
    return true;
  }
}
