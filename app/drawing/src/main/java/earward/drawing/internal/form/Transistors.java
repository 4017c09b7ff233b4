package earward.drawing.internal.form;

import earward.block.device.BipolarTransistor;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Terminal;
import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Stroke;
import java.awt.geom.AffineTransform;
import java.util.List;

/**
 * Transistors: the controlling end at the left at (0, 0), the others four cells right, up, down.
 */
final class Transistors {
  static final int RIGHT_CELLS = 4;
  static final int HALF_CELLS = 3;
  private static final double BAR = 11;

  private Transistors() {}

  /**
   * The symbol.
   *
   * @param upper the terminal that points up
   */
  static Form of(
      BipolarTransistor device, Terminal upper, List<String> label, Lettering lettering) {
    boolean emitterUp = upper == Terminal.EMITTER;
    Pen pen = new Pen();
    double x = Grid.points(RIGHT_CELLS);
    double y = Grid.points(HALF_CELLS);
    pen.lead(0, 0, BAR, 0).bold(BAR, -6.5, BAR, 6.5);
    pen.line(BAR, -2.5, x, -8).lead(x, -8, x, -y).line(BAR, 2.5, x, 8).lead(x, 8, x, y);
    if (device.model().pnp()) {
      pen.arrow(x, 8, BAR + 1.5, 3.4, 5);
    } else {
      pen.arrow(BAR, 2.5, x - 0.8, 7.6, 5);
    }
    return finished(
        pen,
        Terminal.BASE,
        emitterUp ? Terminal.EMITTER : Terminal.COLLECTOR,
        emitterUp ? Terminal.COLLECTOR : Terminal.EMITTER,
        emitterUp,
        lettering.beside(label, x + 4, 0, ""));
  }

  /** The symbol of a junction field-effect transistor. */
  static Form of(
      FieldEffectTransistor device, Terminal upper, List<String> label, Lettering lettering) {
    boolean sourceUp = upper == Terminal.SOURCE;
    Pen pen = new Pen();
    double x = Grid.points(RIGHT_CELLS);
    double y = Grid.points(HALF_CELLS);
    pen.bold(BAR, -7, BAR, 7).line(0, 0, BAR, 0);
    pen.line(BAR, -5, x, -5).lead(x, -5, x, -y).line(BAR, 5, x, 5).lead(x, 5, x, y);
    if (device.model().pChannel()) {
      pen.arrow(BAR, 0, 3, 0, 5.5);
    } else {
      pen.arrow(0, 0, BAR - 1, 0, 5.5);
    }
    return finished(
        pen,
        Terminal.GATE,
        sourceUp ? Terminal.SOURCE : Terminal.DRAIN,
        sourceUp ? Terminal.DRAIN : Terminal.SOURCE,
        sourceUp,
        lettering.beside(label, x + 4, 0, ""));
  }

  private static Form finished(
      Pen pen,
      Terminal control,
      Terminal upper,
      Terminal lower,
      boolean flipped,
      List<earward.drawing.internal.element.Text> texts) {
    AffineTransform flip = AffineTransform.getScaleInstance(1, flipped ? -1 : 1);
    List<Stroke> strokes = pen.strokes().stream().map(s -> s.transformed(flip)).toList();
    return new Form(
        strokes,
        new Box(2, -9, Grid.points(RIGHT_CELLS) + 1, 9),
        List.of(
            new Lead(control.name(), 0, 0, Side.LEFT),
            new Lead(upper.name(), RIGHT_CELLS, -HALF_CELLS, Side.UP),
            new Lead(lower.name(), RIGHT_CELLS, HALF_CELLS, Side.DOWN)),
        texts);
  }
}
