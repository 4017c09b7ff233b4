package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The three kits of the Reedbank Radio Club by way of the command line. */
class StarterKitsTest {
  private static final ObjectMapper MAPPER = new ObjectMapper();

  @TempDir Path folder;

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void aStarterKitPassesItsOwnReviewWithoutAStop(String name) throws IOException {
    Ran ran = Ran.earward("review", TestHome.starterKit(name));
    assertThat(ran.code()).as(ran.results()).isZero();
    assertThat(ran.results()).doesNotContain("STOP");
    assertThat(ran.messages()).isEmpty();
    String json = Ran.earward("review", "--json", TestHome.starterKit(name)).results();
    SchemaCheck.assertValid("review", json);
    assertThat(MAPPER.readTree(json).get("doNotBuild").asBoolean()).isFalse();
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void theFiguresOfAStarterKitAreWholeAndAsTheirSchemaSays(String name) throws IOException {
    String json = Ran.earward("figures", "--json", TestHome.starterKit(name)).results();
    SchemaCheck.assertValid("figures", json);
    JsonNode root = MAPPER.readTree(json);
    assertThat(root.get("solved").asBoolean()).isTrue();
    for (JsonNode point : root.get("testPoints")) {
      for (String key : List.of("dcVoltsNoSignal", "dcVoltsTest", "audioRmsVoltsTest")) {
        assertThat(point.get(key).isNumber()).as("%s of %s", key, point).isTrue();
      }
    }
    assertThat(root.get("seams").size()).isGreaterThanOrEqualTo(5);
    for (JsonNode seam : root.get("seams")) {
      assertThat(seam.get("onwardOhmsTest").isNumber()).as("%s", seam).isTrue();
      assertThat(seam.get("backwardOhmsTest").isNumber()).as("%s", seam).isTrue();
    }
    for (String path :
        List.of(
            "/path/distortionFractionTest",
            "/path/lowEdgeHertz",
            "/path/highEdgeHertz",
            "/path/largestCleanDepthFraction",
            "/path/clipWatts",
            "/path/tenPercentWatts",
            "/supply/amperesNoSignal",
            "/supply/amperesTest",
            "/supply/amperesFullOutput",
            "/heatedParts/0/junctionCelsiusHottest")) {
      assertThat(root.at(path).isNumber()).as(path).isTrue();
      assertThat(root.at(path).asDouble()).as(path).isPositive();
    }
  }

  @Test
  void theBoathouseWithoutItsHeatSinkIsNotToBeBuilt() throws IOException {
    String text = Files.readString(TestHome.starterKit("boathouse"));
    Path bare = folder.resolve("bare.earward");
    Files.writeString(bare, text.replace("\"cooling\": \"heat-sink\"", "\"cooling\": \"bare\""));
    Ran ran = Ran.earward("review", bare);
    assertThat(ran.code()).isEqualTo(1);
    assertThat(ran.results())
        .contains("STOP  junction-temperature (power)", "DO NOT BUILD", "Remedy: ");
    Ran figures = Ran.earward("figures", bare);
    assertThat(figures.code()).isEqualTo(1);
    assertThat(figures.results()).contains("power.amplifier:junction-celsius@hottest");
  }

  @Test
  void figuresAreReadByPeopleInTheirOwnWords() {
    Ran ran = Ran.earward("figures", TestHome.starterKit("lantern"));
    assertThat(ran.code()).isZero();
    assertThat(ran.results())
        .startsWith("Lantern, revision A, digest ")
        .contains("TP2", "Detector output", "largest clean modulation", "Heat", "All figures")
        .doesNotContain("\u202f");
  }

  @Test
  void theSameDesignGivesTheSameJsonInEveryLocale() {
    String expected = Ran.earward("figures", "--json", TestHome.starterKit("lantern")).results();
    Locale former = Locale.getDefault();
    try {
      for (String tag : List.of("de-DE", "ar-EG")) {
        Locale.setDefault(Locale.forLanguageTag(tag));
        assertThat(Ran.earward("figures", "--json", TestHome.starterKit("lantern")).results())
            .isEqualTo(expected);
      }
    } finally {
      Locale.setDefault(former);
    }
  }
}
