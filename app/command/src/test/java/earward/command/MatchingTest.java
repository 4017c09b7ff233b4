package earward.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.design.KitDesign;
import earward.kit.file.Designs;
import earward.kit.path.KitSolver;
import earward.kit.proposal.Matching;
import earward.kit.proposal.MatchingAction;
import earward.kit.proposal.MatchingAction.Effect;
import earward.kit.proposal.MatchingAction.Kind;
import earward.kit.review.ReviewedKit;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What could be done at a seam, each solved before it is taken. */
class MatchingTest {
  private static final FigureName LEVEL =
      new FigureName("seam.power", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST);

  private static KitDesign lantern;
  private static List<MatchingAction> actions;

  @TempDir Path folder;

  @BeforeAll
  static void solve() {
    lantern = TestKits.starter("lantern");
    ReviewedKit reviewed = TestKits.reviewed(lantern);
    actions = Matching.at(reviewed, "power", TestKits.types(), TestKits.library());
  }

  private static Effect effect(MatchingAction action, FigureName name) {
    return action.effects().stream()
        .filter(each -> each.figure().equals(name))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void everyKindIsTriedAndLeavesTheDesignAlone() {
    assertThat(actions).extracting(MatchingAction::kind).containsAll(EnumSet.allOf(Kind.class));
    assertThat(actions).noneMatch(action -> action.edited().equals(lantern));
    assertThat(lantern).isEqualTo(TestKits.starter("lantern"));
  }

  @Test
  void whatIsShownIsWhatTheEditedDesignGives() {
    for (MatchingAction action : actions) {
      double again = KitSolver.figure(TestKits.assembled(action.edited()), LEVEL);
      assertThat(effect(action, LEVEL).after())
          .as(action.sentence())
          .isCloseTo(again, within(1e-6 * again));
    }
  }

  @Test
  void aPadTakesNearlyTheDecibelsThatItIsMadeFor() {
    // an L pad into its own load keeps the source's load, so its loss is its own: 3, 6 and 12 dB,
    // from which resistors of E12 (up to 10 % apart, so 5 % off) depart by up to about 1 dB
    double[] losses =
        actions.stream()
            .filter(action -> action.kind() == Kind.PAD)
            .map(action -> effect(action, LEVEL))
            .mapToDouble(level -> 20 * Math.log10(level.before() / level.after()))
            .sorted()
            .toArray();
    assertThat(losses).hasSize(3);
    assertThat(losses[0]).isCloseTo(3, within(1.0));
    assertThat(losses[1]).isCloseTo(6, within(1.0));
    assertThat(losses[2]).isCloseTo(12, within(1.0));
  }

  @Test
  void aSeamThatIsNotThereIsNamed() {
    ReviewedKit reviewed = TestKits.reviewed(lantern);
    assertThatThrownBy(
            () -> Matching.at(reviewed, "detector", TestKits.types(), TestKits.library()))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("'detector'")
        .hasMessageContaining("volume");
  }

  @Test
  void theCommandWritesTheOneThatIsTaken() throws Exception {
    Path fresh = folder.resolve("new.earward");
    Path kit = TestHome.starterKit("lantern");
    Ran ran = Ran.earward("propose", kit, "-o", fresh, "--seam", "power", "--take", "2");
    assertThat(ran.code()).as(ran.messages()).isLessThan(2);
    assertThat(ran.results()).contains("2 (taken) ", "seam.power:audio-rms-volts@test");
    assertThat(Files.readString(fresh)).isEqualTo(Designs.text(actions.get(1).edited()));
    Files.delete(fresh);
    Ran beyond = Ran.earward("propose", kit, "-o", fresh, "--seam", "power", "--take", "99");
    assertThat(beyond.code()).isEqualTo(2);
    assertThat(beyond.messages()).contains("--take is 99");
    assertThat(fresh).doesNotExist();
  }
}
