package earward.kit.path;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.device.Diode;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.kit.design.KitDesign;
import earward.kit.file.Designs;
import earward.kit.file.PartsFiles;
import earward.kit.parts.PartsLibrary;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a designer is told of parts whose figures were fitted. */
class FittedFiguresTest {
  private static final String FITTED =
      """
      "points": [
        { "current": "10 µA", "voltage": "0.163 V" },
        { "current": "0.1 mA", "voltage": "0.230 V" },
        { "current": "1 mA", "voltage": "0.321 V" },
        { "current": "10 mA", "voltage": "0.655 V" } ]""";
  private static final String GIVEN =
      """
      "saturation current": "1 nA", "emission coefficient": 1.1""";

  @TempDir private Path folder;

  /** A feed with two diode settings, of which it fits the one that the choice names. */
  private record TwoDiodes() implements BlockType {
    @Override
    public String id() {
      return "feed.two-diodes";
    }

    @Override
    public Role role() {
      return Role.FEED;
    }

    @Override
    public List<Setting> settings() {
      return List.of(
          new Setting.Choice("which", List.of("one", "other")),
          new Setting.Part("one", PartKind.DIODE, "D"),
          new Setting.Part("other", PartKind.DIODE, "D"));
    }

    @Override
    public BlockDescription describe(Values values, Conditions conditions) {
      DiodeModel model = values.part(values.choice("which"), DiodeModel.class);
      return BlockDescription.of(
          Wiring.start()
              .at("out")
              .down("d1", new Diode(model), Nodes.GROUND)
              .testPoint("out", "out")
              .to(new Single("out")));
    }
  }

  private static final BlockTypes TYPES =
      new BlockTypes() {
        @Override
        public Optional<BlockType> find(String typeId) {
          return typeId.equals("feed.two-diodes") ? Optional.of(new TwoDiodes()) : Optional.empty();
        }

        @Override
        public List<BlockType> all() {
          return List.of(new TwoDiodes());
        }
      };

  private List<Finding> notes(String libraryFigures, String settings) throws Exception {
    Files.writeString(
        folder.resolve("diodes.json"),
        """
        { "schema": 1, "kind": "diode", "parts": [ { "name": "D", "source": "a bench", %s } ] }
        """
            .formatted(libraryFigures));
    PartsLibrary library = PartsFiles.read(folder);
    KitDesign design =
        Designs.read(
                """
                { "schema": 1, "title": "Fitted",
                  "conditions": { "carrier": "455 kHz", "weak carrier peak": "0.25 V",
                    "test carrier peak": "1.5 V", "strong carrier peak": "4 V" },
                  "path": [ { "id": "feed", "type": "feed.two-diodes", "settings": {%s} } ] }
                """
                    .formatted(settings),
                "kit.earward")
            .design();
    return Assembler.assemble(design, TYPES, library).findings().stream()
        .filter(finding -> finding.code().equals("fitted-figures"))
        .toList();
  }

  @Test
  void aFittedPartOfTheLibraryIsNotedWhereItStands() throws Exception {
    List<Finding> notes = notes(FITTED, "\"other\": { \"kind\": \"diode\", %s }".formatted(GIVEN));
    assertThat(notes).hasSize(1);
    assertThat(notes.get(0).severity()).isEqualTo(Severity.NOTE);
    assertThat(notes.get(0).subject()).isEqualTo("feed.one");
    assertThat(notes.get(0).sentence())
        .startsWith("The diode is fitted to 4 typical points to within")
        .contains("extrapolated below the lowest point");
  }

  @Test
  void givenFiguresAreNotNoted() throws Exception {
    assertThat(notes(GIVEN, "")).isEmpty();
  }

  @Test
  void ownMeasuredPointsInADesignAreFittedAndNoted() throws Exception {
    List<Finding> notes = notes(GIVEN, "\"one\": { \"kind\": \"diode\", %s }".formatted(FITTED));
    assertThat(notes).extracting(Finding::subject).containsExactly("feed.one");
    assertThat(notes.get(0).sentence()).contains("4 typical points");
  }

  @Test
  void aFittedPartThatTheChoiceLeavesOutIsNotNoted() throws Exception {
    assertThat(notes(GIVEN, "\"other\": { \"kind\": \"diode\", %s }".formatted(FITTED))).isEmpty();
  }

  @Test
  void aDesignsZeroBiasResistanceIsNoted() throws Exception {
    List<Finding> notes =
        notes(GIVEN, "\"one\": { \"kind\": \"diode\", \"zero-bias resistance\": \"60 kΩ\" }");
    assertThat(notes).hasSize(1);
    assertThat(notes.get(0).sentence()).contains("zero-bias resistance of 60\u202fkΩ alone");
  }
}
