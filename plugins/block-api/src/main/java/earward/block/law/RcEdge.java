package earward.block.law;

/** The corner of one resistance and one capacitance. Source: f = 1/(2π·R·C), any network text. */
public final class RcEdge {
  private RcEdge() {}

  /** The frequency at which the response is 3.01 dB down, in hertz. */
  public static double hertz(double ohms, double farads) {
    return 1 / (2 * Math.PI * ohms * farads);
  }

  /** The capacitance that puts the corner there, in farads. */
  public static double farads(double ohms, double hertz) {
    return 1 / (2 * Math.PI * ohms * hertz);
  }

  /** The corner of a time constant, in hertz. */
  public static double ofTimeConstant(double seconds) {
    return 1 / (2 * Math.PI * seconds);
  }

  /**
   * Peak-to-peak carrier ripple of a lightly loaded half-wave detector: Vdc/(R·C·fc), in volts.
   *
   * <p>Domain: R·C of at least 20 carrier cycles. Source: constant-current discharge over one cycle
   * (common practice).
   */
  public static double ripplePeakToPeakVolts(
      double directVolts, double ohms, double farads, double carrierHertz) {
    return directVolts / (ohms * farads * carrierHertz);
  }
}
