package earward.desktop.view;

import earward.desktop.model.Preferences;
import earward.desktop.model.Recovery;
import earward.desktop.model.Workshop;
import earward.desktop.task.Runners;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;

/** All windows of the program: one for each open design. Lives on the event thread. */
public final class OpenWindows {
  private final Workshop workshop;
  private final Preferences preferences;
  private final Path recovery;
  private final Runnable allClosed;
  private final List<MainWindow> windows = new ArrayList<>();

  /**
   * No window yet.
   *
   * @param workshop what designs are made of
   * @param userFolder where preferences and autosaves are kept
   * @param allClosed runs when the last window was closed
   */
  public OpenWindows(Workshop workshop, Path userFolder, Runnable allClosed) {
    this.workshop = workshop;
    preferences = Preferences.in(userFolder);
    recovery = userFolder.resolve("recovery");
    this.allClosed = allClosed;
  }

  Workshop workshop() {
    return workshop;
  }

  /** What the user prefers. */
  public Preferences preferences() {
    return preferences;
  }

  Path recovery() {
    return recovery;
  }

  List<Recovery.Left> left() {
    return Recovery.left(recovery);
  }

  /** The windows that are open. */
  public List<MainWindow> windows() {
    return List.copyOf(windows);
  }

  /** Opens a window with the start page. */
  public MainWindow open() {
    Runners runners = new Runners();
    MainWindow window = new MainWindow(this, runners.lanes());
    windows.add(window);
    window.addWindowListener(
        new WindowAdapter() {
          @Override
          public void windowClosed(WindowEvent e) {
            runners.close();
            windows.remove(window);
            if (windows.isEmpty()) {
              allClosed.run();
            }
          }
        });
    window.setLocationByPlatform(true);
    window.setVisible(true);
    return window;
  }

  /** Something that all windows must take over. */
  void each(Consumer<MainWindow> change) {
    windows().forEach(change);
  }
}
