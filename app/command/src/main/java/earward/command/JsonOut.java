package earward.command;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.PrintWriter;
import java.util.OptionalDouble;

/** Writes JSON: indented, the same line ends everywhere, no locale in it. */
final class JsonOut {
  private static final ObjectMapper MAPPER = new ObjectMapper();

  private JsonOut() {}

  static ObjectNode object() {
    return MAPPER.createObjectNode();
  }

  static void print(PrintWriter to, JsonNode tree) {
    DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
    DefaultPrettyPrinter printer =
        new DefaultPrettyPrinter().withObjectIndenter(indenter).withArrayIndenter(indenter);
    try {
      to.print(MAPPER.writer(printer).writeValueAsString(tree));
      to.print("\n");
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("a tree of numbers and texts can always be written", e);
    }
  }

  /** Puts a number; null where there is none or it is not finite, which JSON cannot say. */
  static void put(ObjectNode into, String key, double value) {
    if (Double.isFinite(value)) {
      into.put(key, value);
    } else {
      into.putNull(key);
    }
  }

  static void put(ObjectNode into, String key, OptionalDouble value) {
    put(into, key, value.orElse(Double.NaN));
  }
}
