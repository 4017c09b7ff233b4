package earward.drawing.internal.place;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.form.Grid;
import java.util.ArrayList;
import java.util.List;

/**
 * Forms that are placed together, around one origin, with the stretches of wire that must stay free
 * of symbols.
 *
 * @param pieces the forms
 * @param wires boxes in points
 */
record Cluster(List<Placed> pieces, List<Box> wires) {
  private static final double WIRE_GAP = 2;

  /** So far down that nothing stands below. */
  static final double FAR_POINTS = 1e5;

  Cluster {
    pieces = List.copyOf(pieces);
    wires = List.copyOf(wires);
  }

  static Cluster of(Placed piece) {
    return new Cluster(List.of(piece), List.of());
  }

  Cluster with(Placed piece) {
    List<Placed> more = new ArrayList<>(pieces);
    more.add(piece);
    return new Cluster(more, wires);
  }

  /** With a wire straight down, in cells. */
  Cluster withWireDown(int x, int top, int bottom) {
    return withWire(column(x, Grid.points(top), Grid.points(bottom)));
  }

  /** With a wire down to the line of grounds. */
  Cluster withWireToGround(int x, int top) {
    return withWire(column(x, Grid.points(top), FAR_POINTS));
  }

  private Cluster withWire(Box box) {
    List<Box> more = new ArrayList<>(wires);
    more.add(box);
    return new Cluster(pieces, more);
  }

  private static Box column(int x, double top, double bottom) {
    double middle = Grid.points(x);
    return new Box(middle - WIRE_GAP, top, middle + WIRE_GAP, Math.max(top, bottom));
  }

  Cluster moved(int dx, int dy) {
    return new Cluster(
        pieces.stream().map(piece -> piece.moved(dx, dy)).toList(),
        wires.stream().map(box -> box.moved(Grid.points(dx), Grid.points(dy))).toList());
  }
}
