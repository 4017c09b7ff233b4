package earward.volume;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class MatchingSectionContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new MatchingSection();
  }
}
