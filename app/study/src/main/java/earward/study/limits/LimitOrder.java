package earward.study.limits;

import earward.study.batch.Habits;
import java.util.Objects;

/**
 * What limits are to come from.
 *
 * @param kits kits that are drawn, from 2 to a million
 * @param seed of their draws
 * @param threads how many solve at a time; it changes no result
 * @param withSignal whether readings with the test signal have limits too; without it the kits take
 *     a hundredth of the time
 * @param habits what is taken for granted beside the tolerances
 */
public record LimitOrder(int kits, long seed, int threads, boolean withSignal, Habits habits) {
  private static final int MOST_KITS = 1_000_000;

  public LimitOrder {
    if (kits < 2 || kits > MOST_KITS) {
      throw new IllegalArgumentException(
          "limits come from " + kits + " kits; wanted from 2 to " + MOST_KITS);
    }
    if (threads < 1) {
      throw new IllegalArgumentException("limits are solved by " + threads + " threads");
    }
    Objects.requireNonNull(habits);
  }

  /** So many kits by all cores, with or without the test signal. */
  public static LimitOrder of(int kits, boolean withSignal) {
    return new LimitOrder(
        kits, 1, Runtime.getRuntime().availableProcessors(), withSignal, Habits.USUAL);
  }
}
