package earward.engine.linear;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * Which elements of a system are ever written, and the order of elimination that was found for
 * them. Until {@link #freeze} a new element means a new order; after it, a system with an element
 * outside the pattern is solved densely, so that what a solver was asked before changes nothing.
 */
final class Pattern {
  private final int size;
  private final boolean[] used;
  private @Nullable Elimination order;
  private boolean strange;
  private boolean frozen;
  private int fallBacks;

  Pattern(int size) {
    this.size = size;
    used = new boolean[size * size];
  }

  /** Notes that an element is written. */
  void touch(int at) {
    if (!used[at]) {
      strange = true;
      if (!frozen) {
        used[at] = true;
      }
    }
  }

  /** Forgets what was strange about the last system. */
  void begin() {
    strange = false;
  }

  /**
   * Keeps the pattern from now on, with the order that suits a matrix that stands for all later
   * ones.
   */
  void freeze(double[] real, double[] imaginary) {
    frozen = true;
    if (order != null) {
      Elimination better = Elimination.of(size, used, real, imaginary);
      order = better == null ? order : better;
    }
  }

  /** The order to replay for the present system; null where it must be solved densely. */
  @Nullable Elimination order(double[] real, double[] imaginary) {
    if (strange && frozen) {
      fallBacks++;
      return null;
    }
    if (!frozen && (strange || order == null)) {
      order = Elimination.of(size, used, real, imaginary);
      strange = false;
    }
    if (order == null) {
      fallBacks++;
    }
    return order;
  }

  /** Counts a system whose replayed solution was not good enough. */
  void fellBack() {
    fallBacks++;
  }

  int fallBacks() {
    return fallBacks;
  }

  /** Clears what the last system may have left: its own elements, or all after a dense one. */
  void clear(double[] values, @Nullable Elimination replayed) {
    if (replayed == null || strange) {
      Arrays.fill(values, 0);
    } else {
      for (int at : replayed.filled) {
        values[at] = 0;
      }
    }
  }
}
