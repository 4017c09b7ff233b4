package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;

/**
 * A temperature as a bar from 0 °C; its frame ends at the limit, and a bar that goes beyond it
 * sticks out.
 *
 * @param celsius the temperature; NaN draws no bar
 * @param limitCelsius where the frame ends
 */
record BarCell(double celsius, double limitCelsius) implements Cell {
  private static final float HEIGHT = 8;
  private static final float FRAME_SHARE = 0.8f;

  @Override
  public float height(float width) {
    return Style.BODY.leading();
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width, float rowHeight) {
    if (!(celsius > 0) || !(limitCelsius > 0)) {
      return;
    }
    float frame = width * FRAME_SHARE;
    float bar = (float) Math.min(width, frame * celsius / limitCelsius);
    float top = y + 1.5f;
    canvas.fill(x, top, bar, HEIGHT, celsius > limitCelsius ? Tone.INK : Tone.MIDDLE);
    canvas.frame(x, top, frame, HEIGHT, 0.7f, Tone.INK);
  }
}
