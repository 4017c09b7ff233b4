package earward.drawing.internal.form;

import earward.block.device.BipolarTransistor;
import earward.block.device.Device;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Potentiometer;
import earward.block.device.Terminal;
import java.util.List;
import java.util.Set;

/** The door to the symbols of IEC 60617. */
public final class Symbols {
  private static final double GAP = 2.5;

  private Symbols() {}

  /** A two-ended symbol with its text: above one that lies, to the right of one that stands. */
  public static Form twoEnded(
      Device device, Terminal entering, Side way, List<String> label, Lettering lettering) {
    Form bare = TwoEnded.of(device, entering, way);
    double middleX = (bare.body().left() + bare.body().right()) / 2;
    double middleY = Grid.points(Grid.SPAN_CELLS) / 2 * way.dy();
    return bare.with(
        way.across()
            ? lettering.above(label, middleX, bare.body().top() - GAP, "")
            : lettering.beside(label, bare.body().right() + GAP + 1, middleY, ""));
  }

  /** A potentiometer, TOP at the origin. */
  public static Form track(
      Potentiometer device, boolean wiperLeft, List<String> label, Lettering lettering) {
    return Tracks.of(device, wiperLeft, label, lettering);
  }

  /** A bipolar transistor, its base at the origin. */
  public static Form transistor(
      BipolarTransistor device, Terminal upper, List<String> label, Lettering lettering) {
    return Transistors.of(device, upper, label, lettering);
  }

  /** A field-effect transistor, its gate at the origin. */
  public static Form transistor(
      FieldEffectTransistor device, Terminal upper, List<String> label, Lettering lettering) {
    return Transistors.of(device, upper, label, lettering);
  }

  /** A transformer or IF can, the start of its primary at the origin. */
  public static Form windings(
      boolean can, int heightCells, Set<Terminal> joined, List<String> label, Lettering lettering) {
    return Windings.of(can, heightCells, joined, label, lettering);
  }

  /** An operational amplifier, its upper input at the origin. */
  public static Form triangle(Terminal upper, List<String> label, Lettering lettering) {
    return Triangles.of(upper, label, lettering);
  }
}
