package earward.desktop.model;

import earward.block.setting.Setting;
import java.util.List;

/**
 * One setting as a form shows it.
 *
 * @param blockId whose it is
 * @param setting what may be set
 * @param label its name
 * @param help what the block says of it; may be empty
 * @param words as it stands in the design, or the usual value
 * @param usual whether the design says nothing of it
 * @param options words to choose from; empty for a value that is typed
 * @param optionLabels what the options are called
 */
public record SettingRow(
    String blockId,
    Setting setting,
    String label,
    String help,
    String words,
    boolean usual,
    List<String> options,
    List<String> optionLabels) {
  public SettingRow {
    options = List.copyOf(options);
    optionLabels = List.copyOf(optionLabels);
  }
}
