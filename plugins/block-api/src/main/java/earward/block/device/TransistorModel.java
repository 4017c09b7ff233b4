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
 * @param baseOhms resistance between the base lead and the inner base, above 0: it makes noise
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
    double junctionToAirKelvinPerWatt,
    double baseOhms)
    implements PartModel {
  /** What is taken where a base resistance is not stated, in Ω. */
  private static final double LEAST_BASE_OHMS = 1;

  public TransistorModel {
    Require.named(name, "transistor");
    Require.positive(0.01, saturationAmperes, name + ": saturation current (A)");
    Require.positive(1e6, currentGain, name + ": current gain");
    Require.positive(1e6, reverseGain, name + ": reverse current gain");
    Require.above(0, earlyVolts, name + ": Early voltage (V)");
    Require.positive(1e5, mostVolts, name + ": highest voltage (V)");
    Require.positive(1e3, mostAmperes, name + ": highest current (A)");
    Require.positive(500, mostJunctionCelsius, name + ": highest junction temperature (°C)");
    Require.positive(1e4, junctionToAirKelvinPerWatt, name + ": thermal resistance (K/W)");
    Require.positive(1e5, baseOhms, name + ": base resistance (Ω)");
  }

  /** A transistor whose base resistance is not known: 1 Ω, which makes no noise to speak of. */
  public TransistorModel(
      String name,
      boolean pnp,
      double saturationAmperes,
      double currentGain,
      double reverseGain,
      double earlyVolts,
      double mostVolts,
      double mostAmperes,
      double mostJunctionCelsius,
      double junctionToAirKelvinPerWatt) {
    this(
        name,
        pnp,
        saturationAmperes,
        currentGain,
        reverseGain,
        earlyVolts,
        mostVolts,
        mostAmperes,
        mostJunctionCelsius,
        junctionToAirKelvinPerWatt,
        LEAST_BASE_OHMS);
  }

  @Override
  public PartKind kind() {
    return PartKind.TRANSISTOR;
  }
}
