package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import java.awt.BasicStroke;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Path2D;
import java.awt.geom.RoundRectangle2D;
import javax.swing.AbstractButton;
import javax.swing.Icon;

/** A padlock: filled and shut where the button is pressed, open where it is not. */
final class LockIcon implements Icon {
  private static final int SIZE = 14;

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
    boolean shut = c instanceof AbstractButton button && button.isSelected();
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    g.translate(x, y);
    double s = getIconWidth();
    g.setColor(shut ? Look.copper() : Look.quiet());
    g.setStroke(new BasicStroke((float) (s * 0.1)));
    RoundRectangle2D body =
        new RoundRectangle2D.Double(
            s * (shut ? 0.16 : 0.02), s * 0.46, s * 0.68, s * 0.46, s * 0.12, s * 0.12);
    g.draw(body);
    if (shut) {
      g.fill(body);
    }
    Path2D bow = new Path2D.Double();
    double left = shut ? 0.3 : 0.62; // an open one is swung aside
    bow.moveTo(s * left, s * 0.46);
    bow.lineTo(s * left, s * 0.3);
    bow.curveTo(s * left, s * 0.02, s * (left + 0.38), s * 0.02, s * (left + 0.38), s * 0.3);
    bow.lineTo(s * (left + 0.38), shut ? s * 0.46 : s * 0.36);
    g.draw(bow);
    g.dispose();
  }
}
