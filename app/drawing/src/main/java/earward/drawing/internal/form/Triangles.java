package earward.drawing.internal.form;

import earward.block.device.Terminal;
import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Stroke.Style;
import java.util.List;

/** The operational amplifier: a triangle, its upper input at (0, 0). */
final class Triangles {
  private static final double LEFT = 10;
  private static final double RIGHT = 44;
  private static final double TOP = -9;
  private static final double BOTTOM = 29;

  private Triangles() {}

  /**
   * The symbol.
   *
   * @param upper INPUT or INVERTING, whichever is drawn above
   */
  static Form of(Terminal upper, List<String> label, Lettering lettering) {
    boolean inverting = upper == Terminal.INVERTING;
    Pen pen = new Pen();
    pen.closed(Style.LINE, LEFT, TOP, RIGHT, (TOP + BOTTOM) / 2, LEFT, BOTTOM);
    pen.lead(0, 0, LEFT, 0).lead(0, 20, LEFT, 20).lead(RIGHT, 10, 50, 10);
    pen.lead(25, -10, 25, -0.6).lead(25, 30, 25, 20.6);
    double plusY = inverting ? 20 : 0;
    double minusY = inverting ? 0 : 20;
    pen.plus(15, plusY, 2).lead(13, minusY, 17, minusY);
    return new Form(
        pen.strokes(),
        new Box(LEFT, TOP, RIGHT, BOTTOM),
        List.of(
            new Lead(upper.name(), 0, 0, Side.LEFT),
            new Lead((inverting ? Terminal.INPUT : Terminal.INVERTING).name(), 0, 4, Side.LEFT),
            new Lead(Terminal.OUTPUT.name(), 10, 2, Side.RIGHT),
            new Lead(Terminal.SUPPLY.name(), 5, -2, Side.UP),
            new Lead(Terminal.GROUND.name(), 5, 6, Side.DOWN)),
        lettering.beside(label, 34, -11 - label.size() * Lettering.LINE_POINTS / 2, ""));
  }
}
