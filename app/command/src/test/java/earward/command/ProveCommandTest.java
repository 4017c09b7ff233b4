package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The proof by the full waveform, as a user asks for it. */
class ProveCommandTest {
  @TempDir Path folder;

  /** The Lantern at a tone of 1 kHz: less than half of the cycles of its own 400 Hz. */
  private Path quickLantern() throws IOException {
    Path file = folder.resolve("quick lantern.earward");
    String text = Files.readString(TestHome.starterKit("lantern"));
    Files.writeString(file, text.replace("\"test tone\": \"400 Hz\"", "\"test tone\": \"1 kHz\""));
    return file;
  }

  @Test
  void theWholePathAgreesWithItsFullWaveform() throws IOException {
    Ran ran = Ran.earward("prove", "--json", quickLantern());

    assertThat(ran.code()).as(ran.messages()).isZero();
    SchemaCheck.assertValid("prove", ran.results());
    assertThat(ran.messages())
        .contains("the winding is peaked", "32 steps a carrier cycle, period 1");
    JsonNode root = new ObjectMapper().readTree(ran.results());
    assertThat(root.get("carrierCyclesPerTone").asInt()).isEqualTo(455);
    assertThat(root.get("toneHertz").asDouble()).isEqualTo(1000);
    List<String> places = root.get("figures").findValuesAsText("place");
    assertThat(places).contains("feed.winding", "detector.out", "loudspeaker.hot", "path");
    for (JsonNode figure : root.get("figures")) {
      if (!figure.get("place").asText().equals("battery.rail")) {
        assertThat(figure.get("agrees").asBoolean()).as(figure.toString()).isTrue();
      }
    }
  }

  @Test
  void aProofIsReadByPeople() throws IOException {
    Ran ran = Ran.earward("prove", "--case", "weak", quickLantern());

    assertThat(ran.code()).as(ran.messages()).isZero();
    assertThat(ran.results())
        .startsWith("Lantern, revision A, digest ")
        .contains(
            "Case weak, tone 1000.00 Hz (455 carrier cycles;",
            "averaged",
            "detector.out",
            "figures");
  }

  @Test
  void aCaseWithoutAModulatedCarrierIsRefused() {
    Ran ran = Ran.earward("prove", "--case", "hottest", TestHome.starterKit("lantern"));

    assertThat(ran.code()).isEqualTo(2);
    assertThat(ran.results()).isEmpty();
    assertThat(ran.messages())
        .contains("There is no case 'hottest' to prove; there are weak, test, strong, deepest");
  }

  @Test
  void anInterruptAsksTheProofToStopAndSaysSo() {
    StringWriter said = new StringWriter();
    Cancellation cancellation = new Cancellation(new PrintWriter(said));
    assertThat(cancellation.asked()).isFalse();
    Thread interrupt = new Thread(cancellation::stop);
    interrupt.start();
    while (!cancellation.asked()) {
      Thread.onSpinWait();
    }
    ProofProgress progress = new ProofProgress(new PrintWriter(said), cancellation::asked);
    assertThat(progress.goesOn(32, 1, 0.5)).isFalse();
    cancellation.close();
    try {
      interrupt.join();
    } catch (InterruptedException e) {
      throw new AssertionError(e);
    }
    assertThat(said.toString()).contains("Ended; nothing is shown.");
  }
}
