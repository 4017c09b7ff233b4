package earward.desktop.model;

import earward.block.BlockTexts;
import earward.block.BlockType;
import earward.block.Role;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityText;
import earward.kit.design.SettingEntry;
import earward.kit.parts.SettingException;
import earward.kit.parts.SettingReader;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The settings of a block, from the block type; for a take-off also where it joins. */
final class BlockForm implements Form {
  /** The line that says where a take-off joins. */
  static final String JOINS_AT = "joins-at";

  private final Workshop workshop;
  private final SettingReader reader;

  BlockForm(Workshop workshop) {
    this.workshop = workshop;
    reader = new SettingReader(workshop.parts());
  }

  @Override
  public List<FormRow> rows(KitDesign design) {
    return List.of();
  }

  List<FormRow> rows(KitDesign design, String blockId) {
    List<FormRow> rows = new ArrayList<>();
    Optional<BlockEntry> entry = design.block(blockId);
    Optional<BlockType> type = entry.flatMap(block -> workshop.types().find(block.typeId()));
    if (entry.isPresent() && type.isPresent()) {
      BlockTexts texts = Texts.of(type.get());
      if (type.get().role() == Role.TAKE_OFF) {
        rows.add(joinsAt(design, entry.get()));
      }
      for (Setting setting : type.get().settings()) {
        rows.add(row(entry.get(), setting, texts));
      }
    }
    return rows;
  }

  private FormRow joinsAt(KitDesign design, BlockEntry block) {
    List<String> nodes = Nodes.toJoin(design, workshop);
    return new FormRow(
        block.id(),
        JOINS_AT,
        Words.of("form.joins-at"),
        Words.of("form.joins-at.help"),
        block.joinsAt().orElse(""),
        block.joinsAt().isEmpty(),
        new FormRow.Choice(nodes, nodes),
        false);
  }

  private FormRow row(BlockEntry block, Setting setting, BlockTexts texts) {
    String key = "setting." + setting.id();
    Optional<SettingEntry> entry = Optional.ofNullable(block.settings().get(setting.id()));
    return new FormRow(
        block.id(),
        setting.id(),
        texts.find(key).orElse(setting.id()),
        texts.find(key + ".help").orElse(""),
        entry.map(BlockForm::words).orElseGet(() -> usual(setting)),
        entry.isEmpty(),
        input(setting, key, texts),
        block.locked().contains(setting.id()));
  }

  private FormRow.Input input(Setting setting, String key, BlockTexts texts) {
    if (setting instanceof Setting.Value value) {
      return new FormRow.Amount(value.unit(), value.series(), value.least(), value.most());
    } else if (setting instanceof Setting.Choice choice) {
      return new FormRow.Choice(
          choice.options(),
          choice.options().stream().map(o -> texts.find(key + "." + o).orElse(o)).toList());
    } else if (setting instanceof Setting.Part part) {
      return new FormRow.Part(part.kind(), workshop.parts().names(part.kind()));
    } else if (setting instanceof Setting.Position) {
      return new FormRow.Amount(Unit.FRACTION, Series.ANY, 0, 1);
    }
    Unit unit = ((Setting.Trim) setting).reading().quantity().unit();
    return new FormRow.Amount(unit, Series.ANY, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
  }

  private static String words(SettingEntry entry) {
    if (entry instanceof SettingEntry.Words words) {
      return words.words();
    }
    return entry instanceof SettingEntry.Inline inline
        ? inline.model().name()
        : Words.of("setting.unread");
  }

  private static String usual(Setting setting) {
    if (setting instanceof Setting.Value value) {
      return QuantityText.exact(value.usual(), value.unit());
    } else if (setting instanceof Setting.Choice choice) {
      return choice.options().get(0);
    } else if (setting instanceof Setting.Part part) {
      return part.usual();
    } else if (setting instanceof Setting.Position position) {
      return QuantityText.exact(position.usual(), Unit.FRACTION);
    }
    Setting.Trim trim = (Setting.Trim) setting;
    return QuantityText.exact(trim.usualTarget(), trim.reading().quantity().unit());
  }

  @Override
  public Optional<String> fault(KitDesign design, FormRow row, String words) {
    Optional<Setting> setting = setting(design, row);
    if (setting.isEmpty()) {
      return Optional.empty();
    }
    try {
      var unused =
          reader.read(row.owner(), setting.get(), Optional.of(new SettingEntry.Words(words)));
      return Optional.empty();
    } catch (SettingException e) {
      return Optional.of(e.sentence());
    } catch (IllegalArgumentException e) {
      return Optional.of(String.valueOf(e.getMessage()));
    }
  }

  private Optional<Setting> setting(KitDesign design, FormRow row) {
    return design.block(row.owner()).map(workshop::settings).orElse(List.of()).stream()
        .filter(setting -> setting.id().equals(row.id()))
        .findFirst();
  }

  @Override
  public KitDesign edited(KitDesign design, FormRow row, String words) {
    if (row.id().equals(JOINS_AT)) {
      return design.withBlock(row.owner(), block -> block.joiningAt(words));
    }
    return words.equals(row.words()) ? design : design.withSetting(row.owner(), row.id(), words);
  }
}
