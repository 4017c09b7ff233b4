package earward.sheet.internal.section;

import earward.sheet.content.PinOut;
import earward.sheet.content.PinOut.PinRow;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import java.awt.Color;
import java.util.List;

/**
 * An integrated circuit from above, with what each pin is and where it leads. Packages with two
 * rows of pins count down on the left and up on the right; any other stands in one row.
 *
 * @param pinOut what
 * @param words of the sheet
 */
record PinOutPiece(PinOut pinOut, Words words) implements Piece {
  private static final float STEP = 24;
  private static final float BODY = 58;
  private static final float LEG = 9;
  private static final float HEAD = 17;

  private boolean inTwoRows() {
    return pinOut.packageName().contains("DIP") && pinOut.pins().size() % 2 == 0;
  }

  private int rows() {
    return inTwoRows() ? pinOut.pins().size() / 2 : pinOut.pins().size();
  }

  @Override
  public float height(float width) {
    return HEAD + rows() * STEP + 6;
  }

  @Override
  public float spaceAbove() {
    return 12;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    String head =
        words.text(
            inTwoRows() ? "pin-out.from-above" : "pin-out.from-front",
            "reference",
            pinOut.reference(),
            "type",
            pinOut.type(),
            "package",
            pinOut.packageName());
    canvas.text(Lines.cut(head, Style.STRONG, width), x, y + Style.STRONG.rise(), Style.STRONG);
    float left = inTwoRows() ? x + (width - BODY) / 2 : x + LEG;
    float top = y + HEAD;
    canvas.rounded(left, top, BODY, rows() * STEP, 2, 0.9f, Color.WHITE);
    canvas.polygon(notch(left + BODY / 2, top), 0.9f, false);
    List<PinRow> pins = pinOut.pins();
    for (int i = 0; i < pins.size(); i++) {
      boolean onLeft = inTwoRows() && i < rows();
      int row = inTwoRows() && !onLeft ? pins.size() - 1 - i : i;
      pin(canvas, pins.get(i), onLeft, left, top + row * STEP + STEP / 2, x, width);
    }
  }

  /** The half moon at the end where pin 1 is. */
  private static float[] notch(float x, float y) {
    float radius = 5;
    int steps = 12;
    float[] corners = new float[2 * (steps + 1)];
    for (int i = 0; i <= steps; i++) {
      double angle = Math.PI * i / steps;
      corners[2 * i] = (float) (x + radius * Math.cos(angle));
      corners[2 * i + 1] = (float) (y + radius * Math.sin(angle));
    }
    return corners;
  }

  private void pin(
      Canvas canvas, PinRow pin, boolean onLeft, float body, float y, float x, float width) {
    float edge = onLeft ? body : body + BODY;
    float end = onLeft ? edge - LEG : edge + LEG;
    canvas.line(edge, y, end, y, 1.6f, Tone.INK);
    String number = Integer.toString(pin.number());
    float baseline = y + 3.1f;
    float room = onLeft ? end - 5 - x : x + width - end - 5;
    String function = Lines.cut(pin.function(), Style.STRONG, room);
    String leads = pin.leadsTo().isEmpty() ? words.text("pin-out.open") : pin.leadsTo();
    String leadsTo = Lines.cut(leads, Style.NOTE, room);
    if (onLeft) {
      canvas.text(number, body + 6, baseline, Style.BODY);
      canvas.textToRight(function, end - 5, y - 1, Style.STRONG);
      canvas.textToRight(leadsTo, end - 5, y + 8.5f, Style.NOTE);
    } else {
      canvas.textToRight(number, body + BODY - 6, baseline, Style.BODY);
      canvas.text(function, end + 5, y - 1, Style.STRONG);
      canvas.text(leadsTo, end + 5, y + 8.5f, Style.NOTE);
    }
  }
}
