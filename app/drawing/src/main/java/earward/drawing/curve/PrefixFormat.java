package earward.drawing.curve;

import java.math.BigDecimal;
import java.math.MathContext;
import java.text.FieldPosition;
import java.text.NumberFormat;
import java.text.ParsePosition;

/** Writes the numbers of an axis as people do: 10 k for 10000, 500 m for 0.5; minus as a minus. */
final class PrefixFormat extends NumberFormat {
  private static final long serialVersionUID = 1L;
  private static final int DIGITS = 4;
  private static final String PREFIXES = "pnµm kMG";
  private static final int OF_ONE = 4;

  private final boolean prefixed;
  private final char decimal;

  PrefixFormat(boolean prefixed, char decimal) {
    this.prefixed = prefixed;
    this.decimal = decimal;
  }

  @Override
  public StringBuffer format(double number, StringBuffer to, FieldPosition position) {
    if (number == 0) {
      return to.append('0');
    }
    int step = 0;
    if (prefixed) {
      step = (int) Math.floor(Math.log10(Math.abs(number)) / 3 + 1e-9);
      step = Math.max(-OF_ONE, Math.min(PREFIXES.length() - 1 - OF_ONE, step));
    }
    String digits =
        new BigDecimal(number)
            .round(new MathContext(DIGITS))
            .scaleByPowerOfTen(-3 * step)
            .stripTrailingZeros()
            .toPlainString();
    to.append(digits.replace('-', '\u2212').replace('.', decimal));
    return step == 0 ? to : to.append('\u202f').append(PREFIXES.charAt(step + OF_ONE));
  }

  @Override
  public StringBuffer format(long number, StringBuffer to, FieldPosition position) {
    return format((double) number, to, position);
  }

  @Override
  public Number parse(String source, ParsePosition position) {
    throw new UnsupportedOperationException("an axis is only written");
  }
}
