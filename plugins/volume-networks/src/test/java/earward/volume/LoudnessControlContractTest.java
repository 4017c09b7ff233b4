package earward.volume;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class LoudnessControlContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new LoudnessControl();
  }
}
