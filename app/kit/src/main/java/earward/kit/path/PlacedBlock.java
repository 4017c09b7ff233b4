package earward.kit.path;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.check.Check;
import earward.block.setting.Values;
import earward.block.wiring.WiredPart;
import earward.kit.design.BlockEntry;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;

/**
 * One block in its place in the kit.
 *
 * @param entry what the design says of it
 * @param type what it is
 * @param values its settings, all of them
 * @param description its parts, checks and curves
 * @param globalNodes the node of the whole circuit for each node of the block
 */
public record PlacedBlock(
    BlockEntry entry,
    BlockType type,
    Values values,
    BlockDescription description,
    Map<String, String> globalNodes) {
  public PlacedBlock {
    Objects.requireNonNull(entry);
    Objects.requireNonNull(type);
    Objects.requireNonNull(values);
    Objects.requireNonNull(description);
    globalNodes = Collections.unmodifiableMap(new LinkedHashMap<>(globalNodes));
  }

  /** The block's id in the design. */
  public String id() {
    return entry.id();
  }

  /** The name of a part in the whole circuit, {@code volume.track}. */
  public String partName(WiredPart part) {
    return partName(part.id());
  }

  /** The name of a part in the whole circuit, {@code volume.track}. */
  public String partName(String partId) {
    return id() + "." + partId;
  }

  /**
   * The node of the whole circuit.
   *
   * @throws IllegalArgumentException when the block has no such node
   */
  public String globalNode(String localNode) {
    String node = globalNodes.get(localNode);
    if (node == null) {
      throw new IllegalArgumentException("block '" + id() + "' has no node '" + localNode + "'");
    }
    return node;
  }

  /** A check of this block with the figure's place in the whole path. */
  public Check global(Check check) {
    return new Check(
        check.code(),
        check.severity(),
        check.figure().within(id()),
        check.relation(),
        check.limit(),
        check.source(),
        check.remedies());
  }
}
