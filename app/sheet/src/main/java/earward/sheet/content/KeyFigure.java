package earward.sheet.content;

import java.util.List;
import java.util.Objects;

/**
 * One line of the tables on the cover.
 *
 * @param label what it is
 * @param amounts one, or two from low to high
 * @param note what else must be said of it; may be empty
 */
public record KeyFigure(String label, List<Amount> amounts, String note) {
  public KeyFigure {
    amounts = List.copyOf(amounts);
    Objects.requireNonNull(note);
    if (label.isBlank() || amounts.size() > 2 || (amounts.isEmpty() && note.isBlank())) {
      throw new IllegalArgumentException(
          "a key figure has a label, and one or two amounts or words");
    }
  }

  /** One amount. */
  public static KeyFigure of(String label, Amount amount, String note) {
    return new KeyFigure(label, List.of(amount), note);
  }

  /** Words alone. */
  public static KeyFigure words(String label, String words) {
    return new KeyFigure(label, List.of(), words);
  }
}
