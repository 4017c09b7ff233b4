package earward.desktop.view;

import earward.block.check.Severity;
import earward.desktop.model.FormRow;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.util.List;
import java.util.Optional;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextField;
import javax.swing.Timer;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;
import net.miginfocom.swing.MigLayout;

/**
 * A line that is typed. Figures follow while typing; Enter, leaving the field or a rest of 600 ms
 * makes it an edit. What is wrong is said under the field and what was typed stays. A number that
 * may mean several things asks which.
 */
final class ValueField implements RowField {
  private static final int REST_MILLISECONDS = 600;
  private static int visits;

  private final Workbench workbench;
  private final JTextField field = new JTextField();
  private final JLabel fault = new JLabel();
  private final JPanel asked =
      new JPanel(new MigLayout("insets 2 0 0 0, gapx 4, hidemode 3", "", "[]"));
  private final JPanel whole =
      new JPanel(new MigLayout("insets 0, fillx, wrap 1, hidemode 3", "[grow,fill]", "[]0[]0[]"));
  private final Timer rest = new Timer(REST_MILLISECONDS, e -> enter());
  private FormRow row;
  private String visit = "";
  private boolean filling;

  ValueField(Workbench workbench, FormRow row) {
    this.workbench = workbench;
    this.row = row;
    rest.setRepeats(false);
    fault.setForeground(Look.severity(Severity.STOP));
    fault.setVisible(false);
    asked.setVisible(false);
    asked.setOpaque(false);
    whole.setOpaque(false);
    whole.add(field, "wmin 0");
    whole.add(fault, "wmin 0");
    whole.add(asked, "wmin 0");
    fill(row.words());
    listen();
  }

  private void listen() {
    field.addActionListener(e -> enter());
    field.addFocusListener(
        new FocusAdapter() {
          @Override
          public void focusGained(FocusEvent e) {
            visits++;
            visit = row.name() + " " + visits;
            field.selectAll();
          }

          @Override
          public void focusLost(FocusEvent e) {
            if (!e.isTemporary()) {
              enter();
            }
          }
        });
    field
        .getDocument()
        .addDocumentListener(
            new DocumentListener() {
              @Override
              public void insertUpdate(DocumentEvent e) {
                typed();
              }

              @Override
              public void removeUpdate(DocumentEvent e) {
                typed();
              }

              @Override
              public void changedUpdate(DocumentEvent e) {
                typed();
              }
            });
    Keys.on(field, "UP", () -> step(true));
    Keys.on(field, "DOWN", () -> step(false));
    Keys.on(field, "ESCAPE", this::revert);
  }

  @Override
  public JComponent focus() {
    return field;
  }

  @Override
  public JComponent whole() {
    return whole;
  }

  @Override
  public void show(FormRow now) {
    boolean untouched = field.getText().equals(row.words());
    row = now;
    if (untouched || !(field.isFocusOwner() || fault.isVisible() || asked.isVisible())) {
      fill(now.words());
    }
  }

  private void fill(String words) {
    if (!field.getText().equals(words)) {
      filling = true;
      field.setText(words);
      filling = false;
    }
  }

  private void typed() {
    if (filling) {
      return;
    }
    String words = field.getText();
    ask(List.of());
    rest.restart();
    if (workbench.forms().meanings(row, words).isEmpty()
        && workbench.forms().fault(workbench.design(), row, words).isEmpty()) {
      say(Optional.empty());
      workbench.type(workbench.forms().edited(workbench.design(), row, words));
    } else {
      workbench.untype();
    }
  }

  private void step(boolean up) {
    field.setText(workbench.forms().stepped(row, field.getText(), up));
    field.selectAll();
  }

  private void revert() {
    rest.stop();
    fill(row.words());
    say(Optional.empty());
    ask(List.of());
    workbench.untype();
  }

  /** Makes what is typed an edit, or says why not. */
  private void enter() {
    rest.stop();
    String words = field.getText().strip();
    if (words.equals(row.words())) {
      say(Optional.empty());
      workbench.untype();
      return;
    }
    List<String> meanings = workbench.forms().meanings(row, words);
    ask(meanings);
    if (!meanings.isEmpty()) {
      return;
    }
    Optional<String> wrong = workbench.forms().fault(workbench.design(), row, words);
    say(wrong);
    if (wrong.isEmpty()) {
      FormRow of = row;
      workbench.enter(
          visit,
          Words.of("edit.setting", row.label(), words),
          design -> workbench.forms().edited(design, of, words));
    }
  }

  private void say(Optional<String> wrong) {
    if (wrong.isPresent() != fault.isVisible() || wrong.isPresent()) {
      fault.setText(wrong.map(text -> Html.wrapped(text, 200)).orElse(""));
      fault.setVisible(wrong.isPresent());
      field.putClientProperty("JComponent.outline", wrong.isPresent() ? "error" : null);
      field.getAccessibleContext().setAccessibleDescription(wrong.orElse(row.help()));
    }
  }

  /** Asks which of several meanings is meant; nothing where there is nothing to ask. */
  private void ask(List<String> meanings) {
    if (meanings.isEmpty() && !asked.isVisible()) {
      return;
    }
    asked.removeAll();
    if (!meanings.isEmpty()) {
      asked.add(new JLabel(Words.of("ask.unit")));
    }
    for (String meaning : meanings) {
      JButton button = new JButton(meaning);
      button.setName(row.name() + "=" + meaning);
      button.setMargin(new java.awt.Insets(1, 4, 1, 4));
      button.addActionListener(
          e -> {
            field.setText(meaning);
            ask(List.of());
            enter();
            field.requestFocusInWindow();
          });
      Keys.on(button, "ENTER", button::doClick);
      asked.add(button);
    }
    asked.setVisible(!meanings.isEmpty());
    whole.revalidate();
  }
}
