package earward.desktop.view;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import earward.desktop.TestWorkshop;
import earward.desktop.model.Workbench;
import earward.desktop.task.Runner;
import earward.kit.file.Designs;
import java.awt.Component;
import java.awt.Container;
import java.awt.Graphics2D;
import java.awt.GraphicsEnvironment;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import java.util.function.BooleanSupplier;
import javax.accessibility.Accessible;
import javax.imageio.ImageIO;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JTable;
import javax.swing.JTextField;
import javax.swing.SwingUtilities;
import org.assertj.swing.edt.FailOnThreadViolationRepaintManager;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/**
 * The whole window on a display, real or virtual; .ci/run gives it a virtual one. Leaves pictures
 * of itself in target/pictures.
 */
class WindowTest {
  private static final int PATIENCE_MILLISECONDS = 60_000;

  private final Runner solving = new Runner();
  private final Runner rendering = new Runner();
  private Workbench workbench;
  private MainWindow window;

  @BeforeEach
  void open() throws Exception {
    assumeFalse(GraphicsEnvironment.isHeadless(), "there is no display");
    FailOnThreadViolationRepaintManager.install();
    onEventThread(
        () -> {
          Look.set(false);
          workbench =
              new Workbench(
                  TestWorkshop.open(), solving, Designs.read(TestWorkshop.kit("lantern")).design());
          window = new MainWindow(workbench, rendering);
          window.setVisible(true);
          workbench.open(TestWorkshop.kit("lantern"));
          return "";
        });
    await(() -> !workbench.busy());
  }

  @AfterEach
  void close() throws Exception {
    if (window != null) {
      onEventThread(
          () -> {
            window.dispose();
            return "";
          });
    }
    solving.close();
    rendering.close();
  }

  @Test
  void anEditInAFieldReachesTheTable() throws Exception {
    String before = onEventThread(() -> cell(1, 3));
    onEventThread(
        () -> {
          workbench.select("feed");
          JTextField field = (JTextField) named("feed.parallel-ohms");
          field.setText("6 kΩ");
          field.postActionEvent();
          return "";
        });
    await(() -> !workbench.busy());
    assertThat(onEventThread(() -> cell(1, 3))).isNotEqualTo(before);
    assertThat(onEventThread(() -> window.getTitle())).startsWith("•");
  }

  @Test
  void wrongWordsStayInTheirFieldAndAreExplained() throws Exception {
    onEventThread(
        () -> {
          workbench.select("detector");
          JTextField field = (JTextField) named("detector.c1");
          field.setText("5 kΩ");
          field.postActionEvent();
          return "";
        });
    assertThat(onEventThread(() -> ((JTextField) named("detector.c1")).getText()))
        .isEqualTo("5 kΩ");
    assertThat(onEventThread(() -> workbench.unsaved())).isFalse();
  }

  @Test
  void everythingThatTakesTheFocusHasAName() throws Exception {
    for (String block : List.of("feed", "detector", "power", "battery")) {
      List<String> nameless =
          onEventThread(
              () -> {
                workbench.select(block);
                List<String> found = new ArrayList<>();
                all(window.getContentPane(), found);
                return found;
              });
      assertThat(nameless).as("with %s selected", block).isEmpty();
    }
  }

  @Test
  void picturesAreTakenLightAndDarkAtOnceAndTwiceTheSize() throws Exception {
    Path folder = Files.createDirectories(Path.of("target", "pictures"));
    for (boolean dark : new boolean[] {false, true}) {
      onEventThread(
          () -> {
            window.dark(dark);
            workbench.select("detector");
            return "";
          });
      for (int scale = 1; scale <= 2; scale++) {
        int times = scale;
        BufferedImage picture = onEventThread(() -> picture(times));
        write(picture, folder.resolve((dark ? "dark-" : "light-") + scale + "x.png"));
        assertThat(colours(picture)).as("more than an empty ground").isGreaterThan(200);
      }
    }
  }

  private BufferedImage picture(int scale) {
    JComponent root = window.getRootPane();
    BufferedImage image =
        new BufferedImage(
            root.getWidth() * scale, root.getHeight() * scale, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.scale(scale, scale);
    root.paint(g);
    g.dispose();
    return image;
  }

  private static void write(BufferedImage picture, Path file) throws IOException {
    assertThat(ImageIO.write(picture, "png", file.toFile())).isTrue();
  }

  private static long colours(BufferedImage picture) {
    return java.util.Arrays.stream(
            picture.getRGB(
                0, 0, picture.getWidth(), picture.getHeight(), null, 0, picture.getWidth()))
        .distinct()
        .count();
  }

  private String cell(int row, int column) {
    return String.valueOf(((JTable) named("test-points")).getValueAt(row, column));
  }

  private Component named(String name) {
    return find(window.getContentPane(), name);
  }

  private static Component find(Container in, String name) {
    for (Component each : in.getComponents()) {
      if (name.equals(each.getName())) {
        return each;
      }
      if (each instanceof Container inner) {
        Component found = find(inner, name);
        if (found != null) {
          return found;
        }
      }
    }
    return null;
  }

  private static void all(Container in, List<String> nameless) {
    for (Component each : in.getComponents()) {
      boolean typed =
          each instanceof JTextField || each instanceof JComboBox || each instanceof JTable;
      if (typed || each instanceof LevelPath || each instanceof DrawingPane) {
        String name = ((Accessible) each).getAccessibleContext().getAccessibleName();
        if (name == null || name.isBlank()) {
          nameless.add(each.getClass().getSimpleName() + " " + each.getName());
        }
      }
      if (each instanceof Container inner && !(each instanceof JComboBox)) {
        all(inner, nameless);
      }
    }
  }

  private static <T> T onEventThread(Callable<T> work) throws Exception {
    FutureTask<T> task = new FutureTask<>(work);
    SwingUtilities.invokeAndWait(task);
    return task.get();
  }

  private static void await(BooleanSupplier condition) throws Exception {
    long end = System.currentTimeMillis() + PATIENCE_MILLISECONDS;
    while (!onEventThread(condition::getAsBoolean)) {
      assertThat(System.currentTimeMillis()).as("waiting for the window").isLessThan(end);
      Thread.onSpinWait();
      Thread.sleep(20);
    }
  }
}
