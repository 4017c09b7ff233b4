package earward.desktop.model;

import earward.block.BlockTexts;
import earward.block.BlockType;
import earward.block.setting.Setting;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import earward.kit.design.SettingEntry;
import earward.kit.parts.SettingException;
import earward.kit.parts.SettingReader;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The form of one block: reads it off a design, checks what is typed, steps through a series. */
public final class SettingRows {
  private final Workshop workshop;

  /** Forms for the blocks of a workshop. */
  public SettingRows(Workshop workshop) {
    this.workshop = workshop;
  }

  /** The settings of a block, in its own order; none where its type is missing. */
  public List<SettingRow> of(KitDesign design, String blockId) {
    List<SettingRow> rows = new ArrayList<>();
    Optional<BlockEntry> entry = design.block(blockId);
    Optional<BlockType> type = entry.flatMap(block -> workshop.types().find(block.typeId()));
    if (entry.isPresent() && type.isPresent()) {
      BlockTexts texts = BlockTexts.of(type.get(), Locale.ENGLISH);
      for (Setting setting : type.get().settings()) {
        rows.add(row(entry.get(), setting, texts));
      }
    }
    return rows;
  }

  private SettingRow row(BlockEntry block, Setting setting, BlockTexts texts) {
    String key = "setting." + setting.id();
    Optional<SettingEntry> entry = Optional.ofNullable(block.settings().get(setting.id()));
    List<String> options = options(setting);
    List<String> labels =
        setting instanceof Setting.Choice
            ? options.stream().map(o -> texts.find(key + "." + o).orElse(o)).toList()
            : options;
    return new SettingRow(
        block.id(),
        setting,
        texts.find(key).orElse(setting.id()),
        texts.find(key + ".help").orElse(""),
        entry.map(SettingRows::words).orElseGet(() -> usual(setting)),
        entry.isEmpty(),
        options,
        labels);
  }

  private static String words(SettingEntry entry) {
    if (entry instanceof SettingEntry.Words words) {
      return words.words();
    }
    return entry instanceof SettingEntry.Inline inline
        ? inline.model().name()
        : Words.of("setting.unread");
  }

  private List<String> options(Setting setting) {
    if (setting instanceof Setting.Choice choice) {
      return choice.options();
    }
    return setting instanceof Setting.Part part ? workshop.parts().names(part.kind()) : List.of();
  }

  private static String usual(Setting setting) {
    if (setting instanceof Setting.Value value) {
      return QuantityText.exact(value.usual(), value.unit());
    } else if (setting instanceof Setting.Choice choice) {
      return choice.options().get(0);
    } else if (setting instanceof Setting.Part part) {
      return part.usual();
    } else if (setting instanceof Setting.Position position) {
      return QuantityText.exact(position.usual(), earward.block.quantity.Unit.FRACTION);
    }
    return setting instanceof Setting.Trim trim
        ? QuantityText.exact(trim.usualTarget(), trim.reading().quantity().unit())
        : "";
  }

  /** What is wrong with typed words; empty where nothing is. */
  public Optional<String> fault(SettingRow row, String words) {
    try {
      var unused =
          new SettingReader(workshop.parts())
              .read(
                  row.blockId(), row.setting(), Optional.of(new SettingEntry.Words(words.strip())));
      return Optional.empty();
    } catch (SettingException e) {
      return Optional.of(e.sentence());
    } catch (IllegalArgumentException e) {
      return Optional.of(String.valueOf(e.getMessage()));
    }
  }

  /** The next value of the preferred series, up or down; the same words where there is none. */
  public String stepped(SettingRow row, String words, boolean up) {
    if (!(row.setting() instanceof Setting.Value value)) {
      return words;
    }
    try {
      double now = QuantityText.parse(words, value.unit());
      double next = up ? value.series().next(now) : value.series().previous(now);
      return next >= value.least() && next <= value.most()
          ? QuantityText.exact(next, value.unit())
          : words;
    } catch (QuantityException | IllegalArgumentException e) {
      return words;
    }
  }
}
