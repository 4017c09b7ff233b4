package earward.drawing.internal.route;

import earward.drawing.internal.form.Side;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Collections;
import java.util.List;
import java.util.PriorityQueue;

/**
 * Finds the cheapest way of a wire from an end to a set of cells: short, with few corners, few
 * crossings, and air between wires. A best-first search over cells and directions (Hart, Nilsson
 * and Raphael 1968).
 */
final class PathFinder {
  private static final int STEP = 10;
  private static final int CORNER = 22;
  private static final int CROSSING = 30;
  private static final int CROWD = 7;
  private static final Side[] SIDES = Side.values();

  private final Maze maze;
  private final int[] cost;
  private final int[] cameFrom;

  PathFinder(Maze maze) {
    this.maze = maze;
    cost = new int[maze.width * maze.height * 4];
    cameFrom = new int[cost.length];
  }

  /**
   * The way.
   *
   * @param start cell of the end
   * @param into the direction into the symbol, in which the wire must not start
   * @param goals where it may arrive
   * @return cells from start to goal; empty where there is no way
   */
  List<Integer> find(int start, Side into, BitSet goals, int net) {
    Arrays.fill(cost, Integer.MAX_VALUE);
    int[] box = bounds(goals);
    PriorityQueue<long[]> open = new PriorityQueue<>((a, b) -> Long.compare(a[0], b[0]));
    for (Side side : SIDES) {
      if (side != into) {
        int state = start * 4 + side.number();
        int first = side == into.opposite() ? 0 : CORNER / 2;
        cost[state] = first;
        cameFrom[state] = -1;
        open.add(new long[] {first + rest(start, box), state});
      }
    }
    while (!open.isEmpty()) {
      long[] head = open.remove();
      int state = (int) head[1];
      int cell = state / 4;
      if (head[0] > cost[state] + rest(cell, box)) {
        continue;
      }
      if (goals.get(cell) && !maze.crossed(cell, net)) {
        return path(state);
      }
      expand(state, box, open, net, cell == start);
    }
    return List.of();
  }

  private void expand(int state, int[] box, PriorityQueue<long[]> open, int net, boolean atStart) {
    int cell = state / 4;
    Side heading = SIDES[state % 4];
    boolean straightOnly = atStart || maze.crossed(cell, net);
    for (Side side : SIDES) {
      if (side == heading.opposite() || (straightOnly && side != heading)) {
        continue;
      }
      int next = maze.step(cell, side);
      if (next < 0 || !maze.passable(next, side, net)) {
        continue;
      }
      int price = cost[state] + STEP + (side == heading ? 0 : CORNER);
      price += maze.crossed(next, net) ? CROSSING : 0;
      price += maze.crowded(next, side, net) ? CROWD : 0;
      int nextState = next * 4 + side.number();
      if (price < cost[nextState]) {
        cost[nextState] = price;
        cameFrom[nextState] = state;
        open.add(new long[] {price + rest(next, box), nextState});
      }
    }
  }

  private List<Integer> path(int last) {
    List<Integer> cells = new ArrayList<>();
    for (int state = last; state >= 0; state = cameFrom[state]) {
      cells.add(state / 4);
    }
    Collections.reverse(cells);
    return cells;
  }

  private int[] bounds(BitSet goals) {
    int[] box = {Integer.MAX_VALUE, Integer.MAX_VALUE, Integer.MIN_VALUE, Integer.MIN_VALUE};
    for (int c = goals.nextSetBit(0); c >= 0; c = goals.nextSetBit(c + 1)) {
      box[0] = Math.min(box[0], maze.x(c));
      box[1] = Math.min(box[1], maze.y(c));
      box[2] = Math.max(box[2], maze.x(c));
      box[3] = Math.max(box[3], maze.y(c));
    }
    return box;
  }

  private int rest(int cell, int[] box) {
    int x = maze.x(cell);
    int y = maze.y(cell);
    int dx = Math.max(0, Math.max(box[0] - x, x - box[2]));
    int dy = Math.max(0, Math.max(box[1] - y, y - box[3]));
    return STEP * (dx + dy);
  }
}
