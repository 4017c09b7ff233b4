package earward.desktop.model;

import earward.block.device.BatteryModel;
import earward.block.device.PartKind;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.design.SettingEntry;
import earward.kit.parts.SettingException;
import earward.kit.parts.SettingReader;
import java.util.Optional;

/** A design whose batteries are nearly empty. */
final class Batteries {
  /** A new battery is above its end by so little: the model wants the two to differ. */
  private static final double HAIR = 1.000001;

  private Batteries() {}

  static KitDesign atTheirEnd(KitDesign design, Workshop workshop) {
    KitDesign changed = design;
    SettingReader reader = new SettingReader(workshop.parts());
    for (BlockEntry block : design.supplies()) {
      for (Setting setting : workshop.settings(block)) {
        if (setting instanceof Setting.Part part && part.kind() == PartKind.BATTERY) {
          Optional<SettingEntry> entry = Optional.ofNullable(block.settings().get(setting.id()));
          try {
            if (reader.read(block.id(), setting, entry) instanceof SettingValue.Chosen chosen
                && chosen.model() instanceof BatteryModel model) {
              changed =
                  changed.withSetting(
                      block.id(), setting.id(), new SettingEntry.Inline(empty(model), "{}"));
            }
          } catch (SettingException e) {
            return changed; // the review says what is wrong with the setting
          }
        }
      }
    }
    return changed;
  }

  private static BatteryModel empty(BatteryModel model) {
    return new BatteryModel(
        model.name(),
        model.endVolts() * HAIR,
        model.endOhms(),
        model.endVolts(),
        model.endOhms(),
        model.capacityAmpereHours(),
        model.referenceAmperes(),
        model.capacityExponent(),
        Math.max(model.highestVolts(), model.endVolts() * HAIR),
        model.mostAmperes());
  }
}
