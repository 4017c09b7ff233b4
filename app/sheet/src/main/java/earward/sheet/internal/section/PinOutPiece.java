package earward.sheet.internal.section;

import earward.sheet.content.PinOut;
import earward.sheet.content.PinOut.PinRow;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Lines;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import java.awt.Color;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * An integrated circuit from above, with what each pin is and where it leads. Packages with two
 * rows of pins count down on the left and up on the right; any other stands in one row.
 *
 * @param pinOut what
 * @param words of the sheet
 */
record PinOutPiece(PinOut pinOut, Words words) implements Piece {
  private static final float TWO_ROW_STEP = 21.5f;
  private static final float ONE_ROW_STEP = 14;
  private static final float BODY = 58;

  /** Room for what a pin is, where what it leads to stands in the same line. */
  private static final float ONE_ROW_FUNCTION = 120;

  private static final float LEG = 9;
  private static final float HEAD = 17;
  private static final int MOST_PINS = 40;

  private static final float WIDEST = 360;
  private static final Pattern COUNTED = Pattern.compile("-(\\d{1,3})$");
  private static final Pattern IN_TWO_ROWS = Pattern.compile("DI[PL]|SO");

  /** How many pins the package has by its name, or the highest that is known. */
  private int pins() {
    int highest = pinOut.pins().get(pinOut.pins().size() - 1).number();
    Matcher matcher = COUNTED.matcher(pinOut.packageName());
    int count = matcher.find() ? Integer.parseInt(matcher.group(1)) : 0;
    return count <= MOST_PINS ? Math.max(count, highest) : highest;
  }

  private boolean inTwoRows() {
    return IN_TWO_ROWS.matcher(pinOut.packageName()).find() && pins() % 2 == 0;
  }

  /** From pin to pin: two lines of text in two rows of pins, one where they stand in one. */
  private float step() {
    return inTwoRows() ? TWO_ROW_STEP : ONE_ROW_STEP;
  }

  private int rows() {
    return inTwoRows() ? pins() / 2 : pins();
  }

  @Override
  public float height(float width) {
    return HEAD + rows() * step() + 6;
  }

  @Override
  public float spaceAbove() {
    return 4;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    boolean two = inTwoRows();
    String head =
        words.text(
            two ? "pin-out.from-above" : "pin-out.from-front",
            "reference",
            pinOut.reference(),
            "type",
            pinOut.type(),
            "package",
            pinOut.packageName());
    canvas.text(Lines.cut(head, Style.STRONG, width), x, y + Style.STRONG.rise(), Style.STRONG);
    float wide = Math.min(width, WIDEST);
    float left = two ? x + (wide - BODY) / 2 : x;
    float top = y + HEAD;
    canvas.rounded(left, top, BODY, rows() * step(), 2, 0.9f, Color.WHITE);
    if (two) {
      canvas.polygon(notch(left + BODY / 2, top), 0.9f, false);
    } else {
      canvas.circle(left + 8, top + 8, 2.2f, 0.9f);
    }
    for (int i = 0; i < pins(); i++) {
      boolean onLeft = two && i < rows();
      int row = two && !onLeft ? pins() - 1 - i : i;
      pin(canvas, numbered(i + 1), onLeft, left, top + row * step() + step() / 2, x, wide);
    }
  }

  private PinRow numbered(int number) {
    return pinOut.pins().stream()
        .filter(pin -> pin.number() == number)
        .findFirst()
        .orElse(new PinRow(number, words.text("pin-out.unknown"), words.text("pin-out.look")));
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
    if (!inTwoRows()) {
      canvas.textToRight(number, body + BODY - 6, baseline, Style.BODY);
      canvas.text(function, end + 5, baseline, Style.STRONG);
      canvas.text(leadsTo, end + 5 + ONE_ROW_FUNCTION, baseline, Style.NOTE);
    } else if (onLeft) {
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
