package earward.detectors;

import earward.block.BlockType;
import earward.block.setting.Values;
import earward.block.testkit.BlockContract;

class TransistorFollowerContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new TransistorFollower();
  }

  @Override
  protected boolean goTogether(Values values) {
    return TransistorFollower.goTogether(values);
  }
}
