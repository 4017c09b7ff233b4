package earward.drawing.internal.element;

import java.awt.geom.AffineTransform;
import java.util.List;

/**
 * The symbol of one part.
 *
 * @param part {@code block.part}
 * @param ends where wires touch it
 * @param strokes its form, leads included
 * @param body the box of its form, leads left out
 */
public record Symbol(String part, List<End> ends, List<Stroke> strokes, Box body)
    implements Element {
  public Symbol {
    ends = List.copyOf(ends);
    strokes = List.copyOf(strokes);
  }

  @Override
  public Symbol moved(double dx, double dy) {
    AffineTransform by = AffineTransform.getTranslateInstance(dx, dy);
    return new Symbol(
        part,
        ends.stream().map(end -> end.moved(dx, dy)).toList(),
        strokes.stream().map(stroke -> stroke.transformed(by)).toList(),
        body.moved(dx, dy));
  }

  @Override
  public Box bounds() {
    Box all = body;
    for (End end : ends) {
      all = all.with(new Box(end.x(), end.y(), end.x(), end.y()));
    }
    return all;
  }
}
