package earward.filters;

import earward.block.BlockType;
import earward.block.setting.Values;
import earward.block.testkit.BlockContract;

class BufferContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new Buffer();
  }

  @Override
  protected boolean goTogether(Values values) {
    return Follower.goTogether(values);
  }
}
