package earward.power;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class AmplifierIcContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new AmplifierIc();
  }
}
