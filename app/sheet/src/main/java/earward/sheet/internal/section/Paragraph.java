package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;

/**
 * Text in lines.
 *
 * @param text what
 * @param style how
 * @param most share of the width that lines take, so that they stay readable
 * @param spaceAbove in points
 * @param keptWithNext whether the next piece must follow on the same page
 */
record Paragraph(String text, Style style, float most, float spaceAbove, boolean keptWithNext)
    implements Piece {
  private static final float READABLE = 0.82f;

  static Paragraph body(String text) {
    return new Paragraph(text, Style.BODY, READABLE, 4, false);
  }

  static Paragraph note(String text) {
    return new Paragraph(text, Style.NOTE, READABLE, 4, false);
  }

  /** A legend over a list: as wide as it, and kept with it. */
  static Paragraph wide(String text) {
    return new Paragraph(text, Style.NOTE, 1, 0, true);
  }

  /** The same as the first thing below a heading. */
  Paragraph kept() {
    return new Paragraph(text, style, most, 0, true);
  }

  @Override
  public float height(float width) {
    return Lines.of(text, style, width * most).size() * style.leading();
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    float baseline = y + style.rise();
    for (String line : Lines.of(text, style, width * most)) {
      canvas.text(line, x, baseline, style);
      baseline += style.leading();
    }
  }
}
