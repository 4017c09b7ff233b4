package earward.sheet.internal.section;

import earward.sheet.content.FindingRow;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import java.util.List;
import java.util.Locale;

/**
 * One finding: the shape and word of its severity, its sentence, source and remedies.
 *
 * @param finding what
 * @param words of the sheet
 */
record FindingPiece(FindingRow finding, Words words) implements Piece {
  private static final float WORD_AT = 20;
  private static final float TEXT_AT = 72;
  private static final float PADDING = 5;
  private static final float RADIUS = 5.4f;
  private static final int MOST_LINES = 30;

  private List<String> sentence(float width) {
    return atMost(Lines.of(finding.sentence(), Style.BODY, width - TEXT_AT));
  }

  private List<String> notes(float width) {
    StringBuilder notes = new StringBuilder();
    for (String remedy : finding.remedies()) {
      notes.append(words.text("finding.remedy", "remedy", remedy)).append('\n');
    }
    if (!finding.source().isEmpty()) {
      notes.append(words.text("finding.source", "source", finding.source())).append('\n');
    }
    return notes.length() == 0
        ? List.of()
        : atMost(Lines.of(notes.toString().strip(), Style.NOTE, width - TEXT_AT));
  }

  /** A finding that fills a page says no more than one that fills half of it. */
  private static List<String> atMost(List<String> lines) {
    return lines.size() <= MOST_LINES ? lines : lines.subList(0, MOST_LINES);
  }

  @Override
  public float height(float width) {
    return sentence(width).size() * Style.BODY.leading()
        + notes(width).size() * Style.NOTE.leading()
        + 2 * PADDING;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    float baseline = y + PADDING + Style.BODY.rise();
    SeverityMark.draw(canvas, finding.severity(), x + RADIUS + 1, baseline - 3.1f, RADIUS);
    String word = "severity." + finding.severity().name().toLowerCase(Locale.ROOT);
    canvas.text(words.text(word), x + WORD_AT, baseline, Style.STRONG);
    for (String line : sentence(width)) {
      canvas.text(line, x + TEXT_AT, baseline, Style.BODY);
      baseline += Style.BODY.leading();
    }
    for (String line : notes(width)) {
      canvas.text(line, x + TEXT_AT, baseline, Style.NOTE);
      baseline += Style.NOTE.leading();
    }
    float foot = y + height(width);
    canvas.line(x, foot, x + width, foot, 0.35f, Tone.HAIR);
  }
}
