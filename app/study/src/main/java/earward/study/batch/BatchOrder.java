package earward.study.batch;

import java.util.Objects;

/**
 * What a batch is to be.
 *
 * @param kits how many, at least 1
 * @param seed of all draws: the same seed gives the same kits
 * @param threads how many solve at a time, at least 1; it changes no result
 * @param full whether all figures and checks are solved; else the readings, the test distortion,
 *     currents, heat, and the checks that need no search
 * @param habits what is taken for granted beside the tolerances
 */
public record BatchOrder(long kits, long seed, int threads, boolean full, Habits habits) {
  public BatchOrder {
    if (kits < 1) {
      throw new IllegalArgumentException("a batch has " + kits + " kits; wanted at least 1");
    }
    if (threads < 1) {
      throw new IllegalArgumentException(
          "a batch is solved by " + threads + " threads; wanted at least 1");
    }
    Objects.requireNonNull(habits);
  }

  /** So many kits with the usual habits, by all cores. */
  public static BatchOrder of(long kits, long seed) {
    int threads = Runtime.getRuntime().availableProcessors();
    return new BatchOrder(kits, seed, threads, false, Habits.USUAL);
  }
}
