package earward.drawing;

import java.util.Objects;

/**
 * The few words that a drawing says of itself, in the language of the sheet.
 *
 * @param to before the title of the block in which a broken row goes on
 * @param from before the title of the block from which a row comes
 */
public record LayoutWords(String to, String from) {
  public LayoutWords {
    Objects.requireNonNull(to);
    Objects.requireNonNull(from);
  }

  /** English. */
  public static LayoutWords english() {
    return new LayoutWords("to", "from");
  }
}
