package earward.desktop.view;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.desktop.model.CurveSet;
import earward.desktop.model.CurveText;
import earward.desktop.model.SupplyCurves;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.drawing.curve.CurvePlot;
import earward.kit.design.KitDesign;
import earward.kit.path.KitCurves;
import java.awt.BorderLayout;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.DefaultComboBoxModel;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JToggleButton;
import net.miginfocom.swing.MigLayout;
import org.jspecify.annotations.Nullable;

/** The drawer with the curves: which one, baseline, and what can be taken out of it. */
final class CurvesDrawer extends JPanel {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final CurvePane pane = new CurvePane();
  private final JComboBox<String> which = new JComboBox<>();
  private final JToggleButton pinned = new JToggleButton(Words.of("curves.pin"));
  private final JLabel standing = new QuietLabel("");
  private transient List<CurvePlot> plots = List.of();
  private transient @Nullable KitDesign supplyOf;
  private transient Optional<SupplyCurves> supply = Optional.empty();
  private transient @Nullable KitCurves shown;
  private boolean open;

  CurvesDrawer(Workbench workbench, Consumer<CurvesDrawer> picture, Consumer<CurvesDrawer> csv) {
    super(new BorderLayout());
    this.workbench = workbench;
    setName("curves");
    which.setName("curve-choice");
    which.getAccessibleContext().setAccessibleName(Words.of("curves.which"));
    which.addActionListener(e -> showChosen());
    pinned.setName("curve-pin");
    pinned.addActionListener(
        e -> {
          if (pinned.isSelected()) {
            workbench.pin();
          } else {
            workbench.unpin();
          }
        });
    JPanel bar = new JPanel(new MigLayout("insets 3 8 3 8, gapx 6, fillx", "", "[]"));
    bar.add(which);
    bar.add(pinned);
    bar.add(button("curves.picture", () -> picture.accept(this)));
    bar.add(button("curves.csv", () -> csv.accept(this)));
    bar.add(standing, "push, alignx right");
    add(bar, BorderLayout.NORTH);
    add(pane, BorderLayout.CENTER);
  }

  private static JButton button(String key, Runnable run) {
    JButton button = new JButton(Words.of(key));
    button.setName(key);
    button.addActionListener(e -> run.run());
    return button;
  }

  /** Whether the drawer is open: only then are curves solved. */
  void open(boolean wanted) {
    open = wanted;
    workbench.askCurves(wanted);
    refresh();
  }

  boolean isOpen() {
    return open;
  }

  CurvePane pane() {
    return pane;
  }

  /** The chosen plot as CSV; empty where there is none. */
  Optional<String> csv() {
    CurvePlot plot = pane.plot();
    return plot == null ? Optional.empty() : Optional.of(CurveText.csv(plot));
  }

  /** Takes over the present curves. */
  void refresh() {
    if (!open) {
      return;
    }
    pinned.setSelected(workbench.baseline().isPresent());
    standing.setText(
        workbench.curves().isEmpty()
            ? Words.of(workbench.busy() ? "curves.solving" : "curves.waiting")
            : workbench.curvesCurrent() ? "" : Words.of("curves.former"));
    workbench
        .curves()
        .ifPresent(
            curves -> {
              shown = curves;
              askSupply();
              rebuild(curves);
            });
  }

  /** Heat and supply are solved when the curves are current. */
  private void askSupply() {
    KitDesign design = workbench.design();
    if (!workbench.curvesCurrent() || design.equals(supplyOf)) {
      return;
    }
    supplyOf = design;
    double watts = workbench.readings().find("path", Quantity.OUTPUT_WATTS, CaseName.TEST).value();
    workbench
        .lanes()
        .pages()
        .start(
            () -> SupplyCurves.solved(design, workbench.workshop(), watts),
            solved -> {
              if (design.equals(supplyOf)) {
                supply = solved;
                if (shown != null) {
                  rebuild(shown);
                }
              }
            },
            fault -> {});
  }

  private void rebuild(KitCurves curves) {
    List<CurvePlot> now =
        new ArrayList<>(
            CurveSet.of(workbench.design(), curves, workbench.baseline().flatMap(b -> b.curves())));
    supply.ifPresent(
        found -> {
          now.add(found.heat());
          found.life().ifPresent(now::add);
        });
    if (now.equals(plots)) {
      return;
    }
    List<String> names = now.stream().map(CurvePlot::title).toList();
    List<String> before = plots.stream().map(CurvePlot::title).toList();
    plots = now;
    if (!names.equals(before)) {
      int index = Math.max(0, which.getSelectedIndex());
      which.setModel(new DefaultComboBoxModel<>(names.toArray(String[]::new)));
      which.setSelectedIndex(Math.min(index, names.size() - 1));
    }
    showChosen();
  }

  private void showChosen() {
    int index = which.getSelectedIndex();
    pane.show(index >= 0 && index < plots.size() ? plots.get(index) : null);
  }

  void relook() {
    pane.relook();
  }
}
