package earward.desktop.view;

import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.sheet.content.PathDrawing;
import earward.sheet.content.SheetContent;
import java.awt.Color;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import javax.swing.JPanel;

/** The drawing of the whole path as the sheet has it, on white paper, at any size. */
final class DrawingPane extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final double LEAST = 0.5;
  private static final double MOST = 6;
  private static final double STEP = 1.25;
  private static final int MARGIN = 16;

  private final transient Workbench workbench;
  private transient PathDrawing drawing = PathDrawing.none();
  private double zoom = 1.4;

  DrawingPane(Workbench workbench) {
    this.workbench = workbench;
    setName("drawing");
    setFocusable(true);
    getAccessibleContext().setAccessibleName(Words.of("drawing.name"));
  }

  void refresh() {
    PathDrawing now = workbench.content().map(SheetContent::drawing).orElse(PathDrawing.none());
    if (!now.equals(drawing)) {
      drawing = now;
      revalidate();
      repaint();
    }
  }

  void larger() {
    zoom = Math.min(MOST, zoom * STEP);
    revalidate();
    repaint();
  }

  void smaller() {
    zoom = Math.max(LEAST, zoom / STEP);
    revalidate();
    repaint();
  }

  @Override
  public Dimension getPreferredSize() {
    double width = 0;
    double height = 0;
    for (PathDrawing.Row row : drawing.rows()) {
      width = Math.max(width, row.widthPoints());
      height += row.heightPoints();
    }
    return new Dimension(
        (int) Math.ceil(width * zoom) + 2 * MARGIN, (int) Math.ceil(height * zoom) + 2 * MARGIN);
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, getWidth(), getHeight());
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    g.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    if (drawing.rows().isEmpty()) {
      g.setColor(Color.DARK_GRAY);
      g.drawString(Words.of("drawing.none"), MARGIN, 2 * MARGIN);
    }
    g.translate(MARGIN, MARGIN);
    g.scale(zoom, zoom);
    for (PathDrawing.Row row : drawing.rows()) {
      row.paint().accept(g);
      g.translate(0, row.heightPoints());
    }
    g.dispose();
  }
}
