package earward.desktop.model;

import earward.block.BlockTexts;
import earward.block.BlockType;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** The words of block types, read once for each. Safe for several threads. */
final class Texts {
  private static final Map<BlockType, BlockTexts> READ = new ConcurrentHashMap<>();

  private Texts() {}

  static BlockTexts of(BlockType type) {
    return READ.computeIfAbsent(type, each -> BlockTexts.of(each, Words.locale()));
  }
}
