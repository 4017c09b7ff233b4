package earward.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.kit.design.SheetOptions.Paper;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.page.Sheet;
import earward.sheet.internal.page.Style;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.text.TextPosition;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class SheetWriterTest {
  private final Locale usual = Locale.getDefault();

  @AfterEach
  void backToTheUsualLocale() {
    Locale.setDefault(usual);
  }

  @Test
  void theReadingsToSendBackAreFormFieldsWithNamesOfTheirOwn() throws Exception {
    SheetContent content = SampleSheet.healthy();
    try (ReadSheet sheet = ReadSheet.of(content)) {
      var form = sheet.document().getDocumentCatalog().getAcroForm();
      List<String> names = form.getFields().stream().map(f -> f.getFullyQualifiedName()).toList();
      assertThat(names).doesNotHaveDuplicates().contains("lot", "kit", "meter", "date");
      String flag = content.testPoints().get(0).flag();
      assertThat(names).contains(flag + "-dc-rest", flag + "-audio");
      form.getField("lot").setValue("2026-4");
      assertThat(form.getField("lot").getValueAsString()).isEqualTo("2026-4");
      assertThat(form.getField("lot").getAlternateFieldName()).isEqualTo("Lot, on the bag");
      assertThat(sheet.text(sheet.pages())).contains("Readings to send back", "revision B");
    }
    try (ReadSheet stopped = ReadSheet.of(SampleSheet.stopped())) {
      assertThat(stopped.text()).doesNotContain("Readings to send back");
    }
  }

  @Test
  void theSameContentGivesTheSameBytesAlsoWithOtherSheetsBetween() throws IOException {
    byte[] first = ReadSheet.bytes(SampleSheet.healthy());
    byte[] other = ReadSheet.bytes(SampleSheet.of("Hayloft", List.of()));
    byte[] second = ReadSheet.bytes(SampleSheet.healthy());
    assertThat(second).isEqualTo(first).isNotEqualTo(other);
  }

  @Test
  void sheetsMadeAtOnceOnManyThreadsAreTheSame() throws IOException {
    byte[] first = ReadSheet.bytes(SampleSheet.healthy());
    List<byte[]> made =
        IntStream.range(0, 24)
            .parallel()
            .mapToObj(
                i -> {
                  try {
                    return ReadSheet.bytes(SampleSheet.healthy());
                  } catch (IOException e) {
                    throw new java.io.UncheckedIOException(e);
                  }
                })
            .toList();
    assertThat(made).allSatisfy(bytes -> assertThat(bytes).isEqualTo(first));
  }

  @ParameterizedTest
  @ValueSource(strings = {"de-DE", "tr-TR", "ar-EG-u-nu-arab"})
  void theMachinesLanguageChangesNothing(String tag) throws IOException {
    byte[] first = ReadSheet.bytes(SampleSheet.healthy());
    Locale.setDefault(Locale.forLanguageTag(tag));
    assertThat(ReadSheet.bytes(SampleSheet.healthy())).isEqualTo(first);
  }

  @Test
  void theTextIsReadBackWithItsSigns() throws IOException {
    try (ReadSheet sheet = ReadSheet.of(SampleSheet.healthy())) {
      String text = sheet.text();
      assertThat(text)
          .contains("Lantern", "Reedbank Radio Club", "4.7 kΩ", "220 µF 16 V", "±5 %")
          .contains("yellow violet red gold", "(4K7)")
          .contains("−412 mV", "150 °C", "☐", "WEIGH", "→");
    }
  }

  @ParameterizedTest
  @EnumSource(Paper.class)
  void everyPageHasTheSizeOfThePaper(Paper paper) throws IOException {
    try (ReadSheet sheet = ReadSheet.of(SampleSheet.healthy().withPaper(paper))) {
      assertThat(sheet.pages()).isGreaterThan(3);
      for (var page : sheet.document().getPages()) {
        PDRectangle box = page.getMediaBox();
        assertThat(box.getWidth()).isCloseTo((float) paper.widthPoints(), within(0.01f));
        assertThat(box.getHeight()).isCloseTo((float) paper.heightPoints(), within(0.01f));
      }
    }
  }

  @ParameterizedTest
  @EnumSource(Paper.class)
  void nothingStandsOutsideTheMarginsAndNoTextIsSmall(Paper paper) throws IOException {
    for (SheetContent content :
        List.of(SampleSheet.healthy(), SampleSheet.stopped(), longNamed())) {
      try (ReadSheet sheet = ReadSheet.of(content.withPaper(paper))) {
        for (int page = 1; page <= sheet.pages(); page++) {
          requireInside(sheet, page, paper);
        }
      }
    }
  }

  private static SheetContent longNamed() {
    String name = "Boathouse with a very long name indeed ".repeat(9);
    String word = "W".repeat(400);
    return SampleSheet.of(name + word, List.of(SampleSheet.STOP, SampleSheet.weigh()));
  }

  static void requireInside(ReadSheet sheet, int page, Paper paper) throws IOException {
    for (TextPosition letter : sheet.letters(page)) {
      assertThat(letter.getFontSizeInPt()).isGreaterThanOrEqualTo(Style.LEAST_POINTS - 0.01f);
      assertThat(letter.getX()).isGreaterThanOrEqualTo(Sheet.SIDE - 1.5f);
      assertThat(letter.getX() + letter.getWidth())
          .isLessThanOrEqualTo((float) paper.widthPoints() - Sheet.SIDE + 1.5f);
      assertThat(letter.getY()).isBetween(Sheet.EDGE, (float) paper.heightPoints() - Sheet.EDGE);
    }
    var paths = sheet.paths(page);
    assertThat(paths.getMinX()).isGreaterThanOrEqualTo(Sheet.SIDE - 1.5);
    assertThat(paths.getMaxX()).isLessThanOrEqualTo(paper.widthPoints() - Sheet.SIDE + 1.5);
    assertThat(paths.getMinY()).isGreaterThanOrEqualTo(Sheet.EDGE - 1.0);
    assertThat(paths.getMaxY()).isLessThanOrEqualTo(paper.heightPoints() - Sheet.EDGE + 1.0);
  }

  @Test
  void allFontsAreEmbedded() throws IOException {
    try (ReadSheet sheet = ReadSheet.of(SampleSheet.stopped())) {
      assertThat(sheet.fontsNotEmbedded()).isEmpty();
      var names = sheet.document().getPage(0).getResources().getFontNames();
      assertThat(names).isNotEmpty();
    }
  }

  @Test
  void everyPageIsFootedByKitRevisionDigestAndCount() throws IOException {
    try (ReadSheet sheet = ReadSheet.of(SampleSheet.healthy())) {
      int pages = sheet.pages();
      for (int page = 1; page <= pages; page++) {
        assertThat(sheet.text(page))
            .contains("Lantern", "revision B", "design 1f2e3d4c")
            .contains("page " + page + " of " + pages);
      }
    }
  }

  @Test
  void aStoppedDesignSaysSoOnEveryPageAndNoOtherDoes() throws IOException {
    try (ReadSheet stopped = ReadSheet.of(SampleSheet.stopped());
        ReadSheet healthy = ReadSheet.of(SampleSheet.healthy())) {
      for (int page = 1; page <= stopped.pages(); page++) {
        assertThat(stopped.text(page)).contains("DO NOT BUILD");
      }
      assertThat(stopped.text(1)).contains("The junction of IC1 reaches 171 °C");
      assertThat(healthy.text()).doesNotContain("DO NOT BUILD");
    }
  }

  @Test
  void theHeadOfTheTableIsRepeatedOnThePagesThatItGoesOnTo() throws IOException {
    try (ReadSheet sheet = ReadSheet.of(SampleSheet.healthy())) {
      long pagesWithRows = 0;
      for (int page = 1; page <= sheet.pages(); page++) {
        String text = sheet.text(page);
        if (text.contains("yellow violet")) {
          pagesWithRows++;
          assertThat(text).contains("What you see on it");
        }
      }
      assertThat(pagesWithRows).isGreaterThan(1);
    }
  }

  @Test
  void lettersThatNoFaceHasAreShownAsReplaced() throws IOException {
    try (ReadSheet sheet = ReadSheet.of(SampleSheet.of("Kit 漢 \u0007 Ω", List.of()))) {
      assertThat(sheet.text(1)).contains("Kit").contains("Ω").contains("\ufffd");
    }
  }

  @Test
  void theDocumentSaysWhatItIsAndHasBookmarks() throws IOException {
    try (ReadSheet sheet = ReadSheet.of(SampleSheet.healthy())) {
      assertThat(sheet.document().getDocumentInformation().getTitle())
          .isEqualTo("Build sheet: Lantern");
      assertThat(sheet.document().getDocumentCatalog().getLanguage()).isEqualTo("en");
      assertThat(sheet.document().getDocumentCatalog().getDocumentOutline().children())
          .extracting(item -> item.getTitle())
          .startsWith("Lantern", "Before you start", "The path", "Pins");
    }
  }

  @Test
  void whereThereIsNoFigureADashStands() throws IOException {
    try (ReadSheet sheet = ReadSheet.of(SampleSheet.healthy())) {
      assertThat(sheet.text()).containsPattern("TP8 Supply rail 6.4 V.*6.37 V.*–");
    }
  }
}
