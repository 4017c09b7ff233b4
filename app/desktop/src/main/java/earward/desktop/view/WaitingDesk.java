package earward.desktop.view;

import earward.desktop.model.Words;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import net.miginfocom.swing.MigLayout;

/** A desk that is in its place and says what it will hold, and what can be set for it already. */
final class WaitingDesk extends JPanel {
  private static final long serialVersionUID = 1L;

  WaitingDesk(String key, Runnable settings) {
    super(new MigLayout("insets 40 60 40 60, wrap 1, gapy 10", "[480]", ""));
    setName(key);
    JLabel title = new JLabel(Words.of(key + ".title"));
    title.putClientProperty("FlatLaf.styleClass", "h2");
    JLabel says = new JLabel(Html.wrapped(Words.of(key + ".says"), 460));
    JButton open = new JButton(Words.of(key + ".settings"));
    open.setName(key + ".settings");
    open.addActionListener(e -> settings.run());
    add(title);
    add(says);
    add(open, "gaptop 8, growx 0");
  }
}
