package earward.sheet.internal.page;

import com.lowagie.text.DocumentException;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfFormField;
import com.lowagie.text.pdf.PdfTemplate;
import com.lowagie.text.pdf.PdfWriter;
import com.lowagie.text.pdf.TextField;
import earward.sheet.internal.page.Style.Tone;
import java.awt.Graphics2D;
import java.io.IOException;
import java.util.function.Consumer;

/** One page to draw on: points of 1/72 inch, the origin at the upper left, y growing downwards. */
public final class Canvas {
  private final PdfContentByte content;
  private final float height;

  /**
   * A page.
   *
   * @param content the page's own
   * @param height of the paper
   */
  public Canvas(PdfContentByte content, float height) {
    this.content = content;
    this.height = height;
  }

  /** Sets a text with its left end at x. */
  public void text(String text, float x, float baseline, Style style) {
    float at = x;
    content.beginText();
    content.setColorFill(grey(style.tone()));
    for (Typeface.Run run : Typeface.runs(text, style.weight())) {
      content.setFontAndSize(run.face(), style.size());
      content.setTextMatrix(at, height - baseline);
      content.showText(run.text());
      at += run.face().getWidth(run.text()) * style.size() / 1000;
    }
    content.endText();
  }

  /** Sets a text with its right end at x. */
  public void textToRight(String text, float x, float baseline, Style style) {
    text(text, x - Typeface.width(text, style), baseline, style);
  }

  /** Sets a text with its middle at x. */
  public void textCentred(String text, float x, float baseline, Style style) {
    text(text, x - Typeface.width(text, style) / 2, baseline, style);
  }

  /** A straight line. */
  public void line(float x1, float y1, float x2, float y2, float points, Tone tone) {
    stroke(points, tone);
    content.moveTo(x1, height - y1);
    content.lineTo(x2, height - y2);
    content.stroke();
  }

  /** The outline of a rectangle. */
  public void frame(float x, float y, float width, float high, float points, Tone tone) {
    stroke(points, tone);
    content.rectangle(x, height - y - high, width, high);
    content.stroke();
  }

  /** A filled rectangle. */
  public void fill(float x, float y, float width, float high, Tone tone) {
    fill(x, y, width, high, grey(tone));
  }

  /** A filled rectangle. */
  public void fill(float x, float y, float width, float high, java.awt.Color color) {
    content.setColorFill(color);
    content.rectangle(x, height - y - high, width, high);
    content.fill();
  }

  /** A rectangle with round corners, filled and outlined. */
  public void rounded(
      float x, float y, float width, float high, float radius, float points, java.awt.Color fill) {
    stroke(points, Tone.INK);
    content.setColorFill(fill);
    content.roundRectangle(x, height - y - high, width, high, radius);
    content.fillStroke();
  }

  /** An ellipse, filled and outlined. */
  public void ellipse(
      float x, float y, float width, float high, float points, java.awt.Color fill) {
    stroke(points, Tone.INK);
    content.setColorFill(fill);
    content.ellipse(x, height - y - high, x + width, height - y);
    content.fillStroke();
  }

  /** A closed line through points given as x, y, x, y and so on. */
  public void polygon(float[] corners, float points, boolean filled) {
    stroke(points, Tone.INK);
    content.setColorFill(grey(Tone.INK));
    content.moveTo(corners[0], height - corners[1]);
    for (int i = 2; i < corners.length; i += 2) {
      content.lineTo(corners[i], height - corners[i + 1]);
    }
    if (filled) {
      content.closePathFillStroke();
    } else {
      content.closePathStroke();
    }
  }

  /** A circle's outline. */
  public void circle(float x, float y, float radius, float points) {
    stroke(points, Tone.INK);
    content.circle(x, height - y, radius);
    content.stroke();
  }

  /** A drawing as vectors, its upper left corner at x and y. */
  public void drawing(float x, float y, float width, float high, Consumer<Graphics2D> paint) {
    PdfTemplate template = content.createTemplate(width, high);
    Graphics2D graphics = Drawings.graphics(template, width, high);
    try {
      paint.accept(graphics);
    } finally {
      graphics.dispose();
    }
    content.addTemplate(template, x, height - y - high);
  }

  /** A form field of one line, to be filled in on the screen; its frame is drawn by others. */
  public void field(String name, String tip, float x, float y, float width, float high) {
    PdfWriter writer = content.getPdfWriter();
    Rectangle box = new Rectangle(x, height - y - high, x + width, height - y);
    TextField field = new TextField(writer, box, name);
    field.setFontSize(Style.BODY.size());
    field.setFont(Typeface.forFields());
    try {
      PdfFormField made = field.getTextField();
      made.setUserName(tip);
      writer.addAnnotation(made);
    } catch (IOException | DocumentException e) {
      throw new IllegalStateException("the field " + name + " cannot be made", e);
    }
  }

  private void stroke(float points, Tone tone) {
    content.setLineWidth(points);
    content.setColorStroke(grey(tone));
  }

  private static java.awt.Color grey(Tone tone) {
    return new java.awt.Color(tone.grey(), tone.grey(), tone.grey());
  }
}
