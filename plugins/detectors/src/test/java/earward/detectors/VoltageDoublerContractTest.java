package earward.detectors;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class VoltageDoublerContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new VoltageDoubler();
  }
}
