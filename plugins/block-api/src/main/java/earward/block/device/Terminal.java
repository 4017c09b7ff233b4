package earward.block.device;

/** The named ends of a device. A device kind lists the ones that it has, in drawing order. */
public enum Terminal {
  /** First end of a two-ended part; the positive end of an electrolytic capacitor. */
  A,
  /** Second end of a two-ended part. */
  B,
  /** Of a diode: where current goes in when it conducts. */
  ANODE,
  /** Of a diode: the end with the ring. */
  CATHODE,
  /** Upper end of a track or a winding. */
  TOP,
  /** Slider of a potentiometer. */
  WIPER,
  /** Tap of a winding or of a track. */
  TAP,
  /** Lower end of a track or a winding. */
  BOTTOM,
  /** Start of the winding that is not TOP to BOTTOM; in phase with TOP. */
  PRIMARY_START,
  /** End of the winding that is not TOP to BOTTOM. */
  PRIMARY_END,
  /** Of a bipolar transistor. */
  BASE,
  /** Of a bipolar transistor. */
  COLLECTOR,
  /** Of a bipolar transistor. */
  EMITTER,
  /** Of a field-effect transistor. */
  GATE,
  /** Of a field-effect transistor. */
  DRAIN,
  /** Of a field-effect transistor. */
  SOURCE,
  /** Of a battery or an adaptor. */
  PLUS,
  /** Of a battery or an adaptor. */
  MINUS,
  /** Signal input; the non-inverting one where there are two. */
  INPUT,
  /** The inverting input. */
  INVERTING,
  /**
   * The inverting input of a bridge amplifier's second half, joined to the first by a capacitor.
   */
  INVERTING_TWO,
  /** The output, or the first one of a bridge amplifier. */
  OUTPUT,
  /** The second output of a bridge amplifier. */
  OUTPUT_TWO,
  /** Supply pin. */
  SUPPLY,
  /** Ground pin. */
  GROUND,
  /** Where parts from outside set the gain of an amplifier. */
  GAIN,
  /** Where a capacitor holds ripple off the bias of an amplifier. */
  RIPPLE,
  /** Where a capacitor from the output, fed from the supply, lets an amplifier swing further. */
  BOOTSTRAP,
  /** Where a capacitor sets the upper edge of an amplifier. */
  COMPENSATION,
  /** Where a DC voltage sets the gain of an amplifier. */
  CONTROL
}
