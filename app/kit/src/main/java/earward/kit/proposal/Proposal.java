package earward.kit.proposal;

import earward.kit.design.KitDesign;
import earward.kit.review.ReviewedKit;
import java.util.List;
import java.util.Objects;

/**
 * Values chosen by the program: one edit, solved and reviewed, to be seen as differences before it
 * is taken.
 *
 * @param edited the design with all of them; the same as before where none are better
 * @param changes what differs, in the order of the path
 * @param after the review of the edited design
 */
public record Proposal(KitDesign edited, List<Change> changes, ReviewedKit after) {
  /**
   * One setting that differs.
   *
   * @param block its id
   * @param setting its id
   * @param from as it stood, in words
   * @param to as it is proposed, in words
   * @param why one sentence
   */
  public record Change(String block, String setting, String from, String to, String why) {}

  public Proposal {
    Objects.requireNonNull(edited);
    changes = List.copyOf(changes);
    Objects.requireNonNull(after);
  }
}
