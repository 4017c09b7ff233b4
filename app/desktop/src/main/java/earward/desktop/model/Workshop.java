package earward.desktop.model;

import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.block.setting.Setting;
import earward.kit.design.BlockEntry;
import earward.kit.parts.PartsLibrary;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;

/**
 * What designs are made of: block types, the parts library, starter kits.
 *
 * @param types block types at hand
 * @param parts the parts library
 * @param starterKits design files of the starter kits
 * @param refusals one sentence for each plug-in that is not used
 */
public record Workshop(
    BlockTypes types, PartsLibrary parts, List<Path> starterKits, List<String> refusals) {
  public Workshop {
    Objects.requireNonNull(types);
    Objects.requireNonNull(parts);
    starterKits = List.copyOf(starterKits);
    refusals = List.copyOf(refusals);
  }

  /** The settings of a block; none where its type is missing. */
  public List<Setting> settings(BlockEntry block) {
    return types.find(block.typeId()).map(BlockType::settings).orElse(List.of());
  }
}
