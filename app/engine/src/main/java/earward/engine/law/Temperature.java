package earward.engine.law;

import earward.block.device.DiodeMaterial;

/** Thermal voltage and the movement of saturation currents with temperature. */
public final class Temperature {
  /** Boltzmann constant, J/K, exact (SI 2019). */
  private static final double BOLTZMANN = 1.380649e-23;

  /** Elementary charge, C, exact (SI 2019). */
  private static final double CHARGE = 1.602176634e-19;

  /** 0 °C in K, exact. */
  private static final double ZERO_CELSIUS = 273.15;

  /** Temperature for which saturation currents are given, °C. */
  private static final double GIVEN_AT_CELSIUS = 25;

  private Temperature() {}

  /** Vt = kT/q, in V: 25.693 mV at 25 °C. */
  public static double thermalVolts(double celsius) {
    return BOLTZMANN * (celsius + ZERO_CELSIUS) / CHARGE;
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
