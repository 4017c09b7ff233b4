package earward.drawing.internal.page;

import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.element.Text.Role;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lettering;
import earward.drawing.internal.form.Signs;
import earward.drawing.internal.place.Placed;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A mark at a wire that a row begins or ends with. Its origin is the end of the wire.
 *
 * @param kind what it says
 * @param name of the continuation or node
 * @param form drawn with its wire end at the origin
 * @param row of the wire below the first one, in cells
 * @param notes lines under it
 */
record Cap(Mark.Kind kind, String name, Form form, int row, List<Text> notes) {
  private static final double MOST_NOTE_POINTS = 60;

  Cap {
    notes = List.copyOf(notes);
  }

  static Cap port(boolean atLeft, String name, int row) {
    return new Cap(Mark.Kind.PORT, name, Signs.port(atLeft), row, List.of());
  }

  static Cap node(String name, int row, Lettering lettering) {
    Form form = Signs.tag(name, Mark.Kind.FLAG + " " + name, true, lettering);
    return new Cap(Mark.Kind.FLAG, name, form, row, List.of());
  }

  static Cap continuation(
      boolean atLeft, String letter, String note, int row, Lettering lettering) {
    Form form = Signs.tag(letter, Mark.Kind.CONTINUATION + " " + letter, atLeft, lettering);
    List<Text> notes = new ArrayList<>();
    double baseline = form.body().bottom() + Lettering.LINE_POINTS;
    for (String line : lettering.wrapped(note, MOST_NOTE_POINTS, Role.NET)) {
      notes.add(
          atLeft
              ? lettering.endingAt(line, -2, baseline, Role.NET, "")
              : lettering.at(line, 2, baseline, Role.NET, ""));
      baseline += Lettering.LINE_POINTS;
    }
    return new Cap(Mark.Kind.CONTINUATION, letter, form, row, notes);
  }

  double width() {
    double widest = Math.max(Math.abs(form.body().left()), form.body().right());
    for (Text note : notes) {
      widest = Math.max(widest, Math.max(-note.box().left(), note.box().right()));
    }
    return widest + 1;
  }

  /** What it is on the drawing, its wire ending at a place in points. */
  List<Element> elements(double x, double y) {
    List<Element> all = new ArrayList<>();
    Placed sign = new Placed(form, 0, 0, name, Optional.of(kind), Map.of());
    sign.elements().forEach(element -> all.add(element.moved(x, y)));
    notes.forEach(note -> all.add(note.moved(x, y)));
    return all;
  }

  /** The lowest point below the wire of row 0, in points. */
  double bottom() {
    double lowest = form.body().bottom();
    for (Text note : notes) {
      lowest = Math.max(lowest, note.box().bottom());
    }
    return Grid.points(row) + lowest;
  }
}
