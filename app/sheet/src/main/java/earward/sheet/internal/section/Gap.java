package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Piece;

/**
 * Empty space.
 *
 * @param points its height
 */
record Gap(float points) implements Piece {
  @Override
  public float height(float width) {
    return points;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    // nothing is drawn where nothing stands
  }

  @Override
  public boolean keptWithNext() {
    return true;
  }
}
