package earward.sheet.internal.page;

/** One cell below another. */
record StackedCell(Cell upper, Cell lower) implements Cell {
  @Override
  public float height(float width) {
    return upper.height(width) + lower.height(width);
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width, float rowHeight) {
    float first = upper.height(width);
    upper.draw(canvas, x, y, width, first);
    lower.draw(canvas, x, y + first, width, rowHeight - first);
  }
}
