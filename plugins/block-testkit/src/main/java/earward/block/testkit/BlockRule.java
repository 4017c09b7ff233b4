package earward.block.testkit;

import earward.block.BlockType;
import java.util.List;

/** One thing that every block keeps to. Holds no state. */
public interface BlockRule {
  /**
   * What the block does not keep to, one sentence each; empty when all is well.
   *
   * @param variations the settings in which it is tried, at least one
   */
  List<String> faults(BlockType type, List<Variation> variations);
}
