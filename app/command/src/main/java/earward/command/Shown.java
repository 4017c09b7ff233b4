package earward.command;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import java.util.Locale;

/** Quantities and sentences as a terminal shows them: decimal point, ordinary spaces. */
final class Shown {
  private Shown() {}

  static String quantity(double si, Unit unit) {
    return plain(QuantityText.format(si, unit, Locale.ROOT));
  }

  /** A text with its narrow spaces made ordinary, so that it can be searched for. */
  static String plain(String text) {
    return text.replace('\u202f', ' ');
  }
}
