package earward.desktop.view;

import javax.swing.JLabel;

/** A label in the quiet ink of whatever look is on. */
final class QuietLabel extends JLabel {
  private static final long serialVersionUID = 1L;

  QuietLabel(String text) {
    super(text);
  }

  @Override
  public void updateUI() {
    super.updateUI();
    setForeground(Look.quiet());
  }
}
