package earward.engine;

import earward.block.figure.FigureName;
import java.util.List;

/**
 * Figures of one case while one of its values moves: the rows of a curve.
 *
 * @param slot what moves
 * @param figures the columns
 * @param rows in the order in which they were asked for
 */
public record SweptFigures(String slot, List<FigureName> figures, List<Row> rows) {
  /**
   * One point of every curve.
   *
   * @param at value of what moves
   * @param figures in the order of the columns; NaN where one does not exist or was not solved
   */
  public record Row(double at, List<Double> figures) {
    public Row {
      figures = List.copyOf(figures);
    }
  }

  public SweptFigures {
    figures = List.copyOf(figures);
    rows = List.copyOf(rows);
  }
}
