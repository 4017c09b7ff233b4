package earward.block.device;

/**
 * What an amplifier IC bears, and how it sheds heat.
 *
 * @param leastVolts lowest supply
 * @param mostVolts absolute maximum supply
 * @param leastLoadOhms least load, above 0
 * @param mostPeakAmperes highest output current, above 0
 * @param mostJunctionCelsius highest junction temperature
 * @param junctionToAirKelvinPerWatt bare package in still air, above 0
 * @param junctionToCaseKelvinPerWatt junction to case or to the pins that cool, above 0
 */
public record AmplifierRatings(
    double leastVolts,
    double mostVolts,
    double leastLoadOhms,
    double mostPeakAmperes,
    double mostJunctionCelsius,
    double junctionToAirKelvinPerWatt,
    double junctionToCaseKelvinPerWatt) {
  public AmplifierRatings {
    Require.positive(1e3, leastVolts, "lowest supply (V)");
    Require.above(leastVolts, mostVolts, "absolute maximum supply (V)");
    Require.atMost(1e3, mostVolts, "absolute maximum supply (V)");
    Require.positive(1e6, leastLoadOhms, "least load (Ω)");
    Require.positive(1e3, mostPeakAmperes, "highest output current (A)");
    Require.above(25, mostJunctionCelsius, "highest junction temperature (°C)");
    Require.atMost(500, mostJunctionCelsius, "highest junction temperature (°C)");
    Require.positive(1e4, junctionToAirKelvinPerWatt, "thermal resistance to air (K/W)");
    Require.positive(1e4, junctionToCaseKelvinPerWatt, "thermal resistance to case (K/W)");
  }
}
