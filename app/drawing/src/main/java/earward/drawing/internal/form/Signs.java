package earward.drawing.internal.form;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Stroke.Style;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.element.Text.Role;
import java.util.List;

/** Marks, hung on the origin. */
public final class Signs {
  private static final double FLAG_HEIGHT = 10;
  private static final double PAD = 2.2;
  private static final double POINT = 4;

  private Signs() {}

  /** Ground, hanging down. */
  public static Form ground() {
    Pen pen = new Pen();
    pen.lead(0, 0, 0, 3.5).bold(-6, 3.5, 6, 3.5).line(-3.8, 6, 3.8, 6).line(-1.6, 8.5, 1.6, 8.5);
    return new Form(pen.strokes(), new Box(-6, 3, 6, 9), List.of(lead(Side.UP)), List.of());
  }

  /** A rail: a bar with its name beyond it. */
  public static Form rail(String name, boolean up, Lettering lettering) {
    return rail(name, up, 1, lettering);
  }

  /** A rail on a pole of so many cells. */
  public static Form rail(String name, boolean up, int poleCells, Lettering lettering) {
    double pole = Grid.points(poleCells);
    double sign = up ? -1 : 1;
    Pen pen = new Pen();
    pen.lead(0, 0, 0, sign * pole).bold(-6, sign * pole, 6, sign * pole);
    double baseline = up ? -pole - 3.6 : pole + 9.4;
    Text text = lettering.centred(name, 0, baseline, Role.NET, "");
    Box body = Box.between(-6, sign * (pole - 0.8), 6, sign * (pole + 1));
    return new Form(pen.strokes(), body, List.of(lead(up ? Side.DOWN : Side.UP)), List.of(text));
  }

  /**
   * A flag on a pole: a test point or a node's name.
   *
   * @param owner the mark that the text stands in
   * @param poleCells height of the pole
   * @param up whether the pole stands up
   * @param right whether the flag flies to the right
   */
  public static Form flag(
      String text,
      Role role,
      String owner,
      int poleCells,
      boolean up,
      boolean right,
      Lettering letters) {
    double width = letters.width(text, role) + 2 * PAD;
    double end = (up ? -1 : 1) * Grid.points(poleCells);
    double top = up ? end - FLAG_HEIGHT + 2 : end - 2;
    double left = right ? 0 : -width;
    Pen pen = new Pen();
    pen.lead(0, 0, 0, end);
    pen.add(new java.awt.geom.Rectangle2D.Double(left, top, width, FLAG_HEIGHT), Style.LEAD);
    return new Form(
        pen.strokes(),
        new Box(left, top, left + width, top + FLAG_HEIGHT),
        List.of(lead(up ? Side.DOWN : Side.UP)),
        List.of(letters.at(text, left + PAD, top + FLAG_HEIGHT - 2.4, role, owner)));
  }

  /**
   * A tag with a point, lying along a wire.
   *
   * @param wireAtRight whether the wire leaves at the right of the tag
   */
  public static Form tag(String text, String owner, boolean wireAtRight, Lettering letters) {
    double width = letters.width(text, Role.NET) + 2 * PAD + POINT;
    double half = FLAG_HEIGHT / 2;
    double left = wireAtRight ? -width : 0;
    double right = left + width;
    Pen pen = new Pen();
    pen.closed(
        Style.LEAD, left, -half, right - POINT, -half, right, 0, right - POINT, half, left, half);
    return new Form(
        pen.strokes(),
        new Box(left, -half, right, half),
        List.of(lead(wireAtRight ? Side.RIGHT : Side.LEFT)),
        List.of(letters.at(text, left + PAD, half - 2.4, Role.NET, owner)));
  }

  /** The block's open end: a small ring beyond the wire's end. */
  public static Form port(boolean wireAtRight) {
    double x = wireAtRight ? -2 : 2;
    Pen pen = new Pen();
    pen.circle(x, 0, 1.8, Style.LINE);
    return new Form(
        pen.strokes(),
        new Box(x - 1.9, -1.9, x + 1.9, 1.9),
        List.of(lead(wireAtRight ? Side.RIGHT : Side.LEFT)),
        List.of());
  }

  private static Lead lead(Side side) {
    return new Lead("", 0, 0, side);
  }
}
