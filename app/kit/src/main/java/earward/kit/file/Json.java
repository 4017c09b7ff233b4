package earward.kit.file;

import java.util.List;

/** A JSON text as a tree that knows where each thing stood. Immutable. */
sealed interface Json {
  /** Where it began. */
  Place at();

  /**
   * A place in a text.
   *
   * @param line from 1; 0 for what the program made itself
   * @param column from 1
   */
  record Place(int line, int column) {
    static final Place NOWHERE = new Place(0, 0);
  }

  /** A member of an object. */
  record Member(String name, Json value) {}

  /** An object, its members in order. */
  record Members(List<Member> members, Place at) implements Json {
    public Members {
      members = List.copyOf(members);
    }
  }

  /** An array. */
  record Items(List<Json> items, Place at) implements Json {
    public Items {
      items = List.copyOf(items);
    }
  }

  /**
   * A text, a number, true, false or null.
   *
   * @param quoted whether it is a text
   * @param words the text, or the others letter by letter as they stood
   */
  record Scalar(boolean quoted, String words, Place at) implements Json {
    static Scalar text(String words) {
      return new Scalar(true, words, Place.NOWHERE);
    }

    static Scalar bare(String words) {
      return new Scalar(false, words, Place.NOWHERE);
    }

    boolean isNull() {
      return !quoted && words.equals("null");
    }
  }

  static Items array(List<? extends Json> items) {
    return new Items(List.copyOf(items), Place.NOWHERE);
  }

  static Members object(List<Member> members) {
    return new Members(members, Place.NOWHERE);
  }
}
