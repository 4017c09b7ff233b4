package earward.block.testkit;

import earward.block.BlockType;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.kit.design.QuantityText;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Locale;

/** How numbers, settings and exceptions stand in messages. */
final class Shown {
  private Shown() {}

  static String quantity(double si, Unit unit) {
    if (!Double.isFinite(si)) {
      return Double.isNaN(si) ? "no number" : si > 0 ? "without limit" : "without lower limit";
    }
    return QuantityText.format(si, unit, Locale.ROOT).replace('\u202f', ' ');
  }

  /** From the least to the most; one number where these look alike. */
  static String range(Collection<Double> numbers, Unit unit) {
    String least = quantity(Collections.min(numbers), unit);
    String most = quantity(Collections.max(numbers), unit);
    return least.equals(most) ? least : least + " to " + most;
  }

  /** What a setting is set to. */
  static String value(Setting setting, SettingValue value) {
    if (value instanceof SettingValue.Option option) {
      return "'" + option.word() + "'";
    } else if (value instanceof SettingValue.Chosen chosen) {
      return chosen.model().kind().key() + " '" + chosen.model().name() + "'";
    } else if (value instanceof SettingValue.Amount amount) {
      return quantity(amount.number(), unit(setting));
    }
    throw new IllegalArgumentException("no kind of setting value: " + value);
  }

  private static Unit unit(Setting setting) {
    if (setting instanceof Setting.Value value) {
      return value.unit();
    }
    return setting instanceof Setting.Trim trim ? trim.reading().quantity().unit() : Unit.NUMBER;
  }

  /** What a setting may be set to. */
  static String limits(Setting setting) {
    if (setting instanceof Setting.Value value) {
      return "from " + quantity(value.least(), value.unit()) + upTo(value);
    } else if (setting instanceof Setting.Choice choice) {
      return "one of " + choice.options();
    } else if (setting instanceof Setting.Part part) {
      return "a part of kind " + part.kind().key();
    } else if (setting instanceof Setting.Position) {
      return "nothing from a proposer: it is the listener's";
    }
    return "nothing from a proposer: it is the builder's";
  }

  private static String upTo(Setting.Value value) {
    return Double.isInfinite(value.most())
        ? " upwards"
        : " to " + quantity(value.most(), value.unit());
  }

  /** All settings with their values, in the order of the type. */
  static String settings(BlockType type, Values values) {
    List<String> words = new ArrayList<>();
    for (Setting setting : type.settings()) {
      SettingValue value = values.all().get(setting.id());
      if (value != null) {
        words.add(setting.id() + " " + value(setting, value));
      }
    }
    return String.join(", ", words);
  }

  /** What was thrown, with the line of the block's own that it came through. */
  static String thrown(BlockType type, RuntimeException thrown) {
    return thrown.getClass().getSimpleName()
        + (thrown.getMessage() == null ? "" : ": " + thrown.getMessage())
        + place(type, thrown);
  }

  /** The line of the block through which an exception came, {@code " in Pad.java:12"}. */
  static String place(BlockType type, RuntimeException thrown) {
    String home = type.besideTexts().getPackageName() + ".";
    return Arrays.stream(thrown.getStackTrace())
        .filter(line -> line.getClassName().startsWith(home))
        .findFirst()
        .map(line -> " in " + line.getFileName() + ":" + line.getLineNumber())
        .orElse("");
  }
}
