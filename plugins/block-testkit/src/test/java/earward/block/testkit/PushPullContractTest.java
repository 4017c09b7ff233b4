package earward.block.testkit;

import earward.block.BlockType;
import earward.block.setting.Values;

class PushPullContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new PushPull();
  }

  @Override
  protected boolean goTogether(Values values) {
    return PushPull.goTogether(values);
  }
}
