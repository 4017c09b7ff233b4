package earward.engine.internal;

import earward.block.law.ClippingDepth;
import earward.engine.detection.CarrierSurroundings;

/**
 * The one rule for the depth at which a detector lets go, with all that its diode drives as the
 * circuit has it. The effective source term is what the solved cycle says: the real part of one
 * over the port's small-signal admittance at DC; for a tuned feed it is near 2η²Rp.
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

  private ClippingRule() {}

  /** The depth, from 0 to 1; NaN where the case has no carrier or did not settle. */
  static double depth(CaseWork work, int port, Without without) {
    Detection detection = work.detection;
    if (detection == null || !work.carrierSolved()) {
      return Double.NaN;
    }
    CarrierSurroundings around = detection.around;
    double[] ratio = work.portRatios;
    partners(work, detection, port, ratio);
    double directOhms = 0;
    for (int j = 0; j < ratio.length; j++) {
      directOhms += ratio[j] * around.audioRealOhms[around.index(0, port, j)];
    }
    work.small.fill(around, detection.carrierOnly, work.peakVolts(), 0);
    int own = port * work.network.ports.length + port;
    double sourceOhms = Math.max(0, 1 / work.small.admittanceRe[own]);
    double dividing = COUPLES / (work.toneRadians() * directOhms);
    AlternatingSolver solver = work.alternating;
    switch (without) {
      case NOTHING -> solver.stage().leaveOut(0, Double.POSITIVE_INFINITY);
      case CAPACITOR -> solver.stage().leaveOut(dividing, Double.POSITIVE_INFINITY);
      case COUPLING -> solver.stage().leaveOut(0, dividing);
    }
    boolean factored = solver.audio(work.toneRadians());
    solver.stage().leaveOut(0, Double.POSITIVE_INFINITY);
    if (!factored) {
      return Double.NaN;
    }
    Port of = work.network.ports[port];
    int anode = of.anode(work.stage());
    int cathode = of.cathode(work.stage());
    solver.rest();
    for (int j = 0; j < ratio.length; j++) {
      Port with = work.network.ports[j];
      solver.push(with.anode(work.stage()), with.cathode(work.stage()), ratio[j], 0);
    }
    solver.solve();
    return ClippingDepth.ofLoad(
        solver.re(cathode) - solver.re(anode),
        solver.im(cathode) - solver.im(anode),
        directOhms,
        sourceOhms);
  }

  /**
   * What flows in the ports of the same part with one ampere in one of them: a transistor's emitter
   * current comes from its collector, and only its base current from the base.
   */
  private static void partners(CaseWork work, Detection detection, int port, double[] ratio) {
    Port own = work.network.ports[port];
    double amperes = detection.carrierOnly.audioReal[port];
    for (int j = 0; j < ratio.length; j++) {
      boolean same = work.network.ports[j].part().equals(own.part());
      ratio[j] = j == port ? 1 : same ? detection.carrierOnly.audioReal[j] / amperes : 0;
    }
  }
}
