package earward.drawing.internal.route;

import earward.drawing.internal.element.Dot;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Wire;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Side;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.TreeMap;

/** The wires of one net as cells and steps between them; gives straight wires and dots. */
final class Wires {
  private final Maze maze;
  private final TreeMap<Integer, BitSet> steps = new TreeMap<>();
  private final TreeMap<Integer, Integer> contacts = new TreeMap<>();

  Wires(Maze maze) {
    this.maze = maze;
  }

  void contact(int cell) {
    contacts.merge(cell, 1, Integer::sum);
  }

  void step(int from, int to) {
    for (Side side : Side.values()) {
      if (maze.step(from, side) == to) {
        sides(from).set(side.number());
        sides(to).set(side.opposite().number());
      }
    }
  }

  private BitSet sides(int cell) {
    return steps.computeIfAbsent(cell, any -> new BitSet(4));
  }

  /** Adds wires, broken at every contact, corner and joint, and a dot where three meet. */
  void addTo(List<Element> elements) {
    List<Element> dots = new ArrayList<>();
    steps.forEach(
        (cell, sides) -> {
          for (Side side : new Side[] {Side.RIGHT, Side.DOWN}) {
            boolean begins = sides.get(side.number());
            if (begins && (breaks(cell) || !sides.get(side.opposite().number()))) {
              elements.add(wire(cell, side));
            }
          }
          if (sides.cardinality() + contacts.getOrDefault(cell, 0) > 2) {
            dots.add(new Dot(Grid.points(maze.x(cell)), Grid.points(maze.y(cell))));
          }
        });
    elements.addAll(dots);
  }

  private boolean breaks(int cell) {
    BitSet sides = sides(cell);
    boolean straight =
        sides.cardinality() == 2
            && (sides.get(Side.LEFT.number()) == sides.get(Side.RIGHT.number()));
    return contacts.containsKey(cell) || !straight;
  }

  private Wire wire(int from, Side side) {
    int at = maze.step(from, side);
    while (!breaks(at)) {
      at = maze.step(at, side);
    }
    return new Wire(
        Grid.points(maze.x(from)),
        Grid.points(maze.y(from)),
        Grid.points(maze.x(at)),
        Grid.points(maze.y(at)));
  }
}
