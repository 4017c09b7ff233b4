package earward.kit.file;

import earward.block.quantity.Unit;
import earward.kit.design.AsWritten;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Puts one object together for writing: members in the order in which the file had them, what the
 * program does not know among them, values in the words that were used while they still mean the
 * same, new members behind.
 */
final class MembersWriter {
  private final AsWritten written;
  private final Map<String, Json> known = new LinkedHashMap<>();
  private final Set<String> names = new HashSet<>();

  MembersWriter(AsWritten written) {
    this.written = written;
  }

  MembersWriter text(String name, String words) {
    return put(name, sameWords(name, words).orElseGet(() -> Json.Scalar.text(words)));
  }

  MembersWriter text(String name, String words, String usual) {
    return words.equals(usual) && !written.has(name) ? skip(name) : text(name, words);
  }

  /** A number without unit or quotation marks. */
  MembersWriter bare(String name, String words) {
    return put(name, sameWords(name, words).orElseGet(() -> Json.Scalar.bare(words)));
  }

  MembersWriter quantity(String name, double value, Unit unit) {
    return put(name, quantityAsWritten(name, value, unit).orElseGet(() -> exact(value, unit)));
  }

  MembersWriter quantity(String name, double value, Unit unit, double usual) {
    return value == usual && !written.has(name) ? skip(name) : quantity(name, value, unit);
  }

  /** A member of its own form; left out where it is empty and the file did not have it. */
  MembersWriter nested(String name, Json value) {
    boolean empty =
        (value instanceof Json.Items array && array.items().isEmpty())
            || (value instanceof Json.Members object && object.members().isEmpty());
    return empty && !written.has(name) ? skip(name) : put(name, value);
  }

  /** A name of the program's own that has no value now. */
  MembersWriter skip(String name) {
    names.add(name);
    return this;
  }

  Json.Members done() {
    List<Json.Member> members = new ArrayList<>();
    Map<String, Json> left = new LinkedHashMap<>(known);
    written
        .members()
        .forEach(
            (name, text) -> {
              Json value = left.remove(name);
              if (value != null) {
                members.add(new Json.Member(name, value));
              } else if (!names.contains(name) && !text.isEmpty()) {
                members.add(new Json.Member(name, JsonReading.kept(text)));
              }
            });
    left.forEach((name, value) -> members.add(new Json.Member(name, value)));
    return Json.object(members);
  }

  private MembersWriter put(String name, Json value) {
    names.add(name);
    known.put(name, value);
    return this;
  }

  private Optional<Json.Scalar> scalarAsWritten(String name) {
    return written
        .text(name)
        .map(JsonReading::kept)
        .filter(Json.Scalar.class::isInstance)
        .map(Json.Scalar.class::cast);
  }

  private Optional<Json> sameWords(String name, String words) {
    return scalarAsWritten(name)
        .filter(scalar -> scalar.words().equals(words))
        .map(Json.class::cast);
  }

  private Optional<Json> quantityAsWritten(String name, double value, Unit unit) {
    return scalarAsWritten(name)
        .filter(scalar -> means(scalar.words(), value, unit))
        .map(Json.class::cast);
  }

  static boolean means(String words, double value, Unit unit) {
    try {
      return QuantityText.parse(words, unit) == value;
    } catch (QuantityException e) {
      return false;
    }
  }

  static Json exact(double value, Unit unit) {
    return Json.Scalar.text(QuantityText.exact(value, unit));
  }
}
