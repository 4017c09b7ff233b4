package earward.desktop;

import earward.desktop.model.Preferences;
import earward.desktop.model.Workshop;
import earward.desktop.view.DesktopStart;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import javax.swing.SwingUtilities;

/** Opens the desktop. */
public final class Desktop {
  private Desktop() {}

  /**
   * Opens the first window and waits until the last one is closed.
   *
   * @param workshop block types, parts, starter kits
   * @param design the file to open; the start page without one
   * @throws InterruptedException when the waiting thread is interrupted
   */
  public static void run(Workshop workshop, Optional<Path> design) throws InterruptedException {
    CountDownLatch closed = new CountDownLatch(1);
    Path user = Preferences.folder();
    SwingUtilities.invokeLater(() -> DesktopStart.open(workshop, user, design, closed::countDown));
    closed.await();
  }
}
