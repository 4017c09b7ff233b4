package earward.block.device;

/**
 * A three-ended series regulator.
 *
 * @param name part type
 * @param outputVolts regulated voltage, above 0
 * @param dropOutVolts least difference between input and output, at least 0
 * @param quiescentAmperes current to ground, at least 0
 * @param mostVolts highest input
 * @param mostAmperes highest output current, above 0
 * @param outputOhms output resistance while regulating, above 0
 * @param mostJunctionCelsius highest junction temperature
 * @param junctionToAirKelvinPerWatt thermal resistance in still air, above 0
 */
public record RegulatorModel(
    String name,
    double outputVolts,
    double dropOutVolts,
    double quiescentAmperes,
    double mostVolts,
    double mostAmperes,
    double outputOhms,
    double mostJunctionCelsius,
    double junctionToAirKelvinPerWatt)
    implements PartModel {
  public RegulatorModel {
    Require.named(name, "regulator");
    Require.positive(1e3, outputVolts, name + ": output (V)");
    Require.notNegative(100, dropOutVolts, name + ": drop-out voltage (V)");
    Require.notNegative(10, quiescentAmperes, name + ": quiescent current (A)");
    Require.above(outputVolts, mostVolts, name + ": highest input (V)");
    Require.positive(1e3, mostAmperes, name + ": highest current (A)");
    Require.positive(1e3, outputOhms, name + ": output resistance (Ω)");
    Require.above(25, mostJunctionCelsius, name + ": highest junction temperature (°C)");
    Require.positive(1e4, junctionToAirKelvinPerWatt, name + ": thermal resistance (K/W)");
  }

  @Override
  public PartKind kind() {
    return PartKind.REGULATOR;
  }
}
