package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import java.util.List;
import java.util.Optional;

/**
 * The heading of a section, with its bookmark.
 *
 * @param title of the section
 * @param beginsPage whether it always begins a page
 * @param together how many pieces after it should stand on its page
 */
record Heading(String title, boolean beginsPage, int together) implements Piece {
  private static final float RULE = 1.6f;
  private static final float BELOW = 6;

  Heading(String title, boolean beginsPage) {
    this(title, beginsPage, 0);
  }

  /** The heading of a section that stands on one page where one page can hold it. */
  Heading keepingTogether(int pieces) {
    return new Heading(title, beginsPage, pieces);
  }

  @Override
  public float height(float width) {
    return RULE + 5 + lines(width).size() * Style.HEADING.leading() + BELOW;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    canvas.fill(x, y, width, RULE, Tone.INK);
    float baseline = y + RULE + 5 + Style.HEADING.rise();
    for (String line : lines(width)) {
      canvas.text(line, x, baseline, Style.HEADING);
      baseline += Style.HEADING.leading();
    }
  }

  private List<String> lines(float width) {
    return Lines.of(title, Style.HEADING, width);
  }

  @Override
  public float spaceAbove() {
    return 20;
  }

  @Override
  public boolean keptWithNext() {
    return true;
  }

  @Override
  public Optional<String> bookmark() {
    return Optional.of(title);
  }
}
