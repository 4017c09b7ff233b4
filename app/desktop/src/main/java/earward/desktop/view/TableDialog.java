package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.Difference;
import earward.desktop.model.Words;
import java.awt.Component;
import java.awt.Dialog;
import java.awt.Dimension;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JDialog;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.SwingUtilities;
import javax.swing.table.DefaultTableModel;
import net.miginfocom.swing.MigLayout;
import org.jspecify.annotations.Nullable;

/** Shows differences and, where something is to be decided, takes an answer. */
final class TableDialog {
  private boolean agreed;

  private TableDialog() {}

  /**
   * Shows lines in two columns beside their names.
   *
   * @param take words of the button that agrees; empty where there is nothing to decide
   * @return whether it was agreed to
   */
  static boolean show(
      @Nullable Component over,
      String title,
      String says,
      List<Difference> lines,
      String before,
      String after,
      String take) {
    TableDialog answer = new TableDialog();
    JDialog dialog =
        new JDialog(
            over == null ? null : SwingUtilities.getWindowAncestor(over),
            title,
            Dialog.ModalityType.APPLICATION_MODAL);
    DefaultTableModel model =
        new DefaultTableModel(new String[] {Words.of("difference.what"), before, after}, 0) {
          private static final long serialVersionUID = 1L;

          @Override
          public boolean isCellEditable(int row, int column) {
            return false;
          }
        };
    lines.forEach(line -> model.addRow(new String[] {line.what(), line.before(), line.after()}));
    JTable table = new JTable(model);
    table.setName("differences");
    table.getAccessibleContext().setAccessibleName(title);
    table.getColumnModel().getColumn(0).setPreferredWidth(300);
    JPanel panel =
        new JPanel(new MigLayout("insets 12, fill, wrap 1", "[grow,fill]", "[][grow,fill][]"));
    panel.add(new JLabel(Html.wrapped(says, 560)));
    panel.add(new JScrollPane(table), "hmin 200");
    JButton leave = new JButton(Words.of(take.isEmpty() ? "dialog.shut" : "choose.leave"));
    leave.addActionListener(e -> dialog.dispose());
    if (take.isEmpty()) {
      dialog.getRootPane().setDefaultButton(leave);
    } else {
      JButton agree = new JButton(take);
      agree.setName("take");
      agree.addActionListener(
          e -> {
            answer.agreed = true;
            dialog.dispose();
          });
      panel.add(agree, "split 2, tag ok");
      dialog.getRootPane().setDefaultButton(agree);
      SwingUtilities.invokeLater(agree::requestFocusInWindow);
    }
    panel.add(leave, "tag cancel, growx 0");
    Keys.within(panel, "ESCAPE", dialog::dispose);
    dialog.setContentPane(panel);
    dialog.setMinimumSize(UIScale.scale(new Dimension(640, 420)));
    dialog.pack();
    dialog.setLocationRelativeTo(dialog.getOwner());
    dialog.setVisible(true);
    return answer.agreed;
  }
}
