package earward.desktop.model;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.quantity.Unit;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import java.util.List;

/**
 * One finding as the rail shows it.
 *
 * @param severity STOP, WEIGH or NOTE
 * @param subject block, setting or case that it is about
 * @param sentence what was found
 * @param figure the figure behind it with its limit; may be empty
 * @param source where the limit comes from; may be empty
 * @param remedies proven edits
 */
public record FindingRow(
    Severity severity,
    String subject,
    String sentence,
    String figure,
    String source,
    List<Remedy> remedies) {
  public FindingRow {
    remedies = List.copyOf(remedies);
  }

  /** All findings of a kit, the weightiest first. */
  public static List<FindingRow> of(ReviewedKit kit) {
    return kit.findings().stream().map(FindingRow::of).toList();
  }

  private static FindingRow of(ReviewFinding found) {
    Finding finding = found.finding();
    String figure =
        finding
            .measured()
            .map(
                measured -> {
                  Unit unit = measured.figure().quantity().unit();
                  return Words.of(
                      "finding.figure",
                      Amounts.of(measured.value(), unit),
                      Amounts.of(measured.limit(), unit));
                })
            .orElse("");
    return new FindingRow(
        finding.severity(),
        finding.subject(),
        finding.sentence(),
        figure,
        finding.source(),
        found.remedies());
  }

  /** How many of a severity there are. */
  public static int count(List<FindingRow> rows, Severity severity) {
    return (int) rows.stream().filter(row -> row.severity() == severity).count();
  }

  /** The block that it is about; its subject where it is about none. */
  public String block() {
    int dot = subject.indexOf('.');
    return dot < 0 ? subject : subject.substring(0, dot);
  }
}
