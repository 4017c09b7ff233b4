package earward.drawing.internal.page;

import earward.drawing.internal.form.Grid;
import earward.drawing.internal.place.BlockPlan;
import java.util.ArrayList;
import java.util.List;

/**
 * Blocks side by side, the signal going from each to the next.
 *
 * @param blocks from left to right
 * @param left what stands at the wires that the first begins with
 * @param right what stands at the wires that the last ends with
 */
record Segment(List<BlockPlan> blocks, List<Cap> left, List<Cap> right) {
  Segment {
    blocks = List.copyOf(blocks);
    left = List.copyOf(left);
    right = List.copyOf(right);
  }

  /** Width in points. */
  double width() {
    return leftWidth()
        + Grid.points(blocks.stream().mapToInt(BlockPlan::width).sum())
        + rightWidth();
  }

  double leftWidth() {
    return left.stream().mapToDouble(Cap::width).max().orElse(0);
  }

  double rightWidth() {
    return right.stream().mapToDouble(Cap::width).max().orElse(0);
  }

  /** The row of each block's origin, so that wires meet at the seams. */
  List<Integer> origins() {
    List<Integer> rows = new ArrayList<>();
    int row = 0;
    for (BlockPlan block : blocks) {
      row -= block.entryRows().isEmpty() ? 0 : block.entryRows().get(0);
      rows.add(row);
      row += block.exitRows().isEmpty() ? 0 : block.exitRows().get(0);
    }
    return rows;
  }
}
