package earward.sheet.internal.gather;

import earward.block.BlockTexts;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;

/** What blocks, their parts and their test points are called in the sheet's language. */
final class BlockNames {
  private final Map<String, BlockTexts> texts = new LinkedHashMap<>();
  private final Map<String, String> names = new HashMap<>();

  BlockNames(Assembly assembly, Locale locale) {
    Map<String, Integer> uses = new HashMap<>();
    for (PlacedBlock block : assembly.blocks()) {
      BlockTexts words = BlockTexts.of(block.type(), locale);
      texts.put(block.id(), words);
      names.put(block.id(), words.get("name"));
      uses.merge(words.get("name"), 1, Integer::sum);
    }
    names.replaceAll((id, name) -> uses.getOrDefault(name, 0) == 1 ? name : name + " (" + id + ")");
  }

  /** The name of a block; two of the same type are told apart by their ids. */
  String of(PlacedBlock block) {
    return names.getOrDefault(block.id(), block.id());
  }

  /** What a part is in its block; empty where the block does not say. */
  String part(PlacedBlock block, String partId) {
    BlockTexts words = texts.get(block.id());
    return words == null ? "" : words.find("part." + partId).orElse("");
  }

  /** What a setting is called. */
  String setting(PlacedBlock block, String settingId) {
    BlockTexts words = texts.get(block.id());
    return words == null ? settingId : words.find("setting." + settingId).orElse(settingId);
  }

  /** Where a test point is: the designer's words, the block's words, or its place. */
  String testPoint(PlacedTestPoint point) {
    if (!point.words().isEmpty()) {
      return point.words();
    }
    int dot = point.place().indexOf('.');
    BlockTexts words = dot < 0 ? null : texts.get(point.place().substring(0, dot));
    String id = point.place().substring(dot + 1);
    return words == null ? point.place() : words.find("test-point." + id).orElse(point.place());
  }
}
