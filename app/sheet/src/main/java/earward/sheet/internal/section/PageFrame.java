package earward.sheet.internal.section;

import earward.block.check.Severity;
import earward.sheet.content.KitTitle;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Sheet;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import earward.sheet.internal.page.Style.Weight;
import earward.sheet.internal.page.Typeface;

/** What stands on every page: its foot, and the mark of a design that must not be built. */
public final class PageFrame {
  private static final Style FOOT = Style.LABEL;
  private static final float BAND_TOP = 20;
  private static final float BAND = 20;

  private final SheetContent content;
  private final Sheet sheet;
  private final Words words;

  /** The frame of all pages of a sheet. */
  public PageFrame(SheetContent content, Sheet sheet, Words words) {
    this.content = content;
    this.sheet = sheet;
    this.words = words;
  }

  /** Draws it on one page. */
  public void draw(Canvas canvas, int page, int pages) {
    if (content.stopped()) {
      band(canvas);
    }
    foot(canvas, page, pages);
  }

  private void band(Canvas canvas) {
    canvas.fill(Sheet.SIDE, BAND_TOP, sheet.contentWidth(), BAND, Tone.INK);
    Style strong = new Style(12, Weight.BOLD, Tone.PAPER);
    String mark = words.text("stop.mark");
    canvas.text(mark, Sheet.SIDE + 10, BAND_TOP + 14.3f, strong);
    Style small = new Style(8, Weight.REGULAR, Tone.PAPER);
    float room = sheet.contentWidth() - 40 - Typeface.width(mark, strong);
    String why = Lines.cut(words.text("stop.why", "count", stops()), small, room);
    canvas.textToRight(why, Sheet.SIDE + sheet.contentWidth() - 10, BAND_TOP + 13, small);
  }

  private String stops() {
    long count = content.findings().stream().filter(f -> f.severity() == Severity.STOP).count();
    return Long.toString(count);
  }

  private void foot(Canvas canvas, int page, int pages) {
    float top = sheet.height() - Sheet.BOTTOM + 16;
    float left = Sheet.SIDE;
    float right = left + sheet.contentWidth();
    canvas.line(left, top, right, top, 0.5f, Tone.INK);
    float baseline = top + 11;
    String count =
        words.text("foot.page", "page", Integer.toString(page), "pages", Integer.toString(pages));
    canvas.textToRight(count, right, baseline, FOOT);
    KitTitle title = content.title();
    String which =
        words.text(
            content.stopped() ? "foot.kit-stopped" : "foot.kit",
            "revision",
            Lines.cut(title.revision(), FOOT, 80),
            "digest",
            title.digest());
    float whichWidth = Typeface.width(which, FOOT);
    float room = sheet.contentWidth() - Typeface.width(count, FOOT) - whichWidth - 30;
    Style strong = FOOT.strong().in(Tone.INK);
    String name = Lines.cut(title.name(), strong, room);
    canvas.text(name, left, baseline, strong);
    canvas.text(which, left + Typeface.width(name, strong) + 8, baseline, FOOT);
  }
}
