package earward.command;

import earward.engine.waveform.WaveformListener;
import java.io.PrintWriter;
import java.util.Locale;
import java.util.function.BooleanSupplier;

/** Tells on standard error how far a full waveform is: a line a period, or one in two seconds. */
final class ProofProgress implements WaveformListener {
  private static final long NANOS = 2_000_000_000L;

  private final PrintWriter messages;
  private final BooleanSupplier cancelled;
  private int steps = -1;
  private int period = -1;
  private long said;

  ProofProgress(PrintWriter messages, BooleanSupplier cancelled) {
    this.messages = messages;
    this.cancelled = cancelled;
  }

  @Override
  public boolean goesOn(int stepsPerCycle, int nowPeriod, double share) {
    long now = System.nanoTime();
    boolean settling = stepsPerCycle == 0;
    if (settling ? steps != 0 : stepsPerCycle != steps || nowPeriod != period) {
      say(
          settling
              ? "the carrier settles and the winding is peaked"
              : String.format(
                  Locale.ROOT, "%d steps a carrier cycle, period %d", stepsPerCycle, nowPeriod),
          now);
    } else if (now - said > NANOS && !settling) {
      say(String.format(Locale.ROOT, "%.0f %% of period %d", 100 * share, nowPeriod), now);
    }
    steps = stepsPerCycle;
    period = nowPeriod;
    return !cancelled.getAsBoolean();
  }

  private void say(String what, long now) {
    Faults.say(messages, what);
    messages.flush();
    said = now;
  }
}
