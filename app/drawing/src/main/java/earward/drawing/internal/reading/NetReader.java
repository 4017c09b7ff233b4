package earward.drawing.internal.reading;

import earward.block.wiring.Nodes;
import earward.drawing.internal.element.Dot;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.End;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Symbol;
import earward.drawing.internal.element.Wire;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Reads the netlist from positions alone: wires that end at one place are joined, wires that cross
 * are joined where a dot lies on them, an end or mark belongs to the wire that ends at it, marks of
 * one name belong together.
 */
public final class NetReader {
  private final List<Wire> wires = new ArrayList<>();
  private final Map<Place, Integer> placeNets = new HashMap<>();
  private final List<Integer> parents = new ArrayList<>();
  private final Map<String, Integer> namedNets = new LinkedHashMap<>();

  private NetReader() {}

  /** A place to a thousandth of a point. */
  private record Place(long x, long y) {
    static Place of(double x, double y) {
      return new Place(Math.round(x * 1000), Math.round(y * 1000));
    }
  }

  /** The ends that are joined, by net. */
  public static SortedMap<String, SortedSet<String>> read(List<Element> elements) {
    return new NetReader().readAll(elements);
  }

  private SortedMap<String, SortedSet<String>> readAll(List<Element> elements) {
    for (Element element : elements) {
      if (element instanceof Wire wire) {
        wires.add(wire);
        join(at(wire.x1(), wire.y1()), at(wire.x2(), wire.y2()));
      }
    }
    for (Element element : elements) {
      if (element instanceof Dot dot) {
        joinThrough(dot);
      } else if (element instanceof Mark mark && mark.kind() != Mark.Kind.TEST_POINT) {
        join(at(mark.x(), mark.y()), named(mark));
      }
    }
    return collect(elements);
  }

  private SortedMap<String, SortedSet<String>> collect(List<Element> elements) {
    Map<Integer, SortedSet<String>> ends = new LinkedHashMap<>();
    for (Element element : elements) {
      if (element instanceof Symbol symbol) {
        for (End end : symbol.ends()) {
          int net = root(at(end.x(), end.y()));
          ends.computeIfAbsent(net, any -> new TreeSet<>()).add(end.name());
        }
      } else if (element instanceof Mark mark && mark.kind() == Mark.Kind.TEST_POINT) {
        int net = root(at(mark.x(), mark.y()));
        ends.computeIfAbsent(net, any -> new TreeSet<>()).add(mark.name());
      }
    }
    Map<Integer, String> sharedNames = new HashMap<>();
    namedNets.forEach(
        (name, net) -> {
          if (Nodes.isShared(name)) {
            sharedNames.merge(root(net), name, (one, two) -> one + "+" + two);
          }
        });
    SortedMap<String, SortedSet<String>> nets = new TreeMap<>();
    ends.forEach(
        (net, set) -> nets.put(sharedNames.getOrDefault(net, "net of " + set.first()), set));
    return nets;
  }

  private int named(Mark mark) {
    String key =
        switch (mark.kind()) {
          case GROUND -> Nodes.GROUND;
          case RAIL -> mark.name();
          case FLAG -> "flag " + mark.name();
          case CONTINUATION -> "row " + mark.name();
          case PORT, TEST_POINT -> "own " + mark.name() + " " + mark.x() + " " + mark.y();
        };
    return namedNets.computeIfAbsent(key, any -> fresh());
  }

  private void joinThrough(Dot dot) {
    int net = at(dot.x(), dot.y());
    for (Wire wire : wires) {
      if (lies(dot, wire)) {
        join(net, at(wire.x1(), wire.y1()));
      }
    }
  }

  private static boolean lies(Dot dot, Wire wire) {
    double hair = 0.001;
    var box = wire.bounds().grown(hair);
    return dot.x() >= box.left()
        && dot.x() <= box.right()
        && dot.y() >= box.top()
        && dot.y() <= box.bottom();
  }

  private int at(double x, double y) {
    return placeNets.computeIfAbsent(Place.of(x, y), any -> fresh());
  }

  private int fresh() {
    parents.add(parents.size());
    return parents.size() - 1;
  }

  private int root(int net) {
    int at = net;
    while (parents.get(at) != at) {
      at = parents.get(at);
    }
    return at;
  }

  private void join(int a, int b) {
    parents.set(root(a), root(b));
  }
}
