package earward.desktop.view;

import earward.block.Role;
import earward.desktop.model.Words;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import net.miginfocom.swing.MigLayout;

/** What stands in the drawing's place while the path has no block: the ways to begin. */
final class EmptyPath extends JPanel {
  private static final long serialVersionUID = 1L;

  EmptyPath(BlockCommands blocks, Runnable propose, Runnable toConditions) {
    super(new MigLayout("insets 48 60 24 60, wrap 1, gapy 10", "[420]", ""));
    setName("empty-path");
    setBackground(Look.card());
    JLabel title = new JLabel(Words.of("empty.title"));
    title.putClientProperty("FlatLaf.styleClass", "h2");
    JLabel says = new JLabel(Html.wrapped(Words.of("empty.says"), 400));
    add(title);
    add(says);
    add(button("empty.conditions", toConditions), "gaptop 10, growx");
    add(button("empty.propose", propose), "growx");
    add(button("empty.detector", () -> blocks.fill(Role.DETECTOR)), "growx");
    add(button("empty.feed", () -> blocks.fill(Role.FEED)), "growx");
  }

  private static JButton button(String key, Runnable run) {
    JButton button = new JButton(Words.of(key));
    button.setName(key);
    button.addActionListener(e -> run.run());
    return button;
  }

  void relook() {
    setBackground(Look.card());
  }
}
