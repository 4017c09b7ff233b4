package earward.kit.proposal;

import earward.block.BlockTypes;
import earward.kit.parts.PartsLibrary;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.List;

/**
 * The door of the matching actions: what could be done at a seam where two blocks do not suit one
 * another. Pure: the same kit in gives the same actions out, and nothing is changed.
 */
public final class Matching {
  private Matching() {}

  /**
   * All that the block types at hand can do at a seam, and other tracks of the potentiometers
   * beside it, each solved; those that leave the fewest findings first.
   *
   * @param reviewed a solved kit's review
   * @param into the block that is entered by the seam, behind the detector and before the load
   * @param types the block types at hand
   * @param library the parts that settings may name
   * @throws IllegalArgumentException with one sentence when there is no such seam
   */
  public static List<MatchingAction> at(
      ReviewedKit reviewed, String into, BlockTypes types, PartsLibrary library) {
    Bench bench = new Bench(reviewed, types, library, Reviewer.USUAL_LANGUAGE);
    return new SeamActions(bench, into).all();
  }
}
