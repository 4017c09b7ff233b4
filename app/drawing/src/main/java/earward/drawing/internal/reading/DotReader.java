package earward.drawing.internal.reading;

import earward.drawing.internal.element.Dot;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Symbol;
import earward.drawing.internal.element.Wire;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/** Finds places where three or more lines end together and no dot says so. */
final class DotReader {
  private final Map<String, Integer> ends = new TreeMap<>();
  private final Set<String> dots = new HashSet<>();

  private DotReader() {}

  static List<String> read(List<Element> elements) {
    DotReader reader = new DotReader();
    elements.forEach(reader::count);
    List<String> missing = new ArrayList<>();
    reader.ends.forEach(
        (place, count) -> {
          if (count > 2 && !reader.dots.contains(place)) {
            missing.add(count + " lines meet without a dot at " + place);
          }
        });
    return missing;
  }

  private void count(Element element) {
    if (element instanceof Wire wire) {
      end(wire.x1(), wire.y1());
      end(wire.x2(), wire.y2());
    } else if (element instanceof Symbol symbol) {
      symbol.ends().forEach(end -> end(end.x(), end.y()));
    } else if (element instanceof Mark mark) {
      end(mark.x(), mark.y());
    } else if (element instanceof Dot dot) {
      dots.add(place(dot.x(), dot.y()));
    }
  }

  private void end(double x, double y) {
    ends.merge(place(x, y), 1, Integer::sum);
  }

  private static String place(double x, double y) {
    return String.format(Locale.ROOT, "(%.2f, %.2f)", x, y);
  }
}
