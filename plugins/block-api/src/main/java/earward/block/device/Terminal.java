package earward.block.device;

/** The named ends of a device. A device kind lists the ones that it has, in drawing order. */
public enum Terminal {
  /** First end of a two-ended part; the positive end of an electrolytic capacitor. */
  A,
  /** Second end of a two-ended part. */
  B,
  ANODE,
  CATHODE,
  /** Upper end of a track or a winding. */
  TOP,
  /** Slider of a potentiometer. */
  WIPER,
  /** Tap of a winding. */
  TAP,
  /** Lower end of a track or a winding. */
  BOTTOM,
  PRIMARY_START,
  PRIMARY_END,
  BASE,
  COLLECTOR,
  EMITTER,
  GATE,
  DRAIN,
  SOURCE,
  PLUS,
  MINUS,
  /** Signal input; the non-inverting one where there are two. */
  INPUT,
  INVERTING,
  OUTPUT,
  /** The second output of a bridge amplifier. */
  OUTPUT_TWO,
  SUPPLY,
  GROUND,
  /** Where parts from outside set the gain of an amplifier. */
  GAIN,
  /** Where a capacitor holds ripple off the bias of an amplifier. */
  RIPPLE,
  BOOTSTRAP,
  /** Where a capacitor sets the upper edge of an amplifier. */
  COMPENSATION,
  /** Where a DC voltage sets the gain of an amplifier. */
  CONTROL
}
