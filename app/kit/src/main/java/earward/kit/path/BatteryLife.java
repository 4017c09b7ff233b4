package earward.kit.path;

import earward.block.device.BatteryModel;

/**
 * How long a battery lasts: capacity·(reference/current)^exponent over the current.
 *
 * <p>Source: Peukert's relation, written for the capacity at the drawn current; domain: the
 * exponent of the model, currents near those of its data sheet.
 */
public final class BatteryLife {
  private BatteryLife() {}

  /**
   * Hours to the end voltage; infinite where nothing is drawn.
   *
   * @param model the battery
   * @param amperes mean current drawn, at least 0
   */
  public static double hours(BatteryModel model, double amperes) {
    if (Double.isNaN(amperes)) {
      return Double.NaN;
    }
    if (amperes <= 0) {
      return Double.POSITIVE_INFINITY;
    }
    double capacity =
        model.capacityAmpereHours()
            * Math.pow(model.referenceAmperes() / amperes, model.capacityExponent());
    return capacity / amperes;
  }
}
