package earward.kit.file;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.ToleranceClass;
import earward.block.law.ToneCurve;
import earward.kit.design.FrontEndCircuits;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitDesign;
import earward.kit.design.SettingEntry;
import earward.kit.design.SheetOptions;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DesignRoundTripTest {
  private static final ObjectMapper JSON = new ObjectMapper();

  @Test
  void everythingThatADesignHoldsIsRead() throws Exception {
    KitDesign design = Designs.read(Samples.FULL, Samples.NAME).design();
    assertThat(design.title()).isEqualTo("Sample é \"quoted\"");
    assertThat(design.revision()).isEqualTo("C");
    assertThat(design.conditions().frontEndSupply()).isEqualTo(FrontEndSupply.SELV_ADAPTOR);
    assertThat(design.conditions().core().carrierHertz()).isEqualTo(465e3);
    assertThat(design.conditions().core().toneHertz()).isEqualTo(440);
    assertThat(design.conditions().core().deepestDepth()).isEqualTo(0.9);
    assertThat(design.conditions().core().weakPeakVolts()).isEqualTo(0.12);
    assertThat(design.conditions().core().wantedWatts()).isEqualTo(0.3);
    assertThat(design.conditions().sidebands()).hasSize(2);
    assertThat(design.conditions().sidebands().get(1).offsetHertz()).isEqualTo(4500);
    assertThat(design.conditions().wanted().batteryHours()).hasValue(20);
    assertThat(design.conditions().wanted().curve().orElseThrow().kind())
        .isEqualTo(ToneCurve.Kind.SEVENTY_FIVE_MICROSECONDS);
    assertThat(design.conditions().wanted().listeningMetres()).isEqualTo(2);
    assertThat(design.blocks())
        .extracting(block -> block.id())
        .containsExactly("feed", "detector", "mystery", "battery", "agc");
    assertThat(design.takeOffs().get(0).joinsAt()).contains("detector.out");
    assertThat(design.path().get(2).rails()).isEqualTo(Map.of("main", "quiet"));
    assertThat(design.tolerances().byClass()).isEqualTo(Map.of(ToleranceClass.RESISTOR, 0.01));
    assertThat(design.tolerances().byPart()).isEqualTo(Map.of("filter.r2", 0.005));
    assertThat(design.addedTestPoints().get(0).node()).isEqualTo("detector.out");
    assertThat(design.references().ofPart("gone.r1")).contains("R12");
    assertThat(design.references().ofTestPoint("detector.out")).contains("TP3");
    assertThat(design.sheet().paper()).isEqualTo(SheetOptions.Paper.LETTER);
    assertThat(design.bench().instruments().get(0).inputOhms()).isEqualTo(1e6);
  }

  @Test
  void aFrontEndGivenByItsTunedCircuitsIsReadAndWrittenBack() throws Exception {
    String circuits = "\"front end tuned circuits\": { \"number\": 3, \"quality\": \"60\" },";
    String text = Samples.LEAST.replace("\"carrier\"", circuits + " \"carrier\"");
    KitDesign design = Designs.read(text, Samples.NAME).design();
    assertThat(design.conditions().circuits()).contains(new FrontEndCircuits(3, 60));
    KitDesign again = Designs.read(Designs.text(design), Samples.NAME).design();
    assertThat(again.conditions().circuits()).contains(new FrontEndCircuits(3, 60));
  }

  @Test
  void aPartGivenByItsFiguresIsRead() throws Exception {
    KitDesign design = Designs.read(Samples.FULL, Samples.NAME).design();
    SettingEntry entry = design.path().get(1).settings().get("diode");
    assertThat(entry).isInstanceOf(SettingEntry.Inline.class);
    DiodeModel diode = (DiodeModel) ((SettingEntry.Inline) entry).model();
    assertThat(diode.name()).isEqualTo("bin 7");
    assertThat(diode.material()).isEqualTo(DiodeMaterial.GERMANIUM);
    assertThat(diode.saturationAmperes()).isEqualTo(0.4e-6);
    assertThat(diode.leakageOhms()).isInfinite();
  }

  @Test
  void nothingIsLostWhenADesignIsReadAndWritten() throws Exception {
    String written = Designs.text(Designs.read(Samples.FULL, Samples.NAME).design());
    assertThat(tree(written)).isEqualTo(tree(Samples.FULL));
    assertThat(Designs.text(Designs.read(written, Samples.NAME).design())).isEqualTo(written);
  }

  @Test
  void theLeastDesignStaysAsItIs() throws Exception {
    String written = Designs.text(Designs.read(Samples.LEAST, Samples.NAME).design());
    assertThat(tree(written)).isEqualTo(tree(Samples.LEAST));
  }

  @Test
  void membersThatAreNotKnownAreKeptAndNotedWithTheirPlace() throws Exception {
    DesignReading reading = Designs.read(Samples.FULL, Samples.NAME);
    assertThat(reading.findings()).allMatch(finding -> finding.code().equals("unknown-member"));
    assertThat(reading.findings())
        .anyMatch(finding -> finding.subject().equals("sample.earward, line 20, column 13"))
        .hasSize(12);
    assertThat(Designs.read(Samples.LEAST, Samples.NAME).findings()).isEmpty();
  }

  @Test
  void anEditChangesItsOwnMemberAndNoOther() throws Exception {
    KitDesign design = Designs.read(Samples.FULL, Samples.NAME).design();
    KitDesign edited =
        design
            .withBlock("detector", block -> block.with("c1", "2.2 nF"))
            .withTolerances(design.tolerances().with(ToleranceClass.RESISTOR, 0.02));
    String expected =
        Samples.FULL
            .replace("\"c1\": \"1n5\"", "\"c1\": \"2.2 nF\"")
            .replace("\"resistor\": \"1 %\"", "\"resistor\": \"2 %\"");
    assertThat(tree(Designs.text(edited))).isEqualTo(tree(expected));
  }

  @Test
  void conditionsThatAreEditedAreWrittenWithTheirUnits() throws Exception {
    KitDesign design = Designs.read(Samples.LEAST, Samples.NAME).design();
    KitDesign warm =
        design.withConditions(design.conditions().withFrontEndSupply(FrontEndSupply.BATTERY));
    String text = Designs.text(warm);
    assertThat(text).contains("\"front end powered by\": \"battery\"");
    assertThat(Designs.read(text, Samples.NAME).design().conditions().frontEndSupply())
        .isEqualTo(FrontEndSupply.BATTERY);
  }

  @ParameterizedTest
  @ValueSource(strings = {"de-DE", "tr-TR", "ar-EG"})
  void theLocaleMakesNoDifference(String tag) throws Exception {
    Locale before = Locale.getDefault();
    try {
      String usual = Designs.text(Designs.read(Samples.FULL, Samples.NAME).design());
      Locale.setDefault(Locale.forLanguageTag(tag));
      KitDesign design = Designs.read(Samples.FULL, Samples.NAME).design();
      assertThat(Designs.text(design)).isEqualTo(usual);
      KitDesign edited = design.withTolerances(design.tolerances().with("agc.r-agc", 0.025));
      assertThat(Designs.text(edited)).contains("\"agc.r-agc\": \"2.5 %\"");
    } finally {
      Locale.setDefault(before);
    }
  }

  @Test
  void aDesignIsWrittenOverTheOldFileAndNothingIsLeftBeside(@TempDir Path folder) throws Exception {
    Path file = folder.resolve("kit with space.earward");
    Files.writeString(file, "old");
    KitDesign design = Designs.read(Samples.FULL, Samples.NAME).design();
    Designs.write(design, file);
    assertThat(Designs.read(file).design()).isEqualTo(design);
    try (var files = Files.list(folder)) {
      assertThat(files).containsExactly(file);
    }
  }

  @Test
  void aLinkStaysALinkAndAFileKeepsItsPermissions(@TempDir Path folder) throws Exception {
    Assumptions.assumeTrue(
        Files.getFileStore(folder).supportsFileAttributeView(PosixFileAttributeView.class));
    Path file = Files.writeString(folder.resolve("real.earward"), "old");
    Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-rw-r--"));
    Path link = Files.createSymbolicLink(folder.resolve("link.earward"), file);
    KitDesign design = Designs.read(Samples.LEAST, Samples.NAME).design();
    Designs.write(design, link);
    assertThat(link).isSymbolicLink();
    assertThat(Files.readString(file)).isEqualTo(Designs.text(design));
    assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(file)))
        .isEqualTo("rw-rw-r--");
  }

  @Test
  void theDigestIsThatOfTheTextAndMovesWithAnyEdit() throws Exception {
    KitDesign design = Designs.read(Samples.LEAST, Samples.NAME).design();
    assertThat(Designs.digest(design)).isEqualTo(Designs.digest(design));
    assertThat(Designs.digest(design.withRevision("B"))).isNotEqualTo(Designs.digest(design));
  }

  private static JsonNode tree(String text) throws Exception {
    return JSON.readTree(text);
  }
}
