package earward.drawing.internal.element;

/**
 * A rectangle in points.
 *
 * @param left smallest x
 * @param top smallest y
 * @param right largest x, at least left
 * @param bottom largest y, at least top
 */
public record Box(double left, double top, double right, double bottom) {
  public Box {
    if (!(left <= right && top <= bottom)) {
      throw new IllegalArgumentException(
          "a box from (" + left + ", " + top + ") to (" + right + ", " + bottom + ")");
    }
  }

  /** The box that has both points as corners. */
  public static Box between(double x1, double y1, double x2, double y2) {
    return new Box(Math.min(x1, x2), Math.min(y1, y2), Math.max(x1, x2), Math.max(y1, y2));
  }

  /** The same box elsewhere. */
  public Box moved(double dx, double dy) {
    return new Box(left + dx, top + dy, right + dx, bottom + dy);
  }

  /** Grown to all sides. */
  public Box grown(double by) {
    return new Box(left - by, top - by, right + by, bottom + by);
  }

  /** The least box around both. */
  public Box with(Box other) {
    return new Box(
        Math.min(left, other.left),
        Math.min(top, other.top),
        Math.max(right, other.right),
        Math.max(bottom, other.bottom));
  }

  /** Whether the insides of the two boxes meet by more than a hair (0.01 pt). */
  public boolean overlaps(Box other) {
    double hair = 0.01;
    return left < other.right - hair
        && other.left < right - hair
        && top < other.bottom - hair
        && other.top < bottom - hair;
  }

  /** Width in points. */
  public double width() {
    return right - left;
  }

  /** Height in points. */
  public double height() {
    return bottom - top;
  }

  /** The x within the box that is nearest to one. */
  public double nearestX(double x) {
    return Math.max(left, Math.min(right, x));
  }

  /** The y within the box that is nearest to one. */
  public double nearestY(double y) {
    return Math.max(top, Math.min(bottom, y));
  }
}
