package earward.desktop.view;

import com.formdev.flatlaf.FlatClientProperties;
import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.Words;
import java.awt.Component;
import java.awt.Dialog;
import java.awt.Dimension;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.Optional;
import java.util.function.BiPredicate;
import java.util.function.Function;
import javax.swing.DefaultListModel;
import javax.swing.JButton;
import javax.swing.JDialog;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.ListSelectionModel;
import javax.swing.SwingUtilities;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;
import net.miginfocom.swing.MigLayout;
import org.jspecify.annotations.Nullable;

/**
 * Chooses one of many: what is typed narrows the list, arrow keys go through it, Enter takes,
 * Escape leaves.
 *
 * @param <T> what is chosen
 */
final class ListDialog<T> {
  private final JDialog dialog;
  private final JTextField typed = new JTextField();
  private final DefaultListModel<T> model = new DefaultListModel<>();
  private final JList<T> list = new JList<>(model);
  private final JLabel note = new JLabel(" ");
  private final List<T> all;
  private final BiPredicate<T, String> matches;
  private final Function<T, String> notes;
  private @Nullable T chosen;

  ListDialog(
      @Nullable Component owner,
      String title,
      List<T> all,
      Function<T, String> row,
      BiPredicate<T, String> matches,
      Function<T, String> notes) {
    this.all = all;
    this.matches = matches;
    this.notes = notes;
    dialog =
        new JDialog(
            owner == null ? null : SwingUtilities.getWindowAncestor(owner),
            title,
            Dialog.ModalityType.APPLICATION_MODAL);
    list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
    list.setName("choices");
    list.getAccessibleContext().setAccessibleName(title);
    list.setCellRenderer(
        (of, value, index, selected, focus) -> {
          JLabel label =
              (JLabel)
                  new javax.swing.DefaultListCellRenderer()
                      .getListCellRendererComponent(of, row.apply(value), index, selected, focus);
          label.setBorder(javax.swing.BorderFactory.createEmptyBorder(4, 8, 4, 8));
          return label;
        });
    list.addListSelectionListener(e -> say());
    list.addMouseListener(
        new MouseAdapter() {
          @Override
          public void mouseClicked(MouseEvent e) {
            if (e.getClickCount() == 2) {
              take();
            }
          }
        });
    typed.setName("narrow");
    typed.getAccessibleContext().setAccessibleName(Words.of("choose.narrow"));
    typed.putClientProperty(FlatClientProperties.PLACEHOLDER_TEXT, Words.of("choose.narrow"));
    lay();
    narrow();
  }

  private void lay() {
    JPanel panel =
        new JPanel(new MigLayout("insets 12, fill, wrap 1", "[grow,fill]", "[][grow,fill][][]"));
    panel.add(typed);
    panel.add(new JScrollPane(list), "hmin 180");
    note.setForeground(Look.quiet());
    panel.add(note, "wmin 0, hmin 44, aligny top");
    JButton take = new JButton(Words.of("choose.take"));
    take.setName("take");
    take.addActionListener(e -> take());
    JButton leave = new JButton(Words.of("choose.leave"));
    leave.addActionListener(e -> dialog.dispose());
    panel.add(take, "split 2, tag ok");
    panel.add(leave, "tag cancel");
    dialog.setContentPane(panel);
    dialog.getRootPane().setDefaultButton(take);
    Keys.within(panel, "ESCAPE", dialog::dispose);
    Keys.on(typed, "DOWN", () -> step(1));
    Keys.on(typed, "UP", () -> step(-1));
    Keys.on(list, "ENTER", this::take);
    typed
        .getDocument()
        .addDocumentListener(
            new DocumentListener() {
              @Override
              public void insertUpdate(DocumentEvent e) {
                narrow();
              }

              @Override
              public void removeUpdate(DocumentEvent e) {
                narrow();
              }

              @Override
              public void changedUpdate(DocumentEvent e) {
                narrow();
              }
            });
    dialog.setMinimumSize(UIScale.scale(new Dimension(480, 420)));
    dialog.pack();
    dialog.setLocationRelativeTo(dialog.getOwner());
  }

  private void narrow() {
    model.clear();
    all.stream().filter(each -> matches.test(each, typed.getText())).forEach(model::addElement);
    list.setSelectedIndex(model.isEmpty() ? -1 : 0);
    say();
  }

  private void say() {
    T value = list.getSelectedValue();
    String text = value == null ? Words.of("choose.nothing") : notes.apply(value);
    note.setText("<html>" + Html.escaped(text));
  }

  private void step(int by) {
    int index = list.getSelectedIndex() + by;
    if (index >= 0 && index < model.size()) {
      list.setSelectedIndex(index);
      list.ensureIndexIsVisible(index);
    }
  }

  private void take() {
    chosen = list.getSelectedValue();
    if (chosen != null) {
      dialog.dispose();
    }
  }

  /** Shows the dialog until something is chosen, or nothing. */
  Optional<T> ask() {
    dialog.setVisible(true);
    return Optional.ofNullable(chosen);
  }
}
