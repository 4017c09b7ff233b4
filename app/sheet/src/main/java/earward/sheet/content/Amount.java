package earward.sheet.content;

import earward.block.quantity.Unit;
import java.util.Objects;
import java.util.OptionalDouble;

/**
 * A number on the sheet, in the unit it was given in.
 *
 * @param si the number; NaN where there is none, which is printed as a dash
 * @param unit of the number
 */
public record Amount(double si, Unit unit) {
  public Amount {
    Objects.requireNonNull(unit);
  }

  /** No number: printed as a dash. */
  public static Amount none(Unit unit) {
    return new Amount(Double.NaN, unit);
  }

  /** The number, or none. */
  public static Amount of(OptionalDouble si, Unit unit) {
    return new Amount(si.orElse(Double.NaN), unit);
  }

  /** Whether there is a number. */
  public boolean known() {
    return !Double.isNaN(si);
  }
}
