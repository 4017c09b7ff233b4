package earward.study.limits;

import earward.block.figure.FigureName;
import earward.kit.path.PlacedTestPoint;
import java.util.Objects;

/**
 * What a healthy kit reads at one test point in one case.
 *
 * @param point where
 * @param figure what
 * @param instrument with which it is read; empty where none of the bench can
 * @param trouble why none can; empty where one can
 * @param expected reading of the nominal kit on that instrument, its loading included
 * @param low lowest reading of a healthy kit, at the nominal supply reading
 * @param high highest reading of a healthy kit, at the nominal supply reading
 * @param perSupplyVolt by how much both move for each volt of the builder's own supply reading
 *     above the nominal one; 0 where they do not follow it
 * @param loadedShare share of the voltage that is left with the instrument across the point
 */
public record PointLimits(
    PlacedTestPoint point,
    FigureName figure,
    String instrument,
    String trouble,
    double expected,
    double low,
    double high,
    double perSupplyVolt,
    double loadedShare) {
  public PointLimits {
    Objects.requireNonNull(point);
    Objects.requireNonNull(figure);
    Objects.requireNonNull(instrument);
    Objects.requireNonNull(trouble);
  }

  /** Whether an instrument of the bench reads it. */
  public boolean readable() {
    return trouble.isEmpty();
  }

  /**
   * Whether a reading is that of a healthy kit.
   *
   * @param reading on the instrument
   * @param supplyAbove the builder's supply reading less the nominal one, in V
   */
  public boolean holds(double reading, double supplyAbove) {
    double shift = perSupplyVolt * supplyAbove;
    return reading >= low + shift && reading <= high + shift;
  }
}
