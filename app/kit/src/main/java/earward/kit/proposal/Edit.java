package earward.kit.proposal;

import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.design.KitDesign;
import earward.kit.path.PlacedBlock;

/**
 * One setting of one block changed.
 *
 * @param block as it stands
 * @param setting of it
 * @param value what it is to be
 */
record Edit(PlacedBlock block, Setting setting, SettingValue value) {

  KitDesign of(KitDesign design) {
    return design.withSetting(block.id(), setting.id(), SettingWords.of(setting, value));
  }
}
