package earward.drawing.curve;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.text.NumberFormat;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/** A logarithmic axis with numbers at 1, 2 and 5 of each decade and ticks at the rest. */
final class DecadeAxis extends LogAxis {
  private static final long serialVersionUID = 1L;
  private static final double LEAST_PIXELS = 40;

  private final NumberFormat format;

  DecadeAxis(String label, NumberFormat format) {
    super(label);
    this.format = format;
  }

  @Override
  protected List<NumberTick> refreshTicksHorizontal(
      Graphics2D g, Rectangle2D area, RectangleEdge edge) {
    return ticks(area, edge, TextAnchor.TOP_CENTER);
  }

  @Override
  protected List<NumberTick> refreshTicksVertical(
      Graphics2D g, Rectangle2D area, RectangleEdge edge) {
    return ticks(area, edge, TextAnchor.CENTER_RIGHT);
  }

  private List<NumberTick> ticks(Rectangle2D area, RectangleEdge edge, TextAnchor anchor) {
    List<NumberTick> ticks = new ArrayList<>();
    double low = getRange().getLowerBound();
    double high = getRange().getUpperBound();
    double last = Double.NEGATIVE_INFINITY;
    for (int decade = (int) Math.floor(Math.log10(low)); Math.pow(10, decade) <= high; decade++) {
      for (int digit = 1; digit <= 9; digit++) {
        double value = digit * Math.pow(10, decade);
        if (value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)) {
          double at = valueToJava2D(value, area, edge);
          boolean named =
              (digit == 1 || digit == 2 || digit == 5) && Math.abs(at - last) >= LEAST_PIXELS;
          last = named ? at : last;
          ticks.add(
              new NumberTick(
                  named ? TickType.MAJOR : TickType.MINOR,
                  value,
                  named ? format.format(value) : "",
                  anchor,
                  TextAnchor.CENTER,
                  0));
        }
      }
    }
    return ticks;
  }
}
