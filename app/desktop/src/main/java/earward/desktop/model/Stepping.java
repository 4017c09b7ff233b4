package earward.desktop.model;

import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;

/** Steps a number through its preferred series, or by the steps that its unit is read in. */
final class Stepping {
  private static final double SHARE_STEP = 0.05;
  private static final double DEGREES_STEP = 5;

  private Stepping() {}

  static String stepped(FormRow row, String words, boolean up) {
    if (!(row.input() instanceof FormRow.Amount number)) {
      return words;
    }
    try {
      double now = QuantityText.parse(words, number.unit());
      double next = next(number, now, up);
      double bound = Math.min(number.most(), Math.max(number.least(), next));
      return bound == now ? words : QuantityText.exact(bound, number.unit());
    } catch (QuantityException | IllegalArgumentException e) {
      return words;
    }
  }

  private static double next(FormRow.Amount number, double now, boolean up) {
    if (number.unit() == Unit.FRACTION) {
      double steps = now / SHARE_STEP;
      double whole = up ? Math.floor(steps + 1e-6) + 1 : Math.ceil(steps - 1e-6) - 1;
      return Math.round(whole * SHARE_STEP * 1e6) / 1e6;
    }
    if (number.unit() == Unit.CELSIUS) {
      return now + (up ? DEGREES_STEP : -DEGREES_STEP);
    }
    Series series = number.series() == Series.ANY ? Series.E24 : number.series();
    return up ? series.next(now) : series.previous(now);
  }
}
