package earward.preamplifiers;

import earward.block.BlockType;
import earward.block.setting.Values;
import earward.block.testkit.BlockContract;

class CommonEmitterContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new CommonEmitter();
  }

  @Override
  protected boolean goTogether(Values values) {
    return CommonEmitter.goTogether(values);
  }
}
