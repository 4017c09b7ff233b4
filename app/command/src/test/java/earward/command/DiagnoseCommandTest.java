package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A builder's readings, as a user hands them in. */
class DiagnoseCommandTest {
  @TempDir Path folder;

  private Path readings(String text) throws IOException {
    return Files.writeString(folder.resolve("readings.csv"), text);
  }

  private Ran diagnosed(String text) throws IOException {
    return Ran.earward("diagnose", "--json", TestHome.starterKit("hayloft"), readings(text));
  }

  @Test
  void aBlownFuseIsFoundFromTwoReadings() throws IOException {
    Ran ran = diagnosed("reading,value\nrevision,A\ntone,silent\nTP9:no-signal,0 V\n");

    assertThat(ran.code()).as(ran.messages()).isZero();
    SchemaCheck.assertValid("diagnose", ran.results());
    JsonNode root = new ObjectMapper().readTree(ran.results());
    assertThat(root.get("healthy").asBoolean()).isFalse();
    JsonNode first = root.get("ranked").get(0);
    assertThat(first.get("faults").findValuesAsText("id")).contains("battery.fuse:open");
    assertThat(first.get("fits").asInt()).isEqualTo(2);
    double whole = 0;
    for (JsonNode each : root.get("ranked")) {
      whole += each.get("probability").asDouble();
    }
    assertThat(whole).isBetween(1 - 1e-9, 1 + 1e-9);
  }

  @Test
  void aSoundKitIsCalledSound() throws IOException {
    Ran ran =
        diagnosed(
            "tone;usual\nheat;cool\nTP9:no-signal;9,1 V\nTP7:no-signal;4,55 V\nTP4:ohms;48 kΩ\n");

    assertThat(ran.code()).as(ran.messages()).isZero();
    assertThat(new ObjectMapper().readTree(ran.results()).get("healthy").asBoolean()).isTrue();
  }

  @Test
  void aDiagnosisIsReadByPeople() throws IOException {
    Ran ran =
        Ran.earward(
            "diagnose",
            TestHome.starterKit("hayloft"),
            readings("# after the first switch-on\ntone,silent\n\"TP7:no-signal\",\"4.6 V\"\n"));

    assertThat(ran.code()).as(ran.messages()).isZero();
    assertThat(ran.results())
        .startsWith("Hayloft, revision A, digest ")
        .contains("1.  ", "of 2 readings fit", "Most worth reading next: ", "leave no trace");
  }

  @Test
  void whatCannotBeUsedIsSaidInOneSentence() throws IOException {
    Ran other = diagnosed("revision,B\ntone,silent\n");
    assertThat(other.code()).isEqualTo(2);
    assertThat(other.messages()).contains("is of revision B, and the design at hand is A");
    Ran missing =
        Ran.earward("diagnose", TestHome.starterKit("hayloft"), folder.resolve("none.csv"));
    assertThat(missing.code()).isEqualTo(2);
    assertThat(missing.messages()).contains("none.csv does not exist");
  }
}
