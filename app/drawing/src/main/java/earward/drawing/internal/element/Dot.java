package earward.drawing.internal.element;

/**
 * A dot where three or more wires meet.
 *
 * @param x its middle
 * @param y its middle
 */
public record Dot(double x, double y) implements Element {
  /** Radius in points. */
  public static final double RADIUS_POINTS = 1.5;

  @Override
  public Dot moved(double dx, double dy) {
    return new Dot(x + dx, y + dy);
  }

  @Override
  public Box bounds() {
    return new Box(x, y, x, y).grown(RADIUS_POINTS);
  }
}
