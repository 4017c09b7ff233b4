package earward.kit.file;

import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.law.ThermalVoltage;
import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import earward.kit.parts.DiodeFit;
import earward.kit.parts.DiodePoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Supplier;

/**
 * A diode's figures as a JSON object: given, or fitted to the typical ones of its {@code points}
 * where no saturation current is given, or those of its {@code zero-bias resistance}. Points that
 * are limits are held against the figures.
 */
final class DiodeForm {
  private static final String SATURATION = "saturation current";
  private static final String EMISSION = "emission coefficient";
  private static final String SERIES = "series resistance";
  private static final String ZERO_BIAS = "zero-bias resistance";
  private static final String POINTS = "points";
  private static final double CELSIUS = 25;

  private DiodeForm() {}

  static FittedPart read(MembersReader in, String name) throws DesignFileException {
    List<DiodePoint> points = points(in);
    Optional<DiodeFit> fit = fit(in, points);
    double saturation =
        fit.isPresent()
            ? fit.get().saturationAmperes()
            : in.requiredQuantity(SATURATION, Unit.AMPERE);
    DiodeModel model =
        new DiodeModel(
            name,
            material(in),
            saturation,
            in.quantity("least saturation current", Unit.AMPERE, saturation),
            in.quantity("most saturation current", Unit.AMPERE, saturation),
            fit.isPresent()
                ? fit.get().emissionCoefficient()
                : in.requiredQuantity(EMISSION, Unit.NUMBER),
            fit.isPresent() ? fit.get().seriesOhms() : in.quantity(SERIES, Unit.OHM, 0),
            in.quantity("junction capacitance", Unit.FARAD, 0),
            in.quantity("built-in voltage", Unit.VOLT, 0.5),
            in.quantity("grading exponent", Unit.NUMBER, 0.5),
            in.quantity("leakage resistance", Unit.OHM, Double.POSITIVE_INFINITY),
            in.quantity("breakdown voltage", Unit.VOLT, 1000),
            in.quantity("recovery time", Unit.SECOND, 0));
    requireBelowLimits(model, points);
    return new FittedPart(model, fit.map(DiodeFit::report));
  }

  /**
   * The fit: to the zero-bias resistance, or to the points where no saturation current is given.
   */
  private static Optional<DiodeFit> fit(MembersReader in, List<DiodePoint> points)
      throws DesignFileException {
    OptionalDouble zeroBias = in.quantity(ZERO_BIAS, Unit.OHM);
    if (zeroBias.isPresent()) {
      refuse(in, SATURATION, "is given beside '" + ZERO_BIAS + "'; wanted one of them");
      double emission = in.quantity(EMISSION, Unit.NUMBER, DiodeFit.usualEmission(material(in)));
      double series = in.quantity(SERIES, Unit.OHM, 0);
      return Optional.of(
          fitted(in, () -> DiodeFit.ofZeroBias(zeroBias.getAsDouble(), emission, series)));
    }
    if (points.isEmpty() || in.find(SATURATION).isPresent()) {
      return Optional.empty();
    }
    String why = "is given while '" + SATURATION + "' is left to the fit; wanted both or none";
    refuse(in, EMISSION, why);
    refuse(in, SERIES, why);
    return Optional.of(fitted(in, () -> DiodeFit.of(points)));
  }

  private static DiodeMaterial material(MembersReader in) throws DesignFileException {
    return in.choice("material", DiodeMaterial.values(), DiodeForm::key, DiodeMaterial.SILICON);
  }

  private static void refuse(MembersReader in, String member, String why)
      throws DesignFileException {
    Optional<Json> given = in.find(member);
    if (given.isPresent()) {
      throw in.fault("given-and-fitted", given.get(), member, why);
    }
  }

  private static DiodeFit fitted(MembersReader in, Supplier<DiodeFit> fit)
      throws DesignFileException {
    try {
      return fit.get();
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  static String key(DiodeMaterial material) {
    return material.name().toLowerCase(Locale.ROOT);
  }

  private static List<DiodePoint> points(MembersReader in) throws DesignFileException {
    List<DiodePoint> points = new ArrayList<>();
    for (Json item : in.items(POINTS)) {
      MembersReader point = MembersReader.of(item, in.source(), "a point of " + in.what());
      try {
        points.add(
            new DiodePoint(
                point.requiredQuantity("voltage", Unit.VOLT),
                point.requiredQuantity("current", Unit.AMPERE),
                Meaning.typical(point)));
      } catch (IllegalArgumentException e) {
        throw point.impossible(e);
      }
    }
    return points;
  }

  /** A model above its own data sheet's limit is a slip in the entry. */
  private static void requireBelowLimits(DiodeModel model, List<DiodePoint> points) {
    for (DiodePoint point : points) {
      double volts =
          model.emissionCoefficient()
                  * ThermalVoltage.volts(CELSIUS)
                  * Math.log1p(point.amperes() / model.saturationAmperes())
              + point.amperes() * model.seriesOhms();
      if (!point.typical() && point.amperes() <= DiodeFit.MOST_AMPERES && volts > point.volts()) {
        throw new IllegalArgumentException(
            "at "
                + written(point.amperes(), Unit.AMPERE)
                + " the figures give "
                + written(volts, Unit.VOLT)
                + "; the limit given is "
                + written(point.volts(), Unit.VOLT));
      }
    }
  }

  private static String written(double number, Unit unit) {
    return QuantityText.format(number, unit, Locale.ROOT);
  }
}
