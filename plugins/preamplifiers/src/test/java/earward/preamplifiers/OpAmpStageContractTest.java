package earward.preamplifiers;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class OpAmpStageContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new OpAmpStage();
  }
}
