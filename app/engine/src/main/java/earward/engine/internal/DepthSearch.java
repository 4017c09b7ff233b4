package earward.engine.internal;

/**
 * Searches the depth of modulation at which something first happens, by false position. Mutable,
 * for one thread; makes no garbage.
 */
final class DepthSearch {
  /** Distortion up to which an envelope counts as clean. */
  static final double CLEAN_DISTORTION = 0.03;

  /** Largest depth of the averaged method's domain. */
  static final double MOST = 0.95;

  private static final double LEAST = 0.02;
  private static final double CLOSE = 2e-3;
  private static final int MOST_STEPS = 12;

  private final CaseWork work;
  private int plus;
  private int minus;
  private int port;

  /** Room for the searches of one case. */
  DepthSearch(CaseWork work) {
    this.work = work;
  }

  /**
   * Depth at which the detector's own distortion between two nodes reaches 3 %, outputs unclipped:
   * 0.95, the end of the method's domain, where it stays below, and 0 where it never does.
   */
  double clean(int plusNode, int minusNode) {
    plus = plusNode;
    minus = minusNode;
    port = -1;
    return run();
  }

  /** Depth at which a port's mean current first reverses; 0.95 where it never does. */
  double reversal(int portIndex) {
    port = portIndex;
    return run();
  }

  /** How far the present solution is from what is sought; above 0 where all is well. */
  private double margin(Detection detection) {
    return port < 0 ? distortionMargin(detection) : currentMargin(detection);
  }

  private double distortionMargin(Detection detection) {
    work.trial.clear();
    work.gather(detection, work.trial);
    return CLEAN_DISTORTION - work.trial.distortion(plus, minus);
  }

  private double currentMargin(Detection detection) {
    int samples = detection.modulated.audioSamples();
    double least = Double.POSITIVE_INFINITY;
    double sum = 0;
    for (int s = 0; s < samples; s++) {
      double amperes = detection.modulated.meanAmperes[port * samples + s];
      least = Math.min(least, amperes);
      sum += Math.abs(amperes) / samples;
    }
    return least / sum;
  }

  /** The search; afterwards the case's own solution stands again. */
  private double run() {
    if (work.detection == null || !work.solved()) {
      return Double.NaN;
    }
    double found = search();
    return Double.isNaN(at(work.depth())) ? Double.NaN : found;
  }

  /** False position with the stale end's margin halved (Illinois), from the case's own depth. */
  private double search() {
    double low = Math.min(MOST, Math.max(LEAST, work.depth()));
    double lowMargin = at(low);
    double high = MOST;
    if (!(lowMargin > 0)) {
      high = low;
      low = LEAST;
      lowMargin = at(low);
      if (!(lowMargin > 0)) {
        return 0;
      }
    }
    double highMargin = at(high);
    if (highMargin > 0) {
      return high;
    }
    for (int i = 0; i < MOST_STEPS && high - low > CLOSE; i++) {
      double middle =
          Double.isNaN(highMargin)
              ? (low + high) / 2
              : low + (high - low) * inside(lowMargin / (lowMargin - highMargin));
      double here = at(middle);
      if (here > 0) {
        low = middle;
        lowMargin = here;
        highMargin /= 2;
      } else {
        high = middle;
        highMargin = here;
        lowMargin /= 2;
      }
    }
    return (low + high) / 2;
  }

  private static double inside(double share) {
    return Math.min(0.98, Math.max(0.02, share));
  }

  /** Margin at a depth, NaN where the cycle does not settle there. */
  private double at(double depth) {
    Detection detection = work.detection;
    return detection != null
            && detection.solveModulated(work.peakVolts(), depth, work.toneRadians())
        ? margin(detection)
        : Double.NaN;
  }
}
