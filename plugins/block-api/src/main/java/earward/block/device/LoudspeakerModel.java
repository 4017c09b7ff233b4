package earward.block.device;

/**
 * A loudspeaker by the figures of Thiele and Small: Z = Re + jωLe + Rm/(1 + jQms(f/fs − fs/f)), Rm
 * = Re·Qms/Qes.
 *
 * @param name part type
 * @param ratedOhms nominal impedance, above 0
 * @param dcOhms Re, above 0
 * @param dcToleranceFraction tolerance of Re, from 0 to 0.5
 * @param voiceCoilHenries Le, at least 0
 * @param resonanceHertz fs, above 0
 * @param mechanicalQ Qms, above 0
 * @param electricalQ Qes, above 0
 * @param sensitivityDecibels sound level at 1 m for 1 W into the rated impedance, above fs
 * @param ratedWatts power that it bears, above 0
 */
public record LoudspeakerModel(
    String name,
    double ratedOhms,
    double dcOhms,
    double dcToleranceFraction,
    double voiceCoilHenries,
    double resonanceHertz,
    double mechanicalQ,
    double electricalQ,
    double sensitivityDecibels,
    double ratedWatts)
    implements PartModel {
  public LoudspeakerModel {
    Require.named(name, "loudspeaker");
    Require.positive(1e5, ratedOhms, name + ": rated impedance (Ω)");
    Require.positive(1e5, dcOhms, name + ": DC resistance (Ω)");
    Require.within(0, 0.5, dcToleranceFraction, name + ": tolerance of the DC resistance");
    Require.notNegative(1, voiceCoilHenries, name + ": voice-coil inductance (H)");
    Require.positive(1e5, resonanceHertz, name + ": resonance (Hz)");
    Require.positive(1e3, mechanicalQ, name + ": mechanical Q");
    Require.positive(1e3, electricalQ, name + ": electrical Q");
    Require.within(40, 130, sensitivityDecibels, name + ": sensitivity (dB)");
    Require.positive(1e4, ratedWatts, name + ": rated power (W)");
  }

  @Override
  public PartKind kind() {
    return PartKind.LOUDSPEAKER;
  }
}
