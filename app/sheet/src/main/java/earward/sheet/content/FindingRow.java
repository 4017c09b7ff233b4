package earward.sheet.content;

import earward.block.check.Severity;
import java.util.List;
import java.util.Objects;

/**
 * One finding of the review.
 *
 * @param severity what it weighs
 * @param sentence what was found
 * @param source where the limit comes from; may be empty
 * @param remedies edits that were solved and found to clear it, in words
 */
public record FindingRow(Severity severity, String sentence, String source, List<String> remedies) {
  public FindingRow {
    Objects.requireNonNull(severity);
    Objects.requireNonNull(source);
    remedies = List.copyOf(remedies);
    if (sentence.isBlank()) {
      throw new IllegalArgumentException("a finding has a sentence");
    }
  }
}
