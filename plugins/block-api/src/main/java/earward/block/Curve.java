package earward.block;

import earward.block.figure.FigureName;
import java.util.List;

/**
 * A curve that a block offers: figures over a swept setting of it. Its title is the block's text
 * {@code curve.ID}.
 *
 * @param id local name, lower case with hyphens
 * @param settingId a value or position of the block
 * @param from first value of the sweep
 * @param to last value of the sweep, above from
 * @param points how many, at least 2
 * @param figures local names
 */
public record Curve(
    String id, String settingId, double from, double to, int points, List<FigureName> figures) {
  public Curve {
    figures = List.copyOf(figures);
    if (!id.matches("[a-z0-9]+(-[a-z0-9]+)*")) {
      throw new IllegalArgumentException(
          "'" + id + "' is no curve name; wanted lower case words joined by hyphens");
    }
    if (!(from < to) || Double.isInfinite(to - from)) {
      throw new IllegalArgumentException(
          "curve '" + id + "' runs from " + from + " to " + to + "; wanted rising, finite limits");
    }
    if (points < 2 || figures.isEmpty()) {
      throw new IllegalArgumentException("curve '" + id + "' needs two points and a figure");
    }
  }
}
