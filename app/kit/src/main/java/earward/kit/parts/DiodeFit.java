package earward.kit.parts;

import earward.block.device.DiodeMaterial;
import earward.block.law.ThermalVoltage;
import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Saturation current, emission coefficient and series resistance of a diode, fitted to points of
 * its forward curve, or to its zero-bias resistance alone.
 *
 * <p>Least squares in ln(i): the misfit of a point is ln(i of the model at the point's voltage)
 * less ln(i of the point), so that a decade of current counts alike at every level. Points from 0.1
 * to 50 µA, where detection happens, have full weight; each decade away from there halves it.
 * Points above 30 mA, where a diode heats itself, and limits are left out. n is kept from 1 to 2
 * and Rs at 0 or above.
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
    DiodeCurve best = best(used, thermalVolts);
    return new DiodeFit(
        Math.exp(best.logSaturation()),
        best.emission(),
        best.seriesOhms(),
        report(used, best, thermalVolts));
  }

  /**
   * The diode of a zero-bias resistance: Is = n·Vt/R0, from the slope of Shockley's law at 0 V.
   *
   * @param zeroBiasOhms R0 at 25 °C, above 0
   * @param emission n; see {@link #usualEmission}
   * @param seriesOhms Rs, at least 0
   */
  public static DiodeFit ofZeroBias(double zeroBiasOhms, double emission, double seriesOhms) {
    if (!(zeroBiasOhms > 0) || Double.isInfinite(zeroBiasOhms)) {
      throw new IllegalArgumentException(
          "the zero-bias resistance (Ω) is " + zeroBiasOhms + "; it must be above 0");
    }
    String sentence =
        "The diode is that of its zero-bias resistance of "
            + written(zeroBiasOhms, Unit.OHM)
            + " alone, with an emission coefficient of "
            + written(emission, Unit.NUMBER)
            + "; all above some microamperes is extrapolated.";
    return new DiodeFit(
        emission * ThermalVoltage.volts(CELSIUS) / zeroBiasOhms,
        emission,
        seriesOhms,
        new FitReport(0, OptionalDouble.empty(), false, sentence));
  }

  /** The emission coefficient that is usual of a material (common practice, from memory). */
  public static double usualEmission(DiodeMaterial material) {
    return switch (material) {
      case SCHOTTKY -> 1.05;
      case GERMANIUM -> 1.2;
      case SILICON -> 1.8;
    };
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
      DiodePoint low = used.get(i - 1);
      DiodePoint high = used.get(i);
      if (!(high.volts() > low.volts() && high.amperes() > low.amperes())) {
        throw new IllegalArgumentException(
            "the current does not rise with the voltage from "
                + written(low)
                + " to "
                + written(high)
                + "; wanted a rising curve, so look at both points again");
      }
    }
  }

  private static DiodeCurve best(List<DiodePoint> used, double thermalVolts) {
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
    return best;
  }

  /** The curve of this n, without series resistance, through the lowest point. */
  private static DiodeCurve start(List<DiodePoint> used, double emission, double thermalVolts) {
    DiodePoint lowest = used.get(0);
    return new DiodeCurve(
        Math.log(lowest.amperes()) - lowest.volts() / (emission * thermalVolts), emission, 0);
  }

  private static FitReport report(List<DiodePoint> used, DiodeCurve curve, double thermalVolts) {
    StringBuilder sentence =
        new StringBuilder("The diode is fitted to " + used.size() + " typical points ");
    OptionalDouble residual = OptionalDouble.empty();
    if (used.size() > LEAST_POINTS) {
      double misfit = curve.misfit(used, thermalVolts);
      residual = OptionalDouble.of(misfit);
      sentence.append("to within " + percent(misfit) + " rms of the current");
    } else {
      sentence.append("exactly, so that nothing tells how well");
    }
    if (curve.emission() <= 1 || curve.emission() >= 2) {
      sentence.append(", its emission coefficient at the bound of ");
      sentence.append(written(curve.emission(), Unit.NUMBER));
    }
    sentence.append("; extrapolated below the lowest point, ");
    sentence.append(written(used.get(0).amperes(), Unit.AMPERE));
    Optional<Outlier<DiodePoint>> outlier =
        residual.orElse(0) < 0.03
            ? Optional.empty()
            : Outlier.of(
                used,
                LEAST_POINTS,
                others -> {
                  DiodeCurve without = best(others, thermalVolts);
                  return point -> without.misfit(point, thermalVolts);
                });
    outlier.ifPresent(
        found ->
            sentence.append(
                "; look at the point "
                    + written(found.point())
                    + " again, it lies "
                    + found.off()
                    + " what the others say"));
    return new FitReport(
        used.size(), residual, outlier.isPresent(), sentence.append('.').toString());
  }

  private static String percent(double fraction) {
    return fraction < 0.001 ? "0.1 %" : written(fraction, Unit.FRACTION);
  }

  private static String written(DiodePoint point) {
    return written(point.volts(), Unit.VOLT) + " at " + written(point.amperes(), Unit.AMPERE);
  }

  private static String written(double number, Unit unit) {
    return QuantityText.format(number, unit, Locale.ROOT);
  }

  /** One sentence for the designer. */
  public String sentence() {
    return report.sentence();
  }
}
