package earward.desktop.model;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.desktop.TestWorkshop;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WorkbenchTest {
  @TempDir private Path folder;
  private final Held background = new Held();
  private Workbench workbench;

  @BeforeEach
  void openAStarterKit() throws DesignFileException {
    Workshop workshop = TestWorkshop.open();
    workbench =
        new Workbench(
            workshop,
            new KitSolving(workshop),
            Lanes.single(background),
            Designs.read(TestWorkshop.kit("lantern")).design());
    workbench.open(TestWorkshop.kit("lantern"));
    background.runAll();
  }

  private FormRow row(String block, String setting) {
    return workbench.forms().rows(workbench.design(), block).stream()
        .filter(row -> row.id().equals(setting))
        .findFirst()
        .orElseThrow();
  }

  private void set(String block, String setting, String words) {
    FormRow row = row(block, setting);
    workbench.edit(
        row.label() + " to " + words, design -> workbench.forms().edited(design, row, words));
  }

  private ShownFigure detected() {
    return workbench.readings().find("detector.out", Quantity.DC_VOLTS, CaseName.TEST);
  }

  @Test
  void aStarterKitOpensSolvedAndSaved() {
    assertThat(workbench.message()).isEmpty();
    assertThat(workbench.busy()).isFalse();
    assertThat(workbench.unsaved()).isFalse();
    assertThat(workbench.kit().orElseThrow().doNotBuild()).isFalse();
    assertThat(workbench.readings().standing()).isEqualTo(Standing.SETTLED);
    assertThat(PathLevels.of(workbench.workshop(), workbench.design(), workbench.readings()))
        .hasSize(workbench.design().path().size())
        .allMatch(card -> card.kind() == LevelCard.Kind.BLOCK)
        .allMatch(card -> Double.isFinite(card.decibelsVolt()));
  }

  @Test
  void anEditMovesTheFiguresAndUndoBringsThemBack() {
    double before = detected().value();
    set("feed", "parallel-ohms", "8 kΩ");
    assertThat(workbench.busy()).isTrue();
    background.runAll();
    assertThat(detected().value()).isNotEqualTo(before);
    assertThat(workbench.unsaved()).isTrue();
    assertThat(workbench.undoable()).hasValueSatisfying(name -> assertThat(name).contains("8 kΩ"));
    workbench.undo();
    background.runAll();
    assertThat(detected().value()).isEqualTo(before);
    assertThat(workbench.unsaved()).isFalse();
    workbench.redo();
    background.runAll();
    assertThat(detected().value()).isNotEqualTo(before);
  }

  @Test
  void theHeadlineComesFirstAndIsProvisional() {
    double before = detected().value();
    set("feed", "parallel-ohms", "8 kΩ");
    assertThat(detected()).isEqualTo(new ShownFigure(before, Standing.FORMER));
    background.runFirst();
    ShownFigure ahead = detected();
    assertThat(ahead.standing()).isEqualTo(Standing.PROVISIONAL);
    assertThat(ahead.value()).isNotEqualTo(before);
    background.runAll();
    assertThat(detected().standing()).isEqualTo(Standing.SETTLED);
    assertThat(detected().value()).isCloseTo(ahead.value(), within(ahead.value()));
  }

  private static org.assertj.core.data.Offset<Double> within(double value) {
    return org.assertj.core.data.Offset.offset(Math.abs(value) * 1e-3);
  }

  @Test
  void whatIsTypedMovesFiguresButNeitherFindingsNorHistory() {
    var findings = workbench.kit().orElseThrow().findings();
    double before = detected().value();
    FormRow row = row("feed", "parallel-ohms");
    workbench.type(workbench.forms().edited(workbench.design(), row, "8 kΩ"));
    background.runAll();
    assertThat(detected().standing()).isEqualTo(Standing.PROVISIONAL);
    assertThat(detected().value()).isNotEqualTo(before);
    assertThat(workbench.kit().orElseThrow().findings()).isEqualTo(findings);
    assertThat(workbench.undoable()).isEmpty();
    workbench.untype();
    assertThat(detected()).isEqualTo(new ShownFigure(before, Standing.SETTLED));
  }

  @Test
  void oneVisitToAFieldIsOneStepOfUndo() {
    FormRow row = row("detector", "c1");
    for (String words : new String[] {"1.8 nF", "2.2 nF", "2.7 nF"}) {
      workbench.enter("visit 1", words, design -> workbench.forms().edited(design, row, words));
    }
    workbench.enter("visit 2", "1 nF", design -> workbench.forms().edited(design, row, "1 nF"));
    workbench.undo();
    assertThat(row("detector", "c1").words()).isEqualTo("2.7 nF");
    workbench.undo();
    assertThat(row("detector", "c1").words()).isEqualTo("1.5 nF");
    assertThat(workbench.undoable()).isEmpty();
  }

  @Test
  void anOlderResultNeverOverwritesANewerOne() {
    set("feed", "parallel-ohms", "8 kΩ");
    set("feed", "parallel-ohms", "10 kΩ");
    background.runBackwards();
    double newest = detected().value();
    workbench.solve();
    background.runAll();
    assertThat(detected().value()).isEqualTo(newest);
  }

  @Test
  void aDesignThatCannotBeSolvedKeepsItsFormerFiguresAndSaysSo() {
    double before = detected().value();
    workbench.edit("feed away", design -> design.withoutBlock("feed"));
    background.runAll();
    assertThat(workbench.kit().orElseThrow().doNotBuild()).isTrue();
    assertThat(detected()).isEqualTo(new ShownFigure(before, Standing.FORMER));
    assertThat(workbench.readings().standing()).isEqualTo(Standing.FORMER);
  }

  @Test
  void aFileThatCannotBeReadLeavesTheDesignAlone() {
    Path missing = folder.resolve("missing.earward");
    assertThat(workbench.open(missing)).contains("missing.earward");
    assertThat(workbench.design().title()).isEqualTo("Lantern");
  }

  @Test
  void savingWritesWhatIsShownAndNoticesWhoElseWrites() throws IOException, DesignFileException {
    set("detector", "c1", "1 nF");
    Path saved = folder.resolve("mine.earward");
    assertThat(workbench.save(saved)).isEmpty();
    assertThat(workbench.unsaved()).isFalse();
    assertThat(Designs.read(saved).design()).isEqualTo(workbench.design());
    assertThat(workbench.changedOutside()).isFalse();
    Files.setLastModifiedTime(saved, FileTime.fromMillis(1_000_000));
    assertThat(workbench.changedOutside()).isTrue();
    assertThat(workbench.changedOutside()).as("it is said once").isFalse();
    assertThat(workbench.save(folder)).contains(folder.toString());
  }

  @Test
  void theSheetIsWrittenWholeOrNotAtAll() throws IOException {
    Path sheet = folder.resolve("mine.pdf");
    SheetPages.write(workbench.kit().orElseThrow(), sheet);
    assertThat(Files.readString(sheet, java.nio.charset.StandardCharsets.ISO_8859_1))
        .startsWith("%PDF");
    assertThat(folder.toFile().list()).containsExactly("mine.pdf");
  }

  @Test
  void curvesComeWhenTheyAreAskedForAndABaselineGhostsThem() {
    assertThat(workbench.curves()).isEmpty();
    workbench.askCurves(true);
    background.runAll();
    assertThat(workbench.curvesCurrent()).isTrue();
    workbench.pin();
    set("filter", "c2", "10 nF");
    background.runAll();
    var plots =
        CurveSet.of(
            workbench.design(),
            workbench.curves().orElseThrow(),
            workbench.baseline().flatMap(Baseline::curves));
    assertThat(plots).hasSizeGreaterThan(4).noneMatch(plot -> plot.empty());
    assertThat(plots.get(0).curves()).hasSize(2);
    assertThat(plots.get(0).curves().get(0).points())
        .isNotEqualTo(plots.get(0).curves().get(1).points());
    assertThat(CurveText.csv(plots.get(0)).lines().count()).isGreaterThan(190);
    assertThat(KeyFigure.of(workbench.readings(), workbench.baseline()))
        .anyMatch(figure -> figure.difference().startsWith("\u2212"));
  }

  @Test
  void aMeterOfOneHundredKiloohmsReadsLowWhereTheSourceIsNotFarBelowIt() {
    FormRow ohms = row(Selection.BENCH, "ohms-0");
    var design = workbench.forms().edited(workbench.design(), ohms, "100 kΩ");
    LiveValues read =
        LiveValues.solved(design, CaseView.USUAL.withMeter(true), workbench.workshop());
    LiveValues really = LiveValues.solved(design, CaseView.USUAL, workbench.workshop());
    for (int i = 0; i < read.points().size(); i++) {
      LiveValues.Point point = read.points().get(i);
      if (point.place().equals("agc.agc")) {
        assertThat(point.dcVolts()).isLessThan(really.points().get(i).dcVolts() * 0.9);
      } else if (point.place().equals("battery.rail")) {
        assertThat(point.dcVolts()).isCloseTo(really.points().get(i).dcVolts(), within(1.0));
      }
    }
  }

  @Test
  void theCaseBarSolvesWhatItSays() {
    Workshop workshop = workbench.workshop();
    var design = workbench.design();
    double test = detectedIn(LiveValues.solved(design, CaseView.USUAL, workshop));
    CaseView weak = CaseView.USUAL.with(CaseView.Signal.WEAK);
    assertThat(detectedIn(LiveValues.solved(design, weak, workshop))).isLessThan(test / 2);
    CaseView low = CaseView.USUAL.withBatteryLow(true);
    var rail =
        LiveValues.solved(design, low, workshop).points().stream()
            .filter(point -> point.place().equals("battery.rail"))
            .findFirst()
            .orElseThrow();
    assertThat(rail.dcVolts()).isBetween(2.5, 3.6);
  }

  private static double detectedIn(LiveValues values) {
    return values.points().stream()
        .filter(point -> point.place().equals("detector.out"))
        .findFirst()
        .orElseThrow()
        .dcVolts();
  }
}
