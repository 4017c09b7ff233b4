package earward.desktop.view;

import earward.block.check.Severity;
import earward.desktop.model.FindingRow;
import earward.desktop.model.Words;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javax.swing.JPanel;
import javax.swing.JToggleButton;
import javax.swing.SwingConstants;
import net.miginfocom.swing.MigLayout;

/** The narrow rail: one button for each severity, its shape and its count; a press opens them. */
final class FindingsRail extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int ICON = 18;

  private final transient Runnable toggle;
  private final transient Map<Severity, JToggleButton> buttons = new EnumMap<>(Severity.class);

  FindingsRail(Runnable toggle) {
    super(new MigLayout("insets 8 4 8 4, wrap 1, gapy 6", "[fill,54!]", ""));
    this.toggle = toggle;
    setName("findings-rail");
    for (Severity severity : Severity.values()) {
      JToggleButton button = new JToggleButton("0", new SeverityIcon(severity, ICON));
      button.setName("rail-" + key(severity));
      button.setVerticalTextPosition(SwingConstants.BOTTOM);
      button.setHorizontalTextPosition(SwingConstants.CENTER);
      button.putClientProperty("JButton.buttonType", "toolBarButton");
      button.addActionListener(e -> toggle());
      buttons.put(severity, button);
      add(button);
    }
  }

  private static String key(Severity severity) {
    return severity.name().toLowerCase(Locale.ROOT);
  }

  private void toggle() {
    toggle.run();
  }

  void refresh(List<FindingRow> rows, boolean open) {
    buttons.forEach(
        (severity, button) -> {
          String count = String.valueOf(FindingRow.count(rows, severity));
          String word = Words.of("severity." + key(severity));
          button.setText("<html><center>" + word + "<br>" + count);
          button.setSelected(open);
          button.setToolTipText(Words.of("findings.rail", count, word));
          button.getAccessibleContext().setAccessibleName(Words.of("findings.rail", count, word));
        });
  }
}
