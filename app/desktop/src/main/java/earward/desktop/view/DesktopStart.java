package earward.desktop.view;

import earward.desktop.model.Amounts;
import earward.desktop.model.Preferences;
import earward.desktop.model.Workshop;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;

/** Opens the first window with all that is preferred. */
public final class DesktopStart {
  private DesktopStart() {}

  /**
   * Opens it; on the event thread.
   *
   * @param userFolder where preferences and autosaves are kept
   * @param design the file to open; the start page without one
   * @param allClosed runs when the last window was closed
   */
  public static MainWindow open(
      Workshop workshop, Path userFolder, Optional<Path> design, Runnable allClosed) {
    OpenWindows windows = new OpenWindows(workshop, userFolder, allClosed);
    Preferences preferences = windows.preferences();
    Faults.sayUncaught();
    Amounts.decimalsOf(preferences.decimalComma() ? Locale.GERMANY : Locale.ENGLISH);
    Look.set(preferences.theme(), preferences.textPercent());
    MainWindow window = windows.open();
    design.ifPresent(window::openFile);
    return window;
  }
}
