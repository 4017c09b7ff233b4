package earward.desktop.model;

import earward.drawing.curve.CurvePlot;
import java.util.ArrayList;
import java.util.List;

/** A plot as CSV: RFC 4180, SI base units, decimal point; one column for each curve. */
public final class CurveText {
  private CurveText() {}

  /** The whole text, header first. */
  public static String csv(CurvePlot plot) {
    StringBuilder out = new StringBuilder(quoted(head(plot.across())));
    plot.curves()
        .forEach(
            curve -> out.append(',').append(quoted(curve.name() + " (" + plot.up().unit() + ")")));
    out.append("\r\n");
    List<Double> across = new ArrayList<>();
    plot.curves().forEach(curve -> curve.points().forEach(point -> across.add(point.across())));
    across.stream().distinct().sorted().forEach(at -> row(out, plot, at));
    return out.toString();
  }

  private static void row(StringBuilder out, CurvePlot plot, double at) {
    out.append(at);
    for (CurvePlot.Curve curve : plot.curves()) {
      out.append(',');
      curve.points().stream()
          .filter(point -> point.across() == at)
          .findFirst()
          .ifPresent(point -> out.append(point.up()));
    }
    out.append("\r\n");
  }

  private static String head(CurvePlot.Axis axis) {
    return axis.unit().isEmpty() ? axis.label() : axis.label() + " (" + axis.unit() + ")";
  }

  private static String quoted(String text) {
    return text.matches("[^,\"\r\n]*") ? text : '"' + text.replace("\"", "\"\"") + '"';
  }
}
