package earward.block.law;

/** A potentiometer whose wiper is loaded. */
public final class LoadedPotentiometer {
  private LoadedPotentiometer() {}

  /**
   * Output over input: a/(1 + a·(1 − a)·Rp/RL). Source: the divider with R_L across its lower part.
   *
   * @param fractionBelowWiper a, from 0 to 1, of the track's resistance
   * @param trackOhms Rp, above 0
   * @param loadOhms RL, above 0, may be infinite
   */
  public static double ratio(double fractionBelowWiper, double trackOhms, double loadOhms) {
    double loading = fractionBelowWiper * (1 - fractionBelowWiper) * trackOhms / loadOhms;
    return fractionBelowWiper / (1 + loading);
  }

  /** The AC resistance that the wiper's load leaves of the track, seen from its top. */
  public static double inputOhms(double fractionBelowWiper, double trackOhms, double loadOhms) {
    double below = fractionBelowWiper * trackOhms;
    double loaded = Double.isInfinite(loadOhms) ? below : below * loadOhms / (below + loadOhms);
    return trackOhms - below + loaded;
  }
}
