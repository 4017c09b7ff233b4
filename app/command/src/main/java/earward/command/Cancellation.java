package earward.command;

import java.io.PrintWriter;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicBoolean;

/**
 * Ctrl-C while something long runs: it is asked to stop, and the process waits for that a moment,
 * so that no half a result is left. Closed where the work is done.
 */
final class Cancellation implements AutoCloseable {
  private static final long LONGEST_SECONDS = 5;

  private final AtomicBoolean asked = new AtomicBoolean();
  private final CountDownLatch done = new CountDownLatch(1);
  private final PrintWriter messages;
  private final Thread hook = new Thread(this::stop, "cancellation");

  Cancellation(PrintWriter messages) {
    this.messages = messages;
    Runtime.getRuntime().addShutdownHook(hook);
  }

  /** Whether it is to stop. */
  boolean asked() {
    return asked.get();
  }

  /** What Ctrl-C does. */
  void stop() {
    asked.set(true);
    try {
      if (done.await(LONGEST_SECONDS, TimeUnit.SECONDS)) {
        Faults.say(messages, "Ended; nothing is shown.");
        messages.flush();
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  @Override
  public void close() {
    done.countDown();
    try {
      Runtime.getRuntime().removeShutdownHook(hook);
    } catch (IllegalStateException e) {
      done.countDown(); // the process is ending already, and the hook runs
    }
  }
}
