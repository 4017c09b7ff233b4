package earward.drawing.internal.place;

import earward.block.wiring.Nodes;
import earward.block.wiring.Placement;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.form.Lead;
import earward.drawing.internal.form.Side;
import earward.drawing.internal.form.Signs;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;

/** Places chains from rail to ground that stand beside the signal. */
final class Columns {
  private static final int RAIL_ROOM = 5;

  private final Board board;

  Columns(Board board) {
    this.board = board;
  }

  /** Places the column that begins with a part. */
  boolean place(Part first) {
    List<Part> links = links(first);
    Cluster cluster = cluster(links);
    OptionalInt row = alignedRow(cluster);
    int fromX = fromX(cluster);
    Optional<Cluster> found = Optional.empty();
    if (row.isPresent()) {
      for (int step = 0; step <= 12 && found.isEmpty(); step++) {
        int shift = (step % 2 == 0 ? -1 : 1) * ((step + 1) / 2) * 2;
        found = board.along(cluster, fromX, row.getAsInt() + shift);
      }
    } else {
      found = below(cluster, fromX);
    }
    found.ifPresent(
        here -> {
          board.pending.removeAll(links);
          board.place(here);
        });
    return found.isPresent();
  }

  private List<Part> links(Part first) {
    List<Part> links = new ArrayList<>(List.of(first));
    String net = first.net(first.lower());
    for (Part next : board.pending) {
      boolean follows =
          next.placement() == Placement.COLUMN && next.stacks() && !links.contains(next);
      if (follows && !board.marked(net) && next.from().equals(net)) {
        links.add(next);
        net = next.net(next.lower());
      }
    }
    return links;
  }

  private Cluster cluster(List<Part> links) {
    List<Placed> pieces = new ArrayList<>();
    int y = 0;
    for (Part part : links) {
      Placed piece = Forms.link(part, board.lettering).moved(0, y);
      pieces.add(piece);
      y = piece.y() + piece.form().lead(part.lower().name()).orElseThrow().y();
    }
    String top = links.get(0).from();
    Part last = links.get(links.size() - 1);
    String bottom = last.net(last.lower());
    Cluster cluster = new Cluster(pieces, List.of());
    if (Nodes.isRail(top) && board.marked(top)) {
      cluster = cluster.with(rail(top, 0, true));
    }
    if (Nodes.isRail(bottom) && board.marked(bottom)) {
      return cluster.with(rail(bottom, y, false));
    }
    return bottom.equals(Nodes.GROUND) ? cluster.withWireToGround(0, y) : cluster;
  }

  private Placed rail(String net, int y, boolean up) {
    return Placed.mark(
        Mark.Kind.RAIL, net, Signs.rail(board.railName(net), up, board.lettering), 0, y, net);
  }

  /** The row at which the column's joints, or else its inputs, meet the signal. */
  private OptionalInt alignedRow(Cluster cluster) {
    OptionalDouble joints = shift(cluster, false);
    OptionalDouble found = joints.isPresent() ? joints : shift(cluster, true);
    return found.isPresent()
        ? OptionalInt.of((int) Math.round(found.getAsDouble()))
        : OptionalInt.empty();
  }

  private OptionalDouble shift(Cluster cluster, boolean sideways) {
    List<Integer> shifts = new ArrayList<>();
    for (Placed piece : cluster.pieces()) {
      for (Lead lead : piece.ends()) {
        Spot spot = board.spot(piece.nets().getOrDefault(lead.name(), ""));
        if (spot != null && lead.side().across() == sideways) {
          shifts.add(spot.y - lead.y());
        }
      }
    }
    return shifts.stream().mapToInt(s -> s).average();
  }

  private int fromX(Cluster cluster) {
    int from = 2;
    for (Placed piece : cluster.pieces()) {
      for (Lead lead : piece.ends()) {
        Spot spot = board.spot(piece.nets().getOrDefault(lead.name(), ""));
        if (spot != null && lead.side() != Side.RIGHT) {
          from = Math.max(from, spot.x + 1 - lead.x());
        }
      }
    }
    return from;
  }

  private Optional<Cluster> below(Cluster cluster, int fromX) {
    for (int x = fromX; x < board.frontier() + 16; x++) {
      OptionalInt lane = board.lowestLane(x, Integer.MIN_VALUE, Set.of());
      Cluster here = cluster.moved(x, lane.isPresent() ? lane.getAsInt() + RAIL_ROOM : 0);
      if (board.fits(here)) {
        return Optional.of(here);
      }
    }
    return Optional.empty();
  }
}
