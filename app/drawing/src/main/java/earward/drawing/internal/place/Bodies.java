package earward.drawing.internal.place;

import earward.block.device.BipolarTransistor;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.OperationalAmplifier;
import earward.block.device.Potentiometer;
import earward.block.device.Terminal;
import earward.block.device.Transformer;
import earward.block.device.TunedFeed;
import earward.block.wiring.Nodes;
import earward.drawing.internal.element.Text.Role;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lead;
import earward.drawing.internal.form.Side;
import earward.drawing.internal.form.Symbols;
import java.util.Optional;

/** Places symbols that the signal goes through. */
final class Bodies {
  private static final int WINDING_CELLS = 6;
  private static final int MOST_SHIFT = 40;
  private static final double TALL_POINTS = 40;

  private final Board board;

  Bodies(Board board) {
    this.board = board;
  }

  /** Places a part; one with two ends hangs on the signal or stands in it. */
  boolean place(Part part) {
    if (part.twoEnded()) {
      boolean hangs = board.marked(part.to()) || !part.nets().containsKey(part.leaving());
      return hangs ? new Chains(board).place(part) : new Runs(board).run(part);
    }
    Spot entry = board.spot(part.from());
    int row = entry == null ? board.freshRow() : entry.y;
    Placed piece = Forms.piece(part, form(part, row));
    Lead entering = piece.form().lead(part.entering().name()).orElseThrow();
    Cluster cluster = RailMarks.around(board, piece);
    int fromX = (entry == null ? start() : entry.x + 2 + room(part, piece)) - entering.x();
    Optional<Cluster> found = Optional.empty();
    for (int step = 0; step <= MOST_SHIFT && found.isEmpty(); step++) {
      int shift = (step % 2 == 0 ? -1 : 1) * ((step + 1) / 2) * 2;
      found = board.along(cluster, Math.max(1, fromX), row - entering.y() + shift);
    }
    found.ifPresent(
        here -> {
          board.pending.remove(part);
          if (entry != null && !board.task.exit().contains(part.from())) {
            entry.lane = false;
          }
          board.place(here);
        });
    return found.isPresent();
  }

  private int start() {
    return board.placed.isEmpty() ? 2 : board.frontier() + 2;
  }

  private Form form(Part part, int row) {
    var letters = board.lettering;
    if (part.device() instanceof Potentiometer track) {
      boolean byWiper = part.entering() == Terminal.WIPER;
      return Symbols.track(track, byWiper, part.label(), letters);
    } else if (part.device() instanceof TunedFeed || part.device() instanceof Transformer) {
      boolean can = part.device() instanceof TunedFeed;
      return Symbols.windings(
          can, windingHeight(part), part.nets().keySet(), part.label(), letters);
    } else if (part.device() instanceof BipolarTransistor transistor) {
      boolean emitterUp = up(part, Terminal.EMITTER, Terminal.COLLECTOR, transistor.model().pnp());
      Terminal upper = emitterUp ? Terminal.EMITTER : Terminal.COLLECTOR;
      return Symbols.transistor(transistor, upper, part.label(), letters);
    } else if (part.device() instanceof FieldEffectTransistor transistor) {
      boolean sourceUp = up(part, Terminal.SOURCE, Terminal.DRAIN, transistor.model().pChannel());
      Terminal upper = sourceUp ? Terminal.SOURCE : Terminal.DRAIN;
      return Symbols.transistor(transistor, upper, part.label(), letters);
    } else if (part.device() instanceof OperationalAmplifier) {
      boolean inverting = part.entering() == Terminal.INVERTING;
      Terminal upper = inverting ? Terminal.INVERTING : Terminal.INPUT;
      return Symbols.triangle(upper, part.label(), letters);
    }
    return new PinSides(board, part, row).form();
  }

  /** Whether the first end points up: by its rail or the other's ground, or else as is usual. */
  private static boolean up(Part part, Terminal first, Terminal other, boolean usual) {
    if (Nodes.isRail(part.net(first)) || part.net(other).equals(Nodes.GROUND)) {
      return true;
    }
    if (Nodes.isRail(part.net(other)) || part.net(first).equals(Nodes.GROUND)) {
      return false;
    }
    return usual;
  }

  private int windingHeight(Part part) {
    Spot start = board.spot(part.net(Terminal.PRIMARY_START));
    Spot end = board.spot(part.net(Terminal.PRIMARY_END));
    if (start != null && end != null && end.y - start.y >= WINDING_CELLS) {
      return end.y - start.y;
    }
    boolean pair =
        part.nets().containsKey(Terminal.BOTTOM) && !board.marked(part.net(Terminal.BOTTOM));
    boolean tapped = part.nets().containsKey(Terminal.TAP);
    return tapped ? 2 * WINDING_CELLS : pair ? WINDING_CELLS + 4 : WINDING_CELLS;
  }

  /** Columns that stay free left of it for what hangs on its inputs. */
  private int room(Part part, Placed piece) {
    double points = 0;
    if (piece.form().body().height() > TALL_POINTS) {
      for (BlockTask.Point point : board.task.points()) {
        if (point.net().equals(part.from())) {
          points = board.lettering.width(point.text(), Role.TEST_POINT);
        }
      }
    }
    for (Lead lead : piece.ends()) {
      String net = piece.nets().getOrDefault(lead.name(), "");
      if (lead.side() == Side.LEFT && !lead.name().equals(part.entering().name())) {
        points = Math.max(points, new PinSides(board, part, 0).hangingWidth(net));
      }
    }
    return Grid.cellsFor(points);
  }
}
