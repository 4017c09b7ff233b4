package earward.block.device;

/**
 * A junction field-effect transistor by the square law i = Idss·(1 − vgs/Vp)².
 *
 * <p>Source: Shockley 1952, in the square-law form of any device text.
 *
 * @param name part type
 * @param pChannel whether it is p-channel rather than n-channel
 * @param saturatedDrainAmperes Idss, above 0
 * @param pinchOffVolts magnitude of Vp, above 0
 * @param mostVolts drain-source voltage that it bears, above 0
 * @param mostJunctionCelsius highest junction temperature
 * @param junctionToAirKelvinPerWatt thermal resistance in still air, above 0
 */
public record FieldEffectModel(
    String name,
    boolean pChannel,
    double saturatedDrainAmperes,
    double pinchOffVolts,
    double mostVolts,
    double mostJunctionCelsius,
    double junctionToAirKelvinPerWatt)
    implements PartModel {
  public FieldEffectModel {
    Require.named(name, "field-effect transistor");
    Require.positive(100, saturatedDrainAmperes, name + ": saturated drain current (A)");
    Require.positive(100, pinchOffVolts, name + ": pinch-off voltage (V)");
    Require.positive(1e5, mostVolts, name + ": highest voltage (V)");
    Require.positive(500, mostJunctionCelsius, name + ": highest junction temperature (°C)");
    Require.positive(1e4, junctionToAirKelvinPerWatt, name + ": thermal resistance (K/W)");
  }

  @Override
  public PartKind kind() {
    return PartKind.FIELD_EFFECT_TRANSISTOR;
  }
}
