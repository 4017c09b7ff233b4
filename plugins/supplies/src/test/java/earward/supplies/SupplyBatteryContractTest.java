package earward.supplies;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class SupplyBatteryContractTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new SupplyBattery();
  }
}
