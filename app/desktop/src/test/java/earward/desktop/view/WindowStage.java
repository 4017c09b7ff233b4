package earward.desktop.view;

import static org.assertj.core.api.Assertions.assertThat;

import earward.desktop.TestWorkshop;
import earward.desktop.model.Preferences.Theme;
import earward.desktop.model.Workbench;
import java.awt.Component;
import java.awt.Container;
import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.Window;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import java.util.function.BooleanSupplier;
import java.util.function.Predicate;
import javax.imageio.ImageIO;
import javax.swing.JComponent;
import javax.swing.SwingUtilities;

/** Whole windows for tests: opened, waited for, pictured, closed. */
final class WindowStage {
  private static final int PATIENCE_MILLISECONDS = 60_000;

  private final OpenWindows windows;
  private final MainWindow window;

  /** The first window, at its start page. */
  WindowStage(Path userFolder, Dimension size) throws Exception {
    windows =
        onEventThread(
            () -> {
              Look.set(Theme.LIGHT, 100);
              return new OpenWindows(TestWorkshop.open(), userFolder, () -> {});
            });
    window =
        onEventThread(
            () -> {
              MainWindow opened = windows.open();
              opened.setSize(size);
              opened.validate();
              return opened;
            });
  }

  OpenWindows windows() {
    return windows;
  }

  MainWindow window() {
    return window;
  }

  Workbench workbench() {
    return window.workbench();
  }

  /** Opens a starter kit and waits until it is solved. */
  void openKit(String name) throws Exception {
    onEventThread(
        () -> {
          window.openFile(TestWorkshop.kit(name));
          return "";
        });
    awaitSolved();
  }

  void awaitSolved() throws Exception {
    await("the review", () -> !workbench().busy());
  }

  /** Something by its name, in any window; null where there is none that shows. */
  static Component find(String name) {
    return find(each -> name.equals(each.getName()) && each.isShowing());
  }

  static Component find(Predicate<Component> wanted) {
    for (Window each : Window.getWindows()) {
      if (each.isShowing()) {
        List<Component> all = new ArrayList<>();
        collect(each, all);
        for (Component one : all) {
          if (wanted.test(one)) {
            return one;
          }
        }
      }
    }
    return null;
  }

  static void collect(Component in, List<Component> into) {
    into.add(in);
    if (in instanceof Container container) {
      for (Component each : container.getComponents()) {
        collect(each, into);
      }
    }
  }

  static <T> T onEventThread(Callable<T> work) throws Exception {
    FutureTask<T> task = new FutureTask<>(work);
    SwingUtilities.invokeAndWait(task);
    return task.get();
  }

  static void await(String what, BooleanSupplier condition) throws Exception {
    long end = System.currentTimeMillis() + PATIENCE_MILLISECONDS;
    while (!onEventThread(condition::getAsBoolean)) {
      assertThat(System.currentTimeMillis()).as("waiting for " + what).isLessThan(end);
      Thread.sleep(15);
    }
  }

  /** Everything in the window as a picture, its menu among it. */
  BufferedImage picture(int scale) throws Exception {
    return onEventThread(
        () -> {
          JComponent root = window.getRootPane();
          BufferedImage image =
              new BufferedImage(
                  root.getWidth() * scale, root.getHeight() * scale, BufferedImage.TYPE_INT_RGB);
          Graphics2D g = image.createGraphics();
          g.scale(scale, scale);
          root.paint(g);
          g.dispose();
          return image;
        });
  }

  static void write(BufferedImage picture, Path file) throws IOException {
    Path folder = file.toAbsolutePath().getParent();
    if (folder != null) {
      Files.createDirectories(folder);
    }
    assertThat(ImageIO.write(picture, "png", file.toFile())).isTrue();
  }

  void close() throws Exception {
    onEventThread(
        () -> {
          for (Window each : Window.getWindows()) {
            each.dispose();
          }
          return "";
        });
  }
}
