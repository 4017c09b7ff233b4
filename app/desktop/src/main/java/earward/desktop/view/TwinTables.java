package earward.desktop.view;

import earward.block.quantity.Unit;
import earward.desktop.model.Amounts;
import earward.desktop.model.LiveValues;
import earward.desktop.model.PartRow;
import earward.desktop.model.Words;
import earward.kit.path.Assembly;
import java.awt.Component;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.SwingConstants;
import javax.swing.table.AbstractTableModel;
import javax.swing.table.DefaultTableCellRenderer;
import net.miginfocom.swing.MigLayout;

/** The drawing as tables: test points with all live values, parts with their blocks. */
final class TwinTables extends JPanel {
  private static final long serialVersionUID = 1L;

  private final Rows points =
      new Rows("column.tp", "column.where", "column.dc", "column.audio", "column.thd", "column.rf");
  private final Rows parts =
      new Rows("column.reference", "column.value", "column.part", "column.block");
  private transient List<PartRow> partRows = List.of();

  TwinTables(Consumer<String> openPart) {
    super(new MigLayout("insets 0, fill, wrap 1, gapy 0", "[grow,fill]", "[60%,fill][40%,fill]"));
    JTable pointTable = table(points, "test-points", Words.of("figures.name"));
    DefaultTableCellRenderer right = new DefaultTableCellRenderer();
    right.setHorizontalAlignment(SwingConstants.TRAILING);
    for (int column = 2; column < points.getColumnCount(); column++) {
      pointTable.getColumnModel().getColumn(column).setCellRenderer(right);
    }
    pointTable.getColumnModel().getColumn(0).setMaxWidth(60);
    pointTable.getColumnModel().getColumn(1).setPreferredWidth(260);
    JTable partTable = table(parts, "parts", Words.of("parts.name"));
    partTable.getColumnModel().getColumn(0).setMaxWidth(70);
    Keys.on(
        partTable,
        "ENTER",
        () -> {
          int row = partTable.getSelectedRow();
          if (row >= 0 && row < partRows.size()) {
            openPart.accept(partRows.get(row).place());
          }
        });
    add(framed(pointTable), "grow");
    add(framed(partTable), "grow");
  }

  private static JTable table(Rows rows, String name, String says) {
    JTable table = new JTable(rows);
    table.setName(name);
    table.getAccessibleContext().setAccessibleName(says);
    table.setFillsViewportHeight(true);
    return table;
  }

  private static Component framed(JTable table) {
    JScrollPane scroll = new JScrollPane(table);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    return scroll;
  }

  void show(LiveValues values, Optional<Assembly> assembly) {
    List<List<String>> rows = new ArrayList<>();
    for (LiveValues.Point point : values.points()) {
      rows.add(
          List.of(
              point.reference(),
              point.where(),
              Amounts.reading(point.dcVolts(), Unit.VOLT),
              Amounts.reading(point.audioVolts(), Unit.VOLT),
              Amounts.reading(point.distortion(), Unit.FRACTION),
              Amounts.reading(point.carrierVolts(), Unit.VOLT)));
    }
    points.show(rows);
    partRows = assembly.map(PartRow::of).orElse(List.of());
    parts.show(
        partRows.stream()
            .map(part -> List.of(part.reference(), part.value(), part.what(), part.block()))
            .toList());
  }

  /** Rows of text. */
  private static final class Rows extends AbstractTableModel {
    private static final long serialVersionUID = 1L;

    private final String[] columns;
    private transient List<List<String>> rows = List.of();

    Rows(String... keys) {
      columns = new String[keys.length];
      for (int i = 0; i < keys.length; i++) {
        columns[i] = Words.of(keys[i]);
      }
    }

    void show(List<List<String>> now) {
      if (!now.equals(rows)) {
        boolean like = now.size() == rows.size();
        rows = now;
        if (like && !rows.isEmpty()) {
          fireTableRowsUpdated(0, rows.size() - 1);
        } else {
          fireTableDataChanged();
        }
      }
    }

    @Override
    public int getRowCount() {
      return rows.size();
    }

    @Override
    public int getColumnCount() {
      return columns.length;
    }

    @Override
    public String getColumnName(int column) {
      return columns[column];
    }

    @Override
    public Object getValueAt(int row, int column) {
      return rows.get(row).get(column);
    }
  }
}
