package earward.kit.design;

import earward.block.device.PartModel;
import java.util.List;
import java.util.Objects;

/** What a design says for one setting of a block; read with the block type's help. */
public sealed interface SettingEntry {
  /**
   * A value, choice, position, target or library part by name, as written.
   *
   * @param words for instance {@code 4.7 kΩ}, {@code audio-15}, {@code BAT46}
   * @param bare whether the file has it without quotation marks: a plain number, true or false
   */
  record Words(String words, boolean bare) implements SettingEntry {
    public Words {
      Objects.requireNonNull(words);
    }

    /** Words in quotation marks. */
    public Words(String words) {
      this(words, false);
    }
  }

  /**
   * A part given by its model figures.
   *
   * @param model the figures
   * @param json as written, the source of what is written back
   * @param remarks what is to be said of the figures, each one sentence: how they were fitted
   */
  record Inline(PartModel model, String json, List<String> remarks) implements SettingEntry {
    public Inline {
      Objects.requireNonNull(model);
      Objects.requireNonNull(json);
      remarks = List.copyOf(remarks);
    }

    /** A part of which nothing is to be said. */
    public Inline(PartModel model, String json) {
      this(model, json, List.of());
    }
  }

  /**
   * Something that this program cannot read, kept for the block type that can.
   *
   * @param json as written
   */
  record Unread(String json) implements SettingEntry {}
}
