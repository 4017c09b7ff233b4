package earward.desktop.view;

import earward.desktop.model.FormRow;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.util.ArrayList;
import java.util.List;
import javax.swing.DefaultComboBoxModel;
import javax.swing.JComboBox;
import javax.swing.JComponent;

/** A line with a few words to choose from. */
final class ChoiceField implements RowField {
  private final Workbench workbench;
  private final JComboBox<String> box = new JComboBox<>();
  private List<String> options = List.of();
  private FormRow row;
  private boolean filling;

  ChoiceField(Workbench workbench, FormRow row) {
    this.workbench = workbench;
    this.row = row;
    show(row);
    box.addActionListener(
        e -> {
          int index = box.getSelectedIndex();
          if (!filling && index >= 0) {
            choose(options.get(index));
          }
        });
  }

  private void choose(String words) {
    if (!words.equals(row.words())) {
      FormRow of = row;
      workbench.edit(
          Words.of("edit.setting", row.label(), String.valueOf(box.getSelectedItem())),
          design -> workbench.forms().edited(design, of, words));
    }
  }

  @Override
  public JComponent focus() {
    return box;
  }

  @Override
  public JComponent whole() {
    return box;
  }

  @Override
  public void show(FormRow now) {
    row = now;
    FormRow.Choice choice = (FormRow.Choice) now.input();
    List<String> shown = new ArrayList<>(choice.options());
    List<String> labels = new ArrayList<>(choice.labels());
    if (!shown.contains(now.words())) {
      shown.add(0, now.words());
      labels.add(0, now.words());
    }
    filling = true;
    if (!shown.equals(options)) {
      options = List.copyOf(shown);
      box.setModel(new DefaultComboBoxModel<>(labels.toArray(String[]::new)));
    }
    box.setSelectedIndex(options.indexOf(now.words()));
    filling = false;
  }
}
