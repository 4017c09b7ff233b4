package earward.sheet.content;

import java.util.List;
import java.util.Objects;

/**
 * One hazard, in words.
 *
 * @param signal how grave
 * @param headline the hazard in a few words
 * @param sentence what to do
 * @param references the parts that it belongs to; empty where it is about the whole kit
 */
public record CautionRow(Signal signal, String headline, String sentence, List<String> references) {

  /**
   * Signal words: WARNING where death or grave injury could follow, CAUTION for lesser injury,
   * NOTICE for damage to things.
   *
   * <p>Source: the practice of ANSI Z535 and ISO 3864-2 (from memory).
   */
  public enum Signal {
    WARNING,
    CAUTION,
    NOTICE
  }

  public CautionRow {
    Objects.requireNonNull(signal);
    references = List.copyOf(references);
    if (headline.isBlank() || sentence.isBlank()) {
      throw new IllegalArgumentException("a caution has a headline and a sentence");
    }
  }
}
