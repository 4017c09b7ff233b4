package earward.drawing.internal.reading;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Dot;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Rule;
import earward.drawing.internal.element.Symbol;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.element.Wire;
import java.util.ArrayList;
import java.util.List;

/** Finds what lies over what. */
public final class OverlapReader {
  private static final double HAIR = 0.01;

  private final List<Element> elements;
  private final List<String> found = new ArrayList<>();

  private OverlapReader(List<Element> elements) {
    this.elements = elements;
  }

  /** The overlaps of a drawing, one sentence each. */
  public static List<String> read(List<Element> elements) {
    OverlapReader reader = new OverlapReader(elements);
    for (int i = 0; i < elements.size(); i++) {
      for (int k = i + 1; k < elements.size(); k++) {
        reader.compare(elements.get(i), elements.get(k));
      }
    }
    return List.copyOf(reader.found);
  }

  private void compare(Element a, Element b) {
    if (a instanceof Dot || b instanceof Dot) {
      return;
    }
    if (a instanceof Wire one && b instanceof Wire two) {
      wires(one, two);
    } else if (a instanceof Rule || b instanceof Rule) {
      seam(a, b);
    } else if (a instanceof Text || b instanceof Text) {
      text(a, b);
    } else {
      bodies(a, b);
    }
  }

  private void wires(Wire a, Wire b) {
    if (a.across() == b.across()) {
      boolean sameLine = a.across() ? a.y1() == b.y1() : a.x1() == b.x1();
      if (sameLine && stretch(a, b) > HAIR) {
        report(a, b);
      }
    } else if (endsInside(a, b) || endsInside(b, a)) {
      Wire across = a.across() ? a : b;
      Wire down = a.across() ? b : a;
      if (!dotAt(down.x1(), across.y1())) {
        found.add("a wire ends on another without a dot: " + name(a) + ", " + name(b));
      }
    }
  }

  private static double stretch(Wire a, Wire b) {
    Box one = a.bounds();
    Box two = b.bounds();
    return a.across()
        ? Math.min(one.right(), two.right()) - Math.max(one.left(), two.left())
        : Math.min(one.bottom(), two.bottom()) - Math.max(one.top(), two.top());
  }

  private static boolean endsInside(Wire a, Wire b) {
    return inside(a.x1(), a.y1(), b) || inside(a.x2(), a.y2(), b);
  }

  private static boolean inside(double x, double y, Wire wire) {
    Box box = wire.bounds();
    return wire.across()
        ? Math.abs(y - box.top()) < HAIR && x > box.left() + HAIR && x < box.right() - HAIR
        : Math.abs(x - box.left()) < HAIR && y > box.top() + HAIR && y < box.bottom() - HAIR;
  }

  private boolean dotAt(double x, double y) {
    return elements.stream()
        .anyMatch(e -> e instanceof Dot dot && Math.hypot(dot.x() - x, dot.y() - y) < HAIR);
  }

  private void seam(Element a, Element b) {
    Element other = a instanceof Rule ? b : a;
    if (other instanceof Symbol || other instanceof Text) {
      Element rule = a instanceof Rule ? a : b;
      Box box = other instanceof Symbol symbol ? symbol.body() : other.bounds();
      if (meets(rule.bounds(), box)) {
        report(a, b);
      }
    }
  }

  private void text(Element a, Element b) {
    if (a instanceof Text one && b instanceof Text two) {
      if (one.box().overlaps(two.box())) {
        report(a, b);
      }
      return;
    }
    Text text = (Text) (a instanceof Text ? a : b);
    Element other = a instanceof Text ? b : a;
    if (owner(other).equals(text.inside())) {
      return;
    }
    if (meets(text.box(), other.bounds())) {
      report(a, b);
    }
  }

  private void bodies(Element a, Element b) {
    if (meets(body(a), body(b)) && !touchesAtItsPoint(a, b) && !touchesAtItsPoint(b, a)) {
      report(a, b);
    }
  }

  /** A wire may lie on the box of a mark only where the mark hangs on it. */
  private static boolean touchesAtItsPoint(Element wire, Element mark) {
    if (!(wire instanceof Wire piece) || !(mark instanceof Mark hung)) {
      return false;
    }
    return inside(hung.x(), hung.y(), piece)
        || (Math.abs(piece.x1() - hung.x()) < HAIR && Math.abs(piece.y1() - hung.y()) < HAIR)
        || (Math.abs(piece.x2() - hung.x()) < HAIR && Math.abs(piece.y2() - hung.y()) < HAIR);
  }

  private static Box body(Element element) {
    return element instanceof Symbol symbol ? symbol.body() : element.bounds();
  }

  /** As {@link Box#overlaps}, but a line without breadth counts too. */
  private static boolean meets(Box a, Box b) {
    return a.left() < b.right() - HAIR
        && b.left() < a.right() - HAIR
        && a.top() < b.bottom() - HAIR
        && b.top() < a.bottom() - HAIR;
  }

  private static String owner(Element element) {
    if (element instanceof Symbol symbol) {
      return symbol.part();
    }
    return element instanceof Mark mark ? mark.kind() + " " + mark.name() : "";
  }

  private void report(Element a, Element b) {
    found.add(name(a) + " lies over " + name(b));
  }

  private static String name(Element element) {
    Box box = element.bounds();
    String place = String.format(java.util.Locale.ROOT, " at (%.0f, %.0f)", box.left(), box.top());
    if (element instanceof Text text) {
      return "text '" + text.text() + "'" + place;
    }
    if (element instanceof Symbol symbol) {
      return "symbol " + symbol.part() + place;
    }
    if (element instanceof Mark mark) {
      return "mark " + mark.kind() + " " + mark.name() + place;
    }
    return (element instanceof Wire ? "wire" : "seam") + place;
  }
}
