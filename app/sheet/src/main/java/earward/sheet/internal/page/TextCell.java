package earward.sheet.internal.page;

import java.util.List;

/** Text in a field, from its top. */
record TextCell(String text, Style style, boolean toRight) implements Cell {
  @Override
  public float height(float width) {
    return text.isEmpty() ? 0 : Lines.of(text, style, width).size() * style.leading();
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width, float rowHeight) {
    if (text.isEmpty()) {
      return;
    }
    float baseline = y + style.rise();
    List<String> lines = Lines.of(text, style, width);
    for (String line : lines) {
      if (toRight) {
        canvas.textToRight(line, x + width, baseline, style);
      } else {
        canvas.text(line, x, baseline, style);
      }
      baseline += style.leading();
    }
  }
}
