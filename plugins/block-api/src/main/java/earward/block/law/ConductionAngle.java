package earward.block.law;

/**
 * The straight-line diode with resistance Rd that feeds a well-filtered load R: tan θ − θ = π·Rd/R,
 * where θ is half the angle of conduction.
 *
 * <p>Source: Terman, Radio Engineers' Handbook; Radiotron Designer's Handbook, 4th ed., ch. 27
 * (both from memory). Domain: carrier well above the diode's knee, R·C of many carrier cycles. Rd
 * is the diode's resistance plus the source's.
 */
public final class ConductionAngle {
  private ConductionAngle() {}

  /**
   * θ in radians.
   *
   * @param loadOverDiode R/Rd, above 0
   */
  public static double radians(double loadOverDiode) {
    double wanted = Math.PI / loadOverDiode;
    double low = 0;
    double high = Math.PI / 2;
    for (int i = 0; i < 60; i++) {
      double middle = (low + high) / 2;
      if (Math.tan(middle) - middle < wanted) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }

  /** Detection efficiency: DC out over carrier peak, cos θ. */
  public static double efficiency(double loadOverDiode) {
    return Math.cos(radians(loadOverDiode));
  }

  /**
   * What the detector presents to the carrier, over the load resistance: (Rd/R)·π/(θ − sin θ·cos
   * θ), exact for this diode.
   */
  public static double inputOverLoad(double loadOverDiode) {
    double angle = radians(loadOverDiode);
    return Math.PI / (angle - Math.sin(angle) * Math.cos(angle)) / loadOverDiode;
  }

  /** The same by the short form 1/(2η), which errs by 2 % at R/Rd = 100 and 7 % at 10. */
  public static double inputOverLoadShort(double loadOverDiode) {
    return 1 / (2 * efficiency(loadOverDiode));
  }
}
