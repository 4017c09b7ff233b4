package earward.block.testkit;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.BlockType;
import earward.block.setting.Values;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * What every block keeps to. A block author extends this class, names the block, and runs it with
 * JUnit; each test lists what is wrong, one sentence each. Read the output when all is green too:
 * it says for each check its figure in a plain kit, its limit and whether it holds, and how each
 * diode and transistor rests. None of that is a fault by itself, but a bias diode the wrong way
 * round is seen only there.
 *
 * <pre>{@code
 * class TrebleShelfTest extends BlockContract {
 *   @Override
 *   protected BlockType type() {
 *     return new TrebleShelf();
 *   }
 * }
 * }</pre>
 */
public abstract class BlockContract {

  /** A new block type, as a plug-in's jar offers it. */
  protected abstract BlockType type();

  /**
   * Whether settings go together; all do by default. Settings that do not are tried too: {@code
   * describe} must refuse them with an IllegalArgumentException of one sentence. Override it where
   * a part of a right kind can still be the wrong one, such as an npn transistor in a pnp's place.
   *
   * @param values every choice and sample part combined
   */
  protected boolean goTogether(Values values) {
    return true;
  }

  /**
   * The settings in which it is tried: by default every choice and sample part, with values usual,
   * least and most. A block for which some of these make no sense narrows its limits, or says so in
   * {@link #goTogether}, rather than shorten this list.
   */
  protected List<Variation> variations() {
    return Variations.of(type());
  }

  private void keepsTo(BlockRule rule) {
    assertThat(rule.faults(type(), sound())).as("what is wrong with " + type().id()).isEmpty();
  }

  private List<Variation> sound() {
    List<Variation> sound = variations().stream().filter(v -> goTogether(v.values())).toList();
    assertThat(sound).as("settings of " + type().id() + " that go together").isNotEmpty();
    return sound;
  }

  @Test
  void describesItselfForAllOfItsSettings() {
    keepsTo(new DescriptionRule());
  }

  @Test
  void refusesSettingsThatDoNotGoTogether() {
    List<Variation> others = new ArrayList<>(variations());
    others.removeIf(v -> goTogether(v.values()));
    assertThat(new RefusalRule().faults(type(), others))
        .as("what is wrong with " + type().id())
        .isEmpty();
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

  @Test
  void itsJudgementBearsAnyFigures() {
    keepsTo(new JudgementRule());
  }

  @Test
  void itHasADirectCurrentSolutionWithEachFaultToo() {
    keepsTo(new DirectCurrentRule());
  }

  @Test
  void aWholeKitAroundItIsSolved() {
    keepsTo(new WholeKitRule(BlockContract::say));
  }

  /** Into the test's output, whether it passes or not. */
  private static void say(String line) {
    System.out.println(line);
  }

  @Test
  void itsDrawingReadBackIsTheSameCircuit() {
    keepsTo(new PictureRule());
  }
}
