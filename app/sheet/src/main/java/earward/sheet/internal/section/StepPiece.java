package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;

/**
 * One step to tick off.
 *
 * @param text what to do
 */
record StepPiece(String text) implements Piece {
  private static final float TEXT_AT = 20;
  private static final float PADDING = 2.5f;

  @Override
  public float height(float width) {
    float lines = Lines.of(text, Style.BODY, width - TEXT_AT).size();
    return lines * Style.BODY.leading() + 2 * PADDING;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    new TickCell().draw(canvas, x, y + PADDING, TEXT_AT, height(width));
    float baseline = y + PADDING + Style.BODY.rise();
    for (String line : Lines.of(text, Style.BODY, width - TEXT_AT)) {
      canvas.text(line, x + TEXT_AT, baseline, Style.BODY);
      baseline += Style.BODY.leading();
    }
  }
}
