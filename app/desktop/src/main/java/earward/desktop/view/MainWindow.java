package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.Background;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.BorderLayout;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import java.io.File;
import java.nio.file.Path;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JFileChooser;
import javax.swing.JFrame;
import javax.swing.JLabel;
import javax.swing.JOptionPane;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import javax.swing.JTabbedPane;
import javax.swing.filechooser.FileNameExtensionFilter;
import net.miginfocom.swing.MigLayout;

/** The main window: the level diagram across the top, the desks below, findings at the right. */
public final class MainWindow extends JFrame {
  private static final long serialVersionUID = 1L;
  private static final int WIDTH = 1366;
  private static final int HEIGHT = 768;

  /** Height that the drawing gets at first; the figures below take the rest. */
  private static final int DRAWING_HEIGHT = 290;

  private final transient Workbench workbench;
  private final LevelPath path;
  private final SettingsForm settings;
  private final DrawingPane drawing;
  private final FiguresPanel figures;
  private final FindingsRail findings;
  private final SheetDesk sheet;
  private final Menu menu;
  private final JLabel state = new JLabel(" ");

  /** A window on a workbench; pages are rendered in a background of their own. */
  public MainWindow(Workbench workbench, Background pages) {
    this.workbench = workbench;
    path = new LevelPath(workbench);
    settings = new SettingsForm(workbench);
    drawing = new DrawingPane(workbench);
    figures = new FiguresPanel(workbench);
    findings = new FindingsRail(workbench);
    sheet = new SheetDesk(workbench, pages);
    menu = new Menu(workbench, this);
    setJMenuBar(menu);
    add(path, BorderLayout.NORTH);
    add(desks(), BorderLayout.CENTER);
    add(findings, BorderLayout.EAST);
    findings.setPreferredSize(UIScale.scale(new java.awt.Dimension(290, 10)));
    JPanel foot = new JPanel(new MigLayout("insets 4 12 4 12, fillx", "[grow]"));
    foot.add(state, "wmin 0");
    add(foot, BorderLayout.SOUTH);
    setDefaultCloseOperation(DO_NOTHING_ON_CLOSE);
    addWindowListener(
        new WindowAdapter() {
          @Override
          public void windowClosing(WindowEvent e) {
            quit();
          }
        });
    setSize(UIScale.scale(WIDTH), UIScale.scale(HEIGHT));
    workbench.watch(this::refresh);
    refresh();
  }

  private JTabbedPane desks() {
    JScrollPane paper = new JScrollPane(drawing);
    paper.setBorder(BorderFactory.createEmptyBorder());
    paper.getVerticalScrollBar().setUnitIncrement(24);
    JSplitPane middle = new JSplitPane(JSplitPane.VERTICAL_SPLIT, paper, figures);
    middle.setResizeWeight(1);
    middle.setDividerLocation(UIScale.scale(DRAWING_HEIGHT));
    middle.setBorder(BorderFactory.createEmptyBorder());
    JPanel design = new JPanel(new BorderLayout());
    settings.setPreferredSize(UIScale.scale(new java.awt.Dimension(250, 10)));
    design.add(settings, BorderLayout.WEST);
    design.add(middle, BorderLayout.CENTER);
    JTabbedPane desks = new JTabbedPane();
    desks.setName("desks");
    desks.addTab(Words.of("desk.design"), design);
    desks.addTab(Words.of("desk.sheet"), sheet);
    desks.addChangeListener(e -> sheet.refresh());
    return desks;
  }

  private void refresh() {
    String name = workbench.file().map(file -> " – " + file.getFileName()).orElse("");
    setTitle(
        (workbench.unsaved() ? "• " : "")
            + workbench.design().title()
            + name
            + " – "
            + Words.of("app"));
    path.refresh();
    settings.refresh();
    if (!workbench.busy()) {
      drawing.refresh();
      figures.refresh();
      findings.refresh();
      sheet.refresh();
    }
    menu.refresh();
    String said = workbench.message();
    state.setText(
        said.isEmpty() ? Words.of(workbench.busy() ? "state.solving" : "state.ready") : said);
  }

  void larger() {
    drawing.larger();
  }

  void smaller() {
    drawing.smaller();
  }

  void dark(boolean wanted) {
    Look.change(wanted);
    settings.relook();
    findings.relook();
    refresh();
  }

  void open() {
    choose(Words.of("menu.open"), "earward", false).ifPresent(this::openKit);
  }

  void openKit(Path kit) {
    if (mayLeave()) {
      workbench.open(kit);
    }
  }

  boolean save() {
    return workbench.file().isPresent()
        ? workbench.save(workbench.file().get()).isEmpty()
        : saveAs();
  }

  boolean saveAs() {
    Optional<Path> to = choose(Words.of("menu.save-as"), "earward", true);
    return to.isPresent() && workbench.save(to.get()).isEmpty();
  }

  void export() {
    choose(Words.of("menu.export"), "pdf", true).ifPresent(workbench::export);
  }

  void quit() {
    if (mayLeave()) {
      dispose();
    }
  }

  private boolean mayLeave() {
    if (!workbench.unsaved()) {
      return true;
    }
    Object[] options = {
      Words.of("unsaved.save"), Words.of("unsaved.discard"), Words.of("unsaved.cancel")
    };
    int answer =
        JOptionPane.showOptionDialog(
            this,
            Words.of("unsaved.question"),
            Words.of("unsaved.title"),
            JOptionPane.YES_NO_CANCEL_OPTION,
            JOptionPane.QUESTION_MESSAGE,
            null,
            options,
            options[0]);
    return answer == 1 || (answer == 0 && save());
  }

  private Optional<Path> choose(String title, String ending, boolean saving) {
    JFileChooser chooser = new JFileChooser();
    chooser.setDialogTitle(title);
    chooser.setFileFilter(new FileNameExtensionFilter("*." + ending, ending));
    int answer = saving ? chooser.showSaveDialog(this) : chooser.showOpenDialog(this);
    File file = chooser.getSelectedFile();
    if (answer != JFileChooser.APPROVE_OPTION || file == null) {
      return Optional.empty();
    }
    boolean named = file.getName().contains(".");
    return Optional.of(saving && !named ? Path.of(file.getPath() + "." + ending) : file.toPath());
  }
}
