package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.block.check.Severity;
import java.awt.BasicStroke;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import javax.swing.Icon;

/** An octagon for STOP, a diamond filled by half for WEIGH, a circle for NOTE. */
final class SeverityIcon implements Icon {
  private static final int CORNERS = 8;

  private final Severity severity;
  private final int size;

  SeverityIcon(Severity severity, int size) {
    this.severity = severity;
    this.size = size;
  }

  @Override
  public int getIconWidth() {
    return UIScale.scale(size);
  }

  @Override
  public int getIconHeight() {
    return UIScale.scale(size);
  }

  @Override
  public void paintIcon(Component c, Graphics graphics, int x, int y) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    g.translate(x, y);
    double s = getIconWidth();
    g.setColor(Look.severity(severity));
    g.setStroke(new BasicStroke((float) Math.max(1.4, s * 0.12)));
    switch (severity) {
      case STOP -> g.fill(octagon(s));
      case WEIGH -> {
        Shape diamond = diamond(s);
        g.draw(diamond);
        g.clip(new Rectangle2D.Double(0, 0, s / 2, s));
        g.fill(diamond);
      }
      case NOTE -> g.draw(new Ellipse2D.Double(s * 0.12, s * 0.12, s * 0.76, s * 0.76));
    }
    g.dispose();
  }

  private static Shape octagon(double s) {
    Path2D path = new Path2D.Double();
    double radius = s * 0.5 / Math.cos(Math.PI / CORNERS);
    for (int i = 0; i < CORNERS; i++) {
      double angle = Math.PI / CORNERS + i * 2 * Math.PI / CORNERS;
      double px = s / 2 + radius * Math.cos(angle);
      double py = s / 2 + radius * Math.sin(angle);
      if (i == 0) {
        path.moveTo(px, py);
      } else {
        path.lineTo(px, py);
      }
    }
    path.closePath();
    return path;
  }

  private static Shape diamond(double s) {
    Path2D path = new Path2D.Double();
    path.moveTo(s / 2, s * 0.04);
    path.lineTo(s * 0.96, s / 2);
    path.lineTo(s / 2, s * 0.96);
    path.lineTo(s * 0.04, s / 2);
    path.closePath();
    return path;
  }
}
