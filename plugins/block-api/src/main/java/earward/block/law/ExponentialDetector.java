package earward.block.law;

/**
 * The exponential diode without resistance that feeds a well-filtered load R from a carrier E·cos
 * θ.
 *
 * <p>Mean current J = Is·(exp(−V/nVt)·I0(E/nVt) − 1), fundamental K = 2·Is·exp(−V/nVt)·I1(E/nVt).
 * Source: Clarke and Hess, Communication Circuits, 1971. Domain: R·C of many carrier cycles, no
 * resistance in the diode or the source.
 */
public final class ExponentialDetector {
  private ExponentialDetector() {}

  /**
   * DC out, in volts: solves I0(E/nVt) = exp(V/nVt)·(1 + V/(R·Is)).
   *
   * @param peakVolts E, at least 0
   * @param loadOhms R, above 0
   * @param saturationAmperes Is, above 0
   * @param scaledThermalVolts n·Vt, above 0
   */
  public static double directVolts(
      double peakVolts, double loadOhms, double saturationAmperes, double scaledThermalVolts) {
    double drive = peakVolts / scaledThermalVolts;
    double logOfBessel = drive + Math.log(Bessel.scaled(0, drive));
    double low = 0;
    double high = Math.max(peakVolts, 1e-300);
    for (int i = 0; i < 200; i++) {
      double middle = (low + high) / 2;
      double left =
          middle / scaledThermalVolts + Math.log1p(middle / (loadOhms * saturationAmperes));
      if (left < logOfBessel) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }

  /**
   * What the detector presents to the carrier, E/K in ohms.
   *
   * @see #directVolts for the parameters
   */
  public static double inputOhms(
      double peakVolts, double loadOhms, double saturationAmperes, double scaledThermalVolts) {
    double direct = directVolts(peakVolts, loadOhms, saturationAmperes, scaledThermalVolts);
    double drive = peakVolts / scaledThermalVolts;
    double fundamental =
        2
            * saturationAmperes
            * Math.exp(drive - direct / scaledThermalVolts)
            * Bessel.scaled(1, drive);
    return peakVolts / fundamental;
  }

  /**
   * DC out of a weak carrier: E²/(4·n·Vt)·R/(R + Rj), Rj = n·Vt/Is.
   *
   * <p>Domain: E below about n·Vt, where it errs by 6 %. Source: expansion of I0 to second order.
   */
  public static double squareLawVolts(
      double peakVolts, double loadOhms, double saturationAmperes, double scaledThermalVolts) {
    double junctionOhms = scaledThermalVolts / saturationAmperes;
    return peakVolts * peakVolts / (4 * scaledThermalVolts) * loadOhms / (loadOhms + junctionOhms);
  }

  /**
   * Second harmonic over fundamental of a square-law detector: m/4. Source: (1 + m·cos)² expanded.
   */
  public static double squareLawDistortion(double depth) {
    return depth / 4;
  }
}
