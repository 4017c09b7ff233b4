package earward.desktop.view;

import earward.block.check.Severity;
import earward.desktop.model.FindingRow;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.util.List;
import java.util.Locale;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.ScrollPaneConstants;
import net.miginfocom.swing.MigLayout;

/** Findings by weight, each with its word, its shape, its source and its proven remedies. */
final class FindingsRail extends JPanel {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final JLabel counts = new JLabel();
  private final JPanel list = new JPanel(new MigLayout("insets 0 0 8 0, fillx, wrap 1", "[fill]"));
  private transient List<FindingRow> shown = List.of();

  FindingsRail(Workbench workbench) {
    super(new MigLayout("insets 10, fill, wrap 1", "[fill]", "[][grow,fill]"));
    this.workbench = workbench;
    setName("findings");
    getAccessibleContext().setAccessibleName(Words.of("findings.name"));
    JLabel title = new JLabel(Words.of("findings.name"));
    title.putClientProperty("FlatLaf.styleClass", "h3");
    JScrollPane scroll =
        new JScrollPane(
            list,
            ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
            ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(16);
    add(title, "split 2, growx");
    add(counts, "gapleft push");
    add(scroll);
  }

  /** Takes over the present review; nothing moves while the findings are the same. */
  void refresh() {
    List<FindingRow> now = workbench.kit().map(FindingRow::of).orElse(List.of());
    if (now.equals(shown) && list.getComponentCount() > 0) {
      return;
    }
    shown = now;
    counts.setText(
        Words.of(
            "findings.count", count(Severity.STOP), count(Severity.WEIGH), count(Severity.NOTE)));
    list.removeAll();
    if (now.isEmpty()) {
      list.add(new JLabel(Words.of("findings.none")));
    }
    now.forEach(this::addFinding);
    list.revalidate();
    list.repaint();
  }

  /** Draws everything anew in the colours of the present look. */
  void relook() {
    shown = List.of();
    list.removeAll();
    refresh();
  }

  private long count(Severity severity) {
    return shown.stream().filter(row -> row.severity() == severity).count();
  }

  private void addFinding(FindingRow row) {
    String word = Words.of("severity." + row.severity().name().toLowerCase(Locale.ROOT));
    JLabel head =
        new JLabel(word + "  " + row.subject(), new SeverityIcon(row.severity()), JLabel.LEADING);
    head.setForeground(Look.severity(row.severity()));
    head.putClientProperty("FlatLaf.styleClass", "h4");
    list.add(head, "gaptop 8");
    list.add(paragraph(row.sentence(), false), "wmin 0");
    if (!row.source().isEmpty()) {
      list.add(paragraph(row.source(), true), "wmin 0");
    }
    row.remedies()
        .forEach(
            remedy -> {
              JButton apply = new JButton(Words.of("findings.apply", remedy.sentence()));
              apply.setToolTipText(remedy.sentence());
              apply.addActionListener(
                  e ->
                      workbench.edit(
                          Words.of("edit.remedy", remedy.sentence()), design -> remedy.edited()));
              list.add(apply, "wmin 0");
            });
  }

  private static JTextArea paragraph(String text, boolean quiet) {
    JTextArea area = new JTextArea(text);
    area.setLineWrap(true);
    area.setWrapStyleWord(true);
    area.setEditable(false);
    area.setFocusable(false);
    area.setOpaque(false);
    area.setBorder(BorderFactory.createEmptyBorder());
    area.setFont(new JLabel().getFont());
    area.getAccessibleContext().setAccessibleName(text);
    if (quiet) {
      area.setForeground(Look.quiet());
      area.putClientProperty("FlatLaf.styleClass", "small");
    }
    return area;
  }
}
