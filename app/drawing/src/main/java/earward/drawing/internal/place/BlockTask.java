package earward.drawing.internal.place;

import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * One block to be laid out.
 *
 * @param id of the block
 * @param title written above it
 * @param parts in the order of the drawing
 * @param entry the nets of its entry, in the order of the port
 * @param exit the nets of its exit
 * @param entryGaps rows of the entry's wires below its first, in cells
 * @param points its test points
 * @param flags the names under which nets of it go on elsewhere, by net
 * @param railNames what is written at each rail, by net
 * @param lanes rails that are drawn as a wire of their own here rather than as a mark at each end
 */
public record BlockTask(
    String id,
    String title,
    List<Part> parts,
    List<String> entry,
    List<String> exit,
    List<Integer> entryGaps,
    List<Point> points,
    Map<String, String> flags,
    Map<String, String> railNames,
    Set<String> lanes) {

  /**
   * A test point.
   *
   * @param key {@code block#test-point}
   * @param net where it stands
   * @param text of its flag
   */
  public record Point(String key, String net, String text) {}

  public BlockTask {
    parts = List.copyOf(parts);
    entry = List.copyOf(entry);
    exit = List.copyOf(exit);
    entryGaps = List.copyOf(entryGaps);
    points = List.copyOf(points);
    flags = Map.copyOf(flags);
    railNames = Map.copyOf(railNames);
    lanes = Set.copyOf(lanes);
  }
}
