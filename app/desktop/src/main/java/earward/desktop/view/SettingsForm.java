package earward.desktop.view;

import earward.desktop.model.SettingRow;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.event.ActionEvent;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.util.List;
import javax.swing.AbstractAction;
import javax.swing.BorderFactory;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.KeyStroke;
import javax.swing.ScrollPaneConstants;
import net.miginfocom.swing.MigLayout;

/**
 * The settings of the selected block. A value takes what people write and is applied on Enter or
 * when the field is left; what is wrong with it is said under the field, and the text stays.
 */
final class SettingsForm extends JPanel {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final JLabel title = new JLabel();
  private final JPanel rows =
      new JPanel(new MigLayout("insets 0 0 8 8, fillx, wrap 1, hidemode 3", "[fill]", "[]2[]"));
  private transient List<SettingRow> shown = List.of();

  SettingsForm(Workbench workbench) {
    super(new MigLayout("insets 10, fill, wrap 1", "[fill]", "[][grow,fill]"));
    this.workbench = workbench;
    setName("settings");
    title.putClientProperty("FlatLaf.styleClass", "h3");
    JScrollPane scroll =
        new JScrollPane(
            rows,
            ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
            ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(16);
    add(title);
    add(scroll);
  }

  /** Shows the selected block; a form that is already right is left alone, focus and all. */
  void refresh() {
    List<SettingRow> now = workbench.forms().of(workbench.design(), workbench.selected());
    if (now.equals(shown)) {
      return;
    }
    boolean sameBlock =
        !shown.isEmpty() && !now.isEmpty() && shown.get(0).blockId().equals(now.get(0).blockId());
    String focused = sameBlock ? focusedName() : "";
    shown = now;
    title.setText(Words.of("settings.name", workbench.selected()));
    getAccessibleContext().setAccessibleName(title.getText());
    rows.removeAll();
    now.forEach(this::addRow);
    rows.revalidate();
    rows.repaint();
    for (java.awt.Component field : rows.getComponents()) {
      if (!focused.isEmpty() && focused.equals(field.getName())) {
        field.requestFocusInWindow();
      }
    }
  }

  /** Draws everything anew in the colours of the present look. */
  void relook() {
    shown = List.of();
    refresh();
  }

  private String focusedName() {
    for (java.awt.Component field : rows.getComponents()) {
      if (field.isFocusOwner() && field.getName() != null) {
        return field.getName();
      }
    }
    return "";
  }

  private void addRow(SettingRow row) {
    JLabel label = new JLabel(row.label());
    JLabel fault = new JLabel();
    fault.setForeground(Look.severity(earward.block.check.Severity.STOP));
    fault.setVisible(false);
    JComponent field = row.options().isEmpty() ? value(row, fault) : choice(row);
    field.setName(row.blockId() + "." + row.setting().id());
    field.setToolTipText(row.help().isEmpty() ? null : "<html><p width=300>" + row.help());
    field.getAccessibleContext().setAccessibleDescription(row.help());
    label.setLabelFor(field);
    label.setForeground(row.usual() ? Look.quiet() : Look.ink());
    rows.add(label, "gaptop 6");
    rows.add(field, "wmin 0");
    rows.add(fault, "wmin 0");
  }

  private JComponent choice(SettingRow row) {
    JComboBox<String> box = new JComboBox<>(row.optionLabels().toArray(String[]::new));
    int at = row.options().indexOf(row.words());
    if (at < 0) {
      box.insertItemAt(row.words(), 0);
    }
    box.setSelectedIndex(Math.max(0, at));
    int shift = at < 0 ? 1 : 0;
    box.addActionListener(
        e -> {
          int chosen = box.getSelectedIndex() - shift;
          if (chosen >= 0) {
            workbench.set(row, row.options().get(chosen));
          }
        });
    return box;
  }

  private JComponent value(SettingRow row, JLabel fault) {
    JTextField field = new JTextField(row.words());
    Runnable apply =
        () -> {
          String words = field.getText();
          String wrong = workbench.forms().fault(row, words).orElse("");
          fault.setText(wrong.isEmpty() ? "" : "<html><p width=220>" + wrong);
          fault.setVisible(!wrong.isEmpty());
          field.putClientProperty("JComponent.outline", wrong.isEmpty() ? null : "error");
          if (wrong.isEmpty()) {
            workbench.set(row, words);
          }
        };
    field.addActionListener(e -> apply.run());
    field.addFocusListener(
        new FocusAdapter() {
          @Override
          public void focusLost(FocusEvent e) {
            apply.run();
          }
        });
    step(field, row, "UP", true, apply);
    step(field, row, "DOWN", false, apply);
    return field;
  }

  private void step(JTextField field, SettingRow row, String key, boolean up, Runnable apply) {
    field.getInputMap().put(KeyStroke.getKeyStroke(key), "step-" + key);
    field
        .getActionMap()
        .put(
            "step-" + key,
            new AbstractAction() {
              private static final long serialVersionUID = 1L;

              @Override
              public void actionPerformed(ActionEvent e) {
                field.setText(workbench.forms().stepped(row, field.getText(), up));
                apply.run();
              }
            });
  }
}
