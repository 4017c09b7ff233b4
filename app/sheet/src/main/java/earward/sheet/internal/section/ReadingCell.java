package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;

/**
 * A field in which the builder writes a reading.
 *
 * @param unit printed faintly at its right end; may be empty
 */
record ReadingCell(String unit) implements Cell {
  private static final float LEAST_HEIGHT = 17;
  private static final float OUTWARD = 2;
  private static final Style UNIT = Style.LABEL.in(Tone.MIDDLE);

  @Override
  public float height(float width) {
    return LEAST_HEIGHT - 2 * OUTWARD;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width, float rowHeight) {
    float high = Math.min(rowHeight, LEAST_HEIGHT - 2 * OUTWARD) + 2 * OUTWARD;
    canvas.frame(x, y - OUTWARD, width, high, 0.5f, Tone.MIDDLE);
    if (!unit.isEmpty()) {
      canvas.textToRight(unit, x + width - 3, y - OUTWARD + high - 4, UNIT);
    }
  }
}
