package earward.desktop.view;

import earward.desktop.model.Standing;
import earward.desktop.model.Workshop;
import java.awt.Component;
import java.awt.Container;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicLong;
import javax.swing.JTextField;
import javax.swing.SwingUtilities;
import org.jspecify.annotations.Nullable;

/**
 * Types one value after the other into the real window and takes the time from each keystroke to
 * the headline figures painted from it.
 */
public final class EditTiming {
  private static final int PATIENCE_SECONDS = 30;

  private final MainWindow window;
  private final AtomicLong longestStep = new AtomicLong();

  private EditTiming(MainWindow window) {
    this.window = window;
  }

  /**
   * What was measured, in ns.
   *
   * @param keystrokes from each keystroke to its painted figure
   * @param longestOnEventThread the longest that one keystroke held the event thread
   */
  public record Times(List<Long> keystrokes, long longestOnEventThread) {
    public Times {
      keystrokes = List.copyOf(keystrokes);
    }
  }

  /**
   * Opens a window on a design, types, and closes it.
   *
   * @param userFolder for preferences and autosaves
   * @param field name of the field, for instance {@code detector.c1}
   * @param words what is typed, one after the other
   */
  public static Times of(
      Workshop workshop, Path userFolder, Path design, String field, List<String> words)
      throws Exception {
    CountDownLatch closed = new CountDownLatch(1);
    AtomicWindow opened = new AtomicWindow();
    SwingUtilities.invokeAndWait(
        () ->
            opened.window =
                Optional.of(
                    DesktopStart.open(
                        workshop, userFolder, Optional.of(design), closed::countDown)));
    MainWindow window = opened.window.orElseThrow();
    try {
      return new EditTiming(window).run(field, words);
    } finally {
      SwingUtilities.invokeAndWait(window::dispose);
      closed.await(PATIENCE_SECONDS, TimeUnit.SECONDS);
    }
  }

  /** Carries the window from the event thread. */
  private static final class AtomicWindow {
    private volatile Optional<MainWindow> window = Optional.empty();
  }

  private Times run(String fieldName, List<String> words) throws Exception {
    settle();
    String owner = fieldName.substring(0, fieldName.indexOf('.'));
    SwingUtilities.invokeAndWait(() -> window.workbench().select(owner));
    List<Long> times = new ArrayList<>();
    for (String each : words) {
      times.add(typed(fieldName, each));
    }
    return new Times(times, longestStep.get());
  }

  private void settle() throws Exception {
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
    CountDownLatch settled = new CountDownLatch(1);
    while (settled.getCount() > 0) {
      SwingUtilities.invokeAndWait(
          () -> {
            if (!window.workbench().busy()) {
              settled.countDown();
            }
          });
      if (System.nanoTime() > end) {
        throw new IllegalStateException("the design was not solved in time");
      }
      TimeUnit.MILLISECONDS.sleep(5);
    }
  }

  private long typed(String fieldName, String words) throws Exception {
    CountDownLatch painted = new CountDownLatch(1);
    AtomicLong end = new AtomicLong();
    HeadlineStrip strip = window.designDesk().headline();
    long begin = System.nanoTime();
    SwingUtilities.invokeAndWait(
        () -> {
          strip.onPaint(
              () -> {
                boolean fresh =
                    window.workbench().readings().standing() == Standing.PROVISIONAL
                        && window.workbench().readings().headlineOf(window.workbench().shown());
                if (fresh && end.compareAndSet(0, System.nanoTime())) {
                  painted.countDown();
                }
              });
          long from = System.nanoTime();
          field(window, fieldName).setText(words);
          longestStep.accumulateAndGet(System.nanoTime() - from, Math::max);
        });
    if (!painted.await(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
      throw new IllegalStateException("no figure was painted for '" + words + "'");
    }
    return end.get() - begin;
  }

  private static JTextField field(Container in, String name) {
    JTextField found = fieldOrNone(in, name);
    if (found == null) {
      throw new IllegalArgumentException("there is no field '" + name + "'");
    }
    return found;
  }

  private static @Nullable JTextField fieldOrNone(Container in, String name) {
    for (Component each : in.getComponents()) {
      if (each instanceof JTextField field && name.equals(field.getName())) {
        return field;
      }
      if (each instanceof Container inner) {
        JTextField found = fieldOrNone(inner, name);
        if (found != null) {
          return found;
        }
      }
    }
    return null;
  }
}
