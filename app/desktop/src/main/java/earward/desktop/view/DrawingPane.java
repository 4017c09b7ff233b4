package earward.desktop.view;

import earward.desktop.model.KitDrawing;
import earward.desktop.model.Words;
import earward.drawing.Ink;
import earward.drawing.Schematic;
import java.awt.BasicStroke;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Consumer;
import javax.swing.JPanel;
import org.jspecify.annotations.Nullable;

/**
 * The drawing at any size. A click or the arrow keys go from part to part and test point to test
 * point; Enter opens the setting of the part.
 */
final class DrawingPane extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final double LEAST = 0.4;
  private static final double MOST = 8;
  private static final double STEP = 1.2;
  private static final int MARGIN = 14;
  private static final double REACH = 2.5;

  private final transient Consumer<String> stood;
  private transient @Nullable KitDrawing drawing;
  private transient @Nullable Schematic schematic;
  private transient Map<String, Rectangle2D> places = new TreeMap<>();
  private String cursor = "";
  private double zoom = 1.35;

  /**
   * A pane without a drawing yet.
   *
   * @param stood is told which part or test point the walk stands on, {@code volume.track}
   * @param opened is told which is opened
   */
  DrawingPane(Consumer<String> stood, Consumer<String> opened) {
    this.stood = stood;
    setName("drawing");
    setFocusable(true);
    setToolTipText("");
    getAccessibleContext().setAccessibleName(Words.of("drawing.name"));
    getAccessibleContext().setAccessibleDescription(Words.of("drawing.help"));
    Keys.on(this, "LEFT", () -> walk(-1, 0));
    Keys.on(this, "RIGHT", () -> walk(1, 0));
    Keys.on(this, "UP", () -> walk(0, -1));
    Keys.on(this, "DOWN", () -> walk(0, 1));
    Keys.on(this, "ENTER", () -> opened.accept(cursor));
    addMouseListener(
        new MouseAdapter() {
          @Override
          public void mousePressed(MouseEvent e) {
            requestFocusInWindow();
            hit(e).ifPresent(DrawingPane.this::stand);
            if (e.getClickCount() == 2 && !cursor.isEmpty()) {
              opened.accept(cursor);
            }
          }
        });
    addFocusListener(
        new java.awt.event.FocusAdapter() {
          @Override
          public void focusGained(java.awt.event.FocusEvent e) {
            if (cursor.isEmpty() && !places.isEmpty()) {
              stand(places.keySet().iterator().next());
            }
            repaint();
          }

          @Override
          public void focusLost(java.awt.event.FocusEvent e) {
            repaint();
          }
        });
  }

  /** Shows a drawing with values on its flags. */
  void show(KitDrawing now, Map<String, String> values) {
    drawing = now;
    schematic = now.with(values);
    places = new TreeMap<>(now.schematic().partBounds());
    now.schematic()
        .testPointBounds()
        .forEach((key, box) -> places.put(now.flags().getOrDefault(key, key), box));
    if (!places.containsKey(cursor)) {
      cursor = "";
    }
    revalidate();
    repaint();
  }

  /** The drawing that is shown. */
  Optional<Schematic> schematic() {
    return Optional.ofNullable(schematic);
  }

  /** Only the values change. */
  void values(Map<String, String> values) {
    KitDrawing now = drawing;
    if (now != null) {
      schematic = now.with(values);
      repaint();
    }
  }

  /** Points of the drawing that fit across. */
  double pointsAcross(int pixels) {
    return (pixels - 2.0 * MARGIN) / zoom;
  }

  void larger() {
    zoom(Math.min(MOST, zoom * STEP));
  }

  void smaller() {
    zoom(Math.max(LEAST, zoom / STEP));
  }

  private void zoom(double changed) {
    zoom = changed;
    revalidate();
    repaint();
  }

  double zoom() {
    return zoom;
  }

  private Optional<String> hit(MouseEvent e) {
    Point2D at = new Point2D.Double((e.getX() - MARGIN) / zoom, (e.getY() - MARGIN) / zoom);
    return places.entrySet().stream()
        .filter(place -> grown(place.getValue(), 2).contains(at))
        .min(java.util.Comparator.comparingDouble(place -> area(place.getValue())))
        .map(Map.Entry::getKey);
  }

  private static double area(Rectangle2D box) {
    return box.getWidth() * box.getHeight();
  }

  private static Rectangle2D grown(Rectangle2D box, double by) {
    return new Rectangle2D.Double(
        box.getX() - by, box.getY() - by, box.getWidth() + 2 * by, box.getHeight() + 2 * by);
  }

  /** To the nearest place in a direction; sideways counts more than ahead. */
  private void walk(int dx, int dy) {
    Rectangle2D from = places.get(cursor);
    if (from == null) {
      places.keySet().stream().findFirst().ifPresent(this::stand);
      return;
    }
    String best = "";
    double least = Double.POSITIVE_INFINITY;
    for (Map.Entry<String, Rectangle2D> place : places.entrySet()) {
      double x = place.getValue().getCenterX() - from.getCenterX();
      double y = place.getValue().getCenterY() - from.getCenterY();
      double ahead = dx * x + dy * y;
      double aside = Math.abs(dx * y) + Math.abs(dy * x);
      double cost = ahead + REACH * aside;
      if (ahead > 1 && cost < least) {
        least = cost;
        best = place.getKey();
      }
    }
    if (!best.isEmpty()) {
      stand(best);
    }
  }

  /** Stands on a part or test point. */
  void stand(String place) {
    if (!cursor.equals(place) && places.containsKey(place)) {
      cursor = place;
      getAccessibleContext().setAccessibleDescription(place);
      Rectangle2D box = places.get(place);
      if (box != null) {
        scrollRectToVisible(screen(grown(box, 30)));
      }
      stood.accept(place);
      repaint();
    }
  }

  private Rectangle screen(Rectangle2D box) {
    return new Rectangle(
        (int) (MARGIN + box.getX() * zoom),
        (int) (MARGIN + box.getY() * zoom),
        (int) Math.ceil(box.getWidth() * zoom),
        (int) Math.ceil(box.getHeight() * zoom));
  }

  @Override
  public @Nullable String getToolTipText(MouseEvent e) {
    return hit(e).orElse(null);
  }

  @Override
  public Dimension getPreferredSize() {
    Schematic now = schematic;
    return now == null
        ? new Dimension(200, 120)
        : new Dimension(
            (int) Math.ceil(now.width() * zoom) + 2 * MARGIN,
            (int) Math.ceil(now.height() * zoom) + 2 * MARGIN);
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(
        java.awt.RenderingHints.KEY_TEXT_ANTIALIASING,
        java.awt.RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    Ink ink = Look.drawing();
    g.setColor(ink.paper());
    g.fillRect(0, 0, getWidth(), getHeight());
    Schematic now = schematic;
    if (now == null) {
      g.setColor(Look.quiet());
      g.drawString(Words.of("drawing.none"), MARGIN, 2 * MARGIN);
      g.dispose();
      return;
    }
    g.translate(MARGIN, MARGIN);
    g.scale(zoom, zoom);
    Rectangle2D box = places.get(cursor);
    if (box != null) {
      mark(g, grown(box, 4));
    }
    now.paint(g, ink);
    g.dispose();
  }

  private void mark(Graphics2D g, Rectangle2D box) {
    g.setRenderingHint(
        java.awt.RenderingHints.KEY_ANTIALIASING, java.awt.RenderingHints.VALUE_ANTIALIAS_ON);
    RoundRectangle2D shape =
        new RoundRectangle2D.Double(box.getX(), box.getY(), box.getWidth(), box.getHeight(), 5, 5);
    g.setColor(Look.ground());
    g.fill(shape);
    g.setColor(Look.copper());
    g.setStroke(new BasicStroke(isFocusOwner() ? 1.6f : 0.8f));
    g.draw(shape);
  }
}
