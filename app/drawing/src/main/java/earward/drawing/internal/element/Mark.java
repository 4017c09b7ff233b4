package earward.drawing.internal.element;

import java.awt.geom.AffineTransform;
import java.util.List;

/**
 * A sign that gives a net a name or takes it elsewhere, hung on one point.
 *
 * @param kind what it says
 * @param name of the net, of the continuation, of the test point or of the port
 * @param x where it touches the wire
 * @param y where it touches the wire
 * @param strokes its form
 * @param body the box of its form
 */
public record Mark(Kind kind, String name, double x, double y, List<Stroke> strokes, Box body)
    implements Element {
  /** What a mark says. */
  public enum Kind {
    GROUND,
    RAIL,
    /** The same name stands elsewhere, and the two are one net. */
    FLAG,
    /** The row goes on at the mark of the same name. */
    CONTINUATION,
    TEST_POINT,
    /** The block's open end. */
    PORT
  }

  public Mark {
    strokes = List.copyOf(strokes);
  }

  @Override
  public Mark moved(double dx, double dy) {
    AffineTransform by = AffineTransform.getTranslateInstance(dx, dy);
    return new Mark(
        kind,
        name,
        x + dx,
        y + dy,
        strokes.stream().map(stroke -> stroke.transformed(by)).toList(),
        body.moved(dx, dy));
  }

  @Override
  public Box bounds() {
    return body;
  }
}
