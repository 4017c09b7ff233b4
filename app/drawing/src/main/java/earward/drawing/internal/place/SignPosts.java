package earward.drawing.internal.place;

import earward.block.wiring.Nodes;
import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Text.Role;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lead;
import earward.drawing.internal.form.Signs;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Places what hangs on a wire: test points, names of nodes, rails. */
final class SignPosts {
  private static final int MOST_POLE = 9;
  private static final double BASE_CLEAR = 3;

  private final Board board;

  SignPosts(Board board) {
    this.board = board;
  }

  /** Places all of them. */
  boolean place() {
    boolean all = true;
    for (String rail : board.task.lanes()) {
      all &= rail(rail);
    }
    for (BlockTask.Point point : board.task.points()) {
      String net = point.net();
      all &= flag(Mark.Kind.TEST_POINT, point.key(), point.text(), net, Role.TEST_POINT);
    }
    for (Map.Entry<String, String> flag : new java.util.TreeMap<>(board.task.flags()).entrySet()) {
      all &= flag(Mark.Kind.FLAG, flag.getValue(), flag.getValue(), flag.getKey(), Role.NET);
    }
    return all;
  }

  private boolean rail(String net) {
    List<Form> forms = new ArrayList<>();
    for (int pole = 1; pole <= MOST_POLE; pole++) {
      forms.add(Signs.rail(board.railName(net), true, pole, board.lettering));
    }
    return post(Mark.Kind.RAIL, net, net, forms) || anywhere(Mark.Kind.RAIL, net, net, forms);
  }

  private boolean flag(Mark.Kind kind, String name, String text, String net, Role role) {
    String owner = kind + " " + name;
    List<Form> forms = new ArrayList<>();
    for (boolean up : new boolean[] {true, false}) {
      for (int pole = 2; pole <= MOST_POLE; pole++) {
        for (boolean right : new boolean[] {true, false}) {
          forms.add(Signs.flag(text, role, owner, pole, up, right, board.lettering));
        }
      }
    }
    if (board.marked(net)) {
      return onMark(kind, name, net, forms.get(0));
    }
    return post(kind, name, net, forms) || anywhere(kind, name, net, forms);
  }

  /** On the wire itself, the cheapest form and place first. */
  private boolean post(Mark.Kind kind, String name, String net, List<Form> forms) {
    Spot spot = board.spot(net);
    if (spot == null) {
      return false;
    }
    List<Integer> ends = ends(net, spot.y);
    int first = ends.stream().mapToInt(x -> x).min().orElse(spot.x);
    int last = Math.max(spot.x, ends.stream().mapToInt(x -> x).max().orElse(spot.x));
    if (board.task.exit().contains(net)) {
      last += 4;
    }
    Placed best = null;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < forms.size(); i++) {
      for (int x = Math.max(1, first); x <= last; x++) {
        double cost = 2 * i + 0.5 * (x - first) + crowding(ends, x);
        Placed here = Placed.mark(kind, name, forms.get(i), x, spot.y, net);
        if (cost < least && stands(here, net, ends.contains(x))) {
          best = here;
          least = cost;
        }
      }
    }
    return accept(Optional.ofNullable(best));
  }

  /** A dot of its own is worse than one that is there already, and worst beside one. */
  private static double crowding(List<Integer> ends, int x) {
    if (ends.contains(x)) {
      return 0;
    }
    return ends.contains(x - 1) || ends.contains(x + 1) ? 5 : 1.5;
  }

  /** The columns at which the net has ends in its row. */
  private List<Integer> ends(String net, int row) {
    List<Integer> columns = new ArrayList<>();
    for (Placed piece : board.placed) {
      for (Lead lead : piece.ends()) {
        if (lead.y() == row && net.equals(piece.nets().get(lead.name()))) {
          columns.add(lead.x());
        }
      }
    }
    if (board.task.entry().contains(net)) {
      columns.add(1);
    }
    return columns;
  }

  private boolean stands(Placed sign, String net, boolean atEnd) {
    double x = Grid.points(sign.x());
    double y = Grid.points(sign.y());
    Form form = sign.form();
    Box head = form.body().moved(x, y);
    boolean up = head.bottom() < y;
    Box stem =
        up
            ? new Box(x - 2, Math.min(head.bottom(), y - BASE_CLEAR), x + 2, y - BASE_CLEAR)
            : new Box(x - 2, y + BASE_CLEAR, x + 2, Math.max(head.top(), y + BASE_CLEAR));
    Box base = new Box(x - 1, y - 1, x + 1, y + 1);
    return board.clear(head.grown(2.5))
        && form.texts().stream().allMatch(t -> board.clear(t.box().moved(x, y).grown(1.5)))
        && board.free(stem, net)
        && (atEnd || board.free(base, net));
  }

  private boolean anywhere(Mark.Kind kind, String name, String net, List<Form> forms) {
    Spot spot = board.spot(net);
    int atX = spot == null ? board.frontier() + 2 : spot.x + 1;
    int atY = spot == null ? 0 : spot.y - 2;
    Placed best = null;
    int least = Integer.MAX_VALUE;
    for (Form form : forms.subList(0, Math.min(2, forms.size()))) {
      Cluster cluster = Cluster.of(Placed.mark(kind, name, form, 0, 0, net));
      Optional<Cluster> found =
          board.near(cluster, atX, atY, (x, y) -> Math.abs(x - atX) + Math.abs(y - atY));
      if (found.isPresent()) {
        Placed here = found.get().pieces().get(0);
        int cost = Math.abs(here.x() - atX) + Math.abs(here.y() - atY);
        if (cost < least) {
          best = here;
          least = cost;
        }
      }
    }
    return accept(Optional.ofNullable(best));
  }

  /** A test point at ground or at a rail that is shown by marks: a mark of its own carries it. */
  private boolean onMark(Mark.Kind kind, String name, String net, Form form) {
    Cluster cluster = Cluster.of(Placed.mark(kind, name, form, 0, 0, net));
    if (Nodes.isRail(net)) {
      Form sign = Signs.rail(board.railName(net), false, board.lettering);
      cluster = cluster.with(Placed.mark(Mark.Kind.RAIL, net, sign, 0, 0, net));
    } else {
      cluster = cluster.withWireToGround(0, 1);
    }
    int atX = board.frontier() + 2;
    int atY = Nodes.isRail(net) ? 0 : board.freshRow() - 6;
    Optional<Cluster> found =
        board.near(cluster, atX, atY, (x, y) -> Math.abs(x - atX) + 2.0 * Math.abs(y - atY));
    found.ifPresent(board::place);
    return found.isPresent();
  }

  private boolean accept(Optional<Placed> found) {
    found.ifPresent(sign -> board.place(Cluster.of(sign)));
    return found.isPresent();
  }
}
