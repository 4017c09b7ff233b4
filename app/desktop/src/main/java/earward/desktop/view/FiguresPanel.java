package earward.desktop.view;

import earward.desktop.model.KeyFigure;
import earward.desktop.model.TestPointRow;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.util.ArrayList;
import java.util.List;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.SwingConstants;
import javax.swing.table.AbstractTableModel;
import javax.swing.table.DefaultTableCellRenderer;
import net.miginfocom.swing.MigLayout;

/** The watched figures in one line, the test points in a table below. */
final class FiguresPanel extends JPanel {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final JPanel keys = new JPanel(new MigLayout("insets 6 12 6 12, gapx 16", "", "[]0[]"));
  private final Rows rows = new Rows();

  FiguresPanel(Workbench workbench) {
    super(new MigLayout("insets 0, fill, wrap 1", "[fill]", "[][grow,fill]"));
    this.workbench = workbench;
    setName("figures");
    JTable table = new JTable(rows);
    table.setName("test-points");
    table.getAccessibleContext().setAccessibleName(Words.of("figures.name"));
    table.setAutoCreateRowSorter(false);
    DefaultTableCellRenderer right = new DefaultTableCellRenderer();
    right.setHorizontalAlignment(SwingConstants.TRAILING);
    for (int column = 2; column < rows.getColumnCount(); column++) {
      table.getColumnModel().getColumn(column).setCellRenderer(right);
    }
    table.getColumnModel().getColumn(0).setMaxWidth(60);
    table.getColumnModel().getColumn(3).setPreferredWidth(110);
    table.getColumnModel().getColumn(1).setPreferredWidth(220);
    JScrollPane scroll = new JScrollPane(table);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    add(keys, "wmin 0");
    add(scroll);
  }

  void refresh() {
    workbench
        .kit()
        .ifPresent(
            kit -> {
              show(KeyFigure.of(kit));
              rows.show(TestPointRow.of(kit));
            });
  }

  private void show(List<KeyFigure> figures) {
    keys.removeAll();
    for (KeyFigure figure : figures) {
      JLabel label = new JLabel(figure.label());
      label.setForeground(Look.quiet());
      JLabel value = new JLabel(figure.value());
      value.putClientProperty("FlatLaf.styleClass", "h3");
      label.setLabelFor(value);
      value.getAccessibleContext().setAccessibleName(figure.label() + ": " + figure.value());
      keys.add(label, "flowy, split 2");
      keys.add(value);
    }
    keys.revalidate();
    keys.repaint();
  }

  /** The table's rows. */
  private static final class Rows extends AbstractTableModel {
    private static final long serialVersionUID = 1L;

    private transient List<TestPointRow> rows = List.of();
    private final ArrayList<String> columns = new ArrayList<>();

    Rows() {
      columns.add(Words.of("column.tp"));
      columns.add(Words.of("column.where"));
      TestPointRow.columns().forEach(key -> columns.add(Words.of(key)));
    }

    void show(List<TestPointRow> now) {
      if (!now.equals(rows)) {
        rows = now;
        fireTableDataChanged();
      }
    }

    @Override
    public int getRowCount() {
      return rows.size();
    }

    @Override
    public int getColumnCount() {
      return columns.size();
    }

    @Override
    public String getColumnName(int column) {
      return columns.get(column);
    }

    @Override
    public Object getValueAt(int row, int column) {
      TestPointRow at = rows.get(row);
      return switch (column) {
        case 0 -> at.reference();
        case 1 -> at.where();
        default -> at.figures().get(column - 2);
      };
    }
  }
}
