package earward.block.device;

/** What a capacitor is made of; it decides tolerance, marking and polarity. */
public enum Dielectric {
  FILM(ToleranceClass.FILM_CAPACITOR),
  CERAMIC(ToleranceClass.CERAMIC_CAPACITOR),
  ELECTROLYTIC(ToleranceClass.ELECTROLYTIC);

  private final ToleranceClass tolerance;

  Dielectric(ToleranceClass tolerance) {
    this.tolerance = tolerance;
  }

  /** The tolerance class of the capacitance. */
  public ToleranceClass tolerance() {
    return tolerance;
  }

  /** Whether end A must be the positive one. */
  public boolean polarised() {
    return this == ELECTROLYTIC;
  }

  /**
   * What a designer would fit for this capacitance: ceramic below 1 nF, film below 1 µF,
   * electrolytic from there (common practice).
   */
  public static Dielectric usualFor(double farads) {
    if (farads < 0.999e-9) {
      return CERAMIC;
    }
    return farads < 0.999e-6 ? FILM : ELECTROLYTIC;
  }
}
