package earward.block.testkit;

import earward.block.BlockType;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The settings in which a block is tried: every combination of its choices and sample parts, each
 * with all values as usual, all at their least and all at their most.
 */
public final class Variations {
  /** Where the combinations are more, choices and parts are changed one at a time. */
  private static final int MOST_COMBINATIONS = 400;

  /** Stands for a value without an upper limit, as a multiple of the usual one. */
  private static final double INSTEAD_OF_INFINITE = 1000;

  private Variations() {}

  private enum Stand {
    USUAL(Variation.USUAL),
    LEAST("least values"),
    MOST("most values");

    private final String words;

    Stand(String words) {
      this.words = words;
    }
  }

  /** All variations of the type. */
  public static List<Variation> of(BlockType type) {
    List<Map<String, SettingValue>> combinations = product(type.settings());
    List<Variation> all = new ArrayList<>();
    for (Map<String, SettingValue> combination : combinations) {
      for (Stand stand : Stand.values()) {
        Map<String, SettingValue> values = new LinkedHashMap<>(combination);
        for (Setting setting : type.settings()) {
          values.computeIfAbsent(setting.id(), id -> amount(setting, stand));
        }
        all.add(
            new Variation(
                stand.words + ", " + words(combination),
                Values.of(values),
                Variation.PLAIN_CONDITIONS));
      }
    }
    return all;
  }

  /** The settings of a new block, with the first sample part of each kind. */
  public static Values usual(BlockType type) {
    return of(type).get(0).values();
  }

  private static String words(Map<String, SettingValue> combination) {
    List<String> words = new ArrayList<>();
    combination.forEach((id, value) -> words.add(id + " " + word(value)));
    return String.join(", ", words);
  }

  private static String word(SettingValue value) {
    if (value instanceof SettingValue.Option option) {
      return option.word();
    } else if (value instanceof SettingValue.Chosen chosen) {
      return chosen.model().name();
    }
    return value.toString();
  }

  private static List<SettingValue> options(Setting setting) {
    if (setting instanceof Setting.Choice choice) {
      return choice.options().stream().<SettingValue>map(SettingValue.Option::new).toList();
    } else if (setting instanceof Setting.Part part) {
      return SampleParts.of(part.kind()).stream()
          .<SettingValue>map(SettingValue.Chosen::new)
          .toList();
    }
    return List.of();
  }

  private static List<Map<String, SettingValue>> product(List<Setting> settings) {
    List<Setting> open = settings.stream().filter(s -> !options(s).isEmpty()).toList();
    long count = open.stream().mapToLong(s -> options(s).size()).reduce(1, Math::multiplyExact);
    List<Map<String, SettingValue>> all = new ArrayList<>(List.of(new LinkedHashMap<>()));
    for (Setting setting : open) {
      all = count > MOST_COMBINATIONS ? oneAtATime(all, setting) : times(all, setting);
    }
    return all;
  }

  private static List<Map<String, SettingValue>> times(
      List<Map<String, SettingValue>> before, Setting setting) {
    List<Map<String, SettingValue>> after = new ArrayList<>();
    for (Map<String, SettingValue> one : before) {
      options(setting).forEach(option -> after.add(with(one, setting, option)));
    }
    return after;
  }

  private static List<Map<String, SettingValue>> oneAtATime(
      List<Map<String, SettingValue>> before, Setting setting) {
    List<SettingValue> options = options(setting);
    List<Map<String, SettingValue>> after = new ArrayList<>();
    before.forEach(one -> after.add(with(one, setting, options.get(0))));
    Map<String, SettingValue> first = before.get(0);
    options.stream().skip(1).forEach(option -> after.add(with(first, setting, option)));
    return after;
  }

  private static Map<String, SettingValue> with(
      Map<String, SettingValue> before, Setting setting, SettingValue option) {
    Map<String, SettingValue> after = new LinkedHashMap<>(before);
    after.put(setting.id(), option);
    return after;
  }

  private static SettingValue amount(Setting setting, Stand stand) {
    if (setting instanceof Setting.Value value) {
      double most =
          Double.isInfinite(value.most()) ? value.usual() * INSTEAD_OF_INFINITE : value.most();
      return new SettingValue.Amount(
          switch (stand) {
            case USUAL -> value.usual();
            case LEAST -> value.least();
            case MOST -> most;
          });
    } else if (setting instanceof Setting.Position position) {
      return new SettingValue.Amount(
          switch (stand) {
            case USUAL -> position.usual();
            case LEAST -> 0;
            case MOST -> 1;
          });
    } else if (setting instanceof Setting.Trim trim) {
      return new SettingValue.Amount(trim.usualTarget());
    }
    throw new IllegalArgumentException("setting '" + setting.id() + "' has options, no amount");
  }
}
