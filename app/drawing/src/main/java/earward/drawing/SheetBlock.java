package earward.drawing;

import earward.block.wiring.Nodes;
import earward.block.wiring.Wiring;
import java.util.Collections;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;

/**
 * One block as it is to be drawn. Immutable.
 *
 * @param id of the block in its design
 * @param title written above it
 * @param wiring its parts and their places
 * @param globalNodes the node of the whole circuit for each local node; a local node that is not
 *     named here is ID.NODE, a shared one stays as it is
 * @param labels what is written beside each part, by local part id; a part that is not named here
 *     shows its id
 * @param testPointFlags the text of each flag (TP3), by local test point id; a test point that is
 *     not named here shows its id
 */
public record SheetBlock(
    String id,
    String title,
    Wiring wiring,
    Map<String, String> globalNodes,
    Map<String, PartLabel> labels,
    Map<String, String> testPointFlags) {
  public SheetBlock {
    Objects.requireNonNull(id);
    Objects.requireNonNull(title);
    Objects.requireNonNull(wiring);
    globalNodes = Collections.unmodifiableMap(new TreeMap<>(globalNodes));
    labels = Collections.unmodifiableMap(new TreeMap<>(labels));
    testPointFlags = Collections.unmodifiableMap(new TreeMap<>(testPointFlags));
  }

  /** A block whose parts and test points show their ids. */
  public static SheetBlock plain(String id, Wiring wiring) {
    return new SheetBlock(id, id, wiring, Map.of(), Map.of(), Map.of());
  }

  /** The node of the whole circuit for a local one. A rail that the block offers is that rail. */
  public String globalNode(String node) {
    String given = globalNodes.get(node);
    if (given != null) {
      return given;
    }
    for (Map.Entry<String, String> rail : wiring.offeredRails().entrySet()) {
      if (rail.getValue().equals(node)) {
        return Nodes.rail(rail.getKey());
      }
    }
    return Nodes.isShared(node) ? node : id + "." + node;
  }

  /** What is written beside a part. */
  public PartLabel label(String partId) {
    return labels.getOrDefault(partId, new PartLabel(partId, ""));
  }

  /** What is written on a test point's flag. */
  public String flag(String testPointId) {
    return testPointFlags.getOrDefault(testPointId, testPointId);
  }
}
