package earward.block.device;

import earward.block.quantity.Unit;
import java.util.Objects;

/**
 * One number of a device that a solver takes as a value: changing it never changes the structure.
 *
 * @param name lower case with hyphens, unique in its device, for instance {@code track-ohms}
 * @param unit the unit of the nominal value
 * @param nominal the value of the nominal kit
 * @param tolerance the class by which kits differ in it
 */
public record Parameter(String name, Unit unit, double nominal, ToleranceClass tolerance) {
  public Parameter {
    Objects.requireNonNull(name);
    Objects.requireNonNull(unit);
    Objects.requireNonNull(tolerance);
    if (Double.isNaN(nominal)) {
      throw new IllegalArgumentException("parameter " + name + " is not a number");
    }
  }

  /** A parameter in which kits do not differ. */
  public static Parameter fixed(String name, Unit unit, double nominal) {
    return new Parameter(name, unit, nominal, ToleranceClass.FIXED);
  }
}
