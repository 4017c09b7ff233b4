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
 * comes back to it; later work cancels former work that has not begun to matter.
 */
public final class Runner implements Background, AutoCloseable {
  private final ExecutorService worker =
      Executors.newSingleThreadExecutor(
          work -> {
            Thread thread = new Thread(work, "earward-solver");
            thread.setDaemon(true);
            return thread;
          });
  private @Nullable FutureTask<?> former;

  @Override
  public <T> void start(Callable<T> work, Consumer<T> done, Consumer<Exception> failed) {
    if (former != null) {
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
    worker.execute(task);
  }

  private static <T> void deliver(
      FutureTask<T> task, Consumer<T> done, Consumer<Exception> failed) {
    try {
      done.accept(task.get());
    } catch (CancellationException e) {
      // later work took its place: its result is nobody's any more
    } catch (ExecutionException e) {
      failed.accept(e.getCause() instanceof Exception cause ? cause : e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  @Override
  public void close() {
    worker.shutdownNow();
  }
}
