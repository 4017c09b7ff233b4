package earward.volume;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class FixedPadContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new FixedPad();
  }
}
