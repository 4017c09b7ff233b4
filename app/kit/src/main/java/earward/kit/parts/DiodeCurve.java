package earward.kit.parts;

import java.util.List;

/**
 * A forward curve: v = n·Vt·ln(1 + i/Is) + i·Rs. Source: Shockley 1949, with series resistance.
 *
 * @param logSaturation ln(Is/1 A)
 * @param emission n
 * @param seriesOhms Rs
 */
record DiodeCurve(double logSaturation, double emission, double seriesOhms) {
  private static final double LEAST_WEIGHTED_AMPERES = 0.1e-6;
  private static final double MOST_WEIGHTED_AMPERES = 50e-6;
  private static final int HALVINGS = 200;

  /** ln(i) at a voltage, by halving: the curve rises throughout. */
  double logAmperes(double volts, double thermalVolts) {
    double low = Math.min(logSaturation, 0) - 60;
    double high = 10;
    for (int k = 0; k < HALVINGS && high - low > 1e-13 * Math.abs(low); k++) {
      double middle = (low + high) / 2;
      if (volts(Math.exp(middle), thermalVolts) < volts) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }

  double volts(double amperes, double thermalVolts) {
    double drop = Math.log1p(amperes * Math.exp(-logSaturation));
    return emission * thermalVolts * drop + amperes * seriesOhms;
  }

  /** The weighted misfits in ln(i), point by point. */
  double[] residuals(List<DiodePoint> points, double thermalVolts) {
    double[] residuals = new double[points.size()];
    for (int k = 0; k < residuals.length; k++) {
      DiodePoint point = points.get(k);
      residuals[k] = Math.sqrt(weight(point.amperes())) * misfit(point, thermalVolts);
    }
    return residuals;
  }

  double cost(List<DiodePoint> points, double thermalVolts) {
    double sum = 0;
    for (double residual : residuals(points, thermalVolts)) {
      sum += residual * residual;
    }
    return sum;
  }

  /** ln(i of this curve at the point's voltage) less ln(i of the point). */
  double misfit(DiodePoint point, double thermalVolts) {
    return logAmperes(point.volts(), thermalVolts) - Math.log(point.amperes());
  }

  /** Root mean square of the misfits in ln(i), every point alike. */
  double misfit(List<DiodePoint> points, double thermalVolts) {
    return Outlier.rms(points, point -> misfit(point, thermalVolts));
  }

  /** 1 where detection happens, halved by each decade away from there. */
  private static double weight(double amperes) {
    double decades =
        Math.max(
            0,
            Math.max(
                Math.log10(LEAST_WEIGHTED_AMPERES / amperes),
                Math.log10(amperes / MOST_WEIGHTED_AMPERES)));
    return Math.pow(0.5, decades);
  }
}
