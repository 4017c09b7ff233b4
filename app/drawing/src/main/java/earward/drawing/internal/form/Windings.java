package earward.drawing.internal.form;

import earward.block.device.Terminal;
import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Stroke.Style;
import java.util.List;
import java.util.Set;

/** Two coupled windings: the IF can and the audio transformer. Both upper ends at y 0. */
final class Windings {
  static final int WIDTH_CELLS = 10;
  private static final double PRIMARY_X = 18;
  private static final double SECONDARY_X = 32;
  private static final double OUTLINE = 7;
  private static final double HUMP_POINTS = 7.5;

  private Windings() {}

  /**
   * The symbol.
   *
   * @param can whether it stands in a screening can, its core a ferrite
   * @param heightCells height of the windings, even
   * @param joined the terminals that are connected
   */
  static Form of(
      boolean can, int heightCells, Set<Terminal> joined, List<String> label, Lettering lettering) {
    double height = Grid.points(heightCells);
    double right = Grid.points(WIDTH_CELLS);
    Pen pen = new Pen();
    winding(pen, PRIMARY_X, height, -90);
    winding(pen, SECONDARY_X, height, 90);
    for (double x : new double[] {24, 26}) {
      if (can) {
        pen.add(new java.awt.geom.Line2D.Double(x, 2, x, height - 2), Style.DASHED);
      } else {
        pen.line(x, 1, x, height - 1);
      }
    }
    Box body = new Box(OUTLINE, can ? -6 : 0, right - OUTLINE, height + (can ? 6 : 0));
    if (can) {
      pen.rectangle(body.left(), body.top(), body.right(), body.bottom(), Style.DASHED);
    }
    end(pen, joined, Terminal.PRIMARY_START, 0, PRIMARY_X, 0);
    end(pen, joined, Terminal.PRIMARY_END, 0, PRIMARY_X, height);
    end(pen, joined, Terminal.TOP, right, SECONDARY_X, 0);
    end(pen, joined, Terminal.BOTTOM, right, SECONDARY_X, height);
    if (joined.contains(Terminal.TAP)) {
      end(pen, joined, Terminal.TAP, right, SECONDARY_X, height / 2);
    }
    int w = WIDTH_CELLS;
    return new Form(
        pen.strokes(),
        body,
        List.of(
            new Lead(Terminal.PRIMARY_START.name(), 0, 0, Side.LEFT),
            new Lead(Terminal.PRIMARY_END.name(), 0, heightCells, Side.LEFT),
            new Lead(Terminal.TOP.name(), w, 0, Side.RIGHT),
            new Lead(Terminal.TAP.name(), w, heightCells / 2, Side.RIGHT),
            new Lead(Terminal.BOTTOM.name(), w, heightCells, Side.RIGHT)),
        lettering.above(label, right / 2, body.top() - 2.5, ""));
  }

  private static void winding(Pen pen, double x, double height, double start) {
    int humps = (int) Math.round(height / HUMP_POINTS);
    double radius = height / humps / 2;
    for (int i = 0; i < humps; i++) {
      pen.arc(x, radius + 2 * radius * i, radius, start, 180);
    }
  }

  private static void end(
      Pen pen, Set<Terminal> joined, Terminal terminal, double outer, double inner, double y) {
    if (joined.contains(terminal)) {
      pen.lead(outer, y, inner, y);
    } else {
      double at = outer < inner ? OUTLINE + 2 : outer - OUTLINE - 2;
      pen.lead(at, y, inner, y).circle(at, y, 1.2, Style.LEAD);
    }
  }
}
