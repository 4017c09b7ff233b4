package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;

/**
 * A small heading within a section, kept with what follows.
 *
 * @param text of the heading
 */
record Label(String text) implements Piece {
  @Override
  public float height(float width) {
    return Style.STRONG.leading() + 2;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    canvas.text(text, x, y + Style.STRONG.rise(), Style.STRONG);
  }

  @Override
  public float spaceAbove() {
    return 8;
  }

  @Override
  public boolean keptWithNext() {
    return true;
  }
}
