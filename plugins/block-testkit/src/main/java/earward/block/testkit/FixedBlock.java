package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import java.util.List;

/**
 * A block as it was described, for use in a kit: nothing about it can be set.
 *
 * @param id of its type
 * @param role of its type
 * @param description parts and checks
 */
record FixedBlock(String id, Role role, BlockDescription description) implements BlockType {
  @Override
  public List<Setting> settings() {
    return List.of();
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    return description;
  }
}
