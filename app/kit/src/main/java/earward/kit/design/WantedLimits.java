package earward.kit.design;

import earward.block.law.ToneCurve;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the designer wants of the kit beyond safety.
 *
 * @param lowEdgeHertz the -3 dB edge of the whole path must lie at or below it
 * @param listeningWatts output at which people will usually listen, for battery life
 * @param batteryHours life wanted at the listening level
 * @param distortion most distortion of the test signal, as a share of 1
 * @param curve what the audio response should follow; empty: a low-pass at the highest tone
 * @param listeningMetres how far from the loudspeaker people usually sit
 */
public record WantedLimits(
    double lowEdgeHertz,
    double listeningWatts,
    OptionalDouble batteryHours,
    double distortion,
    Optional<ToneCurve> curve,
    double listeningMetres) {
  /** 150 Hz, 50 mW, no life stated, 5 %, 1 m (common practice of small receivers). */
  public static final WantedLimits USUAL =
      new WantedLimits(150, 0.05, OptionalDouble.empty(), 0.05, Optional.empty(), 1);

  public WantedLimits {
    requirePositive(lowEdgeHertz, "low edge wanted (Hz)");
    requirePositive(listeningWatts, "listening level (W)");
    requirePositive(distortion, "distortion allowed");
    Objects.requireNonNull(curve);
    requirePositive(listeningMetres, "listening distance (m)");
    batteryHours.ifPresent(hours -> requirePositive(hours, "battery life wanted (h)"));
  }

  private static void requirePositive(double value, String what) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " is " + value + "; it must be above 0");
    }
  }
}
