package earward.filters;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class CarrierRcContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new CarrierRc();
  }
}
