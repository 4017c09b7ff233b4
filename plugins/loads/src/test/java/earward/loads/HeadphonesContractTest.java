package earward.loads;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class HeadphonesContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new Headphones();
  }
}
