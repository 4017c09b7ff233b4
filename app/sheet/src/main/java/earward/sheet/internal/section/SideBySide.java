package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Piece;

/**
 * Two pieces, each half as wide as the content.
 *
 * @param left one
 * @param right the other
 * @param spaceAbove in points
 */
public record SideBySide(Piece left, Piece right, float spaceAbove) implements Piece {
  private static final float GUTTER = 22;

  /** The width of each, of so wide a content. */
  public static float half(float width) {
    return (width - GUTTER) / 2;
  }

  @Override
  public float height(float width) {
    return Math.max(left.height(half(width)), right.height(half(width)));
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    left.draw(canvas, x, y, half(width));
    right.draw(canvas, x + half(width) + GUTTER, y, half(width));
  }
}
