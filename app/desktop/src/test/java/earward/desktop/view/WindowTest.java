package earward.desktop.view;

import static earward.desktop.view.WindowStage.onEventThread;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import earward.desktop.TestWorkshop;
import earward.desktop.model.CaseView;
import earward.desktop.model.Preferences.Theme;
import earward.desktop.model.Selection;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.GraphicsEnvironment;
import java.awt.image.BufferedImage;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import javax.accessibility.Accessible;
import javax.swing.AbstractButton;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JScrollBar;
import javax.swing.JTable;
import javax.swing.JTextField;
import javax.swing.SwingUtilities;
import org.assertj.swing.edt.FailOnThreadViolationRepaintManager;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The whole window on a display, real or virtual; .ci/run gives it a virtual one. Leaves pictures
 * of itself in target/pictures.
 */
class WindowTest {
  private static final Path PICTURES = Path.of("target", "pictures");

  @TempDir private Path user;
  private WindowStage stage;

  @BeforeEach
  void open() throws Exception {
    assumeFalse(GraphicsEnvironment.isHeadless(), "there is no display");
    FailOnThreadViolationRepaintManager.install();
    stage = new WindowStage(user, new Dimension(1366, 768));
  }

  @AfterEach
  void close() throws Exception {
    if (stage != null) {
      stage.close();
    }
  }

  private static void type(String name, String words) throws Exception {
    onEventThread(
        () -> {
          JTextField field = (JTextField) WindowStage.find(name);
          field.setText(words);
          field.postActionEvent();
          return "";
        });
  }

  private static String text(String name) throws Exception {
    return onEventThread(() -> ((JTextField) WindowStage.find(name)).getText());
  }

  @Test
  void anEditInAFieldReachesTheTableAndUndoTakesItBack() throws Exception {
    stage.openKit("lantern");
    onEventThread(
        () -> {
          stage.workbench().select("feed");
          stage.window().designDesk().drawing().twin(true);
          return "";
        });
    String before = cell(1, 2);
    type("feed.parallel-ohms", "6 kΩ");
    stage.awaitSolved();
    assertThat(cell(1, 2)).isNotEqualTo(before);
    assertThat(onEventThread(() -> stage.window().getTitle())).startsWith("•");
    onEventThread(
        () -> {
          stage.workbench().undo();
          return "";
        });
    stage.awaitSolved();
    assertThat(cell(1, 2)).isEqualTo(before);
    assertThat(text("feed.parallel-ohms")).isEqualTo("12 kΩ");
  }

  private static String cell(int row, int column) throws Exception {
    return onEventThread(
        () -> String.valueOf(((JTable) WindowStage.find("test-points")).getValueAt(row, column)));
  }

  @Test
  void wrongWordsStayInTheirFieldAndABareNumberAsksItsUnit() throws Exception {
    stage.openKit("lantern");
    onEventThread(
        () -> {
          stage.workbench().select("detector");
          return "";
        });
    type("detector.c1", "5 kΩ");
    assertThat(text("detector.c1")).isEqualTo("5 kΩ");
    assertThat(onEventThread(() -> stage.workbench().unsaved())).isFalse();
    type("detector.c1", "2.2");
    assertThat(onEventThread(() -> stage.workbench().unsaved())).isFalse();
    onEventThread(
        () -> {
          ((JButton) WindowStage.find("detector.c1=2.2 nF")).doClick(0);
          return "";
        });
    assertThat(text("detector.c1")).isEqualTo("2.2 nF");
    assertThat(onEventThread(() -> stage.workbench().undoable()))
        .hasValueSatisfying(name -> assertThat(name).contains("2.2 nF"));
  }

  @Test
  void liveValuesFollowTheCaseBar() throws Exception {
    stage.openKit("lantern");
    onEventThread(
        () -> {
          stage.window().designDesk().drawing().twin(true);
          return "";
        });
    String test = cell(1, 2);
    for (CaseView view :
        List.of(
            CaseView.USUAL.with(CaseView.Signal.STRONG),
            CaseView.USUAL.with(CaseView.Signal.NONE))) {
      onEventThread(
          () -> {
            stage.workbench().look(view);
            return "";
          });
      WindowStage.await("values of " + view, () -> !test.equals(cellNow()));
      onEventThread(
          () -> {
            stage.workbench().look(CaseView.USUAL);
            return "";
          });
      WindowStage.await("the test signal again", () -> test.equals(cellNow()));
    }
  }

  private static String cellNow() {
    return String.valueOf(((JTable) WindowStage.find("test-points")).getValueAt(1, 2));
  }

  @Test
  void everythingThatTakesTheFocusHasANameAndTextStandsOut() throws Exception {
    stage.openKit("lantern");
    for (Theme theme : List.of(Theme.LIGHT, Theme.DARK)) {
      onEventThread(
          () -> {
            Look.change(theme, 100);
            stage.window().relook();
            stage.window().designDesk().openFindings(true);
            stage.window().designDesk().openCurves(true);
            return "";
          });
      for (String selected : List.of("feed", "detector", "battery", Selection.CONDITIONS)) {
        List<String> faults =
            onEventThread(
                () -> {
                  stage.workbench().select(selected);
                  List<Component> all = new ArrayList<>();
                  WindowStage.collect(stage.window().getContentPane(), all);
                  return faults(all);
                });
        assertThat(faults).as("%s with %s selected", theme, selected).isEmpty();
      }
    }
  }

  private static List<String> faults(List<Component> all) {
    List<String> faults = new ArrayList<>();
    for (Component each : all) {
      boolean entered =
          each instanceof JTextField
              || each instanceof JComboBox
              || each instanceof JTable
              || each instanceof AbstractButton
              || each instanceof LevelPath
              || each instanceof DrawingPane
              || each instanceof CurvePane;
      boolean own = each.getParent() != null && !(each.getParent() instanceof JComboBox);
      if (entered && own && each.isShowing() && !inScrollBar(each)) {
        String name = ((Accessible) each).getAccessibleContext().getAccessibleName();
        if (name == null || name.isBlank()) {
          faults.add("no name: " + each.getClass().getSimpleName() + " " + each.getName());
        }
      }
      if (each instanceof JLabel label && label.isShowing() && !label.getText().isBlank()) {
        double contrast = Contrast.of(label.getForeground(), Contrast.behind(label));
        if (label.isEnabled() && contrast < 4.5) {
          faults.add(
              String.format(java.util.Locale.ROOT, "%.1f : 1 %s", contrast, label.getText()));
        }
      }
    }
    return faults;
  }

  private static boolean inScrollBar(Component each) {
    return SwingUtilities.getAncestorOfClass(JScrollBar.class, each) != null
        || each.getParent().getClass().getName().contains("Divider");
  }

  @Test
  void startPageEmptyPathAndDesksArePicturedLightAndDarkAtOnceAndTwiceTheSize() throws Exception {
    Files.createDirectories(PICTURES);
    picture("start");
    onEventThread(
        () -> {
          ((JButton) WindowStage.find("start-empty")).doClick(0);
          return "";
        });
    stage.awaitSolved();
    picture("empty-path");
    onEventThread(
        () -> {
          stage.workbench().open(TestWorkshop.kit("lantern"));
          stage.workbench().select("detector");
          stage.window().setSize(1500, 920);
          return "";
        });
    stage.awaitSolved();
    WindowStage.await(
        "the drawing", () -> stage.window().designDesk().drawing().pane().schematic().isPresent());
    for (Theme theme : List.of(Theme.LIGHT, Theme.DARK)) {
      onEventThread(
          () -> {
            Look.change(theme, 100);
            stage.window().relook();
            return "";
          });
      picture(theme == Theme.DARK ? "design-dark" : "design-light");
    }
    onEventThread(
        () -> {
          Look.change(Theme.LIGHT, 150);
          stage.window().relook();
          return "";
        });
    picture("design-150-percent");
    onEventThread(
        () -> {
          Look.change(Theme.LIGHT, 100);
          stage.window().relook();
          stage.window().designDesk().openCurves(true);
          stage.window().designDesk().openFindings(true);
          return "";
        });
    WindowStage.await("curves", () -> stage.workbench().curvesCurrent());
    picture("curves-and-findings");
    onEventThread(
        () -> {
          stage.window().desks().setSelectedIndex(3);
          return "";
        });
    WindowStage.await("the pages", () -> WindowStage.find("page") != null);
    picture("sheet");
  }

  private void picture(String name) throws Exception {
    for (int scale = 1; scale <= 2; scale++) {
      BufferedImage picture = stage.picture(scale);
      WindowStage.write(picture, PICTURES.resolve(name + "-" + scale + "x.png"));
      assertThat(colours(picture)).as("more than an empty ground").isGreaterThan(100);
    }
  }

  private static long colours(BufferedImage picture) {
    return Arrays.stream(
            picture.getRGB(
                0, 0, picture.getWidth(), picture.getHeight(), null, 0, picture.getWidth()))
        .distinct()
        .count();
  }
}
