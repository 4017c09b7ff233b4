package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.block.check.Severity;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import javax.swing.Icon;

/** A square for STOP, a triangle for WEIGH, a ring for NOTE. */
final class SeverityIcon implements Icon {
  private static final int SIZE = 12;

  private final Severity severity;

  SeverityIcon(Severity severity) {
    this.severity = severity;
  }

  @Override
  public int getIconWidth() {
    return UIScale.scale(SIZE);
  }

  @Override
  public int getIconHeight() {
    return UIScale.scale(SIZE);
  }

  @Override
  public void paintIcon(Component c, Graphics graphics, int x, int y) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.translate(x, y);
    double s = getIconWidth();
    g.setColor(Look.severity(severity));
    switch (severity) {
      case STOP -> g.fill(new Rectangle2D.Double(s * 0.08, s * 0.08, s * 0.84, s * 0.84));
      case WEIGH -> {
        Path2D triangle = new Path2D.Double();
        triangle.moveTo(s / 2, s * 0.04);
        triangle.lineTo(s * 0.98, s * 0.94);
        triangle.lineTo(s * 0.02, s * 0.94);
        triangle.closePath();
        g.fill(triangle);
      }
      case NOTE -> {
        g.setStroke(new java.awt.BasicStroke((float) (s * 0.16)));
        g.draw(new Ellipse2D.Double(s * 0.12, s * 0.12, s * 0.76, s * 0.76));
      }
    }
    g.dispose();
  }
}
