package earward.command;

import earward.block.check.Finding;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import java.io.PrintWriter;

/** The findings of a review, for people. */
final class ReviewText {
  private static final String INDENT = "      ";

  private ReviewText() {}

  static void print(PrintWriter to, ReviewedKit reviewed) {
    to.println(KitHead.line(reviewed));
    to.println();
    if (reviewed.findings().isEmpty()) {
      to.println("Nothing was found.");
    }
    for (ReviewFinding found : reviewed.findings()) {
      Finding finding = found.finding();
      to.println(
          String.format(
              java.util.Locale.ROOT,
              "%-5s %s (%s)",
              finding.severity(),
              finding.code(),
              finding.subject()));
      to.println(INDENT + Shown.plain(finding.sentence()));
      finding.measured().ifPresent(measured -> to.println(INDENT + "Figure: " + measured.figure()));
      if (!finding.source().isEmpty()) {
        to.println(INDENT + "Source: " + Shown.plain(finding.source()));
      }
      for (Remedy remedy : found.remedies()) {
        to.println(INDENT + "Remedy: " + Shown.plain(remedy.sentence()));
      }
    }
    if (reviewed.doNotBuild()) {
      to.println();
      to.println("DO NOT BUILD: a finding is STOP.");
    }
  }
}
