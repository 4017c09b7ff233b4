package earward.drawing.internal.route;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lead;
import earward.drawing.internal.form.Side;
import earward.drawing.internal.place.Placed;

/** The cells of one block: what is barred, and whose wire runs where. Mutable, one thread. */
final class Maze {
  static final int NOBODY = 0;
  private static final double BODY_GAP = 2;
  private static final double TEXT_GAP = 1.2;

  final int width;
  final int height;
  private final int top;
  private final boolean[] barred;
  private final int[] across;
  private final int[] down;
  private final int[] node;

  /**
   * An empty maze.
   *
   * @param widthCells columns 0 to this one
   * @param topRow first row
   * @param bottomRow last row
   */
  Maze(int widthCells, int topRow, int bottomRow) {
    width = widthCells + 1;
    top = topRow;
    height = bottomRow - topRow + 1;
    barred = new boolean[width * height];
    across = new int[width * height];
    down = new int[width * height];
    node = new int[width * height];
  }

  int cell(int x, int y) {
    return (y - top) * width + x;
  }

  int x(int cell) {
    return cell % width;
  }

  int y(int cell) {
    return cell / width + top;
  }

  boolean holds(int x, int y) {
    return x >= 0 && x < width && y >= top && y < top + height;
  }

  /** The neighbour of a cell, or -1 beyond the edge. */
  int step(int cell, Side side) {
    int x = x(cell) + side.dx();
    int y = y(cell) + side.dy();
    return holds(x, y) ? cell(x, y) : -1;
  }

  /** Bars the cells of a form and of its leads. */
  void bar(Placed piece) {
    double dx = Grid.points(piece.x());
    double dy = Grid.points(piece.y());
    bar(piece.form().body().moved(dx, dy).grown(BODY_GAP));
    piece.form().texts().forEach(text -> bar(text.box().moved(dx, dy).grown(TEXT_GAP)));
    for (Lead lead : piece.form().leads()) {
      bar(piece.form().stem(lead).moved(dx, dy).grown(1));
    }
  }

  private void bar(Box box) {
    int left = (int) Math.floor(box.left() / Grid.CELL_POINTS) + 1;
    int right = (int) Math.ceil(box.right() / Grid.CELL_POINTS) - 1;
    int upper = (int) Math.floor(box.top() / Grid.CELL_POINTS) + 1;
    int lower = (int) Math.ceil(box.bottom() / Grid.CELL_POINTS) - 1;
    for (int y = upper; y <= lower; y++) {
      for (int x = left; x <= right; x++) {
        if (holds(x, y)) {
          barred[cell(x, y)] = true;
        }
      }
    }
  }

  /** Opens a cell for the wires of one net alone. */
  void open(int cell, int net) {
    barred[cell] = false;
    node[cell] = net;
  }

  boolean barred(int cell) {
    return barred[cell];
  }

  /** Whether a wire of the net may enter a cell in a direction. */
  boolean passable(int cell, Side way, int net) {
    if (barred[cell] || foreign(node[cell], net)) {
      return false;
    }
    return !foreign(way.across() ? across[cell] : down[cell], net);
  }

  /** Whether a foreign wire runs through the cell, so that one can only go straight on. */
  boolean crossed(int cell, int net) {
    return foreign(across[cell], net) || foreign(down[cell], net);
  }

  /** Whether a foreign wire runs along the way in a neighbouring cell. */
  boolean crowded(int cell, Side way, int net) {
    Side aside = way.across() ? Side.UP : Side.LEFT;
    return runs(step(cell, aside), way, net) || runs(step(cell, aside.opposite()), way, net);
  }

  private boolean runs(int cell, Side way, int net) {
    return cell >= 0
        && (barred[cell]
            || foreign(way.across() ? across[cell] : down[cell], net)
            || foreign(node[cell], net));
  }

  private static boolean foreign(int owner, int net) {
    return owner != NOBODY && owner != net;
  }

  /** Lays a piece of wire between neighbouring cells. */
  void lay(int from, int to, int net) {
    int[] layer = Math.abs(from - to) == 1 ? across : down;
    layer[from] = net;
    layer[to] = net;
  }

  /** Marks a corner, an end or a joint. */
  void join(int cell, int net) {
    node[cell] = net;
  }
}
