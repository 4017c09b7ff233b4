package earward.filters;

import earward.block.BlockType;
import earward.block.setting.Values;
import earward.block.testkit.BlockContract;

class DeEmphasisNetworkContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new DeEmphasisNetwork();
  }

  @Override
  protected boolean goTogether(Values values) {
    return DeEmphasisNetwork.goTogether(values);
  }
}
