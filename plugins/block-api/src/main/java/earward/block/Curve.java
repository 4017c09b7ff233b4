package earward.block;

import earward.block.figure.FigureName;
import java.util.List;

/**
 * A curve that a block offers: figures over a swept setting of it. Its title is the block's text
 * {@code curve.ID}.
 *
 * @param id local name
 * @param settingId a value or position of the block
 * @param from first value of the sweep
 * @param to last value of the sweep
 * @param points how many, at least 2
 * @param figures local names
 */
public record Curve(
    String id, String settingId, double from, double to, int points, List<FigureName> figures) {
  public Curve {
    figures = List.copyOf(figures);
    if (points < 2 || figures.isEmpty()) {
      throw new IllegalArgumentException("curve '" + id + "' needs two points and a figure");
    }
  }
}
