package earward.sheet.internal.section;

import earward.sheet.content.KitTitle;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The head of the first page: what this is, the kit's name, what it is, and which one.
 *
 * @param title of the kit
 * @param introduction one paragraph
 * @param words of the sheet
 */
record TitlePiece(KitTitle title, String introduction, Words words) implements Piece {
  private static final float RULE = 2.4f;
  private static final float FACT_WIDTH = 118;
  private static final float GAP = 24;
  private static final float FACT_HEIGHT = 25;
  private static final int MOST_NAME_LINES = 3;

  private record Fact(String label, String value) {}

  private List<Fact> facts() {
    List<Fact> facts = new ArrayList<>();
    if (!title.kitNumber().isEmpty()) {
      facts.add(new Fact(words.text("title.kit-number"), title.kitNumber()));
    }
    facts.add(new Fact(words.text("title.revision"), title.revision()));
    facts.add(new Fact(words.text("title.digest"), title.digest()));
    return facts;
  }

  private static float textWidth(float width) {
    return width - FACT_WIDTH - GAP;
  }

  private List<String> name(float width) {
    List<String> lines = Lines.of(title.name(), Style.DISPLAY, textWidth(width));
    return lines.subList(0, Math.min(lines.size(), MOST_NAME_LINES));
  }

  private float nameAt() {
    return RULE + 6 + Style.NOTE.leading() + 6;
  }

  @Override
  public float height(float width) {
    float lead = Lines.of(introduction, Style.LEAD, textWidth(width)).size() * Style.LEAD.leading();
    float text = nameAt() + name(width).size() * Style.DISPLAY.leading() + 2 + lead;
    return Math.max(text, nameAt() + 4 + facts().size() * FACT_HEIGHT);
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    canvas.fill(x, y, width, RULE, Tone.INK);
    float baseline = y + RULE + 6 + Style.NOTE.rise();
    canvas.text(words.text("title.sheet"), x, baseline, Style.NOTE.strong().in(Tone.INK));
    String club = Lines.cut(title.clubName(), Style.NOTE, width / 2);
    canvas.text(club, x + width - FACT_WIDTH, baseline, Style.NOTE);
    baseline = y + nameAt() + Style.DISPLAY.rise();
    for (String line : name(width)) {
      canvas.text(line, x, baseline, Style.DISPLAY);
      baseline += Style.DISPLAY.leading();
    }
    baseline += 2 + Style.LEAD.rise() - Style.DISPLAY.rise();
    for (String line : Lines.of(introduction, Style.LEAD, textWidth(width))) {
      canvas.text(line, x, baseline, Style.LEAD);
      baseline += Style.LEAD.leading();
    }
    float at = y + nameAt() + 4;
    for (Fact fact : facts()) {
      float left = x + width - FACT_WIDTH;
      canvas.text(fact.label(), left, at + Style.LABEL.rise(), Style.LABEL);
      String value = Lines.cut(fact.value(), Style.STRONG, FACT_WIDTH);
      canvas.text(value, left, at + Style.LABEL.leading() + Style.STRONG.rise(), Style.STRONG);
      at += FACT_HEIGHT;
    }
  }

  @Override
  public Optional<String> bookmark() {
    return Optional.of(title.name());
  }
}
