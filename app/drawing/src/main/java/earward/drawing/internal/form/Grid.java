package earward.drawing.internal.form;

/** The grid on which ends and wires stand. */
public final class Grid {
  /** One cell, in points at text of 7.5 pt. */
  public static final double CELL_POINTS = 5;

  /** Length of a two-ended symbol with its leads, in cells. */
  public static final int SPAN_CELLS = 6;

  private Grid() {}

  /** Cells to points. */
  public static double points(int cells) {
    return cells * CELL_POINTS;
  }

  /** The least number of cells that is at least so many points. */
  public static int cellsFor(double points) {
    return (int) Math.ceil(points / CELL_POINTS - 1e-9);
  }
}
