package earward.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Locale;
import java.util.stream.Stream;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class SheetCommandTest {
  @TempDir Path folder;

  private static String page(PDDocument document, int number) throws IOException {
    PDFTextStripper stripper = new PDFTextStripper();
    stripper.setStartPage(number);
    stripper.setEndPage(number);
    return stripper.getText(document);
  }

  private static void assertFault(Ran ran, Path named, String words) {
    assertThat(ran.code()).as(ran.messages()).isEqualTo(2);
    assertThat(ran.results()).isEmpty();
    assertThat(ran.messages()).hasLineCount(1).contains(named.toString()).contains(words);
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void theSheetIsWrittenAndItsNameAndKeyFiguresAreSaid(String name) throws IOException {
    Path pdf = folder.resolve("the sheet.pdf");
    Ran ran = Ran.earward("sheet", TestHome.starterKit(name), "-o", pdf);
    assertThat(ran.code()).as(ran.messages()).isZero();
    assertThat(ran.messages()).isEmpty();
    assertThat(ran.results()).startsWith(pdf.toString()).contains(" mW").doesNotContain("\u202f");
    assertThat(ran.results().lines().count()).isGreaterThan(5);
    try (PDDocument document = Loader.loadPDF(pdf.toFile())) {
      assertThat(document.getNumberOfPages()).isGreaterThanOrEqualTo(2);
      assertThat(page(document, 1)).containsIgnoringCase(name).doesNotContain("DO NOT BUILD");
    }
    try (Stream<Path> left = Files.list(folder)) {
      assertThat(left).containsExactly(pdf);
    }
  }

  @Test
  void theSameDesignGivesTheSameBytes() throws IOException {
    Path one = folder.resolve("one.pdf");
    Path other = folder.resolve("other.pdf");
    Ran.earward("sheet", TestHome.starterKit("lantern"), "-o", one);
    Ran.earward("sheet", TestHome.starterKit("lantern"), "--output", other);
    assertThat(one).hasSameBinaryContentAs(other);
  }

  @Test
  void aSheetOfADesignWithAStopIsMadeAndEveryPageSaysSo() throws IOException {
    String text = Files.readString(TestHome.starterKit("boathouse"));
    Path bare = folder.resolve("bare.earward");
    Files.writeString(bare, text.replace("\"cooling\": \"heat-sink\"", "\"cooling\": \"bare\""));
    Path pdf = folder.resolve("bare.pdf");
    Ran ran = Ran.earward("sheet", bare, "-o", pdf);
    assertThat(ran.code()).isEqualTo(1);
    assertThat(ran.results()).contains("DO NOT BUILD");
    try (PDDocument document = Loader.loadPDF(pdf.toFile())) {
      for (int number = 1; number <= document.getNumberOfPages(); number++) {
        assertThat(page(document, number)).as("page %d", number).contains("DO NOT BUILD");
      }
    }
  }

  @Test
  void anOutputThatCannotBeWrittenIsSaidInOneSentence() {
    Path kit = TestHome.starterKit("lantern");
    assertFault(Ran.earward("sheet", kit, "-o", folder), folder, "folder");
    Path lost = folder.resolve("nowhere/kit.pdf");
    assertFault(Ran.earward("sheet", kit, "-o", lost), lost, "does not exist");
    Path full = Path.of("/dev/full");
    if (Files.exists(full)) {
      assertFault(Ran.earward("sheet", kit, "-o", full), full, "cannot be written");
    }
  }

  @Test
  void aSheetMayBeReadLikeAnyNewFileAndOneWrittenOverKeepsItsPermissions() throws IOException {
    Path plain = Files.writeString(folder.resolve("plain"), "");
    Assumptions.assumeTrue(Files.getFileStore(plain).supportsFileAttributeView("posix"));
    Path pdf = folder.resolve("kit.pdf");
    Ran.earward("sheet", TestHome.starterKit("lantern"), "-o", pdf);
    assertThat(Files.getPosixFilePermissions(pdf)).isEqualTo(Files.getPosixFilePermissions(plain));
    Files.setPosixFilePermissions(pdf, PosixFilePermissions.fromString("rw-r-----"));
    Ran.earward("sheet", TestHome.starterKit("lantern"), "-o", pdf);
    assertThat(Files.getPosixFilePermissions(pdf))
        .isEqualTo(PosixFilePermissions.fromString("rw-r-----"));
  }

  @Test
  void aSheetIsNotPrintedInAnotherLanguageUnasked() throws IOException {
    Path kit = folder.resolve("kit.earward");
    String text = Files.readString(TestHome.starterKit("lantern"));
    assertThat(text).contains("\"language\": \"en\"");
    Files.writeString(kit, text.replace("\"language\": \"en\"", "\"language\": \"sw\""));
    Path pdf = folder.resolve("kit.pdf");
    assertFault(Ran.earward("sheet", kit, "-o", pdf), kit, "'sw', for which there is no wording");
    assertThat(Ran.earward("sheet", kit, "-o", pdf).messages()).contains("there are de, en");
    assertThat(pdf).doesNotExist();
    assertThat(Ran.earward("review", kit).code()).isZero();
    Files.writeString(kit, text.replace("\"language\": \"en\"", "\"language\": \"en-GB\""));
    assertThat(Ran.earward("sheet", kit, "-o", pdf).code()).isZero();
  }

  @ParameterizedTest
  @CsvSource({"A4, 210, 297", "Letter, 215.9, 279.4"})
  void everyPageHasTheSizeThatThePaperHas(String paper, double wideMillimetres, double high)
      throws IOException {
    // A4: ISO 216, 210 mm by 297 mm. Letter: ANSI Y14.1 size A, 8.5 in by 11 in.
    Path kit = folder.resolve("kit.earward");
    String text = Files.readString(TestHome.starterKit("lantern"));
    Files.writeString(kit, text.replace("\"paper\": \"A4\"", "\"paper\": \"" + paper + "\""));
    Path pdf = folder.resolve("kit.pdf");
    assertThat(Ran.earward("sheet", kit, "-o", pdf).code()).isZero();
    try (PDDocument document = Loader.loadPDF(pdf.toFile())) {
      assertThat(document.getNumberOfPages()).isGreaterThan(2);
      for (PDPage page : document.getPages()) {
        assertThat(page.getMediaBox().getWidth() * 25.4 / 72)
            .isCloseTo(wideMillimetres, within(0.01));
        assertThat(page.getMediaBox().getHeight() * 25.4 / 72).isCloseTo(high, within(0.01));
        assertThat(page.getRotation()).isZero();
      }
    }
  }

  @Test
  void aTestPointThatTheDesignerAddsHasItsFigureFromTheFileToTheSheet() throws Exception {
    // The test point stands on a node of a block's inside, on which no block has one.
    Path kit = folder.resolve("kit.earward");
    String text = Files.readString(TestHome.starterKit("hayloft"));
    String added =
        "\"test points\": [{\"id\": \"foot\", \"node\": \"power.gain-foot\","
            + " \"words\": \"Foot of the gain resistor\"}],";
    Files.writeString(kit, text.replaceFirst("\\{", "{" + added));
    JsonNode point = null;
    Ran figures = Ran.earward("figures", "--json", kit);
    SchemaCheck.assertValid("figures", figures.results());
    for (JsonNode each : new ObjectMapper().readTree(figures.results()).get("testPoints")) {
      point = each.get("place").asText().equals("added.foot") ? each : point;
    }
    assertThat(point).as(figures.results()).isNotNull();
    // gain 1 + 6 kΩ/56 Ω: the foot stands at the DC of the output, half of the supply and less
    assertThat(point.get("dcVoltsTest").asDouble()).isBetween(3.0, 5.0);
    assertThat(point.get("audioRmsVoltsTest").asDouble()).isPositive();
    String reference = point.get("reference").asText();
    assertThat(reference).isEqualTo("TP10");
    assertThat(Ran.earward("figures", kit).results()).contains("added.foot:dc-volts@test");
    Path pdf = folder.resolve("kit.pdf");
    assertThat(Ran.earward("sheet", kit, "-o", pdf).code()).isZero();
    try (PDDocument document = Loader.loadPDF(pdf.toFile())) {
      String sheet = new PDFTextStripper().getText(document);
      String volts =
          QuantityText.format(point.get("dcVoltsTest").asDouble(), Unit.VOLT, Locale.ROOT)
              .replace('\u202f', '\u00a0');
      assertThat(sheet).containsPattern("(?s)" + reference + " Foot of the gain.{0,60}" + volts);
    }
  }

  @Test
  void theDesignIsNeverWrittenOver() throws IOException {
    Path kit = Files.copy(TestHome.starterKit("lantern"), folder.resolve("kit.earward"));
    String before = Files.readString(kit);
    assertFault(Ran.earward("sheet", kit, "-o", kit), kit, "the design itself");
    assertThat(kit).hasContent(before);
  }

  @Test
  void aFaultyDesignMakesNoSheet() {
    Path pdf = folder.resolve("none.pdf");
    Ran ran = Ran.earward("sheet", folder.resolve("missing.earward"), "-o", pdf);
    assertThat(ran.code()).isEqualTo(2);
    assertThat(pdf).doesNotExist();
  }
}
