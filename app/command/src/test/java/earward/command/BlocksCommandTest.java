package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

class BlocksCommandTest {
  @Test
  void everyTypeIsListedWithItsPlugin() {
    Ran ran = Ran.earward("blocks");
    assertThat(ran.code()).isZero();
    assertThat(ran.messages()).isEmpty();
    assertThat(ran.results())
        .containsPattern("detector.envelope-diode +Diode envelope detector +earward.detectors")
        .contains("feed.tuned-if", "power.amplifier-ic", "take-off.agc")
        .doesNotContain("refused");
  }

  @Test
  void theJsonIsAsItsSchemaSays() throws IOException {
    String json = Ran.earward("blocks", "--json").results();
    SchemaCheck.assertValid("blocks", json);
    JsonNode root = new ObjectMapper().readTree(json);
    assertThat(root.get("blocks").size()).isGreaterThanOrEqualTo(13);
    assertThat(root.at("/blocks/0/settings").size()).isPositive();
  }

  @Test
  void aRefusedPluginIsListedWithTheReason() throws IOException {
    Path broken = Files.writeString(TestHome.path().resolve("plugins/broken.jar"), "no jar");
    try {
      assertThat(Ran.earward("blocks").results()).contains("refused: broken.jar");
      String json = Ran.earward("blocks", "--json").results();
      SchemaCheck.assertValid("blocks", json);
      assertThat(new ObjectMapper().readTree(json).at("/refused/0/file").asText())
          .isEqualTo("broken.jar");
    } finally {
      Files.delete(broken);
    }
  }
}
