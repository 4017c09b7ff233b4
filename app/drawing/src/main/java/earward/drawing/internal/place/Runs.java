package earward.drawing.internal.place;

import earward.block.device.Terminal;
import earward.drawing.internal.form.Side;
import java.util.Optional;

/** Places parts along the signal and those that bridge others. */
final class Runs {
  private static final int CLEARANCE = 5;

  private final Board board;

  Runs(Board board) {
    this.board = board;
  }

  /** Places a part along the signal. */
  boolean run(Part part) {
    Spot from = board.spot(part.from());
    Spot to = board.spot(part.to());
    if (from == null && to != null && !board.marked(part.to())) {
      return beside(part);
    }
    if (from != null && to != null) {
      return bridge(part);
    }
    if (from == null) {
      from = new Spot(board.spots.isEmpty() ? 1 : board.frontier() + 1, board.freshRow(), true);
      if (!board.marked(part.from())) {
        board.spots.put(part.from(), from);
      }
    }
    Cluster cluster = RailMarks.around(board, Forms.twoEnded(part, Side.RIGHT, board.lettering));
    Optional<Cluster> found = board.along(cluster, from.x + 1, from.y);
    if (found.isEmpty() || (!from.lane && found.get().pieces().get(0).x() > from.x + 12)) {
      return beside(part);
    }
    if (!board.task.exit().contains(part.from())) {
      from.lane = false;
    }
    return done(part, found);
  }

  private boolean done(Part part, Optional<Cluster> found) {
    found.ifPresent(
        cluster -> {
          board.pending.remove(part);
          board.place(cluster);
        });
    return found.isPresent();
  }

  /** Places a part over or under what stands between its ends. */
  boolean bridge(Part part) {
    Spot from = board.spot(part.from());
    Spot to = board.spot(part.to());
    if (from == null && to == null) {
      return run(part);
    }
    if (from == null || to == null) {
      return beside(part);
    }
    if (aloneOn(part, part.from(), from)) {
      return done(part, onLane(part, from, to));
    }
    Part turned = reversed(part);
    if (aloneOn(part, part.to(), to)) {
      return done(part, onLane(turned, to, from));
    }
    boolean forward = from.x <= to.x;
    Cluster cluster =
        RailMarks.around(
            board, Forms.twoEnded(forward ? part : turned, Side.RIGHT, board.lettering));
    int middleX = (from.x + to.x) / 2 - 3;
    int upper = Math.min(from.y, to.y);
    int lower = Math.max(from.y, to.y);
    Optional<Cluster> found =
        board.near(
            cluster,
            middleX,
            upper,
            (x, y) -> {
              if (y > upper - CLEARANCE && y < lower + CLEARANCE) {
                return Double.POSITIVE_INFINITY;
              }
              int away = y < upper ? upper - y : y - lower + 3;
              return Math.abs(x - middleX) + 1.5 * away;
            });
    Spot right = forward ? to : from;
    found
        .filter(here -> right.lane)
        .ifPresent(here -> right.x = Math.max(right.x, here.pieces().get(0).x() + 6));
    return done(part, found);
  }

  /** Whether the net leaves a pin to the right and only this part comes to it. */
  private boolean aloneOn(Part part, String net, Spot spot) {
    return spot.lane
        && !board.task.exit().contains(net)
        && board.pending.stream().noneMatch(other -> !other.equals(part) && other.touches(net));
  }

  private Optional<Cluster> onLane(Part part, Spot from, Spot to) {
    Cluster cluster = RailMarks.around(board, Forms.twoEnded(part, Side.RIGHT, board.lettering));
    Optional<Cluster> found = board.along(cluster, from.x + 1, from.y);
    from.lane = false;
    found.ifPresent(here -> to.x = Math.max(to.x, here.pieces().get(0).x() + 6));
    return found;
  }

  private static Part reversed(Part part) {
    Terminal entering = part.leaving();
    return new Part(
        part.key(), part.device(), part.placement(), entering, part.nets(), part.label());
  }

  /** Anywhere near the end that is known. */
  private boolean beside(Part part) {
    Spot from = board.spot(part.from());
    Spot known = from != null ? from : board.spot(part.to());
    int atX = known == null ? board.frontier() : known.x + (from != null ? 2 : -8);
    int atY = known == null ? board.freshRow() : known.y;
    Cluster cluster = RailMarks.around(board, Forms.twoEnded(part, Side.RIGHT, board.lettering));
    return done(
        part, board.near(cluster, atX, atY, (x, y) -> Math.abs(x - atX) + Math.abs(y - atY)));
  }
}
