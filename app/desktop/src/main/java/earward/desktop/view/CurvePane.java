package earward.desktop.view;

import earward.block.quantity.Unit;
import earward.desktop.model.Amounts;
import earward.desktop.model.Words;
import earward.drawing.curve.CurvePicture;
import earward.drawing.curve.CurvePlot;
import java.awt.BasicStroke;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.OptionalDouble;
import javax.swing.JPanel;
import org.jspecify.annotations.Nullable;

/** One plot with a cursor: the mouse or the arrow keys move it, values are said beside it. */
final class CurvePane extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int KEY_STEP = 8;

  private transient @Nullable CurvePlot plot;
  private transient @Nullable CurvePicture picture;
  private OptionalDouble cursor = OptionalDouble.empty();

  CurvePane() {
    setName("curve");
    setFocusable(true);
    getAccessibleContext().setAccessibleName(Words.of("curves.name"));
    MouseAdapter mouse =
        new MouseAdapter() {
          @Override
          public void mouseMoved(MouseEvent e) {
            moveTo(e.getX());
          }

          @Override
          public void mouseDragged(MouseEvent e) {
            moveTo(e.getX());
          }

          @Override
          public void mousePressed(MouseEvent e) {
            requestFocusInWindow();
            moveTo(e.getX());
          }
        };
    addMouseListener(mouse);
    addMouseMotionListener(mouse);
    Keys.on(this, "LEFT", () -> step(-KEY_STEP));
    Keys.on(this, "RIGHT", () -> step(KEY_STEP));
  }

  private static char decimal() {
    return Amounts.of(0.5, Unit.NUMBER).contains(",") ? ',' : '.';
  }

  /** Shows a plot; nothing where there is none. */
  void show(@Nullable CurvePlot now) {
    if (now == null || !now.equals(plot)) {
      plot = now;
      picture = now == null ? null : new CurvePicture(now, Look.curves(), decimal());
      if (now != null) {
        getAccessibleContext().setAccessibleName(now.title());
      }
      repaint();
    }
  }

  /** The plot that is shown. */
  @Nullable CurvePlot plot() {
    return plot;
  }

  void relook() {
    CurvePlot now = plot;
    plot = null;
    show(now);
  }

  private void moveTo(double x) {
    CurvePicture now = picture;
    cursor = now == null ? OptionalDouble.empty() : now.across(x);
    repaint();
  }

  private void step(int by) {
    CurvePicture now = picture;
    if (now != null) {
      Rectangle2D area = now.within();
      double at = cursor.isPresent() ? now.place(cursor.getAsDouble()) + by : area.getCenterX();
      moveTo(Math.max(area.getMinX(), Math.min(area.getMaxX(), at)));
      getAccessibleContext().setAccessibleDescription(String.join(", ", said(now)));
    }
  }

  /** What the cursor says, line by line. */
  private List<String> said(CurvePicture now) {
    CurvePlot shown = plot;
    if (cursor.isEmpty() || shown == null) {
      return List.of();
    }
    double at = cursor.getAsDouble();
    List<String> lines = new java.util.ArrayList<>();
    lines.add(value(at, shown.across()));
    List<Double> heights = now.heights(at);
    for (int i = 0; i < heights.size(); i++) {
      if (Double.isFinite(heights.get(i))) {
        lines.add(shown.curves().get(i).name() + " " + value(heights.get(i), shown.up()));
      }
    }
    return lines;
  }

  private static String value(double number, CurvePlot.Axis axis) {
    return switch (axis.unit()) {
      case "Hz" -> Amounts.of(number, Unit.HERTZ);
      case "V" -> Amounts.of(number, Unit.VOLT);
      case "W" -> Amounts.of(number, Unit.WATT);
      case "dB" -> Amounts.decibels(number);
      case "%" -> Amounts.of(number / 100, Unit.FRACTION);
      case "h" -> Amounts.of(number, Unit.HOUR);
      default -> Amounts.of(number, Unit.NUMBER);
    };
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(
        java.awt.RenderingHints.KEY_TEXT_ANTIALIASING,
        java.awt.RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setColor(Look.card());
    g.fillRect(0, 0, getWidth(), getHeight());
    CurvePicture now = picture;
    if (now == null || getWidth() < 80 || getHeight() < 60) {
      g.setColor(Look.quiet());
      g.drawString(Words.of("curves.none"), 12, 22);
    } else {
      now.paint(g, new Rectangle2D.Double(0, 0, getWidth(), getHeight()));
      paintCursor(g, now);
    }
    g.dispose();
  }

  private void paintCursor(Graphics2D g, CurvePicture now) {
    if (cursor.isEmpty()) {
      return;
    }
    Rectangle2D area = now.within();
    double x = now.place(cursor.getAsDouble());
    g.setColor(Look.ink());
    g.setStroke(new BasicStroke(1f));
    g.draw(new Line2D.Double(x, area.getMinY(), x, area.getMaxY()));
    List<String> lines = said(now);
    g.setFont(Look.small());
    int line = g.getFontMetrics().getHeight();
    int wide = lines.stream().mapToInt(g.getFontMetrics()::stringWidth).max().orElse(0);
    boolean left = x + wide + 20 > area.getMaxX();
    int at = (int) (left ? x - wide - 14 : x + 8);
    g.setColor(Look.card());
    g.fillRect(at - 4, (int) area.getMinY() + 4, wide + 8, line * lines.size() + 4);
    g.setColor(Look.line());
    g.drawRect(at - 4, (int) area.getMinY() + 4, wide + 8, line * lines.size() + 4);
    g.setColor(Look.ink());
    for (int i = 0; i < lines.size(); i++) {
      g.drawString(
          lines.get(i), at, (int) area.getMinY() + 4 + line * i + g.getFontMetrics().getAscent());
    }
  }

  /** The plot as a picture, at twice the size of the screen. */
  BufferedImage image() {
    BufferedImage image =
        new BufferedImage(
            Math.max(1, getWidth()) * 2, Math.max(1, getHeight()) * 2, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.scale(2, 2);
    paint(g);
    g.dispose();
    return image;
  }
}
