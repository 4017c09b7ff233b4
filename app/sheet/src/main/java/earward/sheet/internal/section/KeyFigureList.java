package earward.sheet.internal.section;

import earward.sheet.content.Amount;
import earward.sheet.content.KeyFigure;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import earward.sheet.internal.page.Typeface;
import java.util.List;
import java.util.stream.Collectors;

/**
 * A list of labels and figures under a small heading.
 *
 * @param title above it
 * @param figures from the top
 * @param words of the sheet
 */
record KeyFigureList(String title, List<KeyFigure> figures, Words words) implements Piece {
  private static final float PADDING = 2.4f;
  private static final float GAP = 8;
  private static final float LEAST_LABEL = 70;

  @Override
  public float height(float width) {
    float sum = Style.STRONG.leading() + PADDING;
    for (KeyFigure figure : figures) {
      sum += rowHeight(figure, width);
    }
    return sum;
  }

  private float labelWidth(KeyFigure figure, float width) {
    float value = Math.min(Typeface.width(value(figure), Style.STRONG), width * 0.6f);
    return Math.max(LEAST_LABEL, width - value - GAP);
  }

  private float valueWidth(KeyFigure figure, float width) {
    return width - labelWidth(figure, width) - GAP;
  }

  private float rowHeight(KeyFigure figure, float width) {
    float label = Lines.of(label(figure), Style.BODY, labelWidth(figure, width)).size();
    float value = Lines.of(value(figure), Style.STRONG, valueWidth(figure, width)).size();
    return Math.max(label, value) * Style.BODY.leading() + 2 * PADDING;
  }

  /** What stands at the right: the amounts, or the words where there are none. */
  private String value(KeyFigure figure) {
    if (figure.amounts().isEmpty()) {
      return figure.note();
    }
    return figure.amounts().stream()
        .map(this::written)
        .collect(Collectors.joining(words.text("range.to")));
  }

  private String label(KeyFigure figure) {
    boolean noted = !figure.amounts().isEmpty() && !figure.note().isEmpty();
    return noted ? figure.label() + ", " + figure.note() : figure.label();
  }

  private String written(Amount amount) {
    return words.numbers().write(amount).whole();
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    canvas.text(title, x, y + Style.STRONG.rise(), Style.STRONG);
    float at = y + Style.STRONG.leading() + PADDING;
    canvas.line(x, at, x + width, at, 0.9f, Tone.INK);
    for (KeyFigure figure : figures) {
      row(canvas, figure, x, at, width);
      at += rowHeight(figure, width);
      canvas.line(x, at, x + width, at, 0.35f, Tone.HAIR);
    }
  }

  private void row(Canvas canvas, KeyFigure figure, float x, float y, float width) {
    float baseline = y + PADDING + Style.BODY.rise();
    for (String line : Lines.of(label(figure), Style.BODY, labelWidth(figure, width))) {
      canvas.text(line, x, baseline, Style.BODY);
      baseline += Style.BODY.leading();
    }
    baseline = y + PADDING + Style.BODY.rise();
    for (String line : Lines.of(value(figure), Style.STRONG, valueWidth(figure, width))) {
      canvas.textToRight(line, x + width, baseline, Style.STRONG);
      baseline += Style.BODY.leading();
    }
  }
}
