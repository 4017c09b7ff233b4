package earward.engine.internal;

import java.util.function.DoubleSupplier;

/** Searches the depth of modulation at which something first happens. */
final class DepthSearch {
  /** Distortion up to which an envelope counts as clean. */
  static final double CLEAN_DISTORTION = 0.03;

  /** Largest depth of the averaged method's domain. */
  static final double MOST = 0.95;

  private static final double LEAST = 0.02;
  private static final double CLOSE = 2e-3;
  private static final int MOST_STEPS = 12;

  private final CaseWork work;
  private final Detection detection;
  private final DoubleSupplier margin;

  /**
   * A search.
   *
   * @param margin of the present solution, above 0 where all is well
   */
  private DepthSearch(CaseWork work, Detection detection, DoubleSupplier margin) {
    this.work = work;
    this.detection = detection;
    this.margin = margin;
  }

  /**
   * Depth at which the detector's own distortion between two nodes reaches 3 %, outputs unclipped:
   * 0.95, the end of the method's domain, where it stays below, and 0 where it never does.
   */
  static double clean(CaseWork work, int plus, int minus) {
    Detection detection = work.detection;
    if (detection == null || !work.solved()) {
      return Double.NaN;
    }
    DoubleSupplier margin =
        () -> {
          work.trial.clear();
          work.gather(detection, work.trial);
          return CLEAN_DISTORTION - work.trial.distortion(plus, minus);
        };
    return new DepthSearch(work, detection, margin).run();
  }

  /** Depth at which a port's mean current first reverses; 0.95 where it never does. */
  static double reversal(CaseWork work, int port) {
    Detection detection = work.detection;
    if (detection == null || !work.solved()) {
      return Double.NaN;
    }
    int samples = detection.modulated.audioSamples();
    DoubleSupplier margin =
        () -> {
          double least = Double.POSITIVE_INFINITY;
          double sum = 0;
          for (int s = 0; s < samples; s++) {
            double amperes = detection.modulated.meanAmperes[port * samples + s];
            least = Math.min(least, amperes);
            sum += Math.abs(amperes) / samples;
          }
          return least / sum;
        };
    return new DepthSearch(work, detection, margin).run();
  }

  /** The search; afterwards the case's own solution stands again. */
  private double run() {
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
    return detection.solveModulated(work.peakVolts(), depth, work.toneRadians())
        ? margin.getAsDouble()
        : Double.NaN;
  }
}
