package earward.drawing.internal.place;

import earward.block.wiring.Placement;
import earward.drawing.internal.element.Text.Role;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lettering;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Lays one block out. Used once. */
public final class Placer {
  private static final int MARGIN = 2;
  private static final double TITLE_AIR = 10;
  private static final int LEAST_PORT_GAP = 5;

  private final Board board;
  private final Chains chains;
  private final Runs runs;
  private final Columns columns;
  private final Bodies bodies;

  private Placer(BlockTask task, Lettering lettering, double spacing) {
    this.board = new Board(task, lettering, spacing);
    this.chains = new Chains(board);
    this.runs = new Runs(board);
    this.columns = new Columns(board);
    this.bodies = new Bodies(board);
  }

  /**
   * The block's plan.
   *
   * @param spacing points of air beyond the usual
   * @return empty where some part finds no place
   */
  public static Optional<BlockPlan> plan(BlockTask task, Lettering lettering, double spacing) {
    return new Placer(task, lettering, spacing).plan();
  }

  private Optional<BlockPlan> plan() {
    BlockTask task = board.task;
    List<Integer> entryRows = new ArrayList<>();
    for (int i = 0; i < task.entry().size(); i++) {
      int row = i < task.entryGaps().size() ? task.entryGaps().get(i) : i * 10;
      entryRows.add(row);
      if (!board.marked(task.entry().get(i))) {
        board.spots.putIfAbsent(task.entry().get(i), new Spot(0, row, true));
      }
    }
    while (!board.pending.isEmpty()) {
      if (!place(board.pending.iterator().next())) {
        return Optional.empty();
      }
    }
    List<Integer> exitRows = exitRows();
    if (!new SignPosts(board).place()) {
      return Optional.empty();
    }
    int width = Math.max(board.frontier() + 1, titleWidth());
    return Optional.of(new BlockPlan(task, board.placed, width, entryRows, exitRows));
  }

  private int titleWidth() {
    double widest = 0;
    for (String word : board.task.title().split("\\s+")) {
      widest = Math.max(widest, board.lettering.width(word, Role.TITLE));
    }
    return Grid.cellsFor(widest + TITLE_AIR) + MARGIN;
  }

  private boolean place(Part part) {
    if (part.placement() == Placement.RUN || part.placement() == Placement.BODY) {
      Optional<Part> waiting = waitingAt(part);
      if (waiting.isPresent()) {
        Part first = waiting.get();
        return first.placement() == Placement.BRIDGE ? runs.bridge(first) : chains.place(first);
      }
    }
    return switch (part.placement()) {
      case RUN -> part.twoEnded() ? runs.run(part) : bodies.place(part);
      case BODY -> bodies.place(part);
      case DOWN, UP -> part.twoEnded() ? chains.place(part) : bodies.place(part);
      case COLUMN -> part.stacks() ? columns.place(part) : bodies.place(part);
      case BRIDGE -> part.twoEnded() ? runs.bridge(part) : bodies.place(part);
    };
  }

  /** What hangs on the wire that the part will end, and so stands left of it. */
  private Optional<Part> waitingAt(Part part) {
    Spot spot = board.spot(part.from());
    if (spot == null) {
      return Optional.empty();
    }
    Optional<Part> bridge =
        board.pending.stream()
            .filter(p -> p.placement() == Placement.BRIDGE && p.twoEnded())
            .filter(p -> p.touches(part.from()) && !p.equals(part))
            .filter(p -> board.spot(p.from()) != null && board.spot(p.to()) != null)
            .findFirst();
    if (bridge.isPresent()) {
      return bridge;
    }
    return board.pending.stream()
        .filter(p -> !p.equals(part) && p.twoEnded() && p.from().equals(part.from()))
        .filter(p -> p.placement() == Placement.DOWN || p.placement() == Placement.UP)
        .filter(
            p -> {
              List<Part> chain = chains.chainOf(p);
              String end = chain.get(chain.size() - 1).to();
              return board.marked(end) || board.spot(end) != null;
            })
        .findFirst();
  }

  private List<Integer> exitRows() {
    List<Integer> rows = new ArrayList<>();
    for (String net : board.task.exit()) {
      Spot spot = board.spot(net);
      int row = spot == null ? 0 : spot.y;
      int least = rows.isEmpty() ? Integer.MIN_VALUE : rows.get(rows.size() - 1) + LEAST_PORT_GAP;
      rows.add(Math.max(row, least));
    }
    board.closeAt(board.frontier() + 1);
    return rows;
  }
}
