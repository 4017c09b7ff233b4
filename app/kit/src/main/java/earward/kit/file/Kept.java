package earward.kit.file;

import earward.kit.design.AsWritten;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Turns what a design keeps of its file back into trees. */
final class Kept {
  private Kept() {}

  /** The members of which the text was kept. */
  static Json.Members object(AsWritten written) {
    List<Json.Member> members = new ArrayList<>();
    written
        .members()
        .forEach(
            (name, text) -> {
              if (!text.isEmpty()) {
                members.add(new Json.Member(name, JsonReading.kept(text)));
              }
            });
    return Json.object(members);
  }

  /** How an object inside was written, where its text was kept with that of the outer one. */
  static AsWritten inner(AsWritten outer, String name) {
    return outer
        .text(name)
        .map(JsonReading::kept)
        .filter(Json.Members.class::isInstance)
        .map(tree -> all((Json.Members) tree))
        .orElse(AsWritten.NEW);
  }

  private static AsWritten all(Json.Members object) {
    Map<String, String> members = new LinkedHashMap<>();
    object.members().forEach(m -> members.put(m.name(), JsonWriting.line(m.value())));
    return new AsWritten(members);
  }
}
