package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.KeyFigure;
import earward.desktop.model.Standing;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.util.List;
import java.util.stream.Collectors;
import javax.swing.JPanel;

/** The watched figures in one line: digits large, their unit smaller, a difference beside them. */
final class HeadlineStrip extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int HEIGHT = 48;
  private static final int LEAST_WIDTH = 92;

  private final transient Workbench workbench;
  private transient List<KeyFigure> figures = List.of();
  private transient Runnable afterPaint = () -> {};

  HeadlineStrip(Workbench workbench) {
    this.workbench = workbench;
    setName("headline");
    setFocusable(true);
    getAccessibleContext().setAccessibleName(Words.of("headline.name"));
    setPreferredSize(UIScale.scale(new java.awt.Dimension(400, HEIGHT)));
  }

  /** Calls after each painting. */
  void onPaint(Runnable painted) {
    afterPaint = painted;
  }

  /** Takes over the present readings. */
  void refresh() {
    List<KeyFigure> now = KeyFigure.of(workbench.readings(), workbench.baseline());
    if (!now.equals(figures)) {
      figures = now;
      getAccessibleContext()
          .setAccessibleDescription(
              now.stream()
                  .map(figure -> figure.label() + " " + figure.value())
                  .collect(Collectors.joining(", ")));
      repaint();
    }
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    super.paintComponent(graphics);
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setColor(Look.line());
    g.drawLine(0, 0, getWidth(), 0);
    int inset = UIScale.scale(12);
    int most = Math.max(1, (getWidth() - inset) / UIScale.scale(LEAST_WIDTH));
    int shown = Math.min(most, figures.size());
    int each = shown == 0 ? 0 : (getWidth() - inset) / shown;
    for (int i = 0; i < shown; i++) {
      paint(g, figures.get(i), inset + i * each, each - UIScale.scale(6));
    }
    if (isFocusOwner()) {
      g.setColor(Look.copper());
      g.drawRect(1, 1, getWidth() - 3, getHeight() - 3);
    }
    g.dispose();
    afterPaint.run();
  }

  private void paint(Graphics2D g, KeyFigure figure, int x, int room) {
    Standing standing = figure.figure().standing();
    boolean unsettled = standing == Standing.PROVISIONAL || standing == Standing.FORMER;
    Font small = Look.small();
    g.setFont(small);
    g.setColor(Look.quiet());
    String label =
        figure.label() + (standing == Standing.FORMER ? " " + Words.of("key.former") : "");
    g.drawString(label, x, UIScale.scale(17));
    String[] parts = figure.value().split("[\u202f ]", 2);
    Font large =
        getFont()
            .deriveFont(
                unsettled ? Font.BOLD | Font.ITALIC : Font.BOLD, getFont().getSize2D() * 1.25f);
    g.setFont(large);
    g.setColor(standing == Standing.SETTLED ? Look.ink() : Look.quiet());
    int baseline = UIScale.scale(37);
    g.drawString(parts[0], x, baseline);
    int at = x + g.getFontMetrics().stringWidth(parts[0]) + UIScale.scale(3);
    g.setFont(small);
    if (parts.length > 1) {
      g.drawString(parts[1], at, baseline);
      at += g.getFontMetrics().stringWidth(parts[1]) + UIScale.scale(6);
    }
    if (!figure.difference().isEmpty() && at + UIScale.scale(30) < x + room) {
      g.setColor(Look.copper());
      g.drawString(figure.difference(), at, baseline);
    }
  }
}
