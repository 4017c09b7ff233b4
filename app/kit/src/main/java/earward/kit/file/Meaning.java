package earward.kit.file;

import java.util.Locale;

/** What a data sheet says of a point. */
enum Meaning {
  TYPICAL,
  LIMIT;

  private String key() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** Whether the point is typical, which it is where it does not say. */
  static boolean typical(MembersReader point) throws DesignFileException {
    return point.choice("meaning", values(), Meaning::key, TYPICAL) == TYPICAL;
  }
}
