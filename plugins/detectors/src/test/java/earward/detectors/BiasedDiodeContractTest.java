package earward.detectors;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class BiasedDiodeContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new BiasedDiode();
  }
}
