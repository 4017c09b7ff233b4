package earward.feeds;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class UntunedContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new Untuned();
  }
}
