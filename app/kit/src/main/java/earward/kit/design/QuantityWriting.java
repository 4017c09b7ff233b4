package earward.kit.design;

import earward.block.quantity.Unit;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.text.DecimalFormatSymbols;
import java.util.Locale;

/** Writes one quantity with an engineering prefix. */
final class QuantityWriting {
  private static final char NARROW_NO_BREAK_SPACE = '\u202f';
  private static final String NOT_KNOWN = "–";
  private static final int USUAL_DIGITS = 3;

  private QuantityWriting() {}

  static String of(double si, Unit unit, Locale locale) {
    if (Double.isNaN(si)) {
      return NOT_KNOWN;
    }
    if (Double.isInfinite(si)) {
      return joined(si < 0 ? "-∞" : "∞", NARROW_NO_BREAK_SPACE, unit.symbol());
    }
    BigDecimal shown = scaled(si, unit);
    BigDecimal four = shown.round(new MathContext(USUAL_DIGITS + 1, RoundingMode.HALF_EVEN));
    boolean isFour = Math.abs(four.doubleValue() - shown.doubleValue()) <= 1e-9 * Math.abs(si);
    boolean fine = unit != Unit.DECIBEL && unit != Unit.CELSIUS && isFour;
    BigDecimal rounded =
        fine ? four : shown.round(new MathContext(USUAL_DIGITS, RoundingMode.HALF_EVEN));
    String text = withPrefix(rounded, unit, NARROW_NO_BREAK_SPACE);
    char decimal = DecimalFormatSymbols.getInstance(locale).getDecimalSeparator();
    return decimal == ',' ? text.replace('.', ',') : text;
  }

  /** All digits that the number has, an ordinary space, a decimal point: the form of files. */
  static String exact(double si, Unit unit) {
    return withPrefix(scaled(si, unit), unit, ' ');
  }

  private static BigDecimal scaled(double si, Unit unit) {
    BigDecimal exact = new BigDecimal(Double.toString(si));
    return unit == Unit.FRACTION ? exact.scaleByPowerOfTen(2) : exact;
  }

  private static String withPrefix(BigDecimal number, Unit unit, char space) {
    if (number.signum() == 0) {
      return joined("0", space, unit.symbol());
    }
    int magnitude = number.precision() - number.scale() - 1;
    int wanted = Math.floorDiv(magnitude, 3) * 3;
    String prefix = "";
    int exponent = 0;
    if (wanted != 0) {
      for (char candidate : writtenPrefixes(unit).toCharArray()) {
        int its = QuantityText.exponentOf(candidate);
        boolean nearer = Math.abs(its - wanted) < Math.abs(exponent - wanted);
        if (nearer) {
          exponent = its;
          prefix = String.valueOf(candidate);
        }
      }
    }
    BigDecimal mantissa = number.scaleByPowerOfTen(-exponent).stripTrailingZeros();
    return joined(mantissa.toPlainString(), space, prefix + unit.symbol());
  }

  private static String joined(String number, char space, String unit) {
    return unit.isEmpty() ? number : number + space + unit;
  }

  /** The prefixes that the trade writes with a unit: 2200 µF, not 2.2 mF. */
  private static String writtenPrefixes(Unit unit) {
    return switch (unit) {
      case OHM -> "mkMG";
      case HERTZ -> "kMG";
      case FARAD -> "pnµ";
      case HENRY -> "nµm";
      case VOLT, WATT -> "nµmk";
      case AMPERE -> "pnµm";
      case SECOND -> "pnµm";
      case METRE, AMPERE_HOUR -> "m";
      case HOUR, CELSIUS, KELVIN_PER_WATT, DECIBEL, FRACTION, NUMBER -> "";
    };
  }
}
