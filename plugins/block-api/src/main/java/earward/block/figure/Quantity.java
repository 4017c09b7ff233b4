package earward.block.figure;

import earward.block.quantity.Unit;
import java.util.Optional;

/**
 * What a figure measures. The key is its one name in Java, files, JSON and CSV.
 *
 * <p>Which place has it in which case, and its sign: the table of {@link earward.block.figure}.
 */
public enum Quantity {
  // at a node or a test point
  DC_VOLTS("dc-volts", Unit.VOLT),
  /** Fundamental of the test tone. */
  AUDIO_RMS_VOLTS("audio-rms-volts", Unit.VOLT),
  /** Harmonics 2 to 10 over the fundamental: of detector and clipping IC, no other transistor. */
  DISTORTION("distortion", Unit.FRACTION),
  /** Second harmonic of the test tone over its fundamental. */
  SECOND_HARMONIC("second-harmonic", Unit.FRACTION),
  /** Third harmonic of the test tone over its fundamental. */
  THIRD_HARMONIC("third-harmonic", Unit.FRACTION),
  CARRIER_RMS_VOLTS("carrier-rms-volts", Unit.VOLT),
  SECOND_CARRIER_RMS_VOLTS("second-carrier-rms-volts", Unit.VOLT),
  THIRD_CARRIER_RMS_VOLTS("third-carrier-rms-volts", Unit.VOLT),
  /** The back end's own noise over the audio band of the conditions, not weighted. */
  NOISE_RMS_VOLTS("noise-rms-volts", Unit.VOLT),
  /** The same from 22.4 Hz to 22.4 kHz, weighted by the curve A of IEC 61672-1. */
  A_WEIGHTED_NOISE_RMS_VOLTS("a-weighted-noise-rms-volts", Unit.VOLT),
  // of a part
  /** Positive from the first terminal to the second; of a transistor from collector to emitter. */
  DC_AMPERES("dc-amperes", Unit.AMPERE),
  /** DC voltage from the first terminal of a part to its last, in the order of dc-amperes. */
  DROP_VOLTS("drop-volts", Unit.VOLT),
  /** Heat of DC; of an amplifier IC with its drive, of a detector diode with its bare carrier. */
  DISSIPATION_WATTS("dissipation-watts", Unit.WATT),
  JUNCTION_CELSIUS("junction-celsius", Unit.CELSIUS),
  /** Touchable surface: case or heat sink. */
  SURFACE_CELSIUS("surface-celsius", Unit.CELSIUS),
  /** Highest reverse voltage across a diode. */
  REVERSE_PEAK_VOLTS("reverse-peak-volts", Unit.VOLT),
  /** Unmodulated carrier peak at a diode's drive, with all loads in place. */
  CARRIER_PEAK_VOLTS("carrier-peak-volts", Unit.VOLT),
  /** DC out of a detector over the carrier peak that drives it. */
  DETECTION_EFFICIENCY("detection-efficiency", Unit.FRACTION),
  /** What a carrier-driven device presents to the carrier. */
  CARRIER_INPUT_OHMS("carrier-input-ohms", Unit.OHM),
  /** Impedance at the test tone of all that a detector drives over its resistance at DC. */
  LOAD_RATIO("load-ratio", Unit.FRACTION),
  /** Depth at which the clipping rule says that the detector lets go. */
  CLIPPING_DEPTH("clipping-depth", Unit.FRACTION),
  /** The same with the detector's reservoir capacitor taken away: names the cause. */
  CLIPPING_DEPTH_WITHOUT_CAPACITOR("clipping-depth-without-capacitor", Unit.FRACTION),
  /** The same with all coupling capacitors opened: names the cause. */
  CLIPPING_DEPTH_WITHOUT_COUPLING("clipping-depth-without-coupling", Unit.FRACTION),
  /** Depth at which a diode's mean current first reverses, solved. */
  REVERSAL_DEPTH("reversal-depth", Unit.FRACTION),
  /** Depth of 3 % distortion, solved; of the path the lesser of detector and power stage. */
  CLEAN_DEPTH("clean-depth", Unit.FRACTION),
  /** Depth at which the power stage clips so far that it distorts by 3 %. */
  POWER_STAGE_DEPTH("power-stage-depth", Unit.FRACTION),
  /** Where a knob stands, as a share of its turn. */
  KNOB_POSITION("knob-position", Unit.FRACTION),
  /** Supply voltage across an amplifier IC, rails at the case's state. */
  SUPPLY_VOLTS("supply-volts", Unit.VOLT),
  /** Of the output of an amplifier IC. */
  PEAK_AMPERES("peak-amperes", Unit.AMPERE),
  /** What an amplifier IC gives the load at the edge of clipping. */
  CLIP_WATTS("clip-watts", Unit.WATT),
  /** What an amplifier IC gives the load at 10 % distortion. */
  TEN_PERCENT_WATTS("ten-percent-watts", Unit.WATT),
  /** Ripple on the rail of a battery or adaptor over what of it reaches the path's end. */
  RIPPLE_REJECTION_DECIBELS("ripple-rejection-decibels", Unit.DECIBEL),
  /** Fundamental of an adaptor's ripple at the path's end. */
  HUM_RMS_VOLTS("hum-rms-volts", Unit.VOLT),
  /** Frequency at which the loop through the rail is nearest to sustaining itself. */
  RAIL_LOOP_HERTZ("rail-loop-hertz", Unit.HERTZ),
  /** Rated resistance of the load at the end of the path that an amplifier IC drives. */
  LOAD_OHMS("load-ohms", Unit.OHM),
  // of a seam
  ONWARD_OHMS("onward-ohms", Unit.OHM),
  BACKWARD_OHMS("backward-ohms", Unit.OHM),
  LOADING_LOSS_DECIBELS("loading-loss-decibels", Unit.DECIBEL),
  LOWEST_TONE_ONWARD_OHMS("lowest-tone-onward-ohms", Unit.OHM),
  HIGHEST_TONE_ONWARD_OHMS("highest-tone-onward-ohms", Unit.OHM),
  LOWEST_TONE_BACKWARD_OHMS("lowest-tone-backward-ohms", Unit.OHM),
  HIGHEST_TONE_BACKWARD_OHMS("highest-tone-backward-ohms", Unit.OHM),
  LOWEST_TONE_LOADING_LOSS_DECIBELS("lowest-tone-loading-loss-decibels", Unit.DECIBEL),
  HIGHEST_TONE_LOADING_LOSS_DECIBELS("highest-tone-loading-loss-decibels", Unit.DECIBEL),
  /** Looking on at the carrier, where enough of it still passes. */
  CARRIER_ONWARD_OHMS("carrier-onward-ohms", Unit.OHM),
  CARRIER_BACKWARD_OHMS("carrier-backward-ohms", Unit.OHM),
  /** What the load ratio of the detector before the seam would be if the path ended there. */
  LOAD_RATIO_WITHOUT("load-ratio-without", Unit.FRACTION),
  HEADROOM_DECIBELS("headroom-decibels", Unit.DECIBEL),
  // of the path
  LOW_EDGE_HERTZ("low-edge-hertz", Unit.HERTZ),
  HIGH_EDGE_HERTZ("high-edge-hertz", Unit.HERTZ),
  /** Largest deviation of the response from the curve wanted, within the audio band, with sign. */
  RESPONSE_DEVIATION_DECIBELS("response-deviation-decibels", Unit.DECIBEL),
  /** Where that is. */
  RESPONSE_DEVIATION_HERTZ("response-deviation-hertz", Unit.HERTZ),
  OUTPUT_RMS_VOLTS("output-rms-volts", Unit.VOLT),
  OUTPUT_WATTS("output-watts", Unit.WATT),
  /** Test tone over the noise of the audio band, not weighted. */
  SIGNAL_TO_NOISE_DECIBELS("signal-to-noise-decibels", Unit.DECIBEL),
  /** Test tone over the A-weighted noise. */
  A_WEIGHTED_SIGNAL_TO_NOISE_DECIBELS("a-weighted-signal-to-noise-decibels", Unit.DECIBEL),
  /** Test tone over hum. */
  SIGNAL_TO_HUM_DECIBELS("signal-to-hum-decibels", Unit.DECIBEL),
  SUPPLY_AMPERES("supply-amperes", Unit.AMPERE),
  BATTERY_HOURS("battery-hours", Unit.HOUR),
  SOUND_DECIBELS("sound-decibels", Unit.DECIBEL),
  /**
   * How much more the strongest signal drives an amplifier than its input bears; below 0 is well.
   */
  OVERLOAD_DECIBELS("overload-decibels", Unit.DECIBEL),
  /**
   * Margin of the loop through the supply against motor-boating: how many times the internal
   * resistance might be until it sustains itself; infinite where it never would.
   */
  RAIL_LOOP_MARGIN_DECIBELS("rail-loop-margin-decibels", Unit.DECIBEL);

  private final String key;
  private final Unit unit;

  Quantity(String key, Unit unit) {
    this.key = key;
    this.unit = unit;
  }

  /** The name as written. */
  public String key() {
    return key;
  }

  /** The unit in which its figures are held. */
  public Unit unit() {
    return unit;
  }

  /** The quantity of this written name. */
  public static Optional<Quantity> ofKey(String key) {
    for (Quantity quantity : values()) {
      if (quantity.key.equals(key)) {
        return Optional.of(quantity);
      }
    }
    return Optional.empty();
  }
}
