package earward.timing.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.EnumMap;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** A sample of the thousand random designs, and that the draws are what they say. */
class AccuracySampleTest {
  /** One of each kind, from where each is quick. */
  private static final int FROM = 28;

  @Test
  void aSampleOfTheThousandIsWithinTheBar() {
    ByteArrayOutputStream said = new ByteArrayOutputStream();
    int code =
        new AccuracyRun(AccuracyRun.SEED, FROM, DetectorKind.values().length)
            .run(new PrintStream(said, true, StandardCharsets.UTF_8));

    String text = said.toString(StandardCharsets.UTF_8);
    assertThat(code).as(text).isZero();
    assertThat(text).contains("The worst of 7 designs", "7 of 7 designs within the bar");
  }

  @Test
  void allKindsComeEquallyOftenAndEveryDrawIsInTheDomain() {
    Map<DetectorKind, Integer> counts = new EnumMap<>(DetectorKind.class);
    IntStream.range(0, 7 * 60)
        .mapToObj(number -> Draw.of(AccuracyRun.SEED, number))
        .forEach(
            draw -> {
              counts.merge(draw.kind(), 1, Integer::sum);
              assertThat(draw.carrierHertz()).isBetween(262e3, 2e6);
              assertThat(draw.toneHertz()).isBetween(99.0, 5050.0);
              assertThat(draw.cyclesPerTone()).isGreaterThanOrEqualTo(52);
              assertThat(draw.reservoirCycles()).isBetween(2.0, 500.0);
              assertThat(draw.peakVolts()).isBetween(0.05, 3.0);
              assertThat(draw.depth()).isBetween(0.1, 0.95);
              assertThat(draw.quality()).isBetween(8.0, 60.0);
              assertThat(draw.junctionFarads()).isLessThanOrEqualTo(0.1 * draw.reservoirFarads());
              assertThat(Math.abs(draw.detuningHertz()))
                  .isLessThanOrEqualTo(draw.carrierHertz() / draw.quality() / 2);
            });
    assertThat(counts.values()).hasSize(7).containsOnly(60);
  }

  @Test
  void aDesignIsTheSameWhereverARunBegins() {
    assertThat(Draw.of(7, 12)).isEqualTo(Draw.of(7, 12)).isNotEqualTo(Draw.of(8, 12));
  }

  @Test
  void whatDiffersByMoreThanTheBarIsMissed() {
    Draw draw = Draw.of(1, 0);
    Comparison.Figures full = new Comparison.Figures(1, 0.3, 0.02);
    assertThat(comparison(draw, new Comparison.Figures(1.0009, 0.3, 0.02), full).kept()).isTrue();
    assertThat(comparison(draw, new Comparison.Figures(1.0011, 0.3, 0.02), full).kept()).isFalse();
    assertThat(comparison(draw, new Comparison.Figures(1, 0.3004, 0.02), full).kept()).isFalse();
    assertThat(comparison(draw, new Comparison.Figures(1, 0.3, 0.0206), full).kept()).isFalse();
    Comparison.Figures heavy = new Comparison.Figures(1, 0.3, 0.2);
    assertThat(comparison(draw, new Comparison.Figures(1, 0.3, 0.2019), heavy).kept()).isTrue();
    assertThat(comparison(draw, new Comparison.Figures(1, 0.3, 0.2021), heavy).kept()).isFalse();
    assertThat(new Comparison(draw, full, full, 64, "no solution", "").kept()).isFalse();
  }

  private static Comparison comparison(
      Draw draw, Comparison.Figures fast, Comparison.Figures full) {
    return new Comparison(draw, fast, full, 64, "", "");
  }

  @Test
  void aRunOfNothingIsRefused() {
    assertThatThrownBy(() -> new AccuracyRun(1, 0, 0)).isInstanceOf(IllegalArgumentException.class);
  }
}
