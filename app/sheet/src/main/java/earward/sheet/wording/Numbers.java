package earward.sheet.wording;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import earward.sheet.content.Amount;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.text.DecimalFormatSymbols;
import java.util.Locale;

/** Writes numbers as the sheet prints them: a true minus sign, the language's decimal sign. */
public final class Numbers {
  /** What a number that does not exist is printed as. */
  public static final String DASH = "–";

  private static final char NARROW_NO_BREAK_SPACE = '\u202f';
  private static final char NO_BREAK_SPACE = '\u00a0';
  private static final char MINUS = '\u2212';

  private static final double NOTHING = 1e-3;

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
    double least = least(amount.unit());
    if (Math.abs(amount.si()) >= least) {
      double shown = amount.unit() == Unit.DECIBEL ? tenths(amount.si()) : amount.si();
      return split("", QuantityText.format(shown, amount.unit(), locale));
    }
    boolean nothing = Math.abs(amount.si()) <= NOTHING * least || amount.unit() == Unit.DECIBEL;
    if (nothing) {
      return new Written("0", amount.unit().symbol());
    }
    return amount.unit() == Unit.VOLT
        ? new Written("<" + NO_BREAK_SPACE + decimal("0.1"), "mV")
        : split("<" + NO_BREAK_SPACE, QuantityText.format(least, amount.unit(), locale));
  }

  private static double tenths(double decibels) {
    return Double.isInfinite(decibels) ? decibels : Math.rint(decibels * 10) / 10;
  }

  /**
   * Below this a figure cannot be told from nothing with what a builder owns, and is printed so
   * rather than in nanovolts.
   */
  private static double least(Unit unit) {
    return switch (unit) {
      case VOLT -> 1e-4;
      case AMPERE -> 1e-8;
      case WATT -> 1e-6;
      case OHM -> 1e-3;
      case DECIBEL -> 0.05;
      case FRACTION -> 1e-5;
      case FARAD,
          HENRY,
          HERTZ,
          SECOND,
          METRE,
          AMPERE_HOUR,
          HOUR,
          CELSIUS,
          KELVIN_PER_WATT,
          NUMBER ->
          0;
    };
  }

  private static Written split(String before, String text) {
    String printed = text.replace('-', MINUS);
    int gap = printed.lastIndexOf(NARROW_NO_BREAK_SPACE);
    return gap < 0
        ? new Written(before + printed, "")
        : new Written(before + printed.substring(0, gap), printed.substring(gap + 1));
  }

  /** The number in its unit without a prefix, as ratings are written: 0.25 W. */
  public String plain(double si, Unit unit) {
    String number = BigDecimal.valueOf(si).stripTrailingZeros().toPlainString();
    return decimal(number) + NO_BREAK_SPACE + unit.symbol();
  }

  /**
   * Two voltages in one unit, as a meter shows them: 4.62 to 4.78 V.
   *
   * @param words the wording between them, with {@code {low}} and {@code {high}}
   */
  public String between(double low, double high, String words) {
    double most = Math.max(Math.abs(low), Math.abs(high));
    boolean small = most < 1;
    int digits = small ? (most < 0.1 ? 1 : 0) : most < 2 ? 3 : 2;
    return words
        .replace("{low}", fixed(small ? 1000 * low : low, digits))
        .replace(
            "{high}",
            fixed(small ? 1000 * high : high, digits) + NO_BREAK_SPACE + (small ? "mV" : "V"));
  }

  private String fixed(double number, int digits) {
    String text = BigDecimal.valueOf(number).setScale(digits, RoundingMode.HALF_UP).toPlainString();
    return decimal(text.replace('-', MINUS));
  }

  private String decimal(String number) {
    char decimal = DecimalFormatSymbols.getInstance(locale).getDecimalSeparator();
    return decimal == ',' ? number.replace('.', ',') : number;
  }

  /** The number with its unit, in one line. */
  public String text(double si, Unit unit) {
    return write(new Amount(si, unit)).whole();
  }
}
