package earward.drawing.internal.place;

import earward.block.wiring.Nodes;
import earward.drawing.internal.element.Box;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lead;
import earward.drawing.internal.form.Lettering;
import earward.drawing.internal.form.Side;
import java.awt.Point;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** One block while it is being laid out: what stands where, and what is still to come. */
final class Board {
  /** The farthest column that is tried. */
  static final int MOST_CELLS = 400;

  private static final double LANE_GAP = 2;
  private static final int REACH = 40;

  final BlockTask task;
  final Lettering lettering;
  final Set<Part> pending;
  final List<Placed> placed = new ArrayList<>();
  final Map<String, Spot> spots = new HashMap<>();

  private final double spacing;
  private final List<Box> solids = new ArrayList<>();
  private final List<Box> verticals = new ArrayList<>();
  private final List<Lane> lanes = new ArrayList<>();
  private final Map<Point, String> ends = new HashMap<>();
  private int recentX = 2;

  /** A stretch of wire along a row. */
  private record Lane(String net, Box box) {}

  Board(BlockTask task, Lettering lettering, double spacing) {
    this.task = task;
    this.lettering = lettering;
    this.spacing = spacing;
    this.pending = new LinkedHashSet<>(task.parts());
  }

  /** Whether the net is shown by a mark at each of its ends rather than by one wire. */
  boolean marked(String net) {
    return net.equals(Nodes.GROUND) || (Nodes.isRail(net) && !task.lanes().contains(net));
  }

  String railName(String net) {
    return task.railNames().getOrDefault(net, net);
  }

  /** Whether something is still to come at the net. */
  boolean needed(String net) {
    return task.exit().contains(net) || pending.stream().anyMatch(part -> part.touches(net));
  }

  @Nullable Spot spot(String net) {
    return spots.get(net);
  }

  /** The column from which parts that hang on nothing are tried. */
  int recentX() {
    return recentX;
  }

  /** The column right of all that stands. */
  int frontier() {
    return Grid.cellsFor(solids.stream().mapToDouble(Box::right).max().orElse(0));
  }

  /** A row for something that hangs on nothing that is placed. */
  int freshRow() {
    OptionalInt lowest = spots.values().stream().filter(s -> s.lane).mapToInt(s -> s.y).max();
    return lowest.isPresent() ? lowest.getAsInt() + 12 : 0;
  }

  /** The lowest row below a start along which a foreign wire passes a column. */
  OptionalInt lowestLane(int x, int from, Set<String> own) {
    return crossing(x, own).stream().filter(y -> y > from).mapToInt(y -> y).max();
  }

  /** The highest row above a start along which a foreign wire passes a column. */
  OptionalInt highestLane(int x, int from, Set<String> own) {
    return crossing(x, own).stream().filter(y -> y < from).mapToInt(y -> y).min();
  }

  private List<Integer> crossing(int x, Set<String> own) {
    List<Integer> rows = new ArrayList<>();
    double at = Grid.points(x);
    for (Lane lane : lanes) {
      if (!own.contains(lane.net) && lane.box.left() < at && lane.box.right() > at) {
        rows.add((int) Math.round((lane.box.top() + LANE_GAP) / Grid.CELL_POINTS));
      }
    }
    spots.forEach(
        (net, spot) -> {
          if (spot.lane && spot.x <= x && !own.contains(net) && needed(net)) {
            rows.add(spot.y);
          }
        });
    return rows;
  }

  /** Whether the cluster has all its room to itself. */
  boolean fits(Cluster cluster) {
    for (Placed piece : cluster.pieces()) {
      if (!fits(piece)) {
        return false;
      }
    }
    return cluster.wires().stream()
        .noneMatch(wire -> meets(wire, solids) || meets(wire, verticals));
  }

  /** Whether no end of it stands where an end of another net stands. */
  private boolean meetsNoOther(Placed piece) {
    for (Lead lead : piece.ends()) {
      String there = ends.get(new Point(lead.x(), lead.y()));
      if (there != null && !there.equals(piece.nets().get(lead.name()))) {
        return false;
      }
    }
    return true;
  }

  private boolean fits(Placed piece) {
    if (!meetsNoOther(piece)) {
      return false;
    }
    Form form = piece.form();
    List<Box> boxes = piece.footprint(spacing);
    int firstLead = 1 + form.texts().size();
    for (int i = 0; i < boxes.size(); i++) {
      Box box = boxes.get(i);
      if (box.left() < Grid.CELL_POINTS || meets(box, solids) || meets(box, verticals)) {
        return false;
      }
      for (Lane lane : lanes) {
        boolean ownLead = i >= firstLead && piece.nets().containsValue(lane.net);
        if (!ownLead && box.overlaps(lane.box)) {
          return false;
        }
      }
    }
    return spots.entrySet().stream()
        .filter(e -> e.getValue().lane && !piece.nets().containsValue(e.getKey()))
        .filter(e -> needed(e.getKey()))
        .noneMatch(e -> meets(openLane(e.getValue()), boxes));
  }

  private static Box openLane(Spot spot) {
    double y = Grid.points(spot.y);
    return new Box(Grid.points(spot.x), y - LANE_GAP, Cluster.FAR_POINTS, y + LANE_GAP);
  }

  /** Whether a box is free of symbols, text and foreign wires. */
  boolean free(Box box, String ownNet) {
    return !meets(box, solids)
        && !meets(box, verticals)
        && lanes.stream().noneMatch(l -> !l.net.equals(ownNet) && box.overlaps(l.box))
        && box.left() >= 0;
  }

  /** Whether a box is free of everything, its own net's wires too. */
  boolean clear(Box box) {
    return free(box, "") && lanes.stream().noneMatch(lane -> box.overlaps(lane.box));
  }

  private static boolean meets(Box box, List<Box> others) {
    for (Box other : others) {
      if (box.overlaps(other)) {
        return true;
      }
    }
    return false;
  }

  /** The first place at or right of a column where the cluster fits, in one row. */
  Optional<Cluster> along(Cluster cluster, int fromX, int y) {
    int limit = Math.max(fromX, frontier()) + 12;
    for (int x = fromX; x <= Math.min(MOST_CELLS, limit); x++) {
      Cluster here = cluster.moved(x, y);
      if (fits(here)) {
        return Optional.of(here);
      }
    }
    return Optional.empty();
  }

  /** The cheapest place around a point. */
  Optional<Cluster> near(Cluster cluster, int aroundX, int aroundY, Cost cost) {
    record Place(int x, int y, double price) {}
    List<Place> places = new ArrayList<>();
    for (int y = aroundY - REACH; y <= aroundY + REACH; y++) {
      for (int x = Math.max(1, aroundX - REACH); x <= aroundX + REACH; x++) {
        double price = cost.of(x, y);
        if (price < Double.POSITIVE_INFINITY) {
          places.add(new Place(x, y, price));
        }
      }
    }
    places.sort(Comparator.comparingDouble(Place::price));
    return places.stream()
        .map(place -> cluster.moved(place.x, place.y))
        .filter(this::fits)
        .findFirst();
  }

  /** What a place costs; infinite where it must not be. */
  interface Cost {
    double of(int x, int y);
  }

  /** Puts a cluster where it is and takes up its nets. */
  void place(Cluster cluster) {
    for (Placed piece : cluster.pieces()) {
      placed.add(piece);
      solids.addAll(piece.footprint(spacing));
      recentX = piece.x();
    }
    verticals.addAll(cluster.wires());
    for (Placed piece : cluster.pieces()) {
      piece.ends().forEach(lead -> take(piece.nets().getOrDefault(lead.name(), ""), lead));
    }
  }

  private void take(String net, Lead lead) {
    ends.put(new Point(lead.x(), lead.y()), net);
    if (marked(net)) {
      return;
    }
    Spot spot = spots.get(net);
    if (spot == null) {
      spot = new Spot(lead.x(), lead.y(), lead.side() == Side.RIGHT);
      spot.hangX = lead.side() == Side.DOWN ? lead.x() : null;
      spot.riseX = lead.side() == Side.UP ? lead.x() : null;
      spot.leftward = lead.side() == Side.LEFT;
      spots.put(net, spot);
      return;
    }
    boolean joint = spot.x == lead.x() && spot.y == lead.y();
    if (joint) {
      spot.hangX = null;
      spot.riseX = null;
    } else if (spot.y == lead.y()) {
      lane(net, spot.x, lead.x(), spot.y);
    }
    if (!spot.leftward && (spot.lane || lead.y() == spot.y)) {
      spot.x = Math.max(spot.x, lead.x());
    }
    if (!lead.side().across()) {
      spot.columns.add(lead.x());
    }
  }

  private void lane(String net, int x1, int x2, int y) {
    double row = Grid.points(y);
    Box box =
        new Box(
            Grid.points(Math.min(x1, x2)),
            row - LANE_GAP,
            Grid.points(Math.max(x1, x2)),
            row + LANE_GAP);
    lanes.add(new Lane(net, box));
  }

  /** Draws the wires of the exit as lanes up to the right edge. */
  void closeAt(int width) {
    for (String net : task.exit()) {
      Spot spot = spots.get(net);
      if (spot != null) {
        lane(net, spot.x, width, spot.y);
      }
    }
  }
}
