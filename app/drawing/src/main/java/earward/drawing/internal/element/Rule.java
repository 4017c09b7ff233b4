package earward.drawing.internal.element;

/**
 * A thin dashed line that connects nothing: a seam.
 *
 * @param x its place
 * @param top upper end
 * @param bottom lower end
 */
public record Rule(double x, double top, double bottom) implements Element {
  @Override
  public Rule moved(double dx, double dy) {
    return new Rule(x + dx, top + dy, bottom + dy);
  }

  @Override
  public Box bounds() {
    return new Box(x, top, x, bottom);
  }
}
