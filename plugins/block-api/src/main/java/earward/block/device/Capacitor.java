package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A capacitor. Where the dielectric is polarised, end A is the positive one.
 *
 * <p>Terminals: A (the positive one of a polarised type), B.
 *
 * @param farads capacitance, above 0
 * @param dielectric what it is made of
 * @param ratedVolts rated DC voltage, above 0
 * @param seriesOhms equivalent series resistance, at least 0
 * @param leakageAmperes expected leakage at the rated voltage, at least 0
 */
public record Capacitor(
    double farads,
    Dielectric dielectric,
    double ratedVolts,
    double seriesOhms,
    double leakageAmperes)
    implements Device {

  public Capacitor {
    Require.above(0, farads, "capacitance (F)");
    Require.above(0, ratedVolts, "rated voltage (V)");
    Require.atLeast(0, seriesOhms, "series resistance (Ω)");
    Require.atLeast(0, leakageAmperes, "leakage (A)");
  }

  /** A lossless capacitor of the usual dielectric for its value. */
  public static Capacitor of(double farads, double ratedVolts) {
    Dielectric dielectric = Dielectric.usualFor(farads);
    return dielectric.polarised()
        ? electrolytic(farads, ratedVolts)
        : new Capacitor(farads, dielectric, ratedVolts, 0, 0);
  }

  /**
   * An electrolytic capacitor that leaks 3 % of its limit max(0.01·C·V, 3 µA).
   *
   * <p>Source of the limit: makers' data sheets, two minutes at rated voltage and 20 °C; one to ten
   * per cent of it is what a healthy one leaks (common practice).
   */
  public static Capacitor electrolytic(double farads, double ratedVolts) {
    double limitAmperes = Math.max(0.01 * farads * ratedVolts, 3e-6);
    return new Capacitor(farads, Dielectric.ELECTROLYTIC, ratedVolts, 0, 0.03 * limitAmperes);
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.A, Terminal.B);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter("farads", Unit.FARAD, farads, dielectric.tolerance()),
        Parameter.fixed("series-ohms", Unit.OHM, seriesOhms),
        Parameter.fixed("leakage-siemens", Unit.NUMBER, leakageAmperes / ratedVolts));
  }
}
