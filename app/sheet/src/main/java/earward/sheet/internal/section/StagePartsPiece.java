package earward.sheet.internal.section;

import earward.sheet.content.StageRow;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Typeface;
import java.util.List;

/**
 * The parts of a stage to tick off, down the first column and then down the next.
 *
 * @param parts lowest first
 * @param columns one or two
 */
record StagePartsPiece(List<StageRow.Part> parts, int columns) implements Piece {
  private static final float ROW = 15;
  private static final float GUTTER = 22;
  private static final float REFERENCE_AT = 18;
  private static final float VALUE_AT = 46;
  private static final float GAP = 6;

  StagePartsPiece {
    parts = List.copyOf(parts);
  }

  private int rows() {
    return (parts.size() + columns - 1) / columns;
  }

  @Override
  public float height(float width) {
    return rows() * ROW;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    float half = columns == 1 ? width : (width - GUTTER) / 2;
    for (int i = 0; i < parts.size(); i++) {
      boolean right = i >= rows();
      float left = right ? x + half + GUTTER : x;
      part(canvas, parts.get(i), left, y + (right ? i - rows() : i) * ROW, half);
    }
  }

  private static void part(Canvas canvas, StageRow.Part part, float x, float y, float width) {
    new TickCell().draw(canvas, x, y + 1, REFERENCE_AT, ROW);
    float baseline = y + 1 + Style.BODY.rise();
    canvas.text(part.reference(), x + REFERENCE_AT, baseline, Style.STRONG);
    String value = Lines.cut(part.value(), Style.BODY, width - VALUE_AT);
    canvas.text(value, x + VALUE_AT, baseline, Style.BODY);
    float at = VALUE_AT + Typeface.width(value, Style.BODY) + GAP;
    if (width - at > 20) {
      canvas.text(Lines.cut(part.purpose(), Style.NOTE, width - at), x + at, baseline, Style.NOTE);
    }
  }
}
