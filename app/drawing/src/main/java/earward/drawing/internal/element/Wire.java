package earward.drawing.internal.element;

/**
 * A straight piece of wire, across or down.
 *
 * @param x1 one end
 * @param y1 one end
 * @param x2 the other
 * @param y2 the other
 */
public record Wire(double x1, double y1, double x2, double y2) implements Element {
  public Wire {
    if (x1 != x2 && y1 != y2) {
      throw new IllegalArgumentException("a wire runs straight across or straight down");
    }
  }

  @Override
  public Wire moved(double dx, double dy) {
    return new Wire(x1 + dx, y1 + dy, x2 + dx, y2 + dy);
  }

  @Override
  public Box bounds() {
    return Box.between(x1, y1, x2, y2);
  }

  /** Whether it runs across. */
  public boolean across() {
    return y1 == y2;
  }
}
