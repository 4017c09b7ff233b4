package earward.sheet.internal.section;

import earward.sheet.content.Amount;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Typeface;
import earward.sheet.wording.Numbers;
import earward.sheet.wording.Numbers.Written;

/**
 * A number, aligned at its unit: numbers of a column end in one line and units begin in one.
 *
 * @param amount what
 * @param numbers writes it
 * @param style how
 */
record AmountCell(Amount amount, Numbers numbers, Style style) implements Cell {
  /** Room for the widest unit, at the size of a table. */
  private static final String WIDEST_UNIT = "mW";

  @Override
  public float height(float width) {
    return style.leading();
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width, float rowHeight) {
    Written written = numbers.write(amount);
    float unitAt = x + width - Typeface.width(WIDEST_UNIT, style);
    float baseline = y + style.rise();
    // number, space and unit are one stretch of text, so that they are read back as one
    float before = Typeface.width(written.number() + "\u00a0", style);
    canvas.text(written.whole(), unitAt - before, baseline, style);
  }
}
