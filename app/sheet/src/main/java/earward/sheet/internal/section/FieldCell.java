package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Cell;

/**
 * A field to be filled in on paper or on the screen.
 *
 * @param name of the field, unlike any other of the sheet
 * @param tip what is to be filled in, for a reader that is heard
 * @param unit printed faintly at its right end; may be empty
 */
record FieldCell(String name, String tip, String unit) implements Cell {
  private static final float HEIGHT = 17;
  private static final float UNIT_ROOM = 16;

  @Override
  public float height(float width) {
    return HEIGHT - 4;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width, float rowHeight) {
    new ReadingCell(unit).draw(canvas, x, y, width, rowHeight);
    canvas.field(name, tip, x + 1, y - 1, width - UNIT_ROOM, HEIGHT - 2);
  }
}
