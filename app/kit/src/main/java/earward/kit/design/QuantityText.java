package earward.kit.design;

import earward.block.quantity.Unit;
import java.util.Locale;

/**
 * Quantities as people write them: {@code 4k7}, {@code 4.7 kΩ}, {@code 0,047 µF}, {@code R47},
 * {@code 2u2}, {@code 30 %}. Reading does not depend on any locale: point and comma are both the
 * decimal sign, and thousands are not separated.
 */
public final class QuantityText {
  private QuantityText() {}

  /**
   * The number, in the unit.
   *
   * @param text with or without the unit's symbol; where it is there it must match
   * @param unit wanted
   * @throws QuantityException with one sentence that names the found and the wanted
   */
  public static double parse(String text, Unit unit) throws QuantityException {
    return QuantityReading.of(text, unit);
  }

  /**
   * The quantity with an engineering prefix and three significant digits, four where the number has
   * no more than these: {@code 4.7 kΩ}, {@code 1.475 kHz}. Number and unit are joined by a narrow
   * no-break space.
   *
   * @param si in the unit
   * @param unit of the number
   * @param locale whose decimal sign is used; digits are always 0 to 9
   */
  public static String format(double si, Unit unit, Locale locale) {
    return QuantityWriting.of(si, unit, locale);
  }

  /**
   * The quantity with all its digits, an engineering prefix and a decimal point: what {@link
   * #parse} reads back as the same number. The form of files.
   */
  public static String exact(double si, Unit unit) {
    return QuantityWriting.exact(si, unit);
  }

  /** The prefix letters that a unit may carry, as in {@code kΩ}; empty for units that take none. */
  static String prefixesOf(Unit unit) {
    return switch (unit) {
      case OHM, HERTZ -> "mkMG";
      case FARAD, HENRY, VOLT, AMPERE, WATT, SECOND -> "pnµmk";
      case AMPERE_HOUR, METRE -> "µmk";
      case HOUR, CELSIUS, KELVIN_PER_WATT, DECIBEL, FRACTION, NUMBER -> "";
    };
  }

  /** The power of ten of a prefix letter. */
  static int exponentOf(char prefix) {
    return switch (prefix) {
      case 'p' -> -12;
      case 'n' -> -9;
      case 'µ' -> -6;
      case 'm' -> -3;
      case 'k' -> 3;
      case 'M' -> 6;
      case 'G' -> 9;
      default -> throw new IllegalArgumentException("no prefix: " + prefix);
    };
  }
}
