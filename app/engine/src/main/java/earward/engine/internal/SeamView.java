package earward.engine.internal;

/**
 * Impedances at a seam: one volt in its zero-volt branch, one factorisation, one right-hand side.
 * Looking on is the voltage behind over the current; looking back the voltage before over the
 * current that comes back. Before the detector this is done at the carrier, after it at the tone.
 */
final class SeamView {
  /** Share of the feed's voltage above which a seam belongs to the carrier. */
  private static final double CARRIER_SHARE = 0.5;

  /** Share of the feed's voltage below which a seam has nothing to do with the carrier. */
  private static final double LEAST_CARRIER_SHARE = 1e-3;

  private SeamView() {}

  /** What is asked of a seam. */
  enum Side {
    ONWARD,
    BACKWARD,
    LOSS
  }

  /** At which frequency. Before the detector all but the last are the carrier. */
  enum At {
    OWN_TONE,
    LOWEST_TONE,
    HIGHEST_TONE,
    CARRIER
  }

  /** Magnitude in Ω, or the loss in dB; NaN where the case has no solution. */
  static double of(CaseWork work, int seam, int partner, Side side, At at) {
    if (!work.solved() || !stampAndFactor(work, seam, at)) {
      return Double.NaN;
    }
    int branch = work.network.firstSeamBranch + seam;
    AlternatingSolver solver = work.alternating;
    solver.rest();
    solver.re[branch] = -1;
    if (partner >= 0) {
      solver.re[work.network.firstSeamBranch + partner] = 0;
    }
    solver.solve();
    int after = work.network.seamAfter[seam];
    int before = work.network.seamBefore[seam];
    int otherAfter = partner < 0 ? -1 : work.network.seamAfter[partner];
    int otherBefore = partner < 0 ? -1 : work.network.seamBefore[partner];
    double ir = solver.re[branch];
    double ii = solver.im[branch];
    double norm = ir * ir + ii * ii;
    if (norm < 1e-40) {
      return Double.NaN;
    }
    double ar = solver.re(after) - solver.re(otherAfter);
    double ai = solver.im(after) - solver.im(otherAfter);
    double br = solver.re(otherBefore) - solver.re(before);
    double bi = solver.im(otherBefore) - solver.im(before);
    double amperes = Math.sqrt(norm);
    return switch (side) {
      case ONWARD -> Math.hypot(ar, ai) / amperes;
      case BACKWARD -> Math.hypot(br, bi) / amperes;
      case LOSS -> -20 * Math.log10(Math.hypot(ar, ai) / Math.hypot(ar + br, ai + bi));
    };
  }

  private static boolean stampAndFactor(CaseWork work, int seam, At at) {
    Detection detection = work.detection;
    boolean carrier = work.carrierSolved();
    if (at == At.CARRIER && (!carrier || !passed(work, seam))) {
      return false;
    }
    if (detection != null && carrier && (at == At.CARRIER || atCarrier(work, seam))) {
      work.alternating.stage().beginFreeCarrier(work.carrierRadians());
      work.alternating.stamp();
      for (int i = 0; i < work.network.ports.length; i++) {
        Port port = work.network.ports[i];
        work.alternating
            .stage()
            .admittance(
                port.anode(work.stage()),
                port.cathode(work.stage()),
                CarrierLevels.admittance(work, detection, i, true),
                CarrierLevels.admittance(work, detection, i, false));
      }
      return work.alternating.factor();
    }
    double radians = radians(work, at);
    work.alternating.stage().beginAudio(radians);
    work.alternating.stamp();
    if (detection != null && carrier) {
      work.small.fill(detection.around, detection.carrierOnly, work.peakVolts(), radians);
      SmallResponse.addPorts(work);
    }
    return work.alternating.factor();
  }

  private static double radians(CaseWork work, At at) {
    return switch (at) {
      case LOWEST_TONE -> 2 * Math.PI * work.row[work.network.lowestTone];
      case HIGHEST_TONE -> 2 * Math.PI * work.row[work.network.highestTone];
      case OWN_TONE, CARRIER -> work.toneRadians();
    };
  }

  /** Whether enough of the carrier passes here for its impedance to matter. */
  private static boolean passed(CaseWork work, int seam) {
    double rms = CarrierLevels.rmsVolts(work, 1, work.network.seamBefore[seam], -1);
    return Math.sqrt(2) * rms > LEAST_CARRIER_SHARE * work.peakVolts();
  }

  private static boolean atCarrier(CaseWork work, int seam) {
    int before = work.network.seamBefore[seam];
    return Math.hypot(work.carrierTable.re(1, 0, before), work.carrierTable.im(1, 0, before))
        > CARRIER_SHARE;
  }
}
