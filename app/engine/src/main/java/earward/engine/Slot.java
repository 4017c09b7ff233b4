package earward.engine;

import earward.block.device.ToleranceClass;
import earward.block.quantity.Unit;
import java.util.Objects;

/**
 * One value that a compiled circuit takes.
 *
 * @param name {@code PART:parameter}, {@code PROBE:meter-siemens}, {@code signal:...}, {@code
 *     ambient:celsius} or {@code load:tolerance}
 * @param nominal value of the nominal kit
 * @param unit unit of the value
 * @param tolerance the class by which kits differ in it
 */
public record Slot(String name, double nominal, Unit unit, ToleranceClass tolerance) {
  public static final String CARRIER_HERTZ = "signal:carrier-hertz";

  /** Peak of the carrier at the feed with nothing hung on it. */
  public static final String CARRIER_PEAK_VOLTS = "signal:carrier-peak-volts";

  public static final String DEPTH = "signal:depth";
  public static final String TONE_HERTZ = "signal:tone-hertz";
  public static final String HIGHEST_TONE_HERTZ = "signal:highest-tone-hertz";
  public static final String LOWEST_TONE_HERTZ = "signal:lowest-tone-hertz";
  public static final String AMBIENT_CELSIUS = "ambient:celsius";

  /** Fraction by which the least load lies under the nominal one. */
  public static final String LOAD_TOLERANCE = "load:tolerance";

  public Slot {
    Objects.requireNonNull(name);
    Objects.requireNonNull(unit);
    Objects.requireNonNull(tolerance);
  }
}
