package earward.drawing.internal.form;

import earward.block.device.Adaptor;
import earward.block.device.Battery;
import earward.block.device.Capacitor;
import earward.block.device.CarrierGenerator;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.Fuse;
import earward.block.device.Inductor;
import earward.block.device.Loudspeaker;
import earward.block.device.MeterMovement;
import earward.block.device.Resistor;
import earward.block.device.Switch;
import earward.block.device.Terminal;
import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Stroke;
import earward.drawing.internal.element.Stroke.Style;
import java.awt.geom.AffineTransform;
import java.util.ArrayList;
import java.util.List;

/** Symbols with two ends after IEC 60617, drawn across from (0, 0) to (30, 0) and then turned. */
final class TwoEnded {
  private static final double LENGTH = Grid.points(Grid.SPAN_CELLS);
  private static final double MIDDLE = LENGTH / 2;

  private TwoEnded() {}

  /**
   * The symbol without text.
   *
   * @param way from the entering end to the other one
   */
  static Form of(Device device, Terminal entering, Side way) {
    Pen pen = new Pen();
    Box body = draw(device, pen);
    boolean mirrored = entering != device.terminals().get(0);
    AffineTransform turn = AffineTransform.getQuadrantRotateInstance(quadrants(way));
    if (mirrored) {
      turn.concatenate(new AffineTransform(-1, 0, 0, 1, LENGTH, 0));
    }
    List<Stroke> strokes =
        new ArrayList<>(pen.strokes().stream().map(stroke -> stroke.transformed(turn)).toList());
    Box turned = turned(body, turn);
    strokes.addAll(upright(device, way));
    Terminal leaving = device.terminals().get(mirrored ? 0 : 1);
    int span = Grid.SPAN_CELLS;
    return new Form(
        strokes,
        turned,
        List.of(
            new Lead(entering.name(), 0, 0, way.opposite()),
            new Lead(leaving.name(), span * way.dx(), span * way.dy(), way)),
        List.of());
  }

  private static int quadrants(Side way) {
    return switch (way) {
      case RIGHT -> 0;
      case DOWN -> 1;
      case LEFT -> 2;
      case UP -> 3;
    };
  }

  private static Box turned(Box box, AffineTransform by) {
    var bounds =
        by.createTransformedShape(
                new java.awt.geom.Rectangle2D.Double(
                    box.left(), box.top(), box.width(), box.height()))
            .getBounds2D();
    return new Box(bounds.getMinX(), bounds.getMinY(), bounds.getMaxX(), bounds.getMaxY());
  }

  private static Box draw(Device device, Pen pen) {
    if (device instanceof Resistor) {
      return bar(pen, false);
    } else if (device instanceof Fuse) {
      return bar(pen, true);
    } else if (device instanceof Capacitor capacitor) {
      return capacitor(pen, capacitor.dielectric().polarised());
    } else if (device instanceof Inductor) {
      return inductor(pen);
    } else if (device instanceof Diode) {
      return diode(pen);
    } else if (device instanceof Loudspeaker) {
      return loudspeaker(pen);
    } else if (device instanceof MeterMovement) {
      return meter(pen);
    } else if (device instanceof Battery) {
      return battery(pen);
    } else if (device instanceof Adaptor) {
      pen.rectangle(6, -9, 24, 9, Style.LINE);
      return leads(pen, 6, -9, 24, 9);
    } else if (device instanceof CarrierGenerator) {
      pen.circle(MIDDLE, 0, 9, Style.LINE);
      return leads(pen, 6, -9, 24, 9);
    } else if (device instanceof Switch) {
      return contact(pen);
    }
    throw new IllegalArgumentException("no two-ended symbol for " + device);
  }

  /** What must not be turned with the symbol. */
  private static List<Stroke> upright(Device device, Side way) {
    double x = MIDDLE * way.dx();
    double y = MIDDLE * way.dy();
    Pen pen = new Pen();
    if (device instanceof CarrierGenerator) {
      pen.sine(x, y, 5, 3.2);
    } else if (device instanceof Adaptor) {
      pen.line(x - 9, y + 9, x + 9, y - 9).sine(x - 3.8, y - 4, 3, 1.5);
      pen.line(x + 1.2, y + 3.4, x + 6.8, y + 3.4);
      pen.line(x + 1.2, y + 5.8, x + 2.8, y + 5.8).line(x + 5.2, y + 5.8, x + 6.8, y + 5.8);
    }
    return pen.strokes();
  }

  private static Box leads(Pen pen, double left, double top, double right, double bottom) {
    pen.lead(0, 0, left, 0).lead(right, 0, LENGTH, 0);
    return new Box(left, top, right, bottom);
  }

  private static Box bar(Pen pen, boolean through) {
    pen.rectangle(6, -3.5, 24, 3.5, Style.LINE);
    if (through) {
      pen.lead(6, 0, 24, 0);
    }
    return leads(pen, 6, -3.5, 24, 3.5);
  }

  private static Box capacitor(Pen pen, boolean polarised) {
    pen.line(13.3, -6.5, 13.3, 6.5).line(16.7, -6.5, 16.7, 6.5);
    leads(pen, 13.3, -6.5, 16.7, 6.5);
    if (polarised) {
      pen.plus(9.5, -4.6, 1.7);
      return new Box(7.6, -6.7, 17.2, 6.7);
    }
    return new Box(12.7, -6.7, 17.3, 6.7);
  }

  private static Box inductor(Pen pen) {
    for (int i = 0; i < 4; i++) {
      pen.arc(7.5 + 5 * i, 0, 2.5, 0, 180);
    }
    return leads(pen, 5, -3, 25, 0.6);
  }

  private static Box diode(Pen pen) {
    pen.closed(Style.LINE, 10.5, -5, 10.5, 5, 19.5, 0).line(19.5, -5, 19.5, 5);
    return leads(pen, 10.5, -5.5, 19.5, 5.5);
  }

  private static Box loudspeaker(Pen pen) {
    pen.rectangle(10, -3.5, 20, 3.5, Style.LINE);
    pen.closed(Style.LINE, 10, -3.5, 5, -11, 25, -11, 20, -3.5);
    leads(pen, 10, -3.5, 20, 3.5);
    return new Box(5, -11.5, 25, 4);
  }

  private static Box meter(Pen pen) {
    pen.circle(MIDDLE, 0, 8, Style.LINE).line(10.5, 4.5, 18.5, -3.5);
    pen.arrow(10.5, 4.5, 20, -5, 4);
    return leads(pen, 7, -8, 23, 8);
  }

  private static Box battery(Pen pen) {
    pen.line(10.5, -7, 10.5, 7).bold(13, -3.5, 13, 3.5);
    pen.line(17, -7, 17, 7).bold(19.5, -3.5, 19.5, 3.5).lead(13, 0, 17, 0);
    pen.plus(7, -5, 1.7);
    leads(pen, 10.5, -7, 19.5, 7);
    return new Box(5, -7.5, 20.5, 7.5);
  }

  private static Box contact(Pen pen) {
    pen.line(9.5, 0, 21, -6).circle(20.5, 0, 1, Style.FILLED).circle(9.5, 0, 1, Style.FILLED);
    leads(pen, 9.5, -6.5, 20.5, 1);
    return new Box(8.5, -6.5, 21.5, 1.2);
  }
}
