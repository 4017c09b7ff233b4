package earward.desktop;

import earward.block.Conditions;
import earward.desktop.model.Workbench;
import earward.desktop.model.Workshop;
import earward.desktop.task.Runner;
import earward.desktop.view.Look;
import earward.desktop.view.MainWindow;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitConditions;
import earward.kit.design.KitDesign;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import javax.swing.SwingUtilities;

/** Opens the desktop. */
public final class Desktop {
  /**
   * Conditions of a new kit until its designer says otherwise: the usual IF, tone and depth of
   * receiver measurements, and a kit's room temperature (common practice).
   */
  private static final Conditions USUAL =
      new Conditions(455e3, 400, 4500, 150, 0.3, 0.8, 0.2, 1.5, 3, 25, 40, 0.2);

  private Desktop() {}

  /**
   * Opens the main window and waits until it is closed.
   *
   * @param workshop block types, parts, starter kits
   * @param design the file to open; the first starter kit, or an empty path, without one
   * @throws InterruptedException when the waiting thread is interrupted
   */
  public static void run(Workshop workshop, Optional<Path> design) throws InterruptedException {
    CountDownLatch closed = new CountDownLatch(1);
    Runner solving = new Runner();
    Runner rendering = new Runner();
    SwingUtilities.invokeLater(
        () -> {
          Look.set(false);
          MainWindow window = window(workshop, design, solving, rendering);
          window.addWindowListener(
              new java.awt.event.WindowAdapter() {
                @Override
                public void windowClosed(java.awt.event.WindowEvent e) {
                  closed.countDown();
                }
              });
          window.setLocationByPlatform(true);
          window.setVisible(true);
        });
    closed.await();
    solving.close();
    rendering.close();
  }

  private static MainWindow window(
      Workshop workshop, Optional<Path> design, Runner solving, Runner rendering) {
    Workbench workbench =
        new Workbench(
            workshop,
            solving,
            KitDesign.empty("Untitled", KitConditions.of(USUAL, FrontEndSupply.BATTERY)));
    MainWindow window = new MainWindow(workbench, rendering);
    Optional<Path> first =
        design.isPresent() ? design : workshop.starterKits().stream().findFirst();
    first.ifPresentOrElse(workbench::open, workbench::solve);
    return window;
  }
}
