package earward.drawing.internal.place;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.End;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Stroke;
import earward.drawing.internal.element.Symbol;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lead;
import java.awt.geom.AffineTransform;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * A form in its place.
 *
 * @param form symbol or mark
 * @param x of its origin in cells
 * @param y of its origin in cells
 * @param name the part's key, or the mark's name
 * @param kind empty for a part
 * @param nets the net at each of its leads that is connected
 */
public record Placed(
    Form form, int x, int y, String name, Optional<Mark.Kind> kind, Map<String, String> nets) {
  public Placed {
    // in one order always, so that the same circuit gives the same drawing
    nets = Collections.unmodifiableMap(new TreeMap<>(nets));
  }

  static Placed mark(Mark.Kind kind, String name, Form form, int x, int y, String net) {
    return new Placed(form, x, y, name, Optional.of(kind), Map.of("", net));
  }

  /** The same elsewhere. */
  public Placed moved(int dx, int dy) {
    return new Placed(form, x + dx, y + dy, name, kind, nets);
  }

  /** What nothing else may enter, in points. */
  public List<Box> footprint(double spacing) {
    double dx = Grid.points(x);
    double dy = Grid.points(y);
    return form.footprint(spacing).stream().map(box -> box.moved(dx, dy)).toList();
  }

  /** The leads that are connected, in their place. */
  public List<Lead> ends() {
    return form.leads().stream()
        .filter(lead -> nets.containsKey(lead.name()))
        .map(lead -> new Lead(lead.name(), lead.x() + x, lead.y() + y, lead.side()))
        .toList();
  }

  /** What it is on the drawing. */
  public List<Element> elements() {
    double dx = Grid.points(x);
    double dy = Grid.points(y);
    AffineTransform by = AffineTransform.getTranslateInstance(dx, dy);
    List<Stroke> strokes = form.strokes().stream().map(s -> s.transformed(by)).toList();
    Box body = form.body().moved(dx, dy);
    List<Element> all = new ArrayList<>();
    if (kind.isPresent()) {
      all.add(new Mark(kind.get(), name, dx, dy, strokes, body));
    } else {
      List<End> ends =
          ends().stream()
              .map(
                  lead ->
                      new End(
                          name + ":" + lead.name(), Grid.points(lead.x()), Grid.points(lead.y())))
              .toList();
      all.add(new Symbol(name, ends, strokes, body));
    }
    form.texts().forEach(text -> all.add(text.moved(dx, dy)));
    return all;
  }
}
