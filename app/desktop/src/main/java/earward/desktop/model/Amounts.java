package earward.desktop.model;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import java.util.Locale;

/** Numbers as the window writes them: one decimal sign for all of it, chosen once. */
public final class Amounts {
  /** Below this nothing is there that a meter could show, in V. */
  private static final double LEAST_VOLTS = 20e-6;

  /** A distortion above this is none of a signal that is still there. */
  private static final double MOST_DISTORTION = 10;

  private static volatile Locale decimals = Locale.ENGLISH;

  private Amounts() {}

  /** Takes the decimal sign of a language; digits stay 0 to 9. */
  public static void decimalsOf(Locale locale) {
    decimals = locale;
  }

  /** The quantity with its unit; a dash where it is not a number. */
  public static String of(double value, Unit unit) {
    return Double.isNaN(value) ? Words.of("no-value") : QuantityText.format(value, unit, decimals);
  }

  /** A reading: what is too small for any meter is 0. */
  public static String reading(double value, Unit unit) {
    if (unit == Unit.VOLT && Math.abs(value) < LEAST_VOLTS) {
      return of(0, unit);
    }
    return unit == Unit.FRACTION && !(value < MOST_DISTORTION)
        ? Words.of("no-value")
        : of(value, unit);
  }

  /** A level in dB over 1 V, one decimal; NaN where there is no voltage. */
  public static double decibelsVolt(double volts) {
    return volts > 0 ? 20 * Math.log10(volts) : Double.NaN;
  }

  /** A number of decibels with its sign and one decimal. */
  public static String decibels(double value) {
    if (!Double.isFinite(value)) {
      return Words.of("no-value");
    }
    String text = String.format(Locale.ROOT, "%+.1f", value).replace('-', '\u2212');
    boolean comma =
        java.text.DecimalFormatSymbols.getInstance(decimals).getDecimalSeparator() == ',';
    return (comma ? text.replace('.', ',') : text) + "\u202f" + Unit.DECIBEL.symbol();
  }
}
