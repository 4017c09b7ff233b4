package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style.Tone;

/**
 * Lines to write on.
 *
 * @param lines how many
 */
record NotesPiece(int lines) implements Piece {
  private static final float STEP = 22;

  @Override
  public float height(float width) {
    return lines * STEP;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    for (int i = 1; i <= lines; i++) {
      canvas.line(x, y + i * STEP, x + width, y + i * STEP, 0.35f, Tone.HAIR);
    }
  }
}
