package earward.desktop.model;

import earward.block.quantity.Unit;

/**
 * A figure with its standing.
 *
 * @param value in the SI unit of its quantity; NaN where there is none
 * @param standing how far it may be trusted
 */
public record ShownFigure(double value, Standing standing) {
  /** No figure. */
  public static final ShownFigure NONE = new ShownFigure(Double.NaN, Standing.NONE);

  /** As people write it, a dash where there is none. */
  public String text(Unit unit) {
    return Amounts.of(value, unit);
  }

  /** Whether there is a number. */
  public boolean known() {
    return !Double.isNaN(value);
  }
}
