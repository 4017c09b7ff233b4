package earward.block.law;

/**
 * Power, current and heat of a class-B output stage.
 *
 * <p>Source: Boylestad and Nashelsky, Electronic Devices and Circuit Theory, ch. 12; bridge forms
 * as in the data sheets of bridge amplifiers. All volts are of the whole supply; a split supply ±V
 * is the single supply 2V.
 */
public final class ClassB {
  private ClassB() {}

  /** Output power of a sine: Vp²/(2·RL), in watts. */
  public static double sineWatts(double peakVolts, double loadOhms) {
    return peakVolts * peakVolts / (2 * loadOhms);
  }

  /** Mean supply current of a sine, single-ended through a capacitor: Vp/(π·RL), in amperes. */
  public static double meanAmperes(double peakVolts, double loadOhms) {
    return peakVolts / (Math.PI * loadOhms);
  }

  /** Mean supply current of a sine in a bridge: 2·Vp/(π·RL), in amperes. */
  public static double bridgeMeanAmperes(double peakVolts, double loadOhms) {
    return 2 * meanAmperes(peakVolts, loadOhms);
  }

  /** Largest dissipation with a sine, single-ended: Vs²/(2π²·RL), in watts. */
  public static double worstSineWatts(double supplyVolts, double loadOhms) {
    return supplyVolts * supplyVolts / (2 * Math.PI * Math.PI * loadOhms);
  }

  /** Largest dissipation with a sine in a bridge: 2·Vs²/(π²·RL), in watts. */
  public static double bridgeWorstSineWatts(double supplyVolts, double loadOhms) {
    return 4 * worstSineWatts(supplyVolts, loadOhms);
  }

  /**
   * Dissipation when overdriven to a square wave, single-ended: Vc·(Vs/2 − Vc)/RL, in watts.
   *
   * @param clipVolts Vc, peak of the clipped output
   */
  public static double squareWatts(double supplyVolts, double clipVolts, double loadOhms) {
    return clipVolts * (supplyVolts / 2 - clipVolts) / loadOhms;
  }

  /** The same in a bridge: Vc·(Vs − Vc)/RL, in watts. */
  public static double bridgeSquareWatts(double supplyVolts, double clipVolts, double loadOhms) {
    return clipVolts * (supplyVolts - clipVolts) / loadOhms;
  }

  /**
   * Dissipation of a sine: supply power less output power, in watts.
   *
   * @param meanAmperes supply current of the signal alone
   */
  public static double sineDissipationWatts(
      double supplyVolts, double meanAmperes, double peakVolts, double loadOhms) {
    return supplyVolts * meanAmperes - sineWatts(peakVolts, loadOhms);
  }
}
