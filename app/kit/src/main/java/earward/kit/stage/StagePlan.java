package earward.kit.stage;

import earward.block.Role;
import earward.block.wiring.Nodes;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import java.util.ArrayList;
import java.util.List;

/**
 * In which stages a kit is built: supplies, power stage and load first, so that something is heard
 * as early as it can be; then block by block towards the feed. A take-off is fitted with the block
 * that it hangs on.
 */
final class StagePlan {
  private StagePlan() {}

  static List<BuildStage> of(Assembly kit) {
    List<BuildStage> stages = new ArrayList<>();
    int end = kit.path().size();
    int first = firstToSound(kit.path());
    while (first >= 0 && end > 0) {
      List<PlacedBlock> path = kit.path().subList(first, end);
      stages.add(
          new BuildStage(stages.size() + 1, path, beside(kit, path, stages.isEmpty()), first));
      end = first;
      first = end - 1;
    }
    return stages;
  }

  /** The power stage; where there is none, the last block. */
  private static int firstToSound(List<PlacedBlock> path) {
    for (int i = 0; i < path.size(); i++) {
      if (path.get(i).type().role() == Role.POWER) {
        return i;
      }
    }
    return path.size() - 1;
  }

  private static List<PlacedBlock> beside(Assembly kit, List<PlacedBlock> path, boolean isFirst) {
    return kit.beside().stream()
        .filter(
            block ->
                block.entry().joinsAt().isEmpty()
                    ? isFirst
                    : hangsOn(block.entry().joinsAt().get(), path, isFirst))
        .toList();
  }

  private static boolean hangsOn(String node, List<PlacedBlock> path, boolean isFirst) {
    return Nodes.isShared(node)
        ? isFirst
        : path.stream().anyMatch(block -> block.globalNodes().containsValue(node));
  }
}
