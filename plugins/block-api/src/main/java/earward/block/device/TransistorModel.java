package earward.block.device;

/**
 * A bipolar transistor by the figures of the Ebers-Moll law.
 *
 * <p>Source: Ebers and Moll 1954.
 *
 * @param name part type
 * @param pnp whether it is pnp rather than npn
 * @param saturationAmperes Is at 25 °C, above 0
 * @param currentGain forward current gain, above 0
 * @param reverseGain reverse current gain, above 0
 * @param earlyVolts Early voltage, above 0, infinite for none
 * @param mostVolts collector-emitter voltage that it bears, above 0
 * @param mostAmperes collector current that it bears, above 0
 * @param mostJunctionCelsius highest junction temperature
 * @param junctionToAirKelvinPerWatt thermal resistance in still air, above 0
 */
public record TransistorModel(
    String name,
    boolean pnp,
    double saturationAmperes,
    double currentGain,
    double reverseGain,
    double earlyVolts,
    double mostVolts,
    double mostAmperes,
    double mostJunctionCelsius,
    double junctionToAirKelvinPerWatt)
    implements PartModel {
  public TransistorModel {
    Require.named(name, "transistor");
    Require.above(0, saturationAmperes, name + ": saturation current (A)");
    Require.above(0, currentGain, name + ": current gain");
    Require.above(0, reverseGain, name + ": reverse current gain");
    Require.above(0, earlyVolts, name + ": Early voltage (V)");
    Require.above(0, mostVolts, name + ": highest voltage (V)");
    Require.above(0, mostAmperes, name + ": highest current (A)");
    Require.above(0, mostJunctionCelsius, name + ": highest junction temperature (°C)");
    Require.above(0, junctionToAirKelvinPerWatt, name + ": thermal resistance (K/W)");
  }

  @Override
  public PartKind kind() {
    return PartKind.TRANSISTOR;
  }
}
