package earward.sheet.internal.section;

import earward.sheet.content.CautionRow;
import earward.sheet.content.CautionRow.Signal;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import earward.sheet.internal.page.Style.Weight;
import earward.sheet.internal.page.Typeface;
import java.util.List;

/**
 * One caution: its signal word in a box, its headline, what to do.
 *
 * @param caution what
 * @param words of the sheet
 */
record CautionPiece(CautionRow caution, Words words) implements Piece {
  private static final float BOX_PADDING = 4;
  private static final float BOX_HEIGHT = 12;
  private static final float GAP = 7;
  private static final float BELOW = 3;

  @Override
  public float height(float width) {
    float headline = headlineLines(width).size() * Style.STRONG.leading();
    return Math.max(BOX_HEIGHT, headline)
        + BELOW
        + Lines.of(caution.sentence(), Style.CLOSE, width).size() * Style.CLOSE.leading();
  }

  private String signal() {
    return words.text("signal." + caution.signal().name().toLowerCase(java.util.Locale.ROOT));
  }

  private float boxWidth() {
    return Typeface.width(signal(), Style.PRINT_STRONG) + 2 * BOX_PADDING;
  }

  private List<String> headlineLines(float width) {
    String parts = String.join(", ", caution.references());
    String headline =
        parts.isEmpty()
            ? caution.headline()
            : words.text("caution.of", "headline", caution.headline(), "parts", parts);
    return Lines.of(headline, Style.STRONG, width - boxWidth() - GAP);
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    float wide = boxWidth();
    boolean grave = caution.signal() == Signal.WARNING;
    if (grave) {
      canvas.fill(x, y, wide, BOX_HEIGHT, Tone.INK);
    } else {
      canvas.frame(x + 0.35f, y + 0.35f, wide - 0.7f, BOX_HEIGHT - 0.7f, 0.7f, Tone.INK);
    }
    Style box = new Style(7, Weight.BOLD, grave ? Tone.PAPER : Tone.INK);
    canvas.text(signal(), x + BOX_PADDING, y + 8.6f, box);
    float baseline = y + Style.STRONG.rise() + 0.6f;
    List<String> headline = headlineLines(width);
    for (String line : headline) {
      canvas.text(line, x + wide + GAP, baseline, Style.STRONG);
      baseline += Style.STRONG.leading();
    }
    float top = y + Math.max(BOX_HEIGHT, headline.size() * Style.STRONG.leading()) + BELOW;
    baseline = top + Style.CLOSE.rise();
    for (String line : Lines.of(caution.sentence(), Style.CLOSE, width)) {
      canvas.text(line, x, baseline, Style.CLOSE);
      baseline += Style.CLOSE.leading();
    }
  }
}
