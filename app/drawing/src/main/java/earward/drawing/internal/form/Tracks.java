package earward.drawing.internal.form;

import earward.block.device.Potentiometer;
import earward.block.device.Terminal;
import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Stroke.Style;
import java.util.ArrayList;
import java.util.List;

/**
 * The potentiometer, upright: TOP at (0, 0), BOTTOM ten cells below, the wiper at the side, a tap
 * at the other.
 */
final class Tracks {
  static final int WIPER_DOWN_CELLS = 6;
  static final int LENGTH_CELLS = 10;
  static final int WIPER_OUT_CELLS = 4;

  private Tracks() {}

  static Form of(Potentiometer device, boolean wiperLeft, List<String> label, Lettering lettering) {
    Pen pen = new Pen();
    double sign = wiperLeft ? -1 : 1;
    double middle = Grid.points(WIPER_DOWN_CELLS);
    double out = sign * Grid.points(WIPER_OUT_CELLS);
    pen.rectangle(-3.5, middle - 10, 3.5, middle + 10, Style.LINE);
    pen.lead(0, 0, 0, middle - 10).lead(0, middle + 10, 0, Grid.points(LENGTH_CELLS));
    if (device.trimmer()) {
      pen.lead(out, middle, sign * 3.5, middle);
      pen.line(sign * 6.5, middle - 3.5, sign * 6.5, middle + 3.5);
    } else {
      pen.lead(out, middle, sign * 8, middle).arrow(out, middle, sign * 3.8, middle, 5.5);
    }
    if (device.tapped()) {
      pen.lead(-out, middle, -sign * 3.5, middle);
    }
    Box body =
        wiperLeft
            ? new Box(-9.3, middle - 10, 3.5, middle + 10)
            : new Box(-3.5, middle - 10, 9.3, middle + 10);
    List<Lead> leads =
        new ArrayList<>(
            List.of(
                new Lead(Terminal.TOP.name(), 0, 0, Side.UP),
                side(Terminal.WIPER, wiperLeft),
                new Lead(Terminal.BOTTOM.name(), 0, LENGTH_CELLS, Side.DOWN)));
    if (device.tapped()) {
      leads.add(side(Terminal.TAP, !wiperLeft));
    }
    Form bare = new Form(pen.strokes(), body, leads, List.of());
    boolean under = !wiperLeft || device.tapped();
    return bare.with(
        lettering.beside(label, wiperLeft ? 7 : 12.5, middle + (under ? 13.5 : 0), ""));
  }

  private static Lead side(Terminal terminal, boolean left) {
    return new Lead(
        terminal.name(),
        left ? -WIPER_OUT_CELLS : WIPER_OUT_CELLS,
        WIPER_DOWN_CELLS,
        left ? Side.LEFT : Side.RIGHT);
  }
}
