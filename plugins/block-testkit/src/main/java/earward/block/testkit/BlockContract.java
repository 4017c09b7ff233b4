package earward.block.testkit;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.BlockType;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * What every block keeps to. A block author extends this class, names the block, and runs it with
 * JUnit:
 *
 * <pre>{@code
 * class TwoResistorPadTest extends BlockContract {
 *   @Override
 *   protected BlockType type() {
 *     return new TwoResistorPad();
 *   }
 * }
 * }</pre>
 */
public abstract class BlockContract {

  /** A new block type, as a plug-in's jar offers it. */
  protected abstract BlockType type();

  /**
   * The settings in which it is tried: by default every choice and sample part, with values usual,
   * least and most. A block for which some of these make no sense narrows its limits rather than
   * this list.
   */
  protected List<Variation> variations() {
    return Variations.of(type());
  }

  private void keepsTo(BlockRule rule) {
    assertThat(rule.faults(type(), variations())).as("faults of " + type().id()).isEmpty();
  }

  @Test
  void describesItselfForAllOfItsSettings() {
    keepsTo(new DescriptionRule());
  }

  @Test
  void itsPartsAndNodesAreSound() {
    keepsTo(new WiringRule());
  }

  @Test
  void itsChecksAndCurvesSpeakOfWhatItHas() {
    keepsTo(new CheckRule());
  }

  @Test
  void allThatIsShownHasItsWords() {
    keepsTo(new TextRule());
  }

  @Test
  void whatItProposesStaysWithinItsLimits() {
    keepsTo(new ProposerRule());
  }
}
