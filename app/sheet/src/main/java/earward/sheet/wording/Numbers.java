package earward.sheet.wording;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import earward.sheet.content.Amount;
import java.util.Locale;

/** Writes numbers as the sheet prints them: a true minus sign, the language's decimal sign. */
public final class Numbers {
  /** What a number that does not exist is printed as. */
  public static final String DASH = "–";

  private static final char NARROW_NO_BREAK_SPACE = '\u202f';
  private static final char NO_BREAK_SPACE = '\u00a0';
  private static final char MINUS = '\u2212';

  /** No meter that a builder owns tells less from nothing. */
  private static final double LEAST_VOLTS = 1e-4;

  /** A number and its unit, apart so that they can be aligned. */
  public record Written(String number, String unit) {
    /** Both in one line. */
    public String whole() {
      return unit.isEmpty() ? number : number + NO_BREAK_SPACE + unit;
    }
  }

  private final Locale locale;

  /** Numbers for readers of this language. */
  public Numbers(Locale locale) {
    this.locale = locale;
  }

  /** The number and its unit. */
  public Written write(Amount amount) {
    if (!amount.known()) {
      return new Written(DASH, "");
    }
    if (amount.unit() == Unit.VOLT && Math.abs(amount.si()) < LEAST_VOLTS) {
      boolean nothing = Math.abs(amount.si()) < LEAST_VOLTS / 1000;
      return nothing
          ? new Written("0", "V")
          : split("<" + NO_BREAK_SPACE, QuantityText.format(LEAST_VOLTS, Unit.VOLT, locale));
    }
    return split("", QuantityText.format(amount.si(), amount.unit(), locale));
  }

  private static Written split(String before, String text) {
    String printed = text.replace('-', MINUS);
    int gap = printed.lastIndexOf(NARROW_NO_BREAK_SPACE);
    return gap < 0
        ? new Written(before + printed, "")
        : new Written(before + printed.substring(0, gap), printed.substring(gap + 1));
  }

  /** The number with its unit, in one line. */
  public String text(double si, Unit unit) {
    return write(new Amount(si, unit)).whole();
  }
}
