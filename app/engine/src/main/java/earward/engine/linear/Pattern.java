package earward.engine.linear;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Which elements of a system are ever written, and the orders of elimination that were found for
 * them. One order does for all systems of a kind but where a pivot happens to vanish; then another
 * is found beside it. Until {@link #freeze} a new element means new orders; after it, a system with
 * an element outside the pattern, or one that no order suits, is solved densely, so that what a
 * solver was asked before changes nothing.
 */
final class Pattern {
  private static final int MOST_ORDERS = 6;

  private final int size;
  private final boolean[] used;
  private final List<Elimination> orders = new ArrayList<>();
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
        orders.clear();
      }
    }
  }

  /** Forgets what was strange about the last system. */
  void begin() {
    strange = false;
  }

  /** Keeps pattern and orders from now on. */
  void freeze() {
    frozen = true;
  }

  /**
   * The n-th order to try for the present system, found for it where that is still allowed.
   *
   * @return null where there is none: the system must be solved densely
   */
  @Nullable Elimination order(int n, double[] real, double[] imaginary) {
    if (frozen && strange) {
      return null;
    }
    if (n < orders.size()) {
      return orders.get(n);
    }
    Elimination found =
        frozen || n >= MOST_ORDERS ? null : Elimination.of(size, used, real, imaginary);
    if (found != null) {
      orders.add(found);
    }
    return found;
  }

  /** Counts a system that is solved densely. */
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
