package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Sheet;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import java.util.Optional;

/**
 * The heading of a section, with its bookmark.
 *
 * @param title of the section
 * @param beginsPage whether it always begins a page
 */
record Heading(String title, boolean beginsPage) implements Piece {
  private static final float RULE = 1.6f;
  private static final float BELOW = 8;

  @Override
  public float height(float width) {
    return RULE + 5 + Style.HEADING.leading() + BELOW;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    canvas.fill(x, y, width, RULE, Tone.INK);
    canvas.text(title, x, y + RULE + 5 + Style.HEADING.rise(), Style.HEADING);
  }

  @Override
  public float spaceAbove() {
    return Sheet.TOP / 2;
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
