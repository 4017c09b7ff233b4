package earward.kit.proposal;

import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityText;
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
    return design.withSetting(block.id(), setting.id(), words());
  }

  /** The value as a design file has it. */
  private String words() {
    if (value instanceof SettingValue.Amount amount && setting instanceof Setting.Value kind) {
      return QuantityText.exact(amount.number(), kind.unit());
    }
    if (value instanceof SettingValue.Option option) {
      return option.word();
    }
    if (value instanceof SettingValue.Chosen chosen) {
      return chosen.model().name();
    }
    throw new IllegalStateException("setting '" + setting.id() + "' is not one to edit");
  }
}
