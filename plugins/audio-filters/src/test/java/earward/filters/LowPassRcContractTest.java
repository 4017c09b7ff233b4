package earward.filters;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class LowPassRcContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new LowPassRc();
  }
}
