package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import earward.kit.proposal.Remedies;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class RemediesTest {
  /** A design and the finding of it that is to be cleared. */
  private record Ailing(KitDesign design, String code, String subject, String settingNamed) {}

  static Stream<Named<Ailing>> ailing() {
    return Stream.of(
            new Ailing(
                TestKits.starter("lantern").withSetting("detector", "c1", "3.3 nF"),
                "clipping-depth",
                "detector",
                "'Reservoir capacitor C1' of block 'detector'"),
            new Ailing(
                TestKits.starter("lantern").withSetting("volume", "c-wiper", "4.7 nF"),
                "coupling-edge",
                "volume",
                "'Capacitor at the wiper' of block 'volume'"),
            new Ailing(
                TestKits.starter("boathouse").withSetting("power", "cooling", "bare"),
                "junction-temperature",
                "power",
                "'Cooling' of block 'power'"))
        .map(each -> Named.of(each.code() + " by " + each.settingNamed(), each));
  }

  @ParameterizedTest
  @MethodSource("ailing")
  void everyRemedyAppliedClearsItsFindingAndRaisesNoStop(Ailing ailing) throws DesignFileException {
    ReviewedKit before = TestKits.reviewed(ailing.design());
    List<Remedy> remedies = remedies(before, ailing.code(), ailing.subject());
    assertThat(remedies)
        .extracting(Remedy::sentence)
        .anyMatch(sentence -> sentence.contains(ailing.settingNamed()));
    List<String> stopsBefore = stops(before);
    for (Remedy remedy : remedies) {
      KitDesign written = Designs.read(Designs.text(remedy.edited()), "edited.earward").design();
      ReviewedKit after = TestKits.reviewed(written);
      assertThat(TestKits.findings(after))
          .as(remedy.sentence())
          .noneMatch(f -> f.code().equals(ailing.code()) && f.subject().equals(ailing.subject()));
      assertThat(stopsBefore).as(remedy.sentence()).containsAll(stops(after));
    }
  }

  private static List<Remedy> remedies(ReviewedKit reviewed, String code, String subject) {
    return Remedies.sought(reviewed, TestKits.types(), TestKits.library()).findings().stream()
        .filter(f -> f.finding().code().equals(code) && f.finding().subject().equals(subject))
        .findFirst()
        .map(ReviewFinding::remedies)
        .orElseThrow();
  }

  private static List<String> stops(ReviewedKit reviewed) {
    return TestKits.findings(reviewed).stream()
        .filter(f -> f.severity() == Severity.STOP)
        .map(Finding::code)
        .toList();
  }

  @Test
  void theSmallestStepOfTheSeriesThatClearsIsOffered() {
    KitDesign design = TestKits.starter("lantern").withSetting("volume", "c-wiper", "4.7 nF");
    Remedy first =
        remedies(TestKits.reviewed(design), "coupling-edge", "volume").stream()
            .filter(r -> r.sentence().contains("'Capacitor at the wiper'"))
            .findFirst()
            .orElseThrow();
    String chosen =
        ((earward.kit.design.SettingEntry.Words)
                first.edited().block("volume").orElseThrow().settings().get("c-wiper"))
            .words();
    String before = chosen.equals("10 nF") ? "6.8 nF" : chosen.equals("15 nF") ? "10 nF" : "15 nF";
    assertThat(chosen).isIn("10 nF", "15 nF", "22 nF");
    assertThat(
            TestKits.findings(TestKits.reviewed(design.withSetting("volume", "c-wiper", before))))
        .extracting(Finding::code)
        .contains("coupling-edge");
  }

  @Test
  void aFindingThatNothingClearsKeepsNoRemedy() {
    KitDesign design = TestKits.starter("hayloft");
    ReviewedKit sought =
        Remedies.sought(TestKits.reviewed(design), TestKits.types(), TestKits.library());
    assertThat(sought.findings())
        .filteredOn(f -> f.finding().measured().isEmpty())
        .allMatch(f -> f.remedies().isEmpty());
    assertThat(TestKits.findings(sought)).isEqualTo(TestKits.findings(TestKits.reviewed(design)));
  }
}
