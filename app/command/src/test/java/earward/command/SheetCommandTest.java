package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.stream.Stream;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
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
