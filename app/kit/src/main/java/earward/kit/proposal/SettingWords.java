package earward.kit.proposal;

import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.design.QuantityText;

/** A setting's value as a design file has it. */
final class SettingWords {
  private SettingWords() {}

  static String of(Setting setting, SettingValue value) {
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
