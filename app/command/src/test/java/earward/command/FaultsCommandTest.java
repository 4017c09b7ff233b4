package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** The fault guide of a starter kit, as a user asks for it. */
class FaultsCommandTest {
  private static JsonNode group(JsonNode root, String fault) {
    for (JsonNode group : root.get("groups")) {
      if (group.get("faults").findValuesAsText("id").contains(fault)) {
        return group;
      }
    }
    throw new AssertionError("no group has " + fault);
  }

  @Test
  void everySingleFaultIsSolvedAndGroupedByWhatCanBeToldApart() throws IOException {
    Ran ran = Ran.earward("faults", "--json", TestHome.starterKit("hayloft"));

    assertThat(ran.code()).as(ran.messages()).isZero();
    SchemaCheck.assertValid("faults", ran.results());
    JsonNode root = new ObjectMapper().readTree(ran.results());
    assertThat(root.get("faults").asInt()).isGreaterThan(150);
    Set<String> ids = new HashSet<>();
    double whole = 0;
    for (JsonNode each : root.findValues("faults")) {
      for (JsonNode fault : each) {
        assertThat(ids.add(fault.get("id").asText())).as(fault.toString()).isTrue();
        whole += fault.get("probability").asDouble();
      }
    }
    for (JsonNode fault : root.get("withoutTrace")) {
      assertThat(ids.add(fault.get("id").asText())).as(fault.toString()).isTrue();
      whole += fault.get("probability").asDouble();
    }
    assertThat(ids).hasSize(root.get("faults").asInt());
    assertThat(whole).isBetween(1 - 1e-9, 1 + 1e-9);
    theCircuitsOwnLogicHolds(root);
  }

  /** What anybody who repairs receivers would expect of these faults. */
  private static void theCircuitsOwnLogicHolds(JsonNode root) {
    JsonNode dead = group(root, "battery.fuse:open").get("signs");
    assertThat(dead.get("tone").asText()).isEqualTo("silent");
    assertThat(Math.abs(dead.get("readings").get("supply:no-signal").asDouble())).isLessThan(1e-6);
    assertThat(group(root, "battery.switch:open")).isEqualTo(group(root, "battery.fuse:open"));
    JsonNode turned = group(root, "detector.d1:reversed").get("signs");
    assertThat(turned.get("readings").get("TP2:test").asDouble()).isNegative();
    assertThat(group(root, "loudspeaker.loudspeaker:open").get("signs").get("tone").asText())
        .isEqualTo("silent");
    JsonNode grounded = group(root, "filter.c2:short").get("signs").get("readings");
    assertThat(grounded.get("TP3:ohms").asDouble()).isLessThan(1);
    JsonNode leaking = group(root, "power.output-capacitor:short").get("signs");
    assertThat(leaking.get("hotAtRest").asBoolean()).isTrue();
    JsonNode healthy = root.get("healthy");
    assertThat(healthy.get("tone").asText()).isEqualTo("usual");
    // the track from its top to ground, read with the coupling capacitor charged
    assertThat(healthy.get("readings").get("TP4:ohms").asDouble()).isBetween(46e3, 48e3);
  }

  @Test
  void theGuideIsReadByPeople() {
    Ran ran = Ran.earward("faults", "--threads", "1", TestHome.starterKit("lantern"));

    assertThat(ran.code()).as(ran.messages()).isZero();
    assertThat(ran.results())
        .startsWith("Lantern, revision A, digest ")
        .contains("single faults in", "LS1 is open or not connected", "D1 is the wrong way round");
  }
}
