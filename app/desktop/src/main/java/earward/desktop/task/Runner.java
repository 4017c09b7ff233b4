package earward.desktop.task;

import earward.desktop.model.Background;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.FutureTask;
import java.util.function.Consumer;
import javax.swing.SwingUtilities;
import org.jspecify.annotations.Nullable;

/**
 * The one owner of the window's worker thread. Work is started from the event thread and its result
 * comes back to it; later work takes the place of former work where the runner says so.
 */
public final class Runner implements Background, AutoCloseable {
  private final ExecutorService worker;
  private final boolean latestOnly;
  private @Nullable FutureTask<?> former;

  /**
   * A runner whose thread bears a name; the thread is made when it is first needed.
   *
   * @param latestOnly whether later work takes the place of former work
   */
  public Runner(String name, boolean latestOnly) {
    this.latestOnly = latestOnly;
    worker =
        Executors.newSingleThreadExecutor(
            work -> {
              Thread thread = new Thread(work, "earward-" + name);
              thread.setDaemon(true);
              return thread;
            });
  }

  @Override
  public <T> void start(Callable<T> work, Consumer<T> done, Consumer<Exception> failed) {
    if (former != null && latestOnly) {
      former.cancel(false);
    }
    FutureTask<T> task =
        new FutureTask<>(work) {
          @Override
          protected void done() {
            SwingUtilities.invokeLater(() -> deliver(this, done, failed));
          }
        };
    former = task;
    if (!worker.isShutdown()) {
      worker.execute(task);
    }
  }

  private static <T> void deliver(
      FutureTask<T> task, Consumer<T> done, Consumer<Exception> failed) {
    try {
      done.accept(task.get());
    } catch (CancellationException e) {
      // later work took its place: its result is nobody's any more
    } catch (ExecutionException e) {
      failed.accept(e.getCause() instanceof Exception cause ? cause : e);
      if (e.getCause() instanceof Error error) {
        throw error; // the one uncaught handler says it
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  @Override
  public void close() {
    worker.shutdownNow();
  }
}
