package earward.desktop.view;

import java.awt.Component;
import java.awt.Dimension;
import javax.swing.JPanel;

/**
 * A panel in which one component fills all and another lies over its right side while it is open.
 */
final class OverlayPanel extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int WIDEST_SHARE = 2;

  private final Component below;
  private final Component above;
  private final int aboveWidth;

  OverlayPanel(Component below, Component above, int aboveWidth) {
    super(null);
    this.below = below;
    this.above = above;
    this.aboveWidth = aboveWidth;
    above.setVisible(false);
    add(above);
    add(below);
  }

  /** Shows what lies above, or hides it. */
  void open(boolean wanted) {
    above.setVisible(wanted);
    revalidate();
    repaint();
  }

  @Override
  public boolean isOptimizedDrawingEnabled() {
    return false; // the one lies over the other
  }

  @Override
  public void doLayout() {
    below.setBounds(0, 0, getWidth(), getHeight());
    int width = Math.min(aboveWidth, getWidth() * WIDEST_SHARE / 3);
    above.setBounds(getWidth() - width, 0, width, getHeight());
  }

  @Override
  public Dimension getPreferredSize() {
    return below.getPreferredSize();
  }

  @Override
  public Dimension getMinimumSize() {
    return new Dimension(100, 60);
  }
}
