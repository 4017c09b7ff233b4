package earward.desktop.view;

import earward.desktop.model.FormRow;
import earward.desktop.model.PartChoice;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.SwingConstants;

/** A line with a part of the library; a press opens the picker with figures and sources. */
final class PartField implements RowField {
  private final Workbench workbench;
  private final JButton button = new JButton();
  private FormRow row;

  PartField(Workbench workbench, FormRow row) {
    this.workbench = workbench;
    this.row = row;
    button.setHorizontalAlignment(SwingConstants.LEADING);
    button.addActionListener(e -> pick());
    Keys.on(button, "ENTER", this::pick);
    Keys.on(button, "UP", () -> step(-1));
    Keys.on(button, "DOWN", () -> step(1));
    show(row);
  }

  private List<PartChoice> choices() {
    return PartChoice.of(workbench.workshop().parts(), ((FormRow.Part) row.input()).kind());
  }

  private void pick() {
    new ListDialog<>(
            button,
            Words.of("part.pick", row.label()),
            choices(),
            part ->
                "<html><b>" + Html.escaped(part.name()) + "</b>  " + Html.escaped(part.figures()),
            PartChoice::matches,
            PartChoice::note)
        .ask()
        .ifPresent(part -> take(part.name()));
  }

  private void step(int by) {
    List<String> names = ((FormRow.Part) row.input()).names();
    int index = names.indexOf(row.words()) + by;
    if (index >= 0 && index < names.size()) {
      take(names.get(index));
    }
  }

  private void take(String name) {
    FormRow of = row;
    workbench.edit(
        Words.of("edit.setting", row.label(), name),
        design -> workbench.forms().edited(design, of, name));
  }

  @Override
  public JComponent focus() {
    return button;
  }

  @Override
  public JComponent whole() {
    return button;
  }

  @Override
  public void show(FormRow now) {
    row = now;
    button.setText(now.words() + " …");
  }
}
