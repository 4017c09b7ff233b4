package earward.sheet.internal.section;

import earward.kit.parts.BandColour;
import earward.sheet.content.PartMarking.Body;
import earward.sheet.content.PartMarking.Printed;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Style.Tone;
import earward.sheet.internal.page.Typeface;
import java.awt.Color;
import java.util.List;

/** Small pictures of parts as they lie on the bench. */
final class PartPicture {
  /** Of all of them. */
  static final float HEIGHT = 14;

  private static final float LINE = 0.6f;
  private static final float LEAD = 8;
  private static final float BAND = 4;
  private static final Color PALE = new Color(0xf4f0e6);
  private static final Color PAPER = Color.WHITE;

  private PartPicture() {}

  /** A resistor with its bands; the last of four or five stands apart, as on the part. */
  static void resistor(Canvas canvas, float x, float y, float width, List<BandColour> colours) {
    leads(canvas, x, y, width);
    float body = width - 2 * LEAD;
    canvas.rounded(x + LEAD, y + 1, body, HEIGHT - 2, 3.5f, LINE, PALE);
    boolean apart = colours.size() > 3;
    int near = apart ? colours.size() - 1 : colours.size();
    float step = near > 3 ? 6.6f : 7.6f;
    for (int i = 0; i < near; i++) {
      band(canvas, x + LEAD + 5 + i * step, y, colours.get(i));
    }
    if (apart) {
      band(canvas, x + LEAD + body - 5 - BAND, y, colours.get(near));
    }
  }

  private static void band(Canvas canvas, float x, float y, BandColour colour) {
    canvas.fill(x, y + 1, BAND, HEIGHT - 2, colourOf(colour));
    canvas.frame(x, y + 1, BAND, HEIGHT - 2, 0.35f, Tone.INK);
  }

  /** A body with a print. */
  static void printed(Canvas canvas, float x, float y, float width, Printed printed) {
    Body body = printed.body();
    boolean onLeads = body != Body.INTEGRATED_CIRCUIT && body != Body.OTHER;
    float inset = onLeads ? LEAD : 2;
    float left = x + inset;
    float wide = width - 2 * inset;
    if (onLeads) {
      leads(canvas, x, y, width);
    }
    if (body == Body.CERAMIC_CAPACITOR) {
      canvas.ellipse(left, y, wide, HEIGHT, LINE, PAPER);
    } else {
      canvas.rounded(left, y + 0.5f, wide, HEIGHT - 1, radius(body), LINE, PAPER);
    }
    float taken = decorate(canvas, body, left, y, wide);
    boolean fits = Typeface.width(printed.print(), Style.PRINT) <= wide - taken - 3;
    String print = fits ? printed.print() : "";
    float middle = body == Body.INTEGRATED_CIRCUIT ? taken / 2 : -taken / 2;
    canvas.textCentred(print, left + wide / 2 + middle, y + 9.6f, Style.PRINT);
  }

  private static float radius(Body body) {
    return switch (body) {
      case FILM_CAPACITOR, OTHER -> 1.5f;
      case ELECTROLYTIC_CAPACITOR, DIODE -> 2.5f;
      case INTEGRATED_CIRCUIT, CERAMIC_CAPACITOR -> 1;
    };
  }

  /** What tells which way round a part goes; gives how much of the body it takes. */
  private static float decorate(Canvas canvas, Body body, float left, float y, float wide) {
    switch (body) {
      case ELECTROLYTIC_CAPACITOR -> {
        float stripe = 8;
        float at = left + wide - stripe - 1.5f;
        canvas.fill(at, y + 1, stripe, HEIGHT - 2, Tone.DARK);
        canvas.line(at + 2, y + HEIGHT / 2, at + stripe - 2, y + HEIGHT / 2, 1.2f, Tone.PAPER);
        return stripe + 1;
      }
      case DIODE -> {
        canvas.fill(left + wide - 8, y + 0.5f, 4, HEIGHT - 1, Tone.INK);
        return 8;
      }
      case INTEGRATED_CIRCUIT -> {
        canvas.circle(left + 4, y + HEIGHT - 4, 1.4f, LINE);
        return 6;
      }
      case FILM_CAPACITOR, CERAMIC_CAPACITOR, OTHER -> {
        return 0;
      }
    }
    throw new IllegalStateException("no picture of " + body);
  }

  private static void leads(Canvas canvas, float x, float y, float width) {
    float middle = y + HEIGHT / 2;
    canvas.line(x, middle, x + width, middle, 0.9f, Tone.DARK);
  }

  /** Colours of print that stay apart on a screen and on a colour printer. */
  private static Color colourOf(BandColour colour) {
    return switch (colour) {
      case PINK -> new Color(0xf2a6c0);
      case SILVER -> new Color(0xc3c7cb);
      case GOLD -> new Color(0xc79a2b);
      case BLACK -> new Color(0x111111);
      case BROWN -> new Color(0x7a3f16);
      case RED -> new Color(0xd0232b);
      case ORANGE -> new Color(0xf08019);
      case YELLOW -> new Color(0xf6d51f);
      case GREEN -> new Color(0x2f8f3e);
      case BLUE -> new Color(0x2458b3);
      case VIOLET -> new Color(0x7b3fa0);
      case GREY -> new Color(0x85898c);
      case WHITE -> new Color(0xffffff);
    };
  }
}
