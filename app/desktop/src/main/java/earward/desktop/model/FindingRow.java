package earward.desktop.model;

import earward.block.check.Severity;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import java.util.List;

/**
 * One finding as the rail shows it.
 *
 * @param severity STOP, WEIGH or NOTE
 * @param subject block or case that it is about
 * @param sentence what was found
 * @param source where the limit comes from; may be empty
 * @param remedies proven edits
 */
public record FindingRow(
    Severity severity, String subject, String sentence, String source, List<Remedy> remedies) {
  public FindingRow {
    remedies = List.copyOf(remedies);
  }

  /** All findings of a kit, the weightiest first. */
  public static List<FindingRow> of(ReviewedKit kit) {
    return kit.findings().stream().map(FindingRow::of).toList();
  }

  private static FindingRow of(ReviewFinding found) {
    return new FindingRow(
        found.finding().severity(),
        found.finding().subject(),
        found.finding().sentence(),
        found.finding().source(),
        found.remedies());
  }
}
