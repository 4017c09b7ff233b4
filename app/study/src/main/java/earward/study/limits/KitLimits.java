package earward.study.limits;

import earward.block.figure.FigureName;
import java.util.List;
import java.util.Optional;

/**
 * The limits of a kit's readings: at least 99 % of healthy kits pass all of them together.
 *
 * @param kits drawn kits from which they come
 * @param confidence how sure it is that the share is reached, from 0 to 1
 * @param supplyPlace test point of the supply reading that DC limits follow; empty for none
 * @param supplyVolts nominal reading there
 * @param points test points in the order of the path, each with its readings
 */
public record KitLimits(
    int kits,
    double confidence,
    Optional<String> supplyPlace,
    double supplyVolts,
    List<PointLimits> points) {
  /** Share of healthy kits that pass all limits. */
  public static final double WANTED_SHARE = 0.99;

  /** No limits. */
  public static final KitLimits NONE = new KitLimits(0, 0, Optional.empty(), 0, List.of());

  public KitLimits {
    points = List.copyOf(points);
  }

  /** The limits of a figure. */
  public Optional<PointLimits> of(FigureName figure) {
    return points.stream().filter(each -> each.figure().equals(figure)).findFirst();
  }
}
