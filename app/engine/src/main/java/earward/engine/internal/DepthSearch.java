package earward.engine.internal;

import java.util.function.DoublePredicate;

/** Searches the depth of modulation for which something first happens. */
final class DepthSearch {
  /** Distortion up to which an envelope counts as clean. */
  static final double CLEAN_DISTORTION = 0.03;

  private static final double LEAST = 0.02;
  private static final double MOST = 1;
  private static final int HALVINGS = 9;

  private DepthSearch() {}

  /**
   * Depth at which the detector's own distortion between two nodes reaches 3 %, outputs unclipped;
   * 1 where it never does.
   */
  static double clean(CaseWork work, int plus, int minus) {
    Detection detection = work.detection;
    if (detection == null || !work.solved()) {
      return Double.NaN;
    }
    AudioSignal trial = new AudioSignal(work.signal.harmonics, work.network.size);
    return search(
        work,
        detection,
        depth -> {
          trial.clear();
          int ports = work.network.ports.size();
          for (int h = 1; h <= trial.harmonics; h++) {
            for (int j = 0; j < ports; j++) {
              double real = detection.modulated.audioReal[h * ports + j];
              double imaginary = detection.modulated.audioImaginary[h * ports + j];
              trial.add(work.audioTable, h, j, real, imaginary);
            }
          }
          return trial.distortion(plus, minus) <= CLEAN_DISTORTION;
        });
  }

  /** Depth at which a port's mean current first reverses; 1 where it never does. */
  static double reversal(CaseWork work, int port) {
    Detection detection = work.detection;
    if (detection == null || !work.solved()) {
      return Double.NaN;
    }
    int samples = detection.modulated.audioSamples();
    return search(
        work,
        detection,
        depth -> {
          for (int s = 0; s < samples; s++) {
            if (detection.modulated.meanAmperes[port * samples + s] < 0) {
              return false;
            }
          }
          return true;
        });
  }

  /** The largest depth that is well; the case's own solution is restored. */
  private static double search(CaseWork work, Detection detection, DoublePredicate well) {
    double low = LEAST;
    double high = MOST;
    double found = Double.NaN;
    if (solves(work, detection, LEAST) && well.test(LEAST)) {
      boolean clean = solves(work, detection, MOST) && well.test(MOST);
      for (int i = 0; i < HALVINGS && !clean; i++) {
        double middle = (low + high) / 2;
        if (solves(work, detection, middle) && well.test(middle)) {
          low = middle;
        } else {
          high = middle;
        }
      }
      found = clean ? MOST : (low + high) / 2;
    } else {
      found = 0;
    }
    return solves(work, detection, work.depth()) ? found : Double.NaN;
  }

  private static boolean solves(CaseWork work, Detection detection, double depth) {
    return detection.solveModulated(work.peakVolts(), depth, work.toneRadians());
  }
}
