package earward.block.setting;

import earward.block.device.PartModel;

/** What a setting is set to. */
public sealed interface SettingValue {

  /** Of a value, in its unit; of a position, from 0 to 1; of a trim, its target. */
  record Amount(double number) implements SettingValue {
    public Amount {
      if (Double.isNaN(number)) {
        throw new IllegalArgumentException("a value is a number");
      }
    }
  }

  /** Of a choice. */
  record Option(String word) implements SettingValue {}

  /** Of a part. */
  record Chosen(PartModel model) implements SettingValue {}
}
