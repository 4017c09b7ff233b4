package earward.study.faults;

import earward.study.batch.Habits;
import java.util.Objects;

/**
 * How a fault guide is to be made.
 *
 * @param threads how many solve at a time, at least 1; it changes no result
 * @param spreadKits healthy kits that are drawn for the spread of the readings, at least 2
 * @param seed of their draws
 * @param habits what is taken for granted beside the tolerances
 */
public record FaultOrder(int threads, int spreadKits, long seed, Habits habits) {
  /** Forty kits for the spread, by all cores. */
  public static FaultOrder usual() {
    return new FaultOrder(Runtime.getRuntime().availableProcessors(), 40, 1, Habits.USUAL);
  }

  public FaultOrder {
    Objects.requireNonNull(habits);
    if (threads < 1 || spreadKits < 2) {
      throw new IllegalArgumentException(
          threads + " threads and " + spreadKits + " kits make no fault guide; wanted 1 and 2");
    }
  }
}
