package earward.sheet.content;

import java.awt.Graphics2D;
import java.util.List;
import java.util.Objects;
import java.util.function.Consumer;

/**
 * The drawing of the whole path, row by row, so that pages may break between rows.
 *
 * @param rows from the top
 */
public record PathDrawing(List<Row> rows) {

  /**
   * One row.
   *
   * @param widthPoints in 1/72 inch
   * @param heightPoints in 1/72 inch
   * @param paint paints the row with its upper left corner at the origin
   */
  public record Row(double widthPoints, double heightPoints, Consumer<Graphics2D> paint) {
    public Row {
      Objects.requireNonNull(paint);
      if (!(widthPoints > 0) || !(heightPoints > 0)) {
        throw new IllegalArgumentException("a row of the drawing has a width and a height");
      }
    }
  }

  public PathDrawing {
    rows = List.copyOf(rows);
  }

  /** No drawing: a path without blocks. */
  public static PathDrawing none() {
    return new PathDrawing(List.of());
  }
}
