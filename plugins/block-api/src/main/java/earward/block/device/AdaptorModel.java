package earward.block.device;

/**
 * A plug-in mains adaptor with a SELV output.
 *
 * @param name type
 * @param regulated whether its output is regulated
 * @param ratedVolts at the rated current, above 0
 * @param ratedAmperes rated current, above 0
 * @param unloadedVolts at no load and highest mains, at least ratedVolts
 * @param internalOhms resistance behind which the e.m.f. stands, above 0
 * @param rippleVolts peak-to-peak ripple at the rated current, at least 0
 * @param rippleHertz its frequency, above 0
 */
public record AdaptorModel(
    String name,
    boolean regulated,
    double ratedVolts,
    double ratedAmperes,
    double unloadedVolts,
    double internalOhms,
    double rippleVolts,
    double rippleHertz)
    implements PartModel {
  public AdaptorModel {
    Require.named(name, "adaptor");
    Require.positive(1e3, ratedVolts, name + ": rated voltage (V)");
    Require.positive(1e3, ratedAmperes, name + ": rated current (A)");
    Require.atLeast(ratedVolts, unloadedVolts, name + ": unloaded voltage (V)");
    Require.atMost(1e3, unloadedVolts, name + ": unloaded voltage (V)");
    Require.positive(1e6, internalOhms, name + ": internal resistance (Ω)");
    Require.notNegative(100, rippleVolts, name + ": ripple (V)");
    Require.positive(1e7, rippleHertz, name + ": ripple frequency (Hz)");
  }

  @Override
  public PartKind kind() {
    return PartKind.ADAPTOR;
  }
}
