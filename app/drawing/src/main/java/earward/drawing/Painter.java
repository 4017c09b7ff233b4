package earward.drawing;

import earward.drawing.internal.element.Dot;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Rule;
import earward.drawing.internal.element.Stroke;
import earward.drawing.internal.element.Symbol;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.element.Wire;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.util.List;

/** Draws elements; used once, on one thread. */
final class Painter {
  private static final float SYMBOL_POINTS = 1.2f;
  private static final float WIRE_POINTS = 0.8f;
  private static final float BOLD_POINTS = 2.0f;
  private static final float SEAM_POINTS = 0.5f;
  private static final float[] SEAM_DASH = {2.5f, 2.5f};
  private static final float[] SCREEN_DASH = {4f, 2.5f};

  private final Graphics2D graphics;
  private final Ink ink;
  private final Font font;

  /** A painter of one drawing. */
  Painter(Graphics2D graphics, Ink ink, Font font) {
    this.graphics = (Graphics2D) graphics.create();
    this.ink = ink;
    this.font = font;
  }

  /** Draws them in order: seams first, then wires, symbols and text. */
  void paint(List<Element> elements) {
    graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    graphics.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    graphics.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    try {
      elements.forEach(this::paint);
    } finally {
      graphics.dispose();
    }
  }

  private void paint(Element element) {
    if (element instanceof Wire wire) {
      line(wire.x1(), wire.y1(), wire.x2(), wire.y2(), ink.wire(), solid(WIRE_POINTS));
    } else if (element instanceof Dot dot) {
      double radius = Dot.RADIUS_POINTS;
      graphics.setColor(ink.wire());
      graphics.fill(
          new Ellipse2D.Double(dot.x() - radius, dot.y() - radius, 2 * radius, 2 * radius));
    } else if (element instanceof Mark mark) {
      Color color = mark.kind() == Mark.Kind.TEST_POINT ? ink.testPoint() : ink.wire();
      mark.strokes().forEach(stroke -> stroke(stroke, color, ink.wire()));
    } else if (element instanceof Symbol symbol) {
      symbol.strokes().forEach(stroke -> stroke(stroke, ink.symbol(), ink.wire()));
    } else if (element instanceof Text text) {
      text(text);
    } else if (element instanceof Rule rule) {
      line(
          rule.x(),
          rule.top(),
          rule.x(),
          rule.bottom(),
          ink.quiet(),
          dashed(SEAM_POINTS, SEAM_DASH));
    }
  }

  private void line(double x1, double y1, double x2, double y2, Color color, BasicStroke pen) {
    graphics.setColor(color);
    graphics.setStroke(pen);
    graphics.draw(new Line2D.Double(x1, y1, x2, y2));
  }

  private void stroke(Stroke stroke, Color color, Color leadColor) {
    graphics.setColor(stroke.style() == Stroke.Style.LEAD ? leadColor : color);
    switch (stroke.style()) {
      case FILLED -> graphics.fill(stroke.shape());
      case LINE -> draw(stroke, solid(SYMBOL_POINTS));
      case LEAD -> draw(stroke, solid(WIRE_POINTS));
      case BOLD -> draw(stroke, solid(BOLD_POINTS));
      case DASHED -> draw(stroke, dashed(WIRE_POINTS, SCREEN_DASH));
    }
  }

  private void draw(Stroke stroke, BasicStroke pen) {
    graphics.setStroke(pen);
    graphics.draw(stroke.shape());
  }

  private void text(Text text) {
    boolean strong = text.role() == Text.Role.TITLE;
    graphics.setFont(font.deriveFont(strong ? Font.BOLD : Font.PLAIN, (float) text.sizePoints()));
    graphics.setColor(
        switch (text.role()) {
          case PIN -> ink.quiet();
          case TEST_POINT -> ink.testPoint();
          case REFERENCE, VALUE, TITLE, NET -> ink.text();
        });
    graphics.drawString(text.text(), (float) text.x(), (float) text.baseline());
  }

  private static BasicStroke solid(float width) {
    return new BasicStroke(width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
  }

  private static BasicStroke dashed(float width, float[] dash) {
    return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10, dash, 0);
  }
}
