package earward.kit.parts;

import earward.block.law.ThermalVoltage;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Saturation current, emission coefficient and series resistance of a diode, fitted to points of
 * its forward curve.
 *
 * <p>Least squares in ln(i): the misfit of a point is ln(i of the model at the point's voltage)
 * less ln(i of the point), so that a decade of current counts alike at every level. Points from 0.1
 * to 50 µA, where detection happens, have full weight; each decade away from there halves it.
 * Points above 30 mA, where a diode heats itself, are left out. n is kept from 1 to 2 and Rs at 0
 * or above.
 *
 * <p>Method: damped least squares (Levenberg 1944, Marquardt 1963) from several starts.
 *
 * @param saturationAmperes Is at 25 °C
 * @param emissionCoefficient n
 * @param seriesOhms Rs
 * @param report how well it fits
 */
public record DiodeFit(
    double saturationAmperes, double emissionCoefficient, double seriesOhms, FitReport report) {
  /** Current above which points are left out. */
  public static final double MOST_AMPERES = 30e-3;

  /** Fewest typical points that fix three figures. */
  public static final int LEAST_POINTS = 3;

  private static final double CELSIUS = 25;
  private static final double[] START_EMISSIONS = {1.05, 1.3, 1.8};

  /**
   * The fit to the typical points at 25 °C.
   *
   * @throws IllegalArgumentException when fewer than three of them are at or below 30 mA, or they
   *     do not rise
   */
  public static DiodeFit of(List<DiodePoint> points) {
    return of(points, ThermalVoltage.volts(CELSIUS));
  }

  /**
   * The fit to typical points taken at another temperature.
   *
   * @param thermalVolts kT/q at which the points hold, above 0
   */
  public static DiodeFit of(List<DiodePoint> points, double thermalVolts) {
    List<DiodePoint> used =
        points.stream()
            .filter(point -> point.typical() && point.amperes() <= MOST_AMPERES)
            .sorted(Comparator.comparingDouble(DiodePoint::volts))
            .toList();
    requireEnough(used);
    DiodeCurve best = null;
    for (double emission : START_EMISSIONS) {
      DiodeCurve found =
          new DampedFit(used, thermalVolts).from(start(used, emission, thermalVolts));
      if (best == null || found.cost(used, thermalVolts) < best.cost(used, thermalVolts)) {
        best = found;
      }
    }
    if (best == null) {
      throw new IllegalStateException("a fit has at least one start");
    }
    OptionalDouble residual =
        used.size() > LEAST_POINTS
            ? OptionalDouble.of(best.misfit(used, thermalVolts))
            : OptionalDouble.empty();
    return new DiodeFit(
        Math.exp(best.logSaturation()),
        best.emission(),
        best.seriesOhms(),
        new FitReport(used.size(), residual, used.get(0).amperes()));
  }

  private static void requireEnough(List<DiodePoint> used) {
    if (used.size() < LEAST_POINTS) {
      throw new IllegalArgumentException(
          "there are "
              + used.size()
              + " typical points at or below 30 mA; a fit wants at least "
              + LEAST_POINTS);
    }
    for (int i = 1; i < used.size(); i++) {
      boolean rises =
          used.get(i).volts() > used.get(i - 1).volts()
              && used.get(i).amperes() > used.get(i - 1).amperes();
      if (!rises) {
        throw new IllegalArgumentException(
            "the current does not rise with the voltage from "
                + used.get(i - 1).volts()
                + " V to "
                + used.get(i).volts()
                + " V; wanted a rising curve");
      }
    }
  }

  /** The curve of this n, without series resistance, through the lowest point. */
  private static DiodeCurve start(List<DiodePoint> used, double emission, double thermalVolts) {
    DiodePoint lowest = used.get(0);
    return new DiodeCurve(
        Math.log(lowest.amperes()) - lowest.volts() / (emission * thermalVolts), emission, 0);
  }

  /** One sentence for the designer. */
  public String sentence() {
    String misfit =
        report.residualFraction().isPresent()
            ? "to within " + Math.round(100 * report.residualFraction().getAsDouble()) + " % rms"
            : "exactly, so that nothing tells how well";
    return "Fitted to "
        + report.points()
        + " typical points "
        + misfit
        + "; extrapolated below the lowest point.";
  }
}
