package earward.kit.stage;

import earward.kit.path.PlacedBlock;
import java.util.List;
import java.util.stream.Stream;

/**
 * What is fitted before the next try.
 *
 * @param number from 1
 * @param path blocks of the path, in its order
 * @param beside supplies and take-offs that are fitted with them
 * @param first index in the whole path of the first block that is fitted by now
 */
public record BuildStage(int number, List<PlacedBlock> path, List<PlacedBlock> beside, int first) {
  public BuildStage {
    path = List.copyOf(path);
    beside = List.copyOf(beside);
    if (number < 1 || path.isEmpty() || first < 0) {
      throw new IllegalArgumentException("stage " + number + " begins at block " + first);
    }
  }

  /** All blocks of this stage: those of the path, then the others. */
  public List<PlacedBlock> blocks() {
    return Stream.concat(path.stream(), beside.stream()).toList();
  }
}
