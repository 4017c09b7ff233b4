package earward.command;

import earward.study.batch.BatchProgress;
import java.io.PrintWriter;
import java.util.Locale;
import java.util.function.BooleanSupplier;

/** Tells on standard error how far a batch is: a line in two seconds, with the time left. */
final class KitsProgress implements BatchProgress {
  private static final long NANOS = 1_000_000_000L;
  private static final long BETWEEN = 2 * NANOS;

  private final PrintWriter messages;
  private final BooleanSupplier cancelled;
  private final long start = System.nanoTime();
  private long said = start;

  KitsProgress(PrintWriter messages, BooleanSupplier cancelled) {
    this.messages = messages;
    this.cancelled = cancelled;
  }

  @Override
  public boolean goesOn(long done, long kits) {
    long now = System.nanoTime();
    if (now - said > BETWEEN && done < kits) {
      double secondsLeft = (double) (now - start) / NANOS * (kits - done) / done;
      Faults.say(
          messages,
          String.format(Locale.ROOT, "%d of %d kits, about %.0f s to go", done, kits, secondsLeft));
      messages.flush();
      said = now;
    }
    return !cancelled.getAsBoolean();
  }
}
