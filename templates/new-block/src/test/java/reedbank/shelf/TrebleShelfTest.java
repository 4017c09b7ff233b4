package reedbank.shelf;

import earward.block.BlockType;
import earward.block.testkit.BlockContract;

class TrebleShelfTest extends BlockContract {
  @Override
  protected BlockType type() {
    return new TrebleShelf();
  }
}
