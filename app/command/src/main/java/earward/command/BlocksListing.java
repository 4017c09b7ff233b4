package earward.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.block.BlockTexts;
import earward.block.BlockType;
import earward.block.check.Finding;
import earward.block.setting.Setting;
import earward.host.Plugin;
import earward.host.PluginSet;
import earward.kit.review.Reviewer;
import java.io.PrintWriter;
import java.util.Locale;

/** The list of block types and of refused plug-ins, for people and for programs. */
final class BlocksListing {
  private BlocksListing() {}

  static void print(PrintWriter to, PluginSet types) {
    TextTable table = new TextTable().row("block type", "what it is", "plug-in", "version");
    for (BlockType type : types.all()) {
      Plugin plugin = types.pluginOf(type.id()).orElseThrow();
      table.row(type.id(), name(type), plugin.id(), plugin.version());
    }
    table.print(to);
    for (Finding refusal : types.refusals()) {
      to.println("refused: " + refusal.sentence());
    }
  }

  private static String name(BlockType type) {
    return BlockTexts.of(type, Reviewer.USUAL_LANGUAGE).get("name");
  }

  static ObjectNode json(PluginSet types) {
    ObjectNode root = JsonOut.object().put("schema", "earward-blocks-1");
    ArrayNode blocks = root.putArray("blocks");
    for (BlockType type : types.all()) {
      blocks.add(block(type, types.pluginOf(type.id()).orElseThrow()));
    }
    ArrayNode refused = root.putArray("refused");
    for (Finding refusal : types.refusals()) {
      refused
          .addObject()
          .put("file", refusal.subject())
          .put("code", refusal.code())
          .put("sentence", refusal.sentence());
    }
    return root;
  }

  private static ObjectNode block(BlockType type, Plugin plugin) {
    BlockTexts texts = BlockTexts.of(type, Reviewer.USUAL_LANGUAGE);
    ObjectNode block =
        JsonOut.object()
            .put("id", type.id())
            .put("role", type.role().name().toLowerCase(Locale.ROOT).replace('_', '-'))
            .put("name", texts.get("name"))
            .put("plugin", plugin.id())
            .put("pluginVersion", plugin.version());
    ArrayNode settings = block.putArray("settings");
    for (Setting setting : type.settings()) {
      settings.add(setting(setting).put("label", texts.get("setting." + setting.id())));
    }
    return block;
  }

  private static ObjectNode setting(Setting setting) {
    ObjectNode node = JsonOut.object().put("id", setting.id());
    if (setting instanceof Setting.Value value) {
      node.put("kind", "value").put("unit", value.unit().symbol());
      JsonOut.put(node, "usual", value.usual());
      JsonOut.put(node, "least", value.least());
      JsonOut.put(node, "most", value.most());
    } else if (setting instanceof Setting.Choice choice) {
      ArrayNode options = node.put("kind", "choice").putArray("options");
      choice.options().forEach(options::add);
    } else if (setting instanceof Setting.Part part) {
      node.put("kind", "part").put("partKind", part.kind().key()).put("usual", part.usual());
    } else if (setting instanceof Setting.Position position) {
      node.put("kind", "position").put("usual", position.usual());
    } else if (setting instanceof Setting.Trim trim) {
      node.put("kind", "trim").put("unit", trim.reading().quantity().unit().symbol());
      JsonOut.put(node, "usual", trim.usualTarget());
    }
    return node;
  }
}
