package earward.block.device;

/**
 * A battery from new to its end.
 *
 * @param name type, with the number of cells
 * @param newVolts open-circuit voltage when new, above 0
 * @param newOhms internal resistance when new, above 0
 * @param endVolts open-circuit voltage at its end, above 0, below newVolts
 * @param endOhms internal resistance at its end, above 0
 * @param capacityAmpereHours to the end voltage at the reference current, above 0
 * @param referenceAmperes current for which the capacity holds, above 0
 * @param capacityExponent how capacity falls with load: capacity·(reference/current)^exponent, from
 *     0 to 0.5
 * @param highestVolts what the holder can bring at worst (wrong chemistry in it), at least newVolts
 * @param mostAmperes current that it gives for long without harm, above 0
 */
public record BatteryModel(
    String name,
    double newVolts,
    double newOhms,
    double endVolts,
    double endOhms,
    double capacityAmpereHours,
    double referenceAmperes,
    double capacityExponent,
    double highestVolts,
    double mostAmperes)
    implements PartModel {
  public BatteryModel {
    Require.named(name, "battery");
    Require.positive(1e3, endVolts, name + ": end voltage (V)");
    Require.above(endVolts, newVolts, name + ": voltage when new (V)");
    Require.atMost(1e3, newVolts, name + ": voltage when new (V)");
    Require.positive(1e6, newOhms, name + ": internal resistance when new (Ω)");
    Require.positive(1e6, endOhms, name + ": internal resistance at the end (Ω)");
    Require.positive(1e4, capacityAmpereHours, name + ": capacity (Ah)");
    Require.positive(1e4, referenceAmperes, name + ": reference current (A)");
    Require.within(0, 0.5, capacityExponent, name + ": capacity exponent");
    Require.atLeast(newVolts, highestVolts, name + ": highest voltage (V)");
    Require.atMost(1e3, highestVolts, name + ": highest voltage (V)");
    Require.positive(1e4, mostAmperes, name + ": highest current (A)");
  }

  @Override
  public PartKind kind() {
    return PartKind.BATTERY;
  }
}
