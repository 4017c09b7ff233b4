package earward.desktop.view;

import earward.desktop.model.FindingRow;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.kit.review.Remedy;
import java.awt.Dimension;
import java.awt.Rectangle;
import java.util.List;
import java.util.Locale;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.ScrollPaneConstants;
import javax.swing.Scrollable;
import net.miginfocom.swing.MigLayout;

/** Findings by weight, each with its word, shape, figure, limit, source and proven remedies. */
final class FindingsPanel extends JPanel {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final JLabel note = new JLabel(" ");
  private final Lines list = new Lines();
  private transient List<FindingRow> shown = List.of();
  private boolean filled;

  /** The findings one under the other, as wide as the panel. */
  private static final class Lines extends JPanel implements Scrollable {
    private static final long serialVersionUID = 1L;

    Lines() {
      super(new MigLayout("insets 0 0 8 6, fillx, wrap 1", "[grow,fill]"));
      setOpaque(false);
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
      return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
      return 20;
    }

    @Override
    public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
      return visible.height;
    }

    @Override
    public boolean getScrollableTracksViewportWidth() {
      return true;
    }

    @Override
    public boolean getScrollableTracksViewportHeight() {
      return false;
    }
  }

  FindingsPanel(Workbench workbench) {
    super(new MigLayout("insets 10, fill, wrap 1", "[grow,fill]", "[][][grow,fill]"));
    this.workbench = workbench;
    setName("findings");
    getAccessibleContext().setAccessibleName(Words.of("findings.name"));
    JLabel title = new JLabel(Words.of("findings.name"));
    title.putClientProperty("FlatLaf.styleClass", "h3");
    note.setName("findings-note");
    JScrollPane scroll =
        new JScrollPane(
            list,
            ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
            ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.setOpaque(false);
    scroll.getViewport().setOpaque(false);
    add(title);
    add(note, "wmin 0");
    add(scroll);
    look();
  }

  private void look() {
    setBackground(Look.card());
    setBorder(BorderFactory.createMatteBorder(0, 1, 0, 0, Look.line()));
    note.setForeground(Look.quiet());
    note.setFont(Look.small());
  }

  /** The present findings. */
  List<FindingRow> rows() {
    return workbench.kit().map(FindingRow::of).orElse(List.of());
  }

  /** Takes over the present review; nothing moves while the findings are the same. */
  void refresh() {
    note.setText(
        workbench.seekingRemedies()
            ? Words.of("findings.seeking")
            : workbench.busy() ? Words.of("findings.former") : " ");
    List<FindingRow> now = rows();
    if (filled && now.equals(shown)) {
      return;
    }
    shown = now;
    filled = true;
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
    filled = false;
    look();
    refresh();
  }

  private void addFinding(FindingRow row) {
    String word = Words.of("severity." + row.severity().name().toLowerCase(Locale.ROOT));
    JButton head = new JButton(word + "  " + row.subject(), new SeverityIcon(row.severity(), 13));
    head.putClientProperty("JButton.buttonType", "borderless");
    head.putClientProperty("FlatLaf.styleClass", "h4");
    head.setHorizontalAlignment(JButton.LEADING);
    head.setMargin(new java.awt.Insets(1, 0, 1, 0));
    head.setForeground(Look.severity(row.severity()));
    head.setToolTipText(Words.of("findings.go", row.block()));
    head.addActionListener(e -> workbench.select(row.block()));
    list.add(head, "gaptop 8");
    list.add(paragraph(row.sentence(), false), "wmin 0");
    if (!row.figure().isEmpty()) {
      list.add(paragraph(row.figure(), true), "wmin 0");
    }
    if (!row.source().isEmpty()) {
      list.add(paragraph(row.source(), true), "wmin 0");
    }
    row.remedies().forEach(this::addRemedy);
  }

  private void addRemedy(Remedy remedy) {
    JButton apply = new JButton(Html.wrapped(Words.of("findings.apply", remedy.sentence()), 250));
    apply.setName("remedy");
    apply.setHorizontalAlignment(JButton.LEADING);
    apply.addActionListener(
        e -> workbench.edit(Words.of("edit.remedy", remedy.sentence()), design -> remedy.edited()));
    list.add(apply, "wmin 0");
  }

  private static JTextArea paragraph(String text, boolean quiet) {
    JTextArea area = new JTextArea(text);
    area.setLineWrap(true);
    area.setWrapStyleWord(true);
    area.setEditable(false);
    area.setFocusable(false);
    area.setOpaque(false);
    area.setBorder(BorderFactory.createEmptyBorder());
    area.setFont(quiet ? Look.small() : new JLabel().getFont());
    area.setForeground(quiet ? Look.quiet() : Look.ink());
    area.getAccessibleContext().setAccessibleName(text);
    return area;
  }
}
