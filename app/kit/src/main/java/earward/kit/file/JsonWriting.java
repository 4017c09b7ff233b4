package earward.kit.file;

import java.util.ArrayList;
import java.util.List;

/**
 * Writes a JSON tree for people: two spaces a level, and what holds only plain values on one line
 * where it fits. The same tree gives the same text.
 */
final class JsonWriting {
  private static final int WIDTH = 100;
  private static final String INDENT = "  ";

  private final StringBuilder out = new StringBuilder();

  private JsonWriting() {}

  /** The text of a whole file, ending in a line feed. */
  static String file(Json tree) {
    JsonWriting writing = new JsonWriting();
    writing.value(tree, 0, 0, true);
    return writing.out.append('\n').toString();
  }

  /** The text of a tree on one line. */
  static String line(Json tree) {
    if (tree instanceof Json.Scalar scalar) {
      return scalar.quoted() ? quoted(scalar.words()) : scalar.words();
    }
    if (tree instanceof Json.Items array) {
      return array.items().isEmpty()
          ? "[]"
          : "[" + String.join(", ", array.items().stream().map(JsonWriting::line).toList()) + "]";
    }
    List<String> parts = new ArrayList<>();
    for (Json.Member member : ((Json.Members) tree).members()) {
      parts.add(quoted(member.name()) + ": " + line(member.value()));
    }
    return parts.isEmpty() ? "{}" : "{ " + String.join(", ", parts) + " }";
  }

  private void value(Json tree, int level, int used, boolean spread) {
    String line = flat(tree) && !spread ? line(tree) : "";
    if (!line.isEmpty() && level * INDENT.length() + used + line.length() <= WIDTH) {
      out.append(line);
    } else if (tree instanceof Json.Items array && !array.items().isEmpty()) {
      out.append('[');
      for (int i = 0; i < array.items().size(); i++) {
        newLine(i, level + 1);
        value(array.items().get(i), level + 1, 0, false);
      }
      close(']', level);
    } else if (tree instanceof Json.Members object && !object.members().isEmpty()) {
      out.append('{');
      for (int i = 0; i < object.members().size(); i++) {
        Json.Member member = object.members().get(i);
        newLine(i, level + 1);
        String name = quoted(member.name()) + ": ";
        out.append(name);
        value(member.value(), level + 1, name.length(), false);
      }
      close('}', level);
    } else {
      out.append(line(tree));
    }
  }

  private void newLine(int index, int level) {
    out.append(index == 0 ? "\n" : ",\n").append(INDENT.repeat(level));
  }

  private void close(char bracket, int level) {
    out.append('\n').append(INDENT.repeat(level)).append(bracket);
  }

  private static boolean flat(Json tree) {
    if (tree instanceof Json.Items array) {
      return array.items().stream().allMatch(Json.Scalar.class::isInstance);
    }
    if (tree instanceof Json.Members object) {
      return object.members().stream().allMatch(m -> m.value() instanceof Json.Scalar);
    }
    return true;
  }

  private static String quoted(String text) {
    StringBuilder quoted = new StringBuilder("\"");
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      switch (c) {
        case '"' -> quoted.append("\\\"");
        case '\\' -> quoted.append("\\\\");
        case '\n' -> quoted.append("\\n");
        case '\r' -> quoted.append("\\r");
        case '\t' -> quoted.append("\\t");
        default -> {
          if (c < ' ' || (Character.isSurrogate(c) && !paired(text, i))) {
            quoted.append("\\u").append(hex(c));
          } else {
            quoted.append(c);
          }
        }
      }
    }
    return quoted.append('"').toString();
  }

  private static boolean paired(String text, int index) {
    char c = text.charAt(index);
    return Character.isHighSurrogate(c)
        ? index + 1 < text.length() && Character.isLowSurrogate(text.charAt(index + 1))
        : index > 0 && Character.isHighSurrogate(text.charAt(index - 1));
  }

  private static String hex(char c) {
    String digits = Integer.toHexString(c);
    return "0".repeat(4 - digits.length()) + digits;
  }
}
