package earward.desktop.model;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.desktop.TestWorkshop;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import earward.kit.review.ReviewedKit;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Consumer;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WorkbenchTest {
  @TempDir private Path folder;
  private final Held background = new Held();
  private Workbench workbench;

  /** Holds work until the test lets it run, in any order. */
  private static final class Held implements Background {
    private final List<Runnable> waiting = new ArrayList<>();

    @Override
    public <T> void start(Callable<T> work, Consumer<T> done, Consumer<Exception> failed) {
      waiting.add(
          () -> {
            try {
              done.accept(work.call());
            } catch (Exception e) {
              failed.accept(e);
            }
          });
    }

    void runAll() {
      List<Runnable> now = List.copyOf(waiting);
      waiting.clear();
      now.forEach(Runnable::run);
    }

    void runBackwards() {
      List<Runnable> now = List.copyOf(waiting);
      waiting.clear();
      for (int i = now.size() - 1; i >= 0; i--) {
        now.get(i).run();
      }
    }
  }

  @BeforeEach
  void openAStarterKit() throws DesignFileException {
    workbench =
        new Workbench(
            TestWorkshop.open(), background, Designs.read(TestWorkshop.kit("lantern")).design());
    workbench.open(TestWorkshop.kit("lantern"));
    background.runAll();
  }

  private SettingRow row(String block, String setting) {
    return workbench.forms().of(workbench.design(), block).stream()
        .filter(row -> row.setting().id().equals(setting))
        .findFirst()
        .orElseThrow();
  }

  private double detected() {
    ReviewedKit kit = workbench.kit().orElseThrow();
    return kit.figures().find("detector.out", Quantity.DC_VOLTS, CaseName.TEST).orElseThrow();
  }

  @Test
  void aStarterKitOpensSolvedAndSaved() {
    assertThat(workbench.message()).isEmpty();
    assertThat(workbench.busy()).isFalse();
    assertThat(workbench.unsaved()).isFalse();
    assertThat(workbench.kit().orElseThrow().doNotBuild()).isFalse();
    assertThat(PathLevels.of(workbench.kit().orElseThrow()))
        .hasSize(workbench.design().path().size())
        .allMatch(card -> Double.isFinite(card.decibelsVolt()));
  }

  @Test
  void anEditMovesTheFiguresAndUndoBringsThemBack() {
    double before = detected();
    workbench.set(row("feed", "parallel-ohms"), "8 kΩ");
    assertThat(workbench.busy()).isTrue();
    background.runAll();
    assertThat(detected()).isNotEqualTo(before);
    assertThat(workbench.unsaved()).isTrue();
    assertThat(workbench.undoable()).hasValueSatisfying(name -> assertThat(name).contains("8 kΩ"));
    workbench.undo();
    background.runAll();
    assertThat(detected()).isEqualTo(before);
    assertThat(workbench.unsaved()).isFalse();
    workbench.redo();
    background.runAll();
    assertThat(detected()).isNotEqualTo(before);
  }

  @Test
  void anOlderResultNeverOverwritesANewerOne() {
    workbench.set(row("feed", "parallel-ohms"), "8 kΩ");
    workbench.set(row("feed", "parallel-ohms"), "10 kΩ");
    background.runBackwards();
    double newest = detected();
    workbench.solve();
    background.runAll();
    assertThat(detected()).isEqualTo(newest);
  }

  @Test
  void wrongWordsAreNamedAndChangeNothing() {
    SettingRow row = row("detector", "c1");
    assertThat(workbench.forms().fault(row, "5 kΩ"))
        .hasValueSatisfying(sentence -> assertThat(sentence).contains("5 kΩ"));
    assertThat(workbench.forms().fault(row, "1n5")).isEmpty();
    assertThat(workbench.unsaved()).isFalse();
  }

  @Test
  void arrowKeysStepThroughThePreferredSeries() {
    SettingRow row = row("detector", "c1");
    assertThat(workbench.forms().stepped(row, "1.5 nF", true)).isEqualTo("1.8 nF");
    assertThat(workbench.forms().stepped(row, "1.5 nF", false)).isEqualTo("1.2 nF");
    assertThat(workbench.forms().stepped(row, "not a value", true)).isEqualTo("not a value");
  }

  @Test
  void aFileThatCannotBeReadLeavesTheDesignAlone() {
    Path missing = folder.resolve("missing.earward");
    workbench.open(missing);
    assertThat(workbench.message()).contains("missing.earward");
    assertThat(workbench.design().title()).isEqualTo("Lantern");
  }

  @Test
  void savingAndExportingWriteWhatIsShown() throws IOException, DesignFileException {
    workbench.set(row("detector", "c1"), "1 nF");
    background.runAll();
    Path saved = folder.resolve("mine.earward");
    assertThat(workbench.save(saved)).isEmpty();
    assertThat(workbench.unsaved()).isFalse();
    assertThat(Designs.read(saved).design()).isEqualTo(workbench.design());
    Path sheet = folder.resolve("mine.pdf");
    assertThat(workbench.export(sheet)).isEmpty();
    assertThat(Files.readString(sheet, java.nio.charset.StandardCharsets.ISO_8859_1))
        .startsWith("%PDF");
    assertThat(workbench.export(folder)).contains(folder.toString());
  }

  @Test
  void everyTestPointHasItsRow() {
    List<TestPointRow> rows = TestPointRow.of(workbench.kit().orElseThrow());
    assertThat(rows)
        .extracting(TestPointRow::reference)
        .contains("TP1", "TP2")
        .doesNotHaveDuplicates();
    assertThat(rows).allMatch(row -> row.figures().size() == TestPointRow.columns().size());
    assertThat(rows).noneMatch(row -> row.where().isBlank());
  }
}
