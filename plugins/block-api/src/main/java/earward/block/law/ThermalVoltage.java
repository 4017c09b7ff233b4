package earward.block.law;

/** The voltage by which a junction's current grows e-fold. Source: the SI of 2019, exact values. */
public final class ThermalVoltage {
  /** Boltzmann constant, J/K, exact. */
  public static final double BOLTZMANN = 1.380649e-23;

  /** Elementary charge, C, exact. */
  public static final double CHARGE = 1.602176634e-19;

  /** 0 °C in K, exact. */
  public static final double ZERO_CELSIUS = 273.15;

  private ThermalVoltage() {}

  /**
   * Vt = kT/q, in volts: 25.693 mV at 25 °C.
   *
   * @param celsius temperature, above -273.15 °C
   */
  public static double volts(double celsius) {
    return BOLTZMANN * (celsius + ZERO_CELSIUS) / CHARGE;
  }
}
