package earward.kit.review;

import static earward.block.figure.CaseName.DEEPEST;
import static earward.block.figure.CaseName.HOTTEST;
import static earward.block.figure.CaseName.TEST;
import static earward.block.figure.CaseName.WEAK;
import static org.assertj.core.api.Assertions.assertThat;

import earward.block.Conditions;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.design.BlockEntry;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitConditions;
import earward.kit.design.KitDesign;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Figures;
import earward.kit.path.SolvedKit;
import earward.kit.review.sample.SampleBlock;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ReviewerTest {
  private static final Conditions CONDITIONS =
      new Conditions(455e3, 400, 4500, 150, 0.3, 0.8, 0.25, 1.5, 4, 25, 40, 0.2);
  private static final Check HEAT =
      Check.atMost(
          "heat",
          Severity.STOP,
          new FigureName("r1", Quantity.JUNCTION_CELSIUS, HOTTEST),
          150,
          "test");
  private static final Check DRIVE =
      Check.atLeast(
          "drive",
          Severity.WEIGH,
          new FigureName("r1", Quantity.CARRIER_PEAK_VOLTS, WEAK),
          0.1,
          "test");
  private static final Check LETTING_GO =
      Check.atLeast(
          "letting-go",
          Severity.WEIGH,
          new FigureName("r1", Quantity.CLIPPING_DEPTH, DEEPEST),
          0.8,
          "test");
  private static final Check LOW =
      Check.atMost(
          "low", Severity.WEIGH, new FigureName("out", Quantity.LOW_EDGE_HERTZ, TEST), 150, "test");

  private static KitDesign design() {
    return KitDesign.empty("Test", KitConditions.of(CONDITIONS, FrontEndSupply.BATTERY))
        .addBlock(0, BlockEntry.of("feed", "feed.sample"));
  }

  private static SolvedKit solved(
      SampleBlock block, Map<String, Double> figures, Map<String, Double> knobs) {
    Map<FigureName, Double> byName = new HashMap<>();
    figures.forEach((name, value) -> byName.put(FigureName.parse(name), value));
    return new SolvedKit(
        Assembler.assemble(design(), block.alone(), PartsLibrary.EMPTY),
        new Figures(byName),
        List.of(),
        true,
        knobs);
  }

  private static List<Finding> review(SampleBlock block, Map<String, Double> figures) {
    return review(block, figures, Map.of(), Locale.ENGLISH);
  }

  private static List<Finding> review(
      SampleBlock block, Map<String, Double> figures, Map<String, Double> knobs, Locale language) {
    return Reviewer.review(solved(block, figures, knobs), language).findings().stream()
        .map(ReviewFinding::finding)
        .toList();
  }

  private static String plain(String sentence) {
    return sentence.replace('\u202f', ' ');
  }

  @Test
  void aFigureAtItsLimitHoldsAndTheNextNumberBeyondDoesNot() {
    assertThat(review(SampleBlock.with(HEAT), Map.of("feed.r1:junction-celsius@hottest", 150.0)))
        .isEmpty();
    assertThat(
            review(
                SampleBlock.with(HEAT),
                Map.of("feed.r1:junction-celsius@hottest", Math.nextUp(150.0))))
        .extracting(Finding::code)
        .containsExactly("heat");
    assertThat(review(SampleBlock.with(DRIVE), Map.of("feed.r1:carrier-peak-volts@weak", 0.1)))
        .isEmpty();
    assertThat(
            review(
                SampleBlock.with(DRIVE),
                Map.of("feed.r1:carrier-peak-volts@weak", Math.nextDown(0.1))))
        .extracting(Finding::code)
        .containsExactly("drive");
  }

  @Test
  void aFindingCarriesItsFigureItsLimitItsSourceAndItsPlace() {
    Finding finding =
        review(SampleBlock.with(HEAT), Map.of("feed.r1:junction-celsius@hottest", 171.0)).get(0);

    assertThat(finding.severity()).isEqualTo(Severity.STOP);
    assertThat(finding.subject()).isEqualTo("feed");
    assertThat(finding.source()).isEqualTo("test");
    assertThat(plain(finding.sentence()))
        .isEqualTo("The part is 171 °C hot; 150 °C is allowed at 'feed'.");
    assertThat(finding.measured().orElseThrow().figure())
        .hasToString("feed.r1:junction-celsius@hottest");
    assertThat(finding.measured().orElseThrow().value()).isEqualTo(171);
    assertThat(finding.measured().orElseThrow().limit()).isEqualTo(150);
  }

  @Test
  void aFigureJustBeyondItsLimitIsShownWithTheDigitsThatTellThemApart() {
    Finding finding =
        review(SampleBlock.with(HEAT), Map.of("feed.r1:junction-celsius@hottest", 150.004)).get(0);
    assertThat(plain(finding.sentence())).contains("150.004 °C hot").contains("150 °C is allowed");
  }

  @Test
  void theWeightiestComesFirst() {
    assertThat(
            review(
                SampleBlock.with(DRIVE, HEAT),
                Map.of(
                    "feed.r1:junction-celsius@hottest", 171.0,
                    "feed.r1:carrier-peak-volts@weak", 0.05)))
        .extracting(Finding::severity)
        .containsExactly(Severity.STOP, Severity.WEIGH);
  }

  @Test
  void oneEdgeSeenAtTwoPlacesAndAtTheEndOfThePathIsOneFinding() {
    Check again =
        Check.atMost(
            "again",
            Severity.WEIGH,
            new FigureName("", Quantity.LOW_EDGE_HERTZ, TEST),
            150,
            "test");
    Map<String, Double> figures =
        Map.of(
            "feed.out:low-edge-hertz@test", 211.0,
            "feed:low-edge-hertz@test", 211.0,
            "path:low-edge-hertz@test", 211.0 * (1 + 1e-9));
    assertThat(review(SampleBlock.with(LOW, again), figures))
        .extracting(Finding::code)
        .containsExactly("low");
  }

  @Test
  void aLowerEdgeFurtherAlongIsAnotherFinding() {
    Map<String, Double> figures =
        Map.of("feed.out:low-edge-hertz@test", 211.0, "path:low-edge-hertz@test", 240.0);
    assertThat(review(SampleBlock.with(LOW), figures))
        .extracting(Finding::code)
        .containsExactly("low", "path-low-edge");
  }

  @Test
  void anEdgeThatDoesNotExistHoldsAndAnyOtherMissingFigureIsSaid() {
    assertThat(review(SampleBlock.with(LOW), Map.of())).isEmpty();
    Finding missing = review(SampleBlock.with(HEAT), Map.of()).get(0);
    assertThat(missing.code()).isEqualTo("check-not-held");
    assertThat(missing.severity()).isEqualTo(Severity.NOTE);
    assertThat(missing.sentence()).contains("feed.r1:junction-celsius@hottest");
  }

  private static String lettingGo(double depth, double bare, double uncoupled) {
    return review(
            SampleBlock.with(LETTING_GO),
            Map.of(
                "feed.r1:clipping-depth@deepest", depth,
                "feed.r1:clipping-depth-without-capacitor@deepest", bare,
                "feed.r1:clipping-depth-without-coupling@deepest", uncoupled))
        .get(0)
        .sentence();
  }

  @Test
  void clippingNamesTheCauseWhoseRemovalRaisesTheDepthMore() {
    assertThat(lettingGo(0.6, 0.9, 0.65)).contains("(diagonal clipping)").doesNotContain("two");
    assertThat(lettingGo(0.6, 0.65, 0.9)).contains("(load ratio)").doesNotContain("two");
  }

  @Test
  void twoCausesWithinTwentyPerCentOfTheLargerAreNamedTogether() {
    assertThat(lettingGo(0.5, 0.75, 0.7001)).contains("two, about alike");
    assertThat(lettingGo(0.5, 0.75, 0.6999)).contains("(diagonal").doesNotContain("two");
    assertThat(lettingGo(0.5, 0.6999, 0.75)).contains("(load ratio)").doesNotContain("two");
  }

  @Test
  void clippingThatNeitherRemovalHelpsNamesNoCause() {
    assertThat(lettingGo(0.6, 0.6, 0.6)).isEqualTo("It follows to 60\u202f%; wanted 80\u202f%.");
  }

  @Test
  void theWorstPositionOfTheKnobIsNamedWithTheCause() {
    Finding finding =
        review(
                SampleBlock.with(LETTING_GO),
                Map.of(
                    "feed.r1:clipping-depth@deepest", 0.6,
                    "feed.r1:clipping-depth-without-capacitor@deepest", 0.61,
                    "feed.r1:clipping-depth-without-coupling@deepest", 0.9),
                Map.of("volume.track:position", 0.875),
                Locale.ENGLISH)
            .get(0);
    assertThat(plain(finding.sentence()))
        .endsWith("with the knob of 'volume' at 88 % of its turn.");
  }

  @Test
  void aBlockJudgesByItsOwnNamesAndItsFindingsStandUnderItsId() {
    SampleBlock block =
        new SampleBlock(
            List.of(),
            figure ->
                figure.applyAsDouble("out:dc-volts@test") > 1
                    ? List.of(Finding.of(Severity.NOTE, "own", "", "Own."))
                    : List.of());
    assertThat(review(block, Map.of("feed.out:dc-volts@test", 2.0)))
        .extracting(Finding::subject)
        .containsExactly("feed");
    assertThat(review(block, Map.of("feed.out:dc-volts@test", 0.5))).isEmpty();
  }

  @Test
  void aBlockThatThrowsInItsJudgementIsNamedAndTheRestIsStillHeld() {
    SampleBlock block =
        new SampleBlock(
            List.of(HEAT),
            figure -> {
              throw new IllegalStateException("broken");
            });
    assertThat(review(block, Map.of("feed.r1:junction-celsius@hottest", 171.0)))
        .extracting(Finding::code)
        .containsExactly("heat", "plug-in-failed");
  }

  @Test
  void aDesignThatIsNotCompleteHasTheFindingsOfItsAssemblyOnly() {
    KitDesign design = design().addBlock(1, BlockEntry.of("tube", "detector.tube"));
    ReviewedKit reviewed =
        Reviewer.review(design, SampleBlock.with(HEAT).alone(), PartsLibrary.EMPTY);
    assertThat(reviewed.findings())
        .extracting(f -> f.finding().code())
        .containsExactly("unknown-block");
    assertThat(reviewed.doNotBuild()).isTrue();
    assertThat(reviewed.figures().all()).isEmpty();
  }

  @Test
  void sentencesAreInTheLanguageAskedForWithItsDecimalSign() {
    Finding finding =
        review(
                SampleBlock.with(DRIVE),
                Map.of("feed.r1:carrier-peak-volts@weak", 0.0475),
                Map.of(),
                Locale.GERMAN)
            .get(0);
    assertThat(plain(finding.sentence())).isEqualTo("Es bekommt 47,5 mV; gewünscht sind 100 mV.");
  }

  @ParameterizedTest
  @ValueSource(strings = {"de-DE", "tr-TR", "ar-EG"})
  void theMachinesOwnLocaleChangesNothing(String tag) {
    Map<String, Double> figures =
        Map.of(
            "feed.r1:carrier-peak-volts@weak", 0.0475, "feed.r1:junction-celsius@hottest", 171.5);
    List<Finding> expected = review(SampleBlock.with(DRIVE, HEAT), figures);
    Locale former = Locale.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag(tag));
      assertThat(review(SampleBlock.with(DRIVE, HEAT), figures)).isEqualTo(expected);
    } finally {
      Locale.setDefault(former);
    }
  }

  @Test
  void whatIsWantedOfThePathIsHeldAgainstItsFigures() {
    Map<String, Double> figures =
        Map.of(
            "path:distortion@test", 0.051,
            "path:clip-watts@full-output", 0.199,
            "path:low-edge-hertz@test", 150.0);
    assertThat(review(SampleBlock.with(), figures))
        .extracting(Finding::code)
        .containsExactly("path-distortion", "little-output");
  }
}
