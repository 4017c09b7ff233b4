package earward.kit.parts;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/**
 * The one point that stands against all others: without it the others agree, and it lies far from
 * what they say.
 *
 * <p>Method: each point is left out in turn (cross-validation, common practice).
 *
 * @param point the point
 * @param misfit ln of the model's figure, fitted to the others, over the point's
 */
record Outlier<P>(P point, double misfit) {
  /** What a point must at least be off by, in ln: a fifth. */
  private static final double LEAST_MISFIT = 0.2;

  /** How much further off it must be than the others are among themselves (judgement). */
  private static final double LEAST_RATIO = 4;

  /**
   * The outlier, where there is one.
   *
   * @param points as fitted
   * @param figures how many figures were fitted: with fewer than two points more nothing can be
   *     told
   * @param fit from points to the misfit, in ln, of any point
   */
  static <P> Optional<Outlier<P>> of(
      List<P> points, int figures, Function<List<P>, ToDoubleFunction<P>> fit) {
    Optional<Outlier<P>> worst = Optional.empty();
    if (points.size() < figures + 2) {
      return worst;
    }
    double worstRatio = LEAST_RATIO;
    for (P point : points) {
      List<P> others = new ArrayList<>(points);
      others.remove(point);
      ToDoubleFunction<P> misfit = fit.apply(others);
      double own = misfit.applyAsDouble(point);
      double ratio = Math.abs(own) / Math.max(1e-6, rms(others, misfit));
      if (Math.abs(own) > LEAST_MISFIT && ratio > worstRatio) {
        worstRatio = ratio;
        worst = Optional.of(new Outlier<>(point, own));
      }
    }
    return worst;
  }

  static <P> double rms(List<P> points, ToDoubleFunction<P> misfit) {
    double sum = 0;
    for (P point : points) {
      double own = misfit.applyAsDouble(point);
      sum += own * own;
    }
    return Math.sqrt(sum / points.size());
  }

  /** How far the point's own figure lies from what the others say, as {@code 80 % above}. */
  String off() {
    double ratio = Math.exp(-misfit);
    return Math.round(100 * Math.abs(ratio - 1)) + " % " + (ratio > 1 ? "above" : "below");
  }
}
