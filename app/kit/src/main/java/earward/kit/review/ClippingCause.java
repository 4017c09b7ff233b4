package earward.kit.review;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.path.Figures;
import java.util.Optional;

/**
 * Why a detector lets go of deep modulation: its capacitor is taken away, then the AC coupling, and
 * the one whose removal raises the depth more is the cause; within 20 % of each other it is both.
 */
public enum ClippingCause {
  /** The capacitor cannot discharge as fast as the envelope falls. */
  DIAGONAL("diagonal"),
  /** The load is lower for audio than for DC. */
  LOAD_RATIO("load-ratio"),
  BOTH("both");

  /** The two are named together when their gains differ by at most this share of the larger. */
  private static final double ALIKE = 0.2;

  /** A gain in depth below which neither is a cause. */
  private static final double LEAST_GAIN = 1e-6;

  private final String key;

  ClippingCause(String key) {
    this.key = key;
  }

  /** The cause as written in JSON. */
  public String key() {
    return key;
  }

  /**
   * The cause at one diode; empty where the depths are not known or neither removal helps.
   *
   * @param figures of the kit
   * @param diode its place, {@code detector.d1}
   * @param caseName in which state
   */
  public static Optional<ClippingCause> of(Figures figures, String diode, CaseName caseName) {
    double depth = depth(figures, diode, Quantity.CLIPPING_DEPTH, caseName);
    double byCapacitor =
        depth(figures, diode, Quantity.CLIPPING_DEPTH_WITHOUT_CAPACITOR, caseName) - depth;
    double byCoupling =
        depth(figures, diode, Quantity.CLIPPING_DEPTH_WITHOUT_COUPLING, caseName) - depth;
    double larger = Math.max(byCapacitor, byCoupling);
    if (!(larger > LEAST_GAIN)) {
      return Optional.empty();
    }
    if (Math.abs(byCapacitor - byCoupling) <= ALIKE * larger) {
      return Optional.of(BOTH);
    }
    return Optional.of(byCapacitor > byCoupling ? DIAGONAL : LOAD_RATIO);
  }

  private static double depth(Figures figures, String diode, Quantity quantity, CaseName caseName) {
    return figures.orNaN(new FigureName(diode, quantity, caseName));
  }
}
