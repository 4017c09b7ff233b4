package earward.kit.proposal;

import earward.block.BlockTypes;
import earward.kit.parts.PartsLibrary;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * The door of the remedies: looks for edits that clear the findings of a review. Each is solved and
 * reviewed whole before it is offered; none raises a new STOP.
 */
public final class Remedies {
  private Remedies() {}

  /**
   * The review with remedies at its findings, best first; see {@link #sought(ReviewedKit,
   * BlockTypes, PartsLibrary, Locale)}.
   */
  public static ReviewedKit sought(ReviewedKit reviewed, BlockTypes types, PartsLibrary library) {
    return sought(reviewed, types, library, Reviewer.USUAL_LANGUAGE);
  }

  /**
   * The review with remedies at its findings, best first. A finding keeps none where it has no
   * figure, or nothing that was tried clears it.
   *
   * @param reviewed a design's review
   * @param types the block types at hand
   * @param library the parts that settings may name
   * @param language of the sentences
   */
  public static ReviewedKit sought(
      ReviewedKit reviewed, BlockTypes types, PartsLibrary library, Locale language) {
    if (!reviewed.solved().solved()) {
      return reviewed;
    }
    Bench bench = new Bench(reviewed, types, library, language);
    List<ReviewFinding> findings = new ArrayList<>();
    for (ReviewFinding found : reviewed.findings()) {
      findings.add(
          new ReviewFinding(found.finding(), new RemedySearch(bench, found.finding()).remedies()));
    }
    return new ReviewedKit(reviewed.solved(), findings);
  }
}
