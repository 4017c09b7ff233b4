package earward.drawing.internal.reading;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Dot;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.End;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Rule;
import earward.drawing.internal.element.Symbol;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.element.Wire;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Finds what lies over what. */
public final class OverlapReader {
  private static final double HAIR = 0.01;

  private final List<Dot> dots = new ArrayList<>();
  private final List<String> found = new ArrayList<>();

  private OverlapReader() {}

  /** The overlaps of a drawing and its missing dots, one sentence each. */
  public static List<String> read(List<Element> elements) {
    OverlapReader reader = new OverlapReader();
    elements.forEach(reader::keep);
    for (int i = 0; i < elements.size(); i++) {
      for (int k = i + 1; k < elements.size(); k++) {
        reader.compare(elements.get(i), elements.get(k));
      }
    }
    reader.found.addAll(DotReader.read(elements));
    return List.copyOf(reader.found);
  }

  private void keep(Element element) {
    if (element instanceof Dot dot) {
      dots.add(dot);
    }
  }

  private void compare(Element a, Element b) {
    if (a instanceof Dot || b instanceof Dot) {
      return;
    }
    if (a instanceof Text || b instanceof Text) {
      if (!owns(a, b) && !owns(b, a) && anyMeet(a, b)) {
        report(a, b);
      }
    } else if (a instanceof Rule || b instanceof Rule) {
      seam(a, b);
    } else {
      lines(a, b);
      if (anyMeet(a, b)) {
        report(a, b);
      }
    }
  }

  /** Whether a text stands within the outline of its own symbol or mark. */
  private static boolean owns(Element owner, Element text) {
    return text instanceof Text line
        && !line.inside().isEmpty()
        && name(owner).equals(line.inside());
  }

  private static boolean anyMeet(Element a, Element b) {
    for (Box one : solids(a)) {
      for (Box two : solids(b)) {
        boolean crossing = isLine(a, one) && isLine(b, two);
        if (!crossing && meets(one, two)) {
          return true;
        }
      }
    }
    return false;
  }

  private static boolean isLine(Element element, Box box) {
    return !(element instanceof Text) && (box.width() < HAIR || box.height() < HAIR);
  }

  /** The body, and each lead as a line without breadth. */
  private static List<Box> solids(Element element) {
    List<Box> all = new ArrayList<>();
    if (element instanceof Symbol symbol) {
      all.add(symbol.body());
      symbol.ends().forEach(end -> all.add(lead(end.x(), end.y(), symbol.body())));
    } else if (element instanceof Mark mark) {
      all.add(mark.body());
      all.add(lead(mark.x(), mark.y(), mark.body()));
    } else {
      all.add(element.bounds());
    }
    return all;
  }

  private static Box lead(double x, double y, Box body) {
    return Box.between(x, y, body.nearestX(x), body.nearestY(y));
  }

  private static List<Wire> wires(Element element) {
    if (element instanceof Wire wire) {
      return List.of(wire);
    }
    List<Wire> all = new ArrayList<>();
    for (Box box : solids(element)) {
      if (isLine(element, box) && box.width() + box.height() > HAIR) {
        all.add(new Wire(box.left(), box.top(), box.right(), box.bottom()));
      }
    }
    return all;
  }

  private void lines(Element a, Element b) {
    for (Wire one : wires(a)) {
      for (Wire two : wires(b)) {
        if (one.across() == two.across()) {
          boolean sameLine = one.across() ? one.y1() == two.y1() : one.x1() == two.x1();
          if (sameLine && stretch(one, two) > HAIR) {
            report(a, b);
          }
        } else if (endsInside(one, two) || endsInside(two, one)) {
          Wire across = one.across() ? one : two;
          Wire down = one.across() ? two : one;
          if (!dotAt(down.x1(), across.y1())) {
            found.add("a wire ends on another without a dot: " + place(a) + ", " + place(b));
          }
        } else if (crosses(one, two) && !(a instanceof Wire && b instanceof Wire)) {
          report(a, b);
        }
      }
    }
    endsOn(a, b);
    endsOn(b, a);
  }

  /** A wire that runs over the end of a symbol looks joined to it. */
  private void endsOn(Element a, Element b) {
    if (a instanceof Wire wire && b instanceof Symbol symbol) {
      for (End end : symbol.ends()) {
        if (inside(end.x(), end.y(), wire) && !dotAt(end.x(), end.y())) {
          found.add("a wire passes an end without a dot: " + end.name());
        }
      }
    }
  }

  private static boolean crosses(Wire a, Wire b) {
    Box one = a.bounds();
    Box two = b.bounds();
    return meets(one, two);
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
    return dots.stream().anyMatch(dot -> Math.hypot(dot.x() - x, dot.y() - y) < HAIR);
  }

  private void seam(Element a, Element b) {
    Element rule = a instanceof Rule ? a : b;
    Element other = a instanceof Rule ? b : a;
    if (other instanceof Symbol || other instanceof Mark) {
      if (solids(other).stream().anyMatch(box -> meets(rule.bounds(), box))) {
        report(a, b);
      }
    }
  }

  /** As {@link Box#overlaps}, but a line without breadth counts too. */
  private static boolean meets(Box a, Box b) {
    return a.left() < b.right() - HAIR
        && b.left() < a.right() - HAIR
        && a.top() < b.bottom() - HAIR
        && b.top() < a.bottom() - HAIR;
  }

  private void report(Element a, Element b) {
    found.add(place(a) + " lies over " + place(b));
  }

  private static String name(Element element) {
    if (element instanceof Symbol symbol) {
      return symbol.part();
    }
    return element instanceof Mark mark ? mark.kind() + " " + mark.name() : "";
  }

  private static String place(Element element) {
    Box box = element.bounds();
    String what =
        element instanceof Text text
            ? "text '" + text.text() + "'"
            : element instanceof Wire
                ? "a wire"
                : element instanceof Rule ? "a seam" : name(element);
    return String.format(Locale.ROOT, "%s at (%.0f, %.0f)", what, box.left(), box.top());
  }
}
