package earward.takeoffs;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class AgcContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new Agc();
  }
}
