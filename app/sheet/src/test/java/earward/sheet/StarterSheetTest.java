package earward.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityText;
import earward.kit.design.SheetOptions.Paper;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import earward.kit.stage.BuildStages;
import earward.sheet.content.CautionRow;
import earward.sheet.content.PartMarking.Bands;
import earward.sheet.content.PartRow;
import earward.sheet.content.SheetContent;
import earward.sheet.content.TestPointRow;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The sheets of the starter kits, from their files to the printed text. */
class StarterSheetTest {
  private static final Map<String, ReviewedKit> REVIEWED = new HashMap<>();

  private static ReviewedKit reviewed(String name) throws Exception {
    if (!REVIEWED.containsKey(name)) {
      REVIEWED.put(name, StarterKits.reviewed(StarterKits.design(name)));
    }
    return REVIEWED.get(name);
  }

  private static SheetContent staged(String name) throws Exception {
    ReviewedKit kit = reviewed(name);
    return Sheets.of(kit, BuildStages.solve(kit.solved().assembly()));
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void everyPartAndTestPointOfTheKitStandsOnItsSheet(String name) throws Exception {
    ReviewedKit kit = reviewed(name);
    var references = kit.solved().assembly().references();
    try (ReadSheet sheet = ReadSheet.of(Sheets.of(kit))) {
      String text = sheet.text();
      assertThat(references.parts().size()).isGreaterThan(12);
      references.parts().values().forEach(r -> assertThat(text).containsPattern("\\b" + r + "\\b"));
      references
          .testPoints()
          .values()
          .forEach(r -> assertThat(text).containsPattern("\\b" + r + "\\b"));
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void everyPrintedReadingIsAFigureOfTheSolver(String name) throws Exception {
    ReviewedKit kit = reviewed(name);
    SheetContent content = Sheets.of(kit);
    assertThat(content.testPoints()).hasSizeGreaterThan(7);
    Figures figures = kit.figures();
    for (int i = 0; i < content.testPoints().size(); i++) {
      TestPointRow row = content.testPoints().get(i);
      String place = kit.solved().assembly().testPoints().get(i).place();
      double volts = figures.orNaN(earward.block.figure.FigureName.parse(place + ":dc-volts@test"));
      assertThat(row.dcAtTest().si()).isEqualTo(volts);
    }
    try (ReadSheet sheet = ReadSheet.of(content)) {
      double amperes =
          figures.orNaN(earward.block.figure.FigureName.parse("path:supply-amperes@no-signal"));
      String printed =
          QuantityText.format(amperes, earward.block.quantity.Unit.AMPERE, Locale.ENGLISH);
      assertThat(sheet.text()).contains(printed.replace('\u202f', ' '));
    }
  }

  @Test
  void theSheetSaysWhatTheBuilderSeesOnAPart() throws Exception {
    // brown black red gold for 1 kΩ of 5 %: IEC 60062 (from memory)
    SheetContent content = Sheets.of(reviewed("lantern"));
    PartRow r1 =
        content.parts().stream().filter(p -> p.reference().equals("R1")).findFirst().orElseThrow();
    assertThat(r1.marking()).isInstanceOf(Bands.class);
    try (ReadSheet sheet = ReadSheet.of(content)) {
      assertThat(sheet.text()).contains("brown black red gold", "1 kΩ", "0.25 W, ±5 %");
    }
  }

  @Test
  void onlyTheCautionsThatApplyArePrinted() throws Exception {
    assertThat(headlines("lantern"))
        .contains("Never to the mains", "Bridge output", "No lithium cells in the holder")
        .doesNotContain("Germanium hates heat", "Adaptors give more than they say");
    assertThat(headlines("hayloft"))
        .contains("Germanium hates heat")
        .doesNotContain("Bridge output");
    assertThat(headlines("boathouse"))
        .contains("Adaptors give more than they say")
        .doesNotContain("A shorted battery burns");
  }

  private static List<String> headlines(String name) throws Exception {
    return Sheets.of(reviewed(name)).cautions().stream().map(CautionRow::headline).toList();
  }

  @Test
  void aKitWithAStopIsMarkedOnEveryPage() throws Exception {
    ReviewedKit kit = reviewed("boathouse");
    Finding stop = Finding.of(Severity.STOP, "too-hot", "power", "The junction of IC1 is too hot.");
    ReviewedKit stopped =
        new ReviewedKit(kit.solved(), List.of(new ReviewFinding(stop, List.of())));
    try (ReadSheet sheet = ReadSheet.of(Sheets.of(stopped))) {
      for (int page = 1; page <= sheet.pages(); page++) {
        assertThat(sheet.text(page)).contains("DO NOT BUILD");
      }
      assertThat(sheet.text(1)).contains("The junction of IC1 is too hot.");
    }
  }

  @Test
  void aKitThatCouldNotBeSolvedHasASheetWithDashes() throws Exception {
    ReviewedKit kit = reviewed("hayloft");
    Finding stop = Finding.of(Severity.STOP, "unsolved", "path", "No solution was found.");
    SolvedKit unsolved = new SolvedKit(kit.solved().assembly(), Figures.NONE, List.of(stop), false);
    ReviewedKit without = new ReviewedKit(unsolved, List.of(new ReviewFinding(stop, List.of())));
    try (ReadSheet sheet = ReadSheet.of(Sheets.of(without))) {
      assertThat(sheet.text())
          .contains("DO NOT BUILD", "No solution was found.", "could not be solved", "–");
      assertThat(sheet.text()).doesNotContain("NaN");
    }
  }

  @Test
  void aGermanSheetIsGermanThroughout() throws Exception {
    KitDesign design = StarterKits.german(StarterKits.design("lantern"));
    SolvedKit solved = KitSolver.solve(StarterKits.assembled(design));
    ReviewedKit kit = Reviewer.review(solved, Locale.GERMAN);
    SheetContent content = Sheets.of(kit, BuildStages.solve(solved.assembly()));
    try (ReadSheet sheet = ReadSheet.of(content)) {
      String text = sheet.text();
      assertThat(text)
          .contains("Bauzettel", "Stufe 1: ", "Einkaufsliste", "Seite 1 von", "4,7 Ω", "NF eff.")
          .doesNotContain("4.7 Ω", "Stage", "Readings", "ground", "Resistor", "Fitted");
      assertThat(sheet.document().getDocumentCatalog().getLanguage()).isEqualTo("de");
      for (int page = 1; page <= sheet.pages(); page++) {
        SheetWriterTest.requireInside(sheet, page, Paper.A4);
        assertThat(sheet.overprinted(page)).as("page %s", page).isEmpty();
      }
    }
  }

  @Test
  void aDrawingThatIsHigherThanAPageGoesOnFromRowToRow() throws Exception {
    KitDesign design = StarterKits.design("lantern");
    for (int i = 0; i < 24; i++) {
      design = design.addBlock(3, BlockEntry.of("low-pass-" + i, "filter.low-pass-rc"));
    }
    SolvedKit unsolved =
        new SolvedKit(StarterKits.assembled(design), Figures.NONE, List.of(), false);
    SheetContent content = Sheets.of(new ReviewedKit(unsolved, List.of()));
    assertThat(content.drawing().rows()).hasSizeGreaterThan(4);
    try (ReadSheet sheet = ReadSheet.of(content)) {
      StringBuilder drawn = new StringBuilder();
      for (int page = 1; !sheet.text(page).contains("Parts, in fitting order"); page++) {
        drawn.append(sheet.text(page));
        SheetWriterTest.requireInside(sheet, page, Paper.A4);
      }
      var references = unsolved.assembly().references().parts();
      for (int i = 0; i < 24; i++) {
        String once = "\\b" + references.get("low-pass-" + i + ".r2") + "\\b";
        assertThat(Pattern.compile(once).matcher(drawn).results().count()).as(once).isEqualTo(1);
      }
    }
  }

  @Test
  void theDrawingIsOfVectorsWithItsTextReadable() throws Exception {
    try (ReadSheet sheet = ReadSheet.of(Sheets.of(reviewed("hayloft")))) {
      assertThat(sheet.text(2)).contains("The path", "TBA820M", "2.2 kΩ", "470 µF", "TP5");
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void noLetterOfARealSheetLiesOutsideOrOverAnother(String name) throws Exception {
    for (Paper paper : Paper.values()) {
      try (ReadSheet sheet = ReadSheet.of(staged(name).withPaper(paper))) {
        for (int page = 1; page <= sheet.pages(); page++) {
          SheetWriterTest.requireInside(sheet, page, paper);
          assertThat(sheet.overprinted(page)).as("page %s", page).isEmpty();
        }
      }
    }
  }
}
