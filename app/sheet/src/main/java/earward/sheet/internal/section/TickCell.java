package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import earward.sheet.internal.page.Style.Weight;

/** A box to tick. */
record TickCell() implements Cell {
  /** A letter, so that a reader of the text finds the box too. */
  static final String BOX = "☐";

  private static final Style STYLE = new Style(12, Weight.REGULAR, Tone.INK);

  @Override
  public float height(float width) {
    return STYLE.size();
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width, float rowHeight) {
    canvas.text(BOX, x - 1, y + Style.BODY.rise() + 0.8f, STYLE);
  }
}
