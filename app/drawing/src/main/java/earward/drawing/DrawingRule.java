package earward.drawing;

import java.util.ArrayList;
import java.util.List;

/**
 * The contract of every drawing: read back from its geometry it is the described circuit, and
 * nothing lies over anything else.
 */
public final class DrawingRule {
  private DrawingRule() {}

  /**
   * Lays a path out and reads it back.
   *
   * @param path blocks in the order of the signal
   * @param beside blocks beside the path
   * @return one sentence for each net that differs, text that is too small and overlap; empty for a
   *     sound drawing
   */
  public static List<String> broken(
      List<SheetBlock> path, List<SheetBlock> beside, LayoutOptions options) {
    Schematic drawn = Schematics.lay(path, beside, options);
    List<String> found =
        new ArrayList<>(Netlist.described(path, beside).differences(drawn.readBack()));
    found.addAll(drawn.overlaps());
    drawn.textSizes().stream()
        .filter(size -> size < LayoutOptions.LEAST_TEXT_POINTS)
        .forEach(size -> found.add("text of " + size + " pt; wanted at least 7 pt"));
    return List.copyOf(found);
  }

  /** The same for one block drawn alone. */
  public static List<String> broken(SheetBlock block, LayoutOptions options) {
    return broken(List.of(block), List.of(), options);
  }
}
