package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import java.util.List;

/**
 * Fields in one line that the builder fills in.
 *
 * @param labels from the left
 */
record FillIn(List<String> labels) implements Piece {
  private static final float HEIGHT = 25;
  private static final float GUTTER = 14;

  FillIn {
    labels = List.copyOf(labels);
  }

  @Override
  public float height(float width) {
    return HEIGHT;
  }

  @Override
  public float spaceAbove() {
    return 4;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    float wide = (width - GUTTER * (labels.size() - 1)) / labels.size();
    for (int i = 0; i < labels.size(); i++) {
      float left = x + i * (wide + GUTTER);
      canvas.text(labels.get(i), left, y + HEIGHT - 2, Style.LABEL);
      float line = y + HEIGHT - 12;
      canvas.line(left, line, left + wide, line, 0.6f, Tone.INK);
    }
  }
}
