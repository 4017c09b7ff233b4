package earward.sheet.internal.section;

import earward.sheet.content.PathDrawing;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Piece;

/**
 * One row of the drawing.
 *
 * @param row what
 */
record DrawingPiece(PathDrawing.Row row) implements Piece {
  @Override
  public float height(float width) {
    return (float) row.heightPoints() * scale(width);
  }

  /** A drawing that is wider than the page is made smaller rather than cut. */
  private float scale(float width) {
    return Math.min(1, width / (float) row.widthPoints());
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    float scale = scale(width);
    canvas.drawing(
        x,
        y,
        (float) row.widthPoints() * scale,
        height(width),
        graphics -> {
          graphics.scale(scale, scale);
          row.paint().accept(graphics);
        });
  }
}
