package earward.engine.law;

import static earward.block.law.ThermalVoltage.BOLTZMANN;
import static earward.block.law.ThermalVoltage.CHARGE;
import static earward.block.law.ThermalVoltage.ZERO_CELSIUS;

import earward.block.device.DiodeMaterial;
import earward.block.law.ThermalVoltage;

/** Thermal voltage and the movement of saturation currents with temperature. */
public final class Temperature {
  /** Temperature for which saturation currents are given, °C. */
  private static final double GIVEN_AT_CELSIUS = 25;

  private Temperature() {}

  /** Vt = kT/q, in V: 25.693 mV at 25 °C. */
  public static double thermalVolts(double celsius) {
    return ThermalVoltage.volts(celsius);
  }

  /**
   * Is(T)/Is(25 °C) = (T/T0)^(x/n)·exp((Eg/(n·k/q))·(1/T0 − 1/T)).
   *
   * <p>Source: the saturation current of a pn or Schottky junction in any device text; x and Eg in
   * {@link DiodeMaterial}.
   */
  public static double saturationRatio(DiodeMaterial material, double emission, double celsius) {
    if (celsius == GIVEN_AT_CELSIUS) {
      return 1;
    }
    double t = celsius + ZERO_CELSIUS;
    double given = GIVEN_AT_CELSIUS + ZERO_CELSIUS;
    double exponent =
        CHARGE * material.gapElectronVolts() / (emission * BOLTZMANN) * (1 / given - 1 / t);
    return Math.pow(t / given, material.temperatureExponent() / emission) * Math.exp(exponent);
  }
}
