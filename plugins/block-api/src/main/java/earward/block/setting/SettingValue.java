package earward.block.setting;

import earward.block.device.PartModel;
import java.util.Objects;

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
  record Option(String word) implements SettingValue {
    public Option {
      Objects.requireNonNull(word);
    }
  }

  /** Of a part. */
  record Chosen(PartModel model) implements SettingValue {
    public Chosen {
      Objects.requireNonNull(model);
    }
  }
}
