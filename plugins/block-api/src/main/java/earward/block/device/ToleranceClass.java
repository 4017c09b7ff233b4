package earward.block.device;

/**
 * By what a parameter of one part differs from that of the next: the class says which tolerance of
 * the kit design applies. FIXED parameters do not differ.
 */
public enum ToleranceClass {
  FIXED(0),
  RESISTOR(0.05),
  FILM_CAPACITOR(0.10),
  CERAMIC_CAPACITOR(0.10),
  ELECTROLYTIC(0.20),
  INDUCTOR(0.10),
  POTENTIOMETER_TRACK(0.20),
  POTENTIOMETER_TAPER(0.20),
  /** Saturation current of a diode or transistor; a band in the part's own model comes first. */
  SATURATION_CURRENT(0.40),
  CURRENT_GAIN(0.50),
  AMPLIFIER_GAIN(0.12),
  QUIESCENT_CURRENT(0.40),
  LOUDSPEAKER(0.15),
  WINDING(0.10),
  SUPPLY(0.05);

  private final double usualFraction;

  ToleranceClass(double usualFraction) {
    this.usualFraction = usualFraction;
  }

  /** The tolerance to both sides that applies when the design says nothing (common practice). */
  public double usualFraction() {
    return usualFraction;
  }
}
