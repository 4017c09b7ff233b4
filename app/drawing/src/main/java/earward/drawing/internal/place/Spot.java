package earward.drawing.internal.place;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Where a net can be taken up next. Mutable, belongs to one board. */
final class Spot {
  /** Right end of what is joined so far, in cells. */
  int x;

  /** The row along which it goes on. */
  int y;

  /** Whether it is drawn as a wire that goes on to the right. */
  boolean lane;

  /** Whether its only end so far points left. */
  boolean leftward;

  /** Where a chain may hang directly; null when taken. */
  @Nullable Integer hangX;

  /** Where a chain may stand directly; null when taken. */
  @Nullable Integer riseX;

  /** Where chains hang or stand already. */
  final List<Integer> columns = new ArrayList<>();

  Spot(int x, int y, boolean lane) {
    this.x = x;
    this.y = y;
    this.lane = lane;
  }
}
