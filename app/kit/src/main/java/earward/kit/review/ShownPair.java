package earward.kit.review;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import java.math.BigDecimal;
import java.math.MathContext;
import java.text.DecimalFormatSymbols;
import java.util.Locale;

/**
 * A figure and its limit as a sentence shows them: with as many digits as it takes to tell one from
 * the other, so that nobody reads of 150 °C where 150 °C is allowed.
 *
 * @param figure with its unit
 * @param limit with its unit
 */
record ShownPair(String figure, String limit) {
  private static final int FEWEST_DIGITS = 4;
  private static final int MOST_DIGITS = 15;
  private static final String NARROW_NO_BREAK_SPACE = "\u202f";

  static ShownPair of(double figure, double limit, Unit unit, Locale language) {
    ShownPair usual =
        new ShownPair(
            QuantityText.format(figure, unit, language),
            QuantityText.format(limit, unit, language));
    if (!usual.alike() || !Double.isFinite(figure) || !Double.isFinite(limit)) {
      return usual;
    }
    for (int digits = FEWEST_DIGITS; digits <= MOST_DIGITS; digits++) {
      ShownPair finer =
          new ShownPair(
              rounded(figure, digits, unit, language), rounded(limit, digits, unit, language));
      if (!finer.alike()) {
        return finer;
      }
    }
    return usual;
  }

  private boolean alike() {
    return figure.equals(limit);
  }

  private static String rounded(double si, int digits, Unit unit, Locale language) {
    double number = new BigDecimal(si).round(new MathContext(digits)).doubleValue();
    String text = QuantityText.exact(number, unit).replace(" ", NARROW_NO_BREAK_SPACE);
    char decimal = DecimalFormatSymbols.getInstance(language).getDecimalSeparator();
    return decimal == ',' ? text.replace('.', ',') : text;
  }
}
