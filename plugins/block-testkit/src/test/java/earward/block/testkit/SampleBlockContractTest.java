package earward.block.testkit;

import earward.block.BlockType;

class SampleBlockContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new SampleBlock();
  }
}
