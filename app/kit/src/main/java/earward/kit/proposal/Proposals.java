package earward.kit.proposal;

import earward.block.BlockTypes;
import earward.kit.parts.PartsLibrary;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.Locale;
import java.util.Set;

/**
 * The door of the proposals: values for one block by its design equations, or for a whole path by
 * the equations of its blocks and the remedies of what is found. Everything that is proposed was
 * solved and reviewed whole; nothing brings a new STOP.
 */
public final class Proposals {
  private Proposals() {}

  /**
   * Values for one block by its own design equations.
   *
   * @param reviewed a design's review
   * @param blockId the block
   * @param types the block types at hand
   * @param library the parts that settings may name
   * @param stock the values at hand
   * @param kept settings that stay as they are, {@code detector.c1}
   * @throws IllegalArgumentException with one sentence when there is no such block, or it has no
   *     design equations
   */
  public static Proposal ofBlock(
      ReviewedKit reviewed,
      String blockId,
      BlockTypes types,
      PartsLibrary library,
      Stock stock,
      Set<String> kept) {
    Bench bench = bench(reviewed, types, library);
    return new PathProposal(bench, stock, kept).ofBlock(blockId);
  }

  /**
   * Values for all blocks of a design: equations where they leave fewer findings, then remedies
   * until nothing is left that one clears.
   *
   * @param reviewed a design's review
   * @param types the block types at hand
   * @param library the parts that settings may name
   * @param stock the values at hand
   * @param kept settings that stay as they are, {@code detector.c1}
   */
  public static Proposal ofPath(
      ReviewedKit reviewed, BlockTypes types, PartsLibrary library, Stock stock, Set<String> kept) {
    return new PathProposal(bench(reviewed, types, library), stock, kept).ofPath();
  }

  private static Bench bench(ReviewedKit reviewed, BlockTypes types, PartsLibrary library) {
    Locale language = Reviewer.USUAL_LANGUAGE;
    return new Bench(reviewed, types, library, language);
  }
}
