package earward.drawing.internal.place;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.form.Grid;
import java.util.List;

/**
 * Where the parts of a block stand, before its wires are drawn.
 *
 * @param task what was laid out
 * @param placed symbols and marks
 * @param width in cells
 * @param entryRows rows at which its wires come in at the left edge
 * @param exitRows rows at which they go out at the right edge
 */
public record BlockPlan(
    BlockTask task,
    List<Placed> placed,
    int width,
    List<Integer> entryRows,
    List<Integer> exitRows) {
  public BlockPlan {
    placed = List.copyOf(placed);
    entryRows = List.copyOf(entryRows);
    exitRows = List.copyOf(exitRows);
  }

  /** The upper edge of all that stands, in points. */
  public double top() {
    return boxes().stream().mapToDouble(Box::top).min().orElse(-Grid.CELL_POINTS);
  }

  /** The lower edge of all that stands, in points. */
  public double bottom() {
    return boxes().stream().mapToDouble(Box::bottom).max().orElse(Grid.CELL_POINTS);
  }

  private List<Box> boxes() {
    return placed.stream().flatMap(piece -> piece.footprint(0).stream()).toList();
  }

  /** The same with other things placed. */
  public BlockPlan with(List<Placed> changed) {
    return new BlockPlan(task, changed, width, entryRows, exitRows);
  }
}
