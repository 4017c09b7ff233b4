package earward.block.law;

/**
 * Heat from a junction to the air: ΔT = P·Σθ.
 *
 * <p>Source: the thermal Ohm's law of every power data sheet, for instance NXP TDA2613 (July 1994),
 * page 5. Temperatures in °C, thermal resistances in K/W.
 */
public final class ThermalChain {
  private ThermalChain() {}

  /** Junction temperature, in °C. */
  public static double junctionCelsius(
      double ambientCelsius, double watts, double junctionToAirKelvinPerWatt) {
    return ambientCelsius + watts * junctionToAirKelvinPerWatt;
  }

  /**
   * The heat sink that is needed, in K/W; not above 0 where none is good enough.
   *
   * @param interfaceKelvinPerWatt case to heat sink, at least 0
   */
  public static double heatSinkKelvinPerWatt(
      double watts,
      double ambientCelsius,
      double mostJunctionCelsius,
      double junctionToCaseKelvinPerWatt,
      double interfaceKelvinPerWatt) {
    return (mostJunctionCelsius - ambientCelsius) / watts
        - junctionToCaseKelvinPerWatt
        - interfaceKelvinPerWatt;
  }

  /**
   * Junction to air with a heat sink: the bare package beside the way through case and sink.
   *
   * @param heatSinkKelvinPerWatt with its interface, may be infinite
   */
  public static double withHeatSink(
      double junctionToAirKelvinPerWatt,
      double junctionToCaseKelvinPerWatt,
      double heatSinkKelvinPerWatt) {
    double through = junctionToCaseKelvinPerWatt + heatSinkKelvinPerWatt;
    return Double.isInfinite(through)
        ? junctionToAirKelvinPerWatt
        : 1 / (1 / junctionToAirKelvinPerWatt + 1 / through);
  }
}
