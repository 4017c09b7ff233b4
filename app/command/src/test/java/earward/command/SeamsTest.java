package earward.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import earward.block.Conditions;
import earward.kit.design.KitDesign;
import earward.kit.design.WantedLimits;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import earward.kit.review.SeamVerdict;
import java.io.IOException;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What is said of the seams of a kit. */
class SeamsTest {
  private static SeamVerdict verdict(KitDesign design, String into) {
    SolvedKit solved = KitSolver.solve(TestKits.assembled(design));
    return solved.assembly().circuit().seams().stream()
        .filter(seam -> seam.name().equals(into))
        .map(seam -> SeamVerdict.of(solved, seam))
        .findFirst()
        .orElseThrow();
  }

  private static KitDesign carriers(KitDesign design, double weak, double test, double strong) {
    Conditions core = design.conditions().core();
    return design.withConditions(
        design
            .conditions()
            .withCore(
                new Conditions(
                    core.carrierHertz(),
                    core.toneHertz(),
                    core.highestToneHertz(),
                    core.lowestToneHertz(),
                    core.testDepth(),
                    core.deepestDepth(),
                    weak,
                    test,
                    strong,
                    core.ambientCelsius(),
                    core.highestAmbientCelsius(),
                    core.wantedWatts())));
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void everySeamHasItsLevelsImpedancesAndVerdict(String kit) throws IOException {
    Ran ran = Ran.earward("figures", "--json", TestHome.starterKit(kit));
    SchemaCheck.assertValid("figures", ran.results());
    JsonNode seams = new ObjectMapper().readTree(ran.results()).get("seams");
    assertThat(seams.size()).isGreaterThanOrEqualTo(5);
    for (JsonNode seam : seams) {
      double weak = seam.get("audioRmsVoltsWeak").asDouble();
      double test = seam.get("audioRmsVoltsTest").asDouble();
      double strong = seam.get("audioRmsVoltsStrong").asDouble();
      assertThat(weak).isPositive().isLessThan(test);
      assertThat(test).isLessThan(strong);
      for (String key : new String[] {"onwardOhms", "backwardOhms"}) {
        for (String tone : new String[] {"LowestTone", "Test", "HighestTone"}) {
          assertThat(seam.get(key + tone).asDouble()).as("%s%s", key, tone).isPositive();
        }
      }
      // loss is 20·log|1 + Zback/Zon|, so never above that of the magnitudes in line (arithmetic)
      double most =
          20
              * Math.log10(
                  1
                      + seam.get("backwardOhmsTest").asDouble()
                          / seam.get("onwardOhmsTest").asDouble());
      assertThat(seam.get("loadingLossDecibelsTest").asDouble()).isLessThanOrEqualTo(most + 1e-6);
    }
  }

  @Test
  void aCouplingCapacitorShowsInTheImpedanceAtTheLowestTone() throws IOException {
    // 220 nF into 100 kΩ beside the track: 1/(2π·150 Hz·220 nF) = 4.82 kΩ more, looking back
    JsonNode seams =
        new ObjectMapper()
            .readTree(Ran.earward("figures", "--json", TestHome.starterKit("lantern")).results())
            .get("seams");
    for (JsonNode seam : seams) {
      if (seam.get("into").asText().equals("power")) {
        double high = seam.get("backwardOhmsHighestTone").asDouble();
        double low = seam.get("backwardOhmsLowestTone").asDouble();
        assertThat(low).isCloseTo(Math.hypot(high, 4823), within(0.1 * low));
      }
    }
  }

  @Test
  void verdictsComeFromRealLossAndRealLimits() {
    KitDesign lantern = TestKits.starter("lantern");
    assertThat(verdict(lantern, "filter")).isEqualTo(SeamVerdict.FITS);
    assertThat(verdict(lantern.withSetting("volume", "knob", "100 %"), "power"))
        .isEqualTo(SeamVerdict.OVERDRIVEN);
    assertThat(verdict(carriers(lantern, 0.001, 0.002, 4), "filter")).isEqualTo(SeamVerdict.NOISY);
    assertThat(verdict(TestKits.starter("hayloft"), "volume")).isEqualTo(SeamVerdict.COSTLY_LOSS);
    assertThat(verdict(TestKits.starter("hayloft"), "power")).isEqualTo(SeamVerdict.FITS);
    KitDesign loaded =
        lantern.withSetting("agc", "series-ohms", "1 kΩ").withSetting("detector", "c1", "100 pF");
    assertThat(verdict(loaded, "filter")).isEqualTo(SeamVerdict.CLIPS_THE_DETECTOR);
  }

  @Test
  void theSameLossIsNoMatterWhereTheLevelIsEnough() {
    KitDesign hayloft = TestKits.starter("hayloft");
    WantedLimits quiet =
        new WantedLimits(150, 0.005, OptionalDouble.empty(), 0.05, Optional.empty(), 1);
    assertThat(verdict(hayloft.withConditions(hayloft.conditions().withWanted(quiet)), "volume"))
        .isEqualTo(SeamVerdict.FITS);
  }
}
