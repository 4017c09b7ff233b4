package earward.drawing.internal.form;

import earward.drawing.internal.element.Stroke;
import earward.drawing.internal.element.Stroke.Style;
import java.awt.Shape;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** Collects the strokes of one form; used once. */
final class Pen {
  private final List<Stroke> strokes = new ArrayList<>();

  List<Stroke> strokes() {
    return strokes;
  }

  Pen add(Shape shape, Style style) {
    strokes.add(new Stroke(shape, style));
    return this;
  }

  Pen line(double x1, double y1, double x2, double y2) {
    return add(new Line2D.Double(x1, y1, x2, y2), Style.LINE);
  }

  Pen lead(double x1, double y1, double x2, double y2) {
    return add(new Line2D.Double(x1, y1, x2, y2), Style.LEAD);
  }

  Pen bold(double x1, double y1, double x2, double y2) {
    return add(new Line2D.Double(x1, y1, x2, y2), Style.BOLD);
  }

  Pen rectangle(double left, double top, double right, double bottom, Style style) {
    return add(new Rectangle2D.Double(left, top, right - left, bottom - top), style);
  }

  Pen circle(double x, double y, double radius, Style style) {
    return add(new Ellipse2D.Double(x - radius, y - radius, 2 * radius, 2 * radius), style);
  }

  /** Part of a circle; angles in degrees, 0 to the right, growing against the clock. */
  Pen arc(double x, double y, double radius, double start, double extent) {
    return add(
        new Arc2D.Double(x - radius, y - radius, 2 * radius, 2 * radius, start, extent, Arc2D.OPEN),
        Style.LINE);
  }

  /** A closed form through points given as x, y, x, y. */
  Pen closed(Style style, double... points) {
    Path2D path = new Path2D.Double();
    path.moveTo(points[0], points[1]);
    for (int i = 2; i < points.length; i += 2) {
      path.lineTo(points[i], points[i + 1]);
    }
    path.closePath();
    return add(path, style);
  }

  /** A filled arrow head whose tip is at a point, coming from another. */
  Pen arrow(double fromX, double fromY, double tipX, double tipY, double length) {
    double far = Math.hypot(tipX - fromX, tipY - fromY);
    double ux = (tipX - fromX) / far;
    double uy = (tipY - fromY) / far;
    double half = length * 0.38;
    double baseX = tipX - ux * length;
    double baseY = tipY - uy * length;
    return closed(
        Style.FILLED,
        tipX,
        tipY,
        baseX - uy * half,
        baseY + ux * half,
        baseX + uy * half,
        baseY - ux * half);
  }

  /** One period of a sine around a middle. */
  Pen sine(double x, double y, double halfWidth, double height) {
    Path2D path = new Path2D.Double();
    path.moveTo(x - halfWidth, y);
    path.curveTo(x - halfWidth * 0.6, y - 2 * height, x - halfWidth * 0.4, y - 2 * height, x, y);
    path.curveTo(
        x + halfWidth * 0.4, y + 2 * height, x + halfWidth * 0.6, y + 2 * height, x + halfWidth, y);
    return add(path, Style.LINE);
  }

  /** A plus sign. */
  Pen plus(double x, double y, double half) {
    return add(new Line2D.Double(x - half, y, x + half, y), Style.LEAD)
        .add(new Line2D.Double(x, y - half, x, y + half), Style.LEAD);
  }
}
