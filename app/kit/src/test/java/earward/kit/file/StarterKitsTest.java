package earward.kit.file;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import earward.block.device.PartKind;
import earward.kit.design.KitDesign;
import earward.kit.design.SettingEntry;
import earward.kit.parts.PartsLibrary;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The starter kits and the parts library as they are shipped. */
class StarterKitsTest {
  private static final Path TEMPLATES = Path.of("..", "..", "templates");
  private static final ObjectMapper JSON = new ObjectMapper();

  static List<Path> kits() throws Exception {
    return files("kits", ".earward");
  }

  static List<Path> parts() throws Exception {
    return files("parts", ".json");
  }

  private static List<Path> files(String folder, String ending) throws Exception {
    try (Stream<Path> files = Files.list(TEMPLATES.resolve(folder))) {
      return files.filter(file -> file.toString().endsWith(ending)).sorted().toList();
    }
  }

  @Test
  void thereAreThreeStarterKits() throws Exception {
    assertThat(kits())
        .extracting(kit -> kit.getFileName().toString())
        .containsExactly("boathouse.earward", "hayloft.earward", "lantern.earward");
  }

  @ParameterizedTest
  @MethodSource("kits")
  void aStarterKitIsReadWithoutAFindingAndWrittenByteForByte(Path kit) throws Exception {
    DesignReading reading = Designs.read(kit);
    assertThat(reading.findings()).isEmpty();
    assertThat(reading.design().conditions().frontEndSupply().allowed()).isTrue();
    assertThat(reading.design().references().parts()).isNotEmpty();
    assertThat(Designs.text(reading.design())).isEqualTo(Files.readString(kit));
  }

  @ParameterizedTest
  @MethodSource("kits")
  void aStarterKitNamesPartsOfTheLibrary(Path kit) throws Exception {
    PartsLibrary library = PartsFiles.read(TEMPLATES.resolve("parts"));
    KitDesign design = Designs.read(kit).design();
    for (String setting : List.of("diode", "amplifier", "loudspeaker", "battery", "adaptor")) {
      PartKind kind = PartKind.valueOf(setting.toUpperCase(java.util.Locale.ROOT));
      design.blocks().stream()
          .map(block -> block.settings().get(setting))
          .filter(Objects::nonNull)
          .map(entry -> ((SettingEntry.Words) entry).words())
          .forEach(name -> assertThat(library.names(kind)).contains(name));
    }
  }

  @ParameterizedTest
  @MethodSource("kits")
  void aStarterKitSuitsTheSchema(Path kit) throws Exception {
    assertThat(schema("design").validate(Files.readString(kit), InputFormat.JSON)).isEmpty();
  }

  @ParameterizedTest
  @MethodSource("parts")
  void aFileOfThePartsLibrarySuitsTheSchema(Path file) throws Exception {
    assertThat(schema("parts").validate(Files.readString(file), InputFormat.JSON)).isEmpty();
  }

  @Test
  void whatTheProgramReadsAndWritesSuitsTheSchema() throws Exception {
    for (String text : List.of(Samples.FULL, Samples.LEAST)) {
      assertThat(schema("design").validate(text, InputFormat.JSON)).isEmpty();
      String written = Designs.text(Designs.read(text, Samples.NAME).design());
      assertThat(schema("design").validate(written, InputFormat.JSON)).isEmpty();
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "\"455 kV\"",
        "\"often\"",
        "true",
        "null",
        "[1]",
        "{}",
        "\"455 kHz each\"",
        "\"1,000,000\""
      })
  void theSchemaRefusesWhatTheProgramRefuses(String carrier) throws Exception {
    String text = Samples.LEAST.replace("\"455 kHz\"", carrier);
    assertThat(schema("design").validate(text, InputFormat.JSON)).isNotEmpty();
  }

  @ParameterizedTest
  @ValueSource(strings = {"schema", "title", "conditions"})
  void theSchemaWantsWhatTheProgramWants(String member) throws Exception {
    String text = Samples.LEAST.replace("\"" + member + "\"", "\"other\"");
    assertThat(schema("design").validate(text, InputFormat.JSON)).isNotEmpty();
  }

  private static Schema schema(String name) throws Exception {
    try (InputStream in =
        Objects.requireNonNull(Designs.class.getResourceAsStream(name + ".schema.json"))) {
      return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(JSON.readTree(in));
    }
  }
}
