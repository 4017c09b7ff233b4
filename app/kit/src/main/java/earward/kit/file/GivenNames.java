package earward.kit.file;

import java.util.HashMap;
import java.util.Map;

/** The names that one kind of thing was given in a file, each of which may be given once. */
final class GivenNames {
  private final String kind;
  private final Map<String, Json.Place> places = new HashMap<>();

  /**
   * No names yet.
   *
   * @param kind of thing, for the sentence: {@code block}
   */
  GivenNames(String kind) {
    this.kind = kind;
  }

  /**
   * Takes the name of one more.
   *
   * @param in the object whose member {@code id} it is
   * @throws DesignFileException at that member, when the name was given before
   */
  void take(MembersReader in) throws DesignFileException {
    Json.Scalar id = in.scalar("id").orElseThrow(() -> in.missing("id"));
    Json.Place former = places.put(id.words(), id.at());
    if (former != null) {
      throw DesignFileException.of(
          "duplicate-id",
          in.fileName(),
          id.at(),
          "a second "
              + kind
              + " is named '"
              + id.words()
              + "', as the one in line "
              + former.line()
              + " is; wanted a name of its own for each");
    }
  }
}
