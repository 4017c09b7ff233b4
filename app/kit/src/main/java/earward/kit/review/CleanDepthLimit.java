package earward.kit.review;

import earward.block.device.Diode;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitPart;
import earward.kit.path.Figures;
import earward.kit.path.SolvedKit;
import java.util.Optional;

/** What limits the largest clean modulation, the depth of 3 % distortion. */
public enum CleanDepthLimit {
  DIAGONAL("diagonal"),
  LOAD_RATIO("load-ratio"),
  BOTH("both"),
  /** The detector still follows: its curved law distorts, as it does with little drive. */
  CURVATURE("curvature"),
  /** The power stage clips before the detector distorts. */
  POWER_STAGE("power-stage");

  /**
   * Share of the clipping depth below which the detector is not clipping yet. Clipping shows as 3 %
   * of distortion only a little beyond the depth of the rule.
   */
  private static final double NOT_CLIPPING_YET = 0.9;

  private final String key;

  CleanDepthLimit(String key) {
    this.key = key;
  }

  /** The limit as written in JSON. */
  public String key() {
    return key;
  }

  /** What limits the diode that lets go first; empty where no diode has a clean depth. */
  public static Optional<CleanDepthLimit> of(SolvedKit kit) {
    return of(kit, CaseName.TEST);
  }

  /**
   * The same in the test case or at the worst of the knobs' turn; empty where no diode has a clean
   * depth in it.
   */
  public static Optional<CleanDepthLimit> of(SolvedKit kit, CaseName caseName) {
    String first = "";
    double least = Double.POSITIVE_INFINITY;
    for (CircuitPart part : kit.assembly().circuit().parts()) {
      double depth = depth(kit.figures(), part.name(), Quantity.CLEAN_DEPTH, caseName);
      if (part.device() instanceof Diode && depth < least) {
        first = part.name();
        least = depth;
      }
    }
    if (first.isEmpty()) {
      return Optional.empty();
    }
    if (depth(kit.figures(), "path", Quantity.POWER_STAGE_DEPTH, caseName) < least) {
      return Optional.of(POWER_STAGE);
    }
    double clipping = depth(kit.figures(), first, Quantity.CLIPPING_DEPTH, caseName);
    if (least < NOT_CLIPPING_YET * clipping) {
      return Optional.of(CURVATURE);
    }
    return ClippingCause.of(kit.figures(), first, caseName).map(CleanDepthLimit::of);
  }

  private static CleanDepthLimit of(ClippingCause cause) {
    return switch (cause) {
      case DIAGONAL -> DIAGONAL;
      case LOAD_RATIO -> LOAD_RATIO;
      case BOTH -> BOTH;
    };
  }

  private static double depth(Figures figures, String place, Quantity quantity, CaseName caseName) {
    return figures.orNaN(new FigureName(place, quantity, caseName));
  }
}
