package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.FormRow;
import earward.desktop.model.SeamFigures;
import earward.desktop.model.Selection;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.kit.design.KitDesign;
import java.awt.Dimension;
import java.awt.Rectangle;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JToggleButton;
import javax.swing.ScrollPaneConstants;
import javax.swing.Scrollable;
import net.miginfocom.swing.MigLayout;

/** The settings of what is selected, line by line; of a seam, what was solved of it. */
final class FormPanel extends JPanel {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final transient BlockCommands commands;
  private final JLabel title = new JLabel();
  private final JLabel help = new JLabel();
  private final Lines lines = new Lines();
  private final transient Map<String, RowField> fields = new LinkedHashMap<>();
  private transient List<FormRow> shown = List.of();
  private transient List<SeamFigures> seam = List.of();
  private String owner = "";

  /** The lines, as wide as the panel. */
  private static final class Lines extends JPanel implements Scrollable {
    private static final long serialVersionUID = 1L;

    Lines() {
      super(new MigLayout("insets 0 0 8 8, fillx, wrap 2, hidemode 3", "[grow,fill]2[]", "[]2[]"));
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
      return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
      return UIScale.scale(20);
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

  FormPanel(Workbench workbench, BlockCommands commands) {
    super(new MigLayout("insets 8 10 4 4, fill, wrap 1", "[fill]", "[][]4[grow,fill]"));
    this.workbench = workbench;
    this.commands = commands;
    setName("settings");
    title.putClientProperty("FlatLaf.styleClass", "h3");
    JScrollPane scroll =
        new JScrollPane(
            lines,
            ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
            ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    add(title, "wmin 0");
    add(help, "wmin 0, hmax 66");
    add(scroll);
  }

  /** Shows what is selected; a form that is already right is left alone, focus and all. */
  void refresh() {
    KitDesign design = workbench.design();
    String now = workbench.selected();
    if (Selection.seamOf(now).isPresent()) {
      refreshSeam(now);
      return;
    }
    List<FormRow> rows = workbench.forms().rows(design, now);
    if (now.equals(owner) && rows.equals(shown)) {
      return;
    }
    boolean same =
        now.equals(owner) && names(rows).equals(names(shown)) && inputs(rows).equals(inputs(shown));
    shown = rows;
    owner = now;
    if (same) {
      rows.forEach(
          row -> {
            RowField field = fields.get(row.name());
            if (field != null) {
              field.show(row);
            }
          });
      relabel();
      return;
    }
    rebuild(design);
  }

  private static List<String> names(List<FormRow> rows) {
    return rows.stream().map(FormRow::name).toList();
  }

  private static List<Class<?>> inputs(List<FormRow> rows) {
    return rows.stream().<Class<?>>map(row -> row.input().getClass()).toList();
  }

  private void rebuild(KitDesign design) {
    title.setText(workbench.forms().title(design, owner));
    getAccessibleContext().setAccessibleName(title.getText());
    String says = workbench.forms().help(design, owner);
    help.setText(says.isEmpty() ? "" : Html.wrapped(first(says), 210));
    help.setToolTipText(says.isEmpty() ? null : Html.wrapped(says, 320));
    help.setForeground(Look.quiet());
    help.setFont(Look.small());
    lines.removeAll();
    fields.clear();
    shown.forEach(this::addRow);
    if (shown.isEmpty() && !Selection.own(owner)) {
      lines.add(new JLabel(Html.wrapped(Words.of("form.missing"), 200)), "span 2");
    }
    lines.revalidate();
    lines.repaint();
  }

  private static String first(String text) {
    int end = text.indexOf(". ");
    return end < 0 ? text : text.substring(0, end + 1);
  }

  private void addRow(FormRow row) {
    RowField field =
        row.input() instanceof FormRow.Choice
            ? new ChoiceField(workbench, row)
            : row.input() instanceof FormRow.Part
                ? new PartField(workbench, row)
                : new ValueField(workbench, row);
    JLabel label = new JLabel(row.label());
    label.setName("label " + row.name());
    label.setLabelFor(field.focus());
    label.setForeground(row.usual() ? Look.quiet() : Look.ink());
    JComponent focus = field.focus();
    focus.setName(row.name());
    focus.setToolTipText(row.help().isEmpty() ? null : Html.wrapped(row.help(), 320));
    focus.getAccessibleContext().setAccessibleName(row.label());
    focus.getAccessibleContext().setAccessibleDescription(row.help());
    fields.put(row.name(), field);
    lines.add(label, "span 2, gaptop 5");
    lines.add(field.whole(), "wmin 0, growx" + (row.lockable() ? "" : ", span 2"));
    if (row.lockable()) {
      lines.add(lock(row), "aligny top, w 26!, h 26!");
    }
  }

  private JToggleButton lock(FormRow row) {
    JToggleButton lock = new JToggleButton(new LockIcon());
    lock.setSelected(row.locked());
    lock.setName("lock " + row.name());
    lock.setToolTipText(Words.of("lock.help"));
    lock.getAccessibleContext().setAccessibleName(Words.of("lock.name", row.label()));
    lock.putClientProperty("JButton.buttonType", "toolBarButton");
    lock.addActionListener(
        e ->
            workbench.edit(
                Words.of(lock.isSelected() ? "edit.lock" : "edit.unlock", row.label()),
                design ->
                    design.withBlock(
                        row.owner(), block -> block.withLock(row.id(), lock.isSelected()))));
    return lock;
  }

  private void relabel() {
    for (FormRow row : shown) {
      for (java.awt.Component each : lines.getComponents()) {
        if (("label " + row.name()).equals(each.getName())) {
          each.setForeground(row.usual() ? Look.quiet() : Look.ink());
        } else if (("lock " + row.name()).equals(each.getName())) {
          ((JToggleButton) each).setSelected(row.locked());
        }
      }
    }
  }

  private void refreshSeam(String now) {
    String blockId = Selection.seamOf(now).orElse("");
    List<SeamFigures> rows = SeamFigures.of(workbench.shown(), workbench.readings(), blockId);
    if (now.equals(owner) && rows.equals(seam)) {
      return;
    }
    seam = rows;
    owner = now;
    shown = List.of();
    KitDesign design = workbench.design();
    title.setText(Words.of("seam.title"));
    help.setForeground(Look.quiet());
    help.setText(
        Html.wrapped(
            Words.of(
                "seam.between",
                workbench.forms().title(design, SeamFigures.before(design, blockId)),
                workbench.forms().title(design, blockId)),
            210));
    lines.removeAll();
    fields.clear();
    for (SeamFigures row : rows) {
      JLabel label = new JLabel(row.label());
      label.setForeground(Look.quiet());
      lines.add(label, "gaptop 4");
      lines.add(new JLabel(row.value()), "alignx right");
    }
    JButton add = new JButton(Words.of("seam.add"));
    add.setName("seam-add");
    add.addActionListener(e -> commands.add());
    lines.add(add, "span 2, gaptop 12");
    lines.revalidate();
    lines.repaint();
  }

  /** Draws everything anew in the colours of the present look. */
  void relook() {
    owner = "";
    shown = List.of();
    seam = List.of();
    refresh();
  }

  /** Takes the keyboard to a field by its name; to the first where there is none of this name. */
  void focus(String name) {
    RowField field = fields.get(name);
    List<RowField> all = new ArrayList<>(fields.values());
    RowField wanted = field == null && !all.isEmpty() ? all.get(0) : field;
    if (wanted != null) {
      wanted.focus().requestFocusInWindow();
      wanted.whole().scrollRectToVisible(new Rectangle(0, 0, 10, 60));
    }
  }
}
