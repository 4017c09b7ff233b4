package earward.detectors;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class FieldEffectFollowerContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new FieldEffectFollower();
  }
}
