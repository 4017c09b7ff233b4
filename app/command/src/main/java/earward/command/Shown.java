package earward.command;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import java.util.Locale;

/** Quantities and sentences as a terminal shows them: decimal point, ordinary spaces. */
final class Shown {
  private Shown() {}

  static String quantity(double si, Unit unit) {
    double shown = Math.abs(si) < nothing(unit) ? 0 : si;
    return plain(QuantityText.format(shown, unit, Locale.ROOT));
  }

  /** Below this a figure is what rounding left, and shown as 0. */
  private static double nothing(Unit unit) {
    return switch (unit) {
      case VOLT -> 1e-9;
      case AMPERE, WATT -> 1e-12;
      case OHM -> 1e-6;
      case DECIBEL -> 1e-3;
      case FRACTION -> 1e-7;
      default -> 0;
    };
  }

  /** A text with ordinary spaces and minus signs, so that it can be searched for. */
  static String plain(String text) {
    return text.replace('\u202f', ' ').replace('\u00a0', ' ').replace('\u2212', '-');
  }
}
