package earward.drawing.curve;

import earward.drawing.curve.CurvePlot.Curve;
import earward.drawing.curve.CurvePlot.Kind;
import earward.drawing.curve.CurvePlot.Limit;
import earward.drawing.curve.CurvePlot.Point;
import java.awt.BasicStroke;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnitSource;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Draws a plot, and tells what a place in the picture means. For one thread. */
public final class CurvePicture {
  private static final float[] LONG_DASH = {7f, 4f};
  private static final float[] SHORT_DASH = {2f, 3f};
  private static final float[] LIMIT_DASH = {6f, 3f, 1.5f, 3f};

  private final CurvePlot plot;
  private final CurveInk ink;
  private final char decimal;
  private final JFreeChart chart;
  private final ChartRenderingInfo info = new ChartRenderingInfo();

  /**
   * A picture of a plot.
   *
   * @param decimal sign of the numbers at the axes
   */
  public CurvePicture(CurvePlot plot, CurveInk ink, char decimal) {
    this.plot = plot;
    this.ink = ink;
    this.decimal = decimal;
    chart = new JFreeChart(null, ink.font(), xyPlot(), false);
    chart.setBackgroundPaint(ink.paper());
    chart.setPadding(new RectangleInsets(4, 2, 2, 10));
    chart.addSubtitle(legend());
  }

  private LegendTitle legend() {
    LegendTitle legend = new LegendTitle(chart.getPlot());
    legend.setItemFont(ink.font());
    legend.setItemPaint(ink.text());
    legend.setBackgroundPaint(ink.paper());
    legend.setPosition(RectangleEdge.TOP);
    return legend;
  }

  private XYPlot xyPlot() {
    XYSeriesCollection data = new XYSeriesCollection();
    XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
    for (int i = 0; i < plot.curves().size(); i++) {
      Curve curve = plot.curves().get(i);
      XYSeries series = new XYSeries(i + " " + curve.name(), false);
      for (Point point : curve.points()) {
        if (Double.isFinite(point.up())) {
          series.add(point.across(), point.up());
        }
      }
      data.addSeries(series);
      renderer.setSeriesStroke(i, stroke(curve.kind()));
      renderer.setSeriesPaint(
          i,
          switch (curve.kind()) {
            case MAIN -> ink.line();
            case SECOND, THIRD -> ink.second();
            case GHOST -> ink.quiet();
          });
    }
    renderer.setLegendItemLabelGenerator((set, index) -> plot.curves().get(index).name());
    renderer.setDrawSeriesLineAsPath(true);
    renderer.setLegendLine(new java.awt.geom.Line2D.Double(-12, 0, 12, 0));
    XYPlot xy = new XYPlot(data, axis(plot.across()), axis(plot.up()), renderer);
    xy.setBackgroundPaint(ink.paper());
    xy.setDomainGridlinePaint(ink.quiet());
    xy.setRangeGridlinePaint(ink.quiet());
    xy.setDomainGridlineStroke(new BasicStroke(0.4f));
    xy.setRangeGridlineStroke(new BasicStroke(0.4f));
    xy.setOutlinePaint(ink.quiet());
    plot.limits().forEach(limit -> mark(xy, limit));
    return xy;
  }

  private static BasicStroke stroke(Kind kind) {
    return switch (kind) {
      case MAIN -> new BasicStroke(2f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
      case SECOND -> dashed(1.6f, LONG_DASH);
      case THIRD -> dashed(1.6f, SHORT_DASH);
      case GHOST -> dashed(1.2f, new float[] {3f, 3f});
    };
  }

  private static BasicStroke dashed(float width, float[] dash) {
    return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1, dash, 0);
  }

  private ValueAxis axis(CurvePlot.Axis axis) {
    String label = axis.unit().isEmpty() ? axis.label() : axis.label() + " (" + axis.unit() + ")";
    ValueAxis made;
    PrefixFormat format = new PrefixFormat(axis.prefixed(), decimal);
    if (axis.logarithmic()) {
      LogAxis log = new DecadeAxis(label, format);
      log.setSmallestValue(1e-15);
      log.setLowerMargin(0);
      log.setUpperMargin(0);
      made = log;
    } else {
      NumberAxis number = new NumberAxis(label);
      number.setAutoRangeIncludesZero(false);
      number.setStandardTickUnits(new NumberTickUnitSource(false, format));
      number.setAutoRangeMinimumSize(1e-9);
      number.setNumberFormatOverride(format);
      made = number;
    }
    made.setLabelFont(ink.font());
    made.setTickLabelFont(ink.font().deriveFont(Font.PLAIN, ink.font().getSize2D() * 0.92f));
    made.setLabelPaint(ink.text());
    made.setTickLabelPaint(ink.text());
    made.setAxisLinePaint(ink.quiet());
    made.setTickMarkPaint(ink.quiet());
    return made;
  }

  private void mark(XYPlot xy, Limit limit) {
    ValueMarker marker = new ValueMarker(limit.value(), ink.limit(), dashed(1.2f, LIMIT_DASH));
    marker.setLabel(limit.label());
    marker.setLabelFont(ink.font());
    marker.setLabelPaint(ink.limit());
    marker.setLabelBackgroundColor(ink.paper());
    if (limit.upright()) {
      marker.setLabelAnchor(RectangleAnchor.TOP_LEFT);
      marker.setLabelTextAnchor(TextAnchor.TOP_RIGHT);
      xy.addDomainMarker(marker);
    } else {
      marker.setLabelAnchor(RectangleAnchor.TOP_RIGHT);
      marker.setLabelTextAnchor(TextAnchor.BOTTOM_RIGHT);
      xy.addRangeMarker(marker);
    }
  }

  /** Draws it. */
  public void paint(Graphics2D graphics, Rectangle2D area) {
    chart.draw(graphics, area, info);
  }

  /** The area within the axes, as it was last drawn. */
  public Rectangle2D within() {
    return info.getPlotInfo().getDataArea();
  }

  /** What a place in the picture that was last drawn is on the axis across; empty outside. */
  public OptionalDouble across(double x) {
    Rectangle2D area = within();
    if (area.getWidth() <= 0 || x < area.getMinX() || x > area.getMaxX()) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(
        chart.getXYPlot().getDomainAxis().java2DToValue(x, area, RectangleEdge.BOTTOM));
  }

  /** The place across of a value in the picture that was last drawn. */
  public double place(double across) {
    return chart.getXYPlot().getDomainAxis().valueToJava2D(across, within(), RectangleEdge.BOTTOM);
  }

  /** The height of every curve at a value across, NaN where it does not reach. */
  public List<Double> heights(double across) {
    List<Double> heights = new ArrayList<>();
    for (Curve curve : plot.curves()) {
      heights.add(height(curve.points(), across, plot.across().logarithmic()));
    }
    return heights;
  }

  /** Between two points a straight line, in the measure of the axis. */
  private static double height(List<Point> points, double across, boolean logarithmic) {
    for (int i = 1; i < points.size(); i++) {
      Point left = points.get(i - 1);
      Point right = points.get(i);
      if (across >= left.across() && across <= right.across()) {
        double share =
            logarithmic
                ? Math.log(across / left.across()) / Math.log(right.across() / left.across())
                : (across - left.across()) / (right.across() - left.across());
        return left.up() + share * (right.up() - left.up());
      }
    }
    return Double.NaN;
  }
}
