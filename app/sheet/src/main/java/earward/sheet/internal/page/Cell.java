package earward.sheet.internal.page;

/** What stands in one field of a table. */
public interface Cell {
  /** Its height in points at the width. */
  float height(float width);

  /**
   * Draws it.
   *
   * @param x left edge
   * @param y upper edge of the row
   * @param width of the field
   * @param rowHeight of the whole row
   */
  void draw(Canvas canvas, float x, float y, float width, float rowHeight);

  /** Text, broken into lines. */
  static Cell text(String text, Style style) {
    return new TextCell(text, style, false);
  }

  /** Text that ends at the right. */
  static Cell textToRight(String text, Style style) {
    return new TextCell(text, style, true);
  }

  /** Nothing. */
  static Cell empty() {
    return text("", Style.BODY);
  }

  /** Two cells, the second below the first. */
  static Cell stacked(Cell upper, Cell lower) {
    return new StackedCell(upper, lower);
  }
}
