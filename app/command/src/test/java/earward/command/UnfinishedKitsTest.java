package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.block.check.Finding;
import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** A path may end after any block, stand either way round, and hold parts of the designer's own. */
class UnfinishedKitsTest {
  private static final ObjectMapper MAPPER = new ObjectMapper();

  @TempDir Path folder;

  static Stream<Arguments> ends() {
    return Stream.of("lantern", "hayloft", "boathouse")
        .flatMap(kit -> IntStream.rangeClosed(1, 6).mapToObj(count -> Arguments.of(kit, count)));
  }

  private static ObjectNode kit(String name) throws IOException {
    return (ObjectNode) MAPPER.readTree(Files.readString(TestHome.starterKit(name)));
  }

  private Path write(JsonNode kit) throws IOException {
    return Files.writeString(folder.resolve("kit.earward"), MAPPER.writeValueAsString(kit));
  }

  private static ObjectNode endingAfter(String name, int count) throws IOException {
    ObjectNode kit = kit(name);
    ArrayNode path = (ArrayNode) kit.get("path");
    while (path.size() > count) {
      path.remove(path.size() - 1);
    }
    if (count < 2) {
      kit.remove("take-offs");
    }
    return kit;
  }

  private static List<String> codes(KitDesign design) {
    return TestKits.findings(TestKits.reviewed(design)).stream().map(Finding::code).toList();
  }

  private static KitDesign read(JsonNode kit) throws IOException, DesignFileException {
    return Designs.read(MAPPER.writeValueAsString(kit), "kit.earward").design();
  }

  @ParameterizedTest(name = "{0} after {1}")
  @MethodSource("ends")
  void aPathMayEndAfterAnyBlock(String name, int count) throws IOException {
    Ran ran = Ran.earward("figures", "--json", write(endingAfter(name, count)));
    assertThat(ran.code()).as(ran.messages()).isZero();
    SchemaCheck.assertValid("figures", ran.results());
    JsonNode root = MAPPER.readTree(ran.results());
    assertThat(root.get("solved").asBoolean()).isTrue();
    for (JsonNode point : root.get("testPoints")) {
      assertThat(point.get("dcVoltsTest").isNumber()).as("%s", point).isTrue();
    }
  }

  @Test
  void outputIsWantedOnlyOfAPathThatHasALoudspeaker() throws Exception {
    assertThat(codes(read(endingAfter("lantern", 5)))).doesNotContain("little-output");
  }

  @Test
  void aDetectorThatNothingLoadsForDcIsTold() throws Exception {
    assertThat(codes(read(endingAfter("boathouse", 2)))).contains("no-direct-load");
    assertThat(codes(read(endingAfter("boathouse", 4)))).doesNotContain("no-direct-load");
  }

  @Test
  void anAmplifierWithoutTheNetworkThatItNeedsIsTold() {
    KitDesign bare = TestKits.starter("lantern").withSetting("power", "network", "none");
    assertThat(codes(TestKits.starter("lantern"))).doesNotContain("output-network-missing");
    assertThat(codes(bare)).contains("output-network-missing");
    // the Boathouse's amplifier is stable without one, and has none
    assertThat(codes(TestKits.starter("boathouse"))).doesNotContain("output-network-missing");
  }

  @Test
  void aSwitchingAmplifierBesideAnAmReceiverIsTold() throws Exception {
    ObjectNode kit = kit("lantern");
    copy(kit, 4, "amplifier", "amplifiers", "TDA2822M bridge");
    assertThat(codes(read(kit))).doesNotContain("switching-amplifier");
    ((ObjectNode) kit.get("path").get(4).get("settings").get("amplifier")).put("switching", true);
    assertThat(codes(read(kit))).contains("switching-amplifier");
  }

  @Test
  void aDetectorTurnedRoundGivesTheSameWithTheOtherSignAndItsAgcMustFollow() {
    KitDesign turned = TestKits.starter("lantern").withSetting("detector", "direction", "negative");
    assertThat(codes(TestKits.starter("lantern"))).doesNotContain("agc-direction");
    assertThat(codes(turned)).contains("agc-direction");
    assertThat(codes(turned.withSetting("agc", "direction", "negative")))
        .doesNotContain("agc-direction");
  }

  @Test
  void anEntryOfTheLibraryCopiedIntoADesignIsTakenWithoutAWord() throws IOException {
    String plain = Ran.earward("figures", "--json", TestHome.starterKit("lantern")).results();
    JsonNode expected = MAPPER.readTree(plain).get("testPoints");
    ObjectNode kit = kit("lantern");
    copy(kit, 1, "diode", "diodes", "BAT46");
    copy(kit, 4, "amplifier", "amplifiers", "TDA2822M bridge");
    copy(kit, 5, "loudspeaker", "loudspeakers", "16 ohm 77 mm");
    Ran ran = Ran.earward("figures", "--json", write(kit));
    assertThat(ran.code()).isZero();
    assertThat(ran.messages()).isEmpty();
    assertThat(MAPPER.readTree(ran.results()).get("testPoints")).isEqualTo(expected);
  }

  private static void copy(ObjectNode kit, int block, String setting, String file, String part)
      throws IOException {
    Path library = TestHome.path().resolve("templates/parts/" + file + ".json");
    for (JsonNode entry : MAPPER.readTree(Files.readString(library)).get("parts")) {
      if (entry.get("name").asText().equals(part)) {
        ((ObjectNode) kit.get("path").get(block).get("settings")).set(setting, entry);
        return;
      }
    }
    throw new AssertionError("no part " + part);
  }
}
