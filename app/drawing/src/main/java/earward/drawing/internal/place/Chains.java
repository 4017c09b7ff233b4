package earward.drawing.internal.place;

import earward.block.wiring.Nodes;
import earward.block.wiring.Placement;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.form.Side;
import earward.drawing.internal.form.Signs;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;

/** Places chains that hang down from the signal or stand up from it. */
final class Chains {
  private static final int BELOW_LANE = 2;
  private static final int RAIL_ROOM = 5;
  private static final int APART = 2;

  private final Board board;
  private int lastRow = Integer.MIN_VALUE;

  Chains(Board board) {
    this.board = board;
  }

  /** The part and what goes on in line with it. */
  List<Part> chainOf(Part first) {
    List<Part> chain = new ArrayList<>(List.of(first));
    Placement way = first.placement();
    String net = first.to();
    while (!board.marked(net) && board.spot(net) == null) {
      String at = net;
      Optional<Part> next =
          board.pending.stream()
              .filter(p -> p.placement() == way && p.twoEnded() && p.from().equals(at))
              .filter(p -> !chain.contains(p))
              .findFirst();
      if (next.isEmpty()) {
        break;
      }
      chain.add(next.get());
      net = next.get().to();
    }
    return chain;
  }

  /** Places the chain that begins with a part. */
  boolean place(Part first) {
    List<Part> chain = chainOf(first);
    String from = first.from();
    String end = chain.get(chain.size() - 1).to();
    Spot start = board.spot(from);
    if (start == null && board.marked(from)) {
      return done(chain, alone(chain, from, end));
    }
    if (start == null) {
      start = new Spot(board.spots.isEmpty() ? 1 : board.frontier() + 1, board.freshRow(), true);
      board.spots.put(from, start);
    }
    Spot far = board.spot(end);
    boolean down = first.placement() != Placement.UP;
    if (far != null && far.y != start.y) {
      down = far.y > start.y;
    }
    Cluster cluster = cluster(chain, end, down);
    Set<String> own = nets(chain);
    if (far != null && !board.marked(end)) {
      return done(chain, between(chain, cluster, start, far, down));
    }
    return done(chain, fromLane(cluster, start, own, down));
  }

  private boolean done(List<Part> chain, Optional<Cluster> found) {
    found.ifPresent(
        cluster -> {
          board.pending.removeAll(chain);
          board.place(cluster);
          lastRow = cluster.pieces().get(0).y();
        });
    return found.isPresent();
  }

  private static Set<String> nets(List<Part> chain) {
    Set<String> nets = new HashSet<>();
    chain.forEach(part -> nets.addAll(part.nets().values()));
    return nets;
  }

  private Cluster cluster(List<Part> chain, String end, boolean down) {
    Side way = down ? Side.DOWN : Side.UP;
    List<Placed> pieces = new ArrayList<>();
    int y = 0;
    for (Part part : chain) {
      Placed piece = Forms.twoEnded(part, way, board.lettering).moved(0, y);
      pieces.add(piece);
      y += 6 * way.dy();
    }
    Cluster cluster = new Cluster(pieces, List.of());
    if (Nodes.isRail(end) && board.marked(end)) {
      return cluster.with(rail(end, 0, y, !down));
    }
    return end.equals(Nodes.GROUND) && down ? cluster.withWireToGround(0, y) : cluster;
  }

  private Placed rail(String net, int x, int y, boolean up) {
    return Placed.mark(
        Mark.Kind.RAIL, net, Signs.rail(board.railName(net), up, board.lettering), x, y, net);
  }

  /** From a lane, where the column is free, beyond the wires that it must cross. */
  private Optional<Cluster> fromLane(Cluster cluster, Spot start, Set<String> own, boolean down) {
    Integer direct = down ? start.hangX : start.riseX;
    if (direct != null) {
      Cluster here = cluster.moved(direct, row(direct, start.y, own, down));
      if (board.fits(here)) {
        return Optional.of(here);
      }
    }
    List<Integer> columns = new ArrayList<>(start.columns);
    if (start.leftward) {
      for (int x = start.x - 1; x > start.x - 14; x--) {
        columns.add(x);
      }
    }
    for (int x = start.x + APART; x < Math.max(start.x, board.frontier()) + 16; x++) {
      columns.add(x);
    }
    for (int x : columns) {
      int y = aligned(row(x, start.y, own, down), start.y, down);
      Cluster here = cluster.moved(x, y);
      if (y != start.y) {
        here = here.withWireDown(x, Math.min(y, start.y), Math.max(y, start.y));
      }
      if (board.fits(here)) {
        return Optional.of(here);
      }
    }
    Spot at = start;
    return board.near(cluster, at.x, at.y, (x, y) -> Math.abs(x - at.x) + 1.5 * Math.abs(y - at.y));
  }

  /** The row of the chain before, where that is only a little farther down. */
  private int aligned(int row, int from, boolean down) {
    boolean near = down && lastRow > row && lastRow <= from + BELOW_LANE;
    return near ? lastRow : row;
  }

  private int row(int x, int from, Set<String> own, boolean down) {
    OptionalInt lane = down ? board.lowestLane(x, from, own) : board.highestLane(x, from, own);
    if (lane.isEmpty()) {
      return from;
    }
    return lane.getAsInt() + (down ? BELOW_LANE : -BELOW_LANE);
  }

  private Optional<Cluster> between(
      List<Part> chain, Cluster cluster, Spot start, Spot far, boolean down) {
    int length = 6 * chain.size();
    int gap = Math.abs(far.y - start.y);
    if (gap >= length) {
      int offset = (gap - length) / 2 * (down ? 1 : -1);
      int fromX = Math.max(start.x, far.x) + APART;
      Optional<Cluster> found = board.along(cluster, fromX, start.y + offset);
      if (found.isPresent()) {
        return found;
      }
    }
    int x0 = Math.max(start.x, far.x) + 2;
    int y0 = Math.min(start.y, far.y);
    return board.near(cluster, x0, y0, (x, y) -> Math.abs(x - x0) + Math.abs(y - y0));
  }

  /** A chain between marks only, such as a bypass capacitor: where there is room below. */
  private Optional<Cluster> alone(List<Part> chain, String from, String end) {
    boolean down = chain.get(0).placement() != Placement.UP;
    Cluster cluster = cluster(chain, end, down);
    if (Nodes.isRail(from)) {
      cluster = cluster.with(rail(from, 0, 0, down));
    }
    for (int x = board.recentX(); x < board.frontier() + 16; x++) {
      OptionalInt lane = board.lowestLane(x, Integer.MIN_VALUE, Set.of());
      int y = lane.isPresent() ? lane.getAsInt() + RAIL_ROOM : 0;
      for (int lower = 0; lower <= 4; lower += 2) {
        Cluster here = cluster.moved(x, y + lower);
        if (board.fits(here)) {
          return Optional.of(here);
        }
      }
    }
    return Optional.empty();
  }
}
