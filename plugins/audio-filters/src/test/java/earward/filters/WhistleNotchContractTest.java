package earward.filters;

import earward.block.BlockType;
import earward.block.setting.Values;
import earward.block.testkit.BlockContract;

class WhistleNotchContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new WhistleNotch();
  }

  @Override
  protected boolean goTogether(Values values) {
    return WhistleNotch.goTogether(values);
  }
}
