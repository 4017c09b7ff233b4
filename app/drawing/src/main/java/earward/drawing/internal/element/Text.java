package earward.drawing.internal.element;

/**
 * A line of text.
 *
 * @param text what is written
 * @param x left end
 * @param baseline y of its baseline
 * @param sizePoints size
 * @param role what it is
 * @param inside the symbol within whose outline it stands; empty for text of its own
 * @param box the box of its letters
 */
public record Text(
    String text, double x, double baseline, double sizePoints, Role role, String inside, Box box)
    implements Element {
  /** What a text is. */
  public enum Role {
    REFERENCE,
    VALUE,
    TITLE,
    PIN,
    TEST_POINT,
    NET
  }

  @Override
  public Text moved(double dx, double dy) {
    return new Text(text, x + dx, baseline + dy, sizePoints, role, inside, box.moved(dx, dy));
  }

  @Override
  public Box bounds() {
    return box;
  }
}
