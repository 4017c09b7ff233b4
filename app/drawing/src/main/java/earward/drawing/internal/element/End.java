package earward.drawing.internal.element;

/**
 * An end of a part on the drawing.
 *
 * @param name {@code block.part:TERMINAL}
 * @param x where a wire may touch it
 * @param y where a wire may touch it
 */
public record End(String name, double x, double y) {
  /** The same end elsewhere. */
  public End moved(double dx, double dy) {
    return new End(name, x + dx, y + dy);
  }
}
