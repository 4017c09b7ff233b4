package earward.sheet.internal.page;

/**
 * One column of a table.
 *
 * @param title above it; may be empty
 * @param points its width; 0 for a column that takes what is left
 * @param toRight whether its title ends at the right
 */
public record Column(String title, float points, boolean toRight) {
  /** Words, from the left. */
  public static Column words(String title, float points) {
    return new Column(title, points, false);
  }

  /** Numbers, to the right. */
  public static Column numbers(String title, float points) {
    return new Column(title, points, true);
  }

  /** Takes what is left. */
  public static Column rest(String title) {
    return new Column(title, 0, false);
  }
}
