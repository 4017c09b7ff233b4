package earward.feeds;

/**
 * A tuned circuit as the diode's winding shows it, without the diode.
 *
 * @param parallelOhms Rp at that winding
 * @param quality Q, loaded by the stage before it
 */
record AtWinding(double parallelOhms, double quality) {

  /**
   * What a can's own figures come to at the diode's winding: Rp = n²·(Q0/(ω·C) ∥ Rs), Q =
   * ω·C·(Q0/(ω·C) ∥ Rs). Source: parallel tuned circuit and ideal transformer, any network text.
   *
   * @param farads C across the tuned winding, above 0
   * @param unloadedQuality Q0 of the coil in its can, above 0
   * @param turnsRatio n, turns of the diode's winding over those of the tuned winding, above 0
   * @param stageOhms Rs, output resistance of the IF stage across the tuned winding, above 0
   * @param carrierHertz where it is tuned
   */
  static AtWinding ofCan(
      double farads,
      double unloadedQuality,
      double turnsRatio,
      double stageOhms,
      double carrierHertz) {
    double susceptance = 2 * Math.PI * carrierHertz * farads;
    double ohms = 1 / (susceptance / unloadedQuality + 1 / stageOhms);
    return new AtWinding(turnsRatio * turnsRatio * ohms, Math.max(1, susceptance * ohms));
  }
}
