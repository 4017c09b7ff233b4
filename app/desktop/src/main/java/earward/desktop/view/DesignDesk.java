package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.Selection;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.BorderLayout;
import java.awt.Dimension;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JPanel;
import javax.swing.JSplitPane;
import javax.swing.JToggleButton;
import net.miginfocom.swing.MigLayout;

/** The desk on which a kit is designed: settings, drawing, findings over it, curves in a drawer. */
final class DesignDesk extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int FORM_WIDTH = 262;
  private static final int FINDINGS_WIDTH = 340;
  private static final int DRAWER_HEIGHT = 240;

  private final transient Workbench workbench;
  private final FormPanel form;
  private final DrawingView drawing;
  private final FindingsPanel findings;
  private final FindingsRail rail;
  private final HeadlineStrip headline;
  private final CurvesDrawer curves;
  private final OverlayPanel overlay;
  private final JSplitPane split;
  private final JToggleButton drawer = new JToggleButton(Words.of("curves.open"));
  private boolean findingsOpen;

  DesignDesk(
      Workbench workbench,
      BlockCommands commands,
      Runnable propose,
      Consumer<CurvesDrawer> picture,
      Consumer<CurvesDrawer> csv) {
    super(new BorderLayout());
    this.workbench = workbench;
    setName("design");
    form = new FormPanel(workbench, commands);
    form.setPreferredSize(UIScale.scale(new Dimension(FORM_WIDTH, 10)));
    form.setBorder(BorderFactory.createMatteBorder(0, 0, 0, 1, Look.line()));
    drawing =
        new DrawingView(
            workbench,
            this::toField,
            new EmptyPath(commands, propose, () -> toField(Selection.CONDITIONS)));
    findings = new FindingsPanel(workbench);
    rail = new FindingsRail(() -> openFindings(!findingsOpen));
    headline = new HeadlineStrip(workbench);
    curves = new CurvesDrawer(workbench, picture, csv);
    overlay = new OverlayPanel(drawing, findings, UIScale.scale(FINDINGS_WIDTH));
    curves.setMinimumSize(UIScale.scale(new Dimension(100, 0)));
    split = new JSplitPane(JSplitPane.VERTICAL_SPLIT, overlay, null);
    split.setResizeWeight(1);
    split.setBorder(BorderFactory.createEmptyBorder());
    add(form, BorderLayout.WEST);
    add(split, BorderLayout.CENTER);
    add(rail, BorderLayout.EAST);
    add(foot(), BorderLayout.SOUTH);
  }

  private JPanel foot() {
    drawer.setName("curves-toggle");
    drawer.addActionListener(e -> openCurves(drawer.isSelected()));
    JPanel foot = new JPanel(new MigLayout("insets 0 0 0 8, fill", "[grow,fill][]", "[fill]"));
    foot.add(headline);
    foot.add(drawer, "aligny center");
    return foot;
  }

  /** Opens the curves or shuts them. */
  void openCurves(boolean wanted) {
    drawer.setSelected(wanted);
    split.setBottomComponent(wanted ? curves : null);
    if (wanted) {
      split.setDividerLocation(
          Math.max(UIScale.scale(80), split.getHeight() - UIScale.scale(DRAWER_HEIGHT)));
    }
    curves.open(wanted);
    revalidate();
  }

  boolean curvesOpen() {
    return curves.isOpen();
  }

  /** Opens the findings or shuts them. */
  void openFindings(boolean wanted) {
    findingsOpen = wanted;
    overlay.open(wanted);
    workbench.askRemedies(wanted);
    refreshFindings();
    if (wanted) {
      findings.requestFocusInWindow();
    }
  }

  boolean findingsOpen() {
    return findingsOpen;
  }

  /** Selects a block or form and takes the keyboard to one of its fields. */
  void toField(String name) {
    int dot = name.indexOf('.');
    workbench.select(dot < 0 ? name : name.substring(0, dot));
    form.refresh();
    form.focus(name);
  }

  HeadlineStrip headline() {
    return headline;
  }

  DrawingView drawing() {
    return drawing;
  }

  CurvesDrawer curves() {
    return curves;
  }

  void refresh() {
    headline.refresh();
    form.refresh();
    drawing.refresh();
    refreshFindings();
    curves.refresh();
  }

  private void refreshFindings() {
    rail.refresh(findings.rows(), findingsOpen);
    if (findingsOpen) {
      findings.refresh();
    }
  }

  void relook() {
    form.setBorder(BorderFactory.createMatteBorder(0, 0, 0, 1, Look.line()));
    form.relook();
    drawing.relook();
    findings.relook();
    curves.relook();
    refresh();
  }
}
