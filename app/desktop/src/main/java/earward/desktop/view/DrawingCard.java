package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.drawing.Schematic;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import javax.swing.JButton;
import org.jspecify.annotations.Nullable;

/** A press that shows a real drawing in small, a name and one line. */
final class DrawingCard extends JButton {
  private static final long serialVersionUID = 1L;
  private static final int WIDTH = 372;
  private static final int HEIGHT = 250;
  private static final int TEXT = 70;

  private final String title;
  private final String line;
  private transient @Nullable Schematic drawing;

  DrawingCard(String title, String line) {
    this.title = title;
    this.line = line;
    getAccessibleContext().setAccessibleName(title);
    getAccessibleContext().setAccessibleDescription(line);
    setBorderPainted(false);
    setContentAreaFilled(false);
    setFocusPainted(false);
    setToolTipText(line);
  }

  void show(Schematic schematic) {
    drawing = schematic;
    repaint();
  }

  @Override
  public Dimension getPreferredSize() {
    return UIScale.scale(new Dimension(WIDTH, HEIGHT));
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setColor(Look.card());
    g.fillRect(0, 0, getWidth(), getHeight());
    int pad = UIScale.scale(10);
    int foot = getHeight() - UIScale.scale(TEXT);
    Schematic shown = drawing;
    if (shown != null) {
      double scale =
          Math.min((getWidth() - 2.0 * pad) / shown.width(), (foot - 2.0 * pad) / shown.height());
      Graphics2D d = (Graphics2D) g.create();
      d.translate(pad + (getWidth() - 2.0 * pad - shown.width() * scale) / 2, pad);
      d.scale(scale, scale);
      shown.paint(d, Look.drawing());
      d.dispose();
    }
    g.setColor(isFocusOwner() || getModel().isRollover() ? Look.copper() : Look.line());
    int border = isFocusOwner() ? 2 : 1;
    for (int i = 0; i < border; i++) {
      g.drawRect(i, i, getWidth() - 1 - 2 * i, getHeight() - 1 - 2 * i);
    }
    g.drawLine(pad, foot, getWidth() - pad, foot);
    g.setColor(Look.ink());
    g.setFont(getFont().deriveFont(Font.BOLD, getFont().getSize2D() * 1.1f));
    g.drawString(title, pad, foot + UIScale.scale(20));
    g.setFont(Look.small());
    g.setColor(Look.quiet());
    lines(g, pad, foot + UIScale.scale(38), getWidth() - 2 * pad);
    g.dispose();
  }

  private void lines(Graphics2D g, int x, int y, int room) {
    StringBuilder now = new StringBuilder();
    int at = y;
    for (String word : line.split(" ")) {
      if (now.length() > 0 && g.getFontMetrics().stringWidth(now + " " + word) > room) {
        g.drawString(now.toString(), x, at);
        now.setLength(0);
        at += g.getFontMetrics().getHeight();
      }
      now.append(now.length() > 0 ? " " : "").append(word);
    }
    g.drawString(now.toString(), x, at);
  }
}
