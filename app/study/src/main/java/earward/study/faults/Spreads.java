package earward.study.faults;

import java.util.List;

/** How much healthy kits differ in a reading. */
final class Spreads {
  /** Nothing is predicted better than this. */
  private static final double LEAST = 0.02;

  private static final double MOST = 0.5;

  private Spreads() {}

  /** Standard deviation of the kits as a share of their mean, within sensible ends. */
  static double relative(List<Signs> kits, int reading) {
    double[] values =
        kits.stream()
            .mapToDouble(signs -> signs.readings().get(reading))
            .filter(value -> !Double.isNaN(value))
            .toArray();
    double mean = 0;
    for (double value : values) {
      mean += value / values.length;
    }
    double squares = 0;
    for (double value : values) {
      squares += (value - mean) * (value - mean);
    }
    double deviation = values.length < 2 ? 0 : Math.sqrt(squares / (values.length - 1));
    double share = mean == 0 ? LEAST : deviation / Math.abs(mean);
    return Math.min(MOST, Math.max(LEAST, share));
  }
}
