package earward.desktop.model;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;

/** What a number without a unit may mean where nobody writes the plain unit: 47 for a capacitor. */
final class Meanings {
  private static final String BARE = "[0-9]+([.,][0-9]+)?";

  private Meanings() {}

  /** The meanings within the limits, nearest to the present value first; empty where plain. */
  static List<String> of(FormRow row, String words) {
    String bare = words.strip();
    if (!(row.input() instanceof FormRow.Amount number)
        || !bare.matches(BARE)
        || prefixes(number.unit()).isEmpty()
        || bare.matches("0+([.,]0+)?")) {
      return List.of();
    }
    double now = value(row.words(), number.unit());
    return prefixes(number.unit()).stream()
        .map(prefix -> bare + " " + prefix + number.unit().symbol())
        .filter(
            each -> {
              double value = value(each, number.unit());
              return value >= number.least() && value <= number.most();
            })
        .sorted(
            Comparator.comparingDouble(
                each -> Math.abs(Math.log(value(each, number.unit()) / now))))
        .toList();
  }

  private static List<String> prefixes(Unit unit) {
    return switch (unit) {
      case FARAD -> List.of("p", "n", "µ");
      case HENRY -> List.of("n", "µ", "m");
      default -> List.of();
    };
  }

  private static double value(String words, Unit unit) {
    try {
      return QuantityText.parse(words, unit);
    } catch (QuantityException e) {
      return Double.NaN;
    }
  }

  /** The first meaning of words, or the words where they are plain. */
  static String plain(FormRow row, String words) {
    return Stream.concat(of(row, words).stream(), Stream.of(words)).findFirst().orElse(words);
  }
}
