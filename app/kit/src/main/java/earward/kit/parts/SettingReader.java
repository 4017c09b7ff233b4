package earward.kit.parts;

import earward.block.device.PartKind;
import earward.block.device.PartModel;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import earward.kit.design.SettingEntry;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Reads what a design says for a setting, with the help of the block type's own declaration. */
public final class SettingReader {
  private final PartsLibrary library;

  /** A reader that knows these parts. */
  public SettingReader(PartsLibrary library) {
    this.library = library;
  }

  /**
   * What the setting is set to.
   *
   * @param blockId for the sentence
   * @param setting as the block type declares it
   * @param entry what the design says; empty for the usual value
   * @throws SettingException with one sentence when the entry does not suit the setting
   */
  public SettingValue read(String blockId, Setting setting, Optional<SettingEntry> entry)
      throws SettingException {
    String place = "setting '" + setting.id() + "' of block '" + blockId + "'";
    if (entry.isPresent() && entry.get() instanceof SettingEntry.Unread) {
      throw new SettingException(
          "setting-form", place + " is no text, number or part of a known kind; give it as a text");
    }
    if (setting instanceof Setting.Part part) {
      return new SettingValue.Chosen(part(place, part, entry));
    }
    if (entry.isPresent() && entry.get() instanceof SettingEntry.Inline inline) {
      throw new SettingException(
          "setting-form", place + " is a part (" + inline.model().name() + "); a text is wanted");
    }
    Optional<String> words =
        entry.map(SettingEntry.Words.class::cast).map(SettingEntry.Words::words);
    if (setting instanceof Setting.Choice choice) {
      return new SettingValue.Option(option(place, choice, words));
    }
    if (setting instanceof Setting.Value value) {
      return new SettingValue.Amount(amount(place, value, words));
    }
    if (setting instanceof Setting.Position position) {
      return new SettingValue.Amount(
          words.isPresent()
              ? within(
                  place,
                  words.get(),
                  quantity(place, words.get(), Unit.FRACTION),
                  0,
                  1,
                  Unit.FRACTION)
              : position.usual());
    }
    Setting.Trim trim = (Setting.Trim) setting;
    return new SettingValue.Amount(
        words.isPresent()
            ? quantity(place, words.get(), trim.reading().quantity().unit())
            : trim.usualTarget());
  }

  /**
   * What is to be said of a part's figures: how they were fitted, one sentence each.
   *
   * @param setting as the block type declares it
   * @param entry what the design says; empty for the usual value
   */
  public List<String> remarks(Setting setting, Optional<SettingEntry> entry) {
    if (!(setting instanceof Setting.Part part)) {
      return List.of();
    }
    if (entry.isPresent() && entry.get() instanceof SettingEntry.Inline inline) {
      return inline.remarks();
    }
    return library
        .find(part.kind(), name(part, entry))
        .flatMap(PartEntry::fit)
        .map(FitReport::sentence)
        .stream()
        .toList();
  }

  private static String name(Setting.Part part, Optional<SettingEntry> entry) {
    return entry
        .filter(SettingEntry.Words.class::isInstance)
        .map(SettingEntry.Words.class::cast)
        .map(SettingEntry.Words::words)
        .orElse(part.usual());
  }

  private static String option(String place, Setting.Choice choice, Optional<String> words)
      throws SettingException {
    String word = words.orElse(choice.options().get(0));
    if (!choice.options().contains(word)) {
      throw new SettingException(
          "unknown-choice",
          place + " is '" + word + "'; it can be " + String.join(", ", choice.options()));
    }
    return word;
  }

  private static double amount(String place, Setting.Value value, Optional<String> words)
      throws SettingException {
    if (words.isEmpty()) {
      return value.usual();
    }
    double number = quantity(place, words.get(), value.unit());
    return within(place, words.get(), number, value.least(), value.most(), value.unit());
  }

  private static double quantity(String place, String words, Unit unit) throws SettingException {
    try {
      return QuantityText.parse(words, unit);
    } catch (QuantityException e) {
      throw new SettingException("quantity", place + ": " + e.sentence());
    }
  }

  private static double within(
      String place, String words, double number, double least, double most, Unit unit)
      throws SettingException {
    if (number >= least && number <= most) {
      return number;
    }
    String wanted =
        Double.isInfinite(most)
            ? "at least " + written(least, unit)
            : "from " + written(least, unit) + " to " + written(most, unit);
    throw new SettingException(
        "impossible-value", place + " is " + words + "; it must be " + wanted);
  }

  private static String written(double number, Unit unit) {
    return QuantityText.format(number, unit, Locale.ROOT);
  }

  private PartModel part(String place, Setting.Part part, Optional<SettingEntry> entry)
      throws SettingException {
    if (entry.isPresent() && entry.get() instanceof SettingEntry.Inline inline) {
      if (inline.model().kind() != part.kind()) {
        throw new SettingException(
            "part-kind",
            place + " is of kind " + inline.model().kind().key() + "; wanted " + part.kind().key());
      }
      return inline.model();
    }
    String name = name(part, entry);
    Optional<PartEntry> found = library.find(part.kind(), name);
    if (found.isEmpty()) {
      throw new SettingException("unknown-part", unknown(place, part.kind(), name));
    }
    return found.get().model();
  }

  private String unknown(String place, PartKind kind, String name) {
    List<String> names = library.names(kind);
    return place
        + " names the "
        + kind.key()
        + " '"
        + name
        + "', which the parts library does not have; "
        + (names.isEmpty()
            ? "it has none of that kind"
            : "it has " + String.join(", ", names) + "; or give its model figures here");
  }
}
