package earward.drawing.internal.place;

import earward.block.wiring.Nodes;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Lead;
import earward.drawing.internal.form.Side;
import earward.drawing.internal.form.Signs;

/** Gives a symbol the rails at its ends, and keeps its way to ground free. */
final class RailMarks {
  private RailMarks() {}

  static Cluster around(Board board, Placed piece) {
    Cluster cluster = Cluster.of(piece);
    double middle =
        (piece.form().body().top() + piece.form().body().bottom()) / 2 + piece.y() * 5.0;
    for (Lead lead : piece.ends()) {
      String net = piece.nets().getOrDefault(lead.name(), "");
      Side side = lead.side();
      if (net.equals(Nodes.GROUND)) {
        if (side == Side.DOWN) {
          cluster = cluster.withWireToGround(lead.x(), lead.y());
        } else if (side == Side.RIGHT) {
          cluster = cluster.withWireToGround(lead.x() + 1, lead.y());
        }
      } else if (Nodes.isRail(net) && board.marked(net)) {
        boolean up = side == Side.UP || (side.across() && lead.y() * 5.0 <= middle);
        Form sign = Signs.rail(board.railName(net), up, board.lettering);
        cluster =
            cluster.with(
                Placed.mark(Mark.Kind.RAIL, net, sign, lead.x() + 2 * side.dx(), lead.y(), net));
      }
    }
    return cluster;
  }
}
