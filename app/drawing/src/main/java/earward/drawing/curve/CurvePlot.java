package earward.drawing.curve;

import java.util.List;
import java.util.Objects;

/**
 * One picture of curves, as data. Immutable.
 *
 * @param title what it shows
 * @param across the axis from left to right
 * @param up the axis from bottom to top
 * @param curves at least none
 * @param limits lines that say where something begins or ends
 */
public record CurvePlot(
    String title, Axis across, Axis up, List<Curve> curves, List<Limit> limits) {
  /**
   * An axis.
   *
   * @param label what is measured
   * @param unit its symbol, without a prefix; empty for a plain number
   * @param logarithmic whether like ratios are like lengths
   * @param prefixed whether the unit takes prefixes, as in 10 kHz
   */
  public record Axis(String label, String unit, boolean logarithmic, boolean prefixed) {}

  /**
   * A curve.
   *
   * @param name of it
   * @param points from left to right
   * @param kind how it is drawn
   */
  public record Curve(String name, List<Point> points, Kind kind) {
    public Curve {
      points = List.copyOf(points);
      Objects.requireNonNull(kind);
    }
  }

  /** A point, in the units of the axes. */
  public record Point(double across, double up) {}

  /** How a curve is drawn: told apart by its line, not by its colour alone. */
  public enum Kind {
    /** The curve itself. */
    MAIN,
    /** One beside it. */
    SECOND,
    /** One more beside it. */
    THIRD,
    /** Of the pinned baseline, or of what would be ideal. */
    GHOST
  }

  /**
   * A limit line.
   *
   * @param label what it says
   * @param value where it stands
   * @param upright whether it stands on the axis across
   */
  public record Limit(String label, double value, boolean upright) {}

  public CurvePlot {
    Objects.requireNonNull(title);
    Objects.requireNonNull(across);
    Objects.requireNonNull(up);
    curves = List.copyOf(curves);
    limits = List.copyOf(limits);
  }

  /** Whether there is anything to draw. */
  public boolean empty() {
    return curves.stream().allMatch(curve -> curve.points().isEmpty());
  }
}
