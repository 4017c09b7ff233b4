package earward.engine.internal;

/**
 * How much lower the load of a detector is for audio than for DC: the impedance at the tone of all
 * that one of its devices drives, its reservoir left out, over the resistance at DC (Terman, Radio
 * Engineers' Handbook, from memory). It is the depth at which the detector lets go where nothing
 * else limits it.
 */
final class LoadRatio {
  /** Share of the tone at which every capacitor has ceased to count. */
  private static final double NEARLY_DIRECT = 1e-6;

  /** What stands in a seam that is cut. */
  private static final double OPEN_OHMS = 1e12;

  /** A resistance at DC above this is no load. */
  private static final double NO_LOAD_OHMS = 1e8;

  /** A capacitor with ω·C·R above this couples; one below it stores: as in the clipping rule. */
  private static final double COUPLES = 10;

  private LoadRatio() {}

  /** The ratio at a port, 1 where audio sees what DC sees; NaN where DC has no way. */
  static double of(CaseWork work, int port) {
    return ratio(work, port, -1, -1);
  }

  /** The least ratio of all ports if the path ended at a seam; of a pair's, both wires are cut. */
  static double cut(CaseWork work, int seam, int partner) {
    double least = Double.NaN;
    for (int port = 0; port < work.network.ports.length; port++) {
      double here = ratio(work, port, seam, partner);
      least = here > least ? least : Double.isNaN(here) ? least : here;
    }
    return least;
  }

  private static double ratio(CaseWork work, int port, int seam, int partner) {
    if (work.detection == null || !work.carrierSolved()) {
      return Double.NaN;
    }
    double tone = work.toneRadians();
    double direct = ohms(work, port, NEARLY_DIRECT * tone, 0, seam, partner);
    return direct < NO_LOAD_OHMS
        ? ohms(work, port, tone, COUPLES / (tone * direct), seam, partner) / direct
        : Double.NaN;
  }

  private static double ohms(
      CaseWork work, int port, double radians, double leastFarads, int seam, int partner) {
    AlternatingSolver solver = work.alternating;
    solver.stage().leaveOut(leastFarads, Double.POSITIVE_INFINITY);
    solver.stage().beginAudio(radians);
    solver.stamp();
    solver.stage().leaveOut(0, Double.POSITIVE_INFINITY);
    open(work, seam);
    open(work, partner);
    if (!solver.factor()) {
      return Double.NaN;
    }
    Port at = work.network.ports[port];
    int anode = at.anode(work.stage());
    int cathode = at.cathode(work.stage());
    solver.rest();
    solver.push(anode, cathode, 1, 0);
    solver.solve();
    return Math.hypot(solver.re(cathode) - solver.re(anode), solver.im(cathode) - solver.im(anode));
  }

  private static void open(CaseWork work, int seam) {
    if (seam >= 0) {
      int branch = work.network.firstSeamBranch + seam;
      work.alternating.stage().add(branch, branch, -OPEN_OHMS, 0);
    }
  }
}
