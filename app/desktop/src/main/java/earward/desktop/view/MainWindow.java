package earward.desktop.view;

import com.formdev.flatlaf.FlatClientProperties;
import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.KitSolving;
import earward.desktop.model.Lanes;
import earward.desktop.model.Proposing;
import earward.desktop.model.Recovery;
import earward.desktop.model.Selection;
import earward.desktop.model.Solving;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.event.ComponentAdapter;
import java.awt.event.ComponentEvent;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import javax.swing.JFrame;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTabbedPane;
import javax.swing.SwingUtilities;
import javax.swing.Timer;
import net.miginfocom.swing.MigLayout;

/** One window: its start page, or the level diagram across the top and the desks under it. */
public final class MainWindow extends JFrame {
  private static final long serialVersionUID = 1L;
  private static final int WIDTH = 1366;
  private static final int HEIGHT = 768;

  /** Below this the level diagram folds to its ribbon. */
  private static final int FOLD_HEIGHT = 800;

  private static final int AUTOSAVE_MILLISECONDS = 2000;
  private static final String START = "start";
  private static final String DESK = "desk";

  private final transient OpenWindows windows;
  private final transient Workbench workbench;
  private final transient Solving solving;
  private final transient FileActions files;
  private final transient Recovery recovery;
  private final transient BlockCommands blocks;
  private final transient WindowCommands commands;
  private final LevelPath path;
  private final DesignDesk design;
  private final SheetDesk sheet;
  private final CaseBar cases;
  private final JTabbedPane desks = new JTabbedPane();
  private final JPanel deck = new JPanel(new CardLayout());
  private final JLabel state = new JLabel(" ");
  private final WindowMenu menu;
  private final Timer autosave = new Timer(AUTOSAVE_MILLISECONDS, e -> autosave());
  private boolean atStart = true;

  /** A window at its start page. */
  MainWindow(OpenWindows windows, Lanes lanes) {
    this.windows = windows;
    solving = new KitSolving(windows.workshop());
    workbench = new Workbench(windows.workshop(), solving, lanes, NewKit.design());
    recovery = new Recovery(windows.recovery());
    files = new FileActions(this, windows, workbench);
    blocks = new BlockCommands(workbench, () -> design().toField(workbench.selected()));
    path = new LevelPath(workbench, blocks);
    blocks.over(path);
    design =
        new DesignDesk(
            workbench,
            blocks,
            this::propose,
            drawer -> files.exportCurve(drawer, false),
            drawer -> files.exportCurve(drawer, true));
    sheet = new SheetDesk(workbench, files::export, () -> Printing.print(workbench));
    cases = new CaseBar(workbench);
    commands = new WindowCommands(this, windows, workbench, files, blocks, design);
    menu = new WindowMenu(workbench, commands.all());
    setJMenuBar(menu);
    lay(new StartPage(windows.workshop(), lanes, files));
    listen();
    setSize(UIScale.scale(WIDTH), UIScale.scale(HEIGHT));
    autosave.setRepeats(false);
    workbench.watch(this::refresh);
    refresh();
  }

  private DesignDesk design() {
    return design;
  }

  private void lay(StartPage start) {
    desks.setName("desks");
    desks.addTab(Words.of("desk.design"), design);
    desks.addTab(
        Words.of("desk.batch"),
        new WaitingDesk("batch", () -> workbenchForm(Selection.TOLERANCES)));
    desks.addTab(
        Words.of("desk.bench"), new WaitingDesk("bench", () -> workbenchForm(Selection.BENCH)));
    desks.addTab(Words.of("desk.sheet"), sheet);
    desks.putClientProperty(FlatClientProperties.TABBED_PANE_TRAILING_COMPONENT, cases);
    desks.addChangeListener(e -> refresh());
    JPanel desk = new JPanel(new BorderLayout());
    desk.add(path, BorderLayout.NORTH);
    desk.add(desks, BorderLayout.CENTER);
    JPanel foot = new JPanel(new MigLayout("insets 3 12 3 12, fillx", "[grow]"));
    state.setName("state");
    foot.add(state, "wmin 0");
    desk.add(foot, BorderLayout.SOUTH);
    deck.add(start, START);
    deck.add(desk, DESK);
    add(deck, BorderLayout.CENTER);
    SwingUtilities.invokeLater(start.first()::requestFocusInWindow);
  }

  private void workbenchForm(String form) {
    desks.setSelectedIndex(0);
    workbench.select(form);
  }

  private void listen() {
    setDefaultCloseOperation(DO_NOTHING_ON_CLOSE);
    addWindowListener(
        new WindowAdapter() {
          @Override
          public void windowClosing(WindowEvent e) {
            leave();
          }

          @Override
          public void windowActivated(WindowEvent e) {
            SwingUtilities.invokeLater(files::noticeChange);
          }
        });
    addComponentListener(
        new ComponentAdapter() {
          @Override
          public void componentResized(ComponentEvent e) {
            path.fold(getHeight() < UIScale.scale(FOLD_HEIGHT));
          }
        });
    getRootPane().setTransferHandler(new DropToOpen(files));
  }

  /** Its design. */
  public Workbench workbench() {
    return workbench;
  }

  Solving solving() {
    return solving;
  }

  boolean atStart() {
    return atStart;
  }

  /** Opens a file here or says why not. */
  public void openFile(java.nio.file.Path file) {
    files.open(file);
  }

  /** Puts the design in the place of the start page. */
  void showDesk() {
    atStart = false;
    ((CardLayout) deck.getLayout()).show(deck, DESK);
    path.requestFocusInWindow();
    refresh();
  }

  JTabbedPane desks() {
    return desks;
  }

  java.util.List<String> deskKeys() {
    return java.util.List.of("desk.design", "desk.batch", "desk.bench", "desk.sheet");
  }

  LevelPath path() {
    return path;
  }

  DesignDesk designDesk() {
    return design;
  }

  private void refresh() {
    String name = workbench.file().map(file -> " – " + file.getFileName()).orElse("");
    boolean unsaved = !atStart && workbench.unsaved();
    setTitle(
        atStart
            ? Words.of("app")
            : (unsaved ? "• " : "") + workbench.design().title() + name + " – " + Words.of("app"));
    menu.refresh();
    if (atStart) {
      return;
    }
    path.refresh();
    cases.refresh();
    if (design.isShowing()) {
      design.refresh();
    }
    sheet.refresh();
    String said = workbench.message();
    state.setText(
        said.isEmpty() ? Words.of(workbench.busy() ? "state.solving" : "state.ready") : said);
    if (unsaved && !autosave.isRunning()) {
      autosave.start();
    }
  }

  /** Keeps what is not saved; forgets the autosave of what is. */
  void autosave() {
    if (!workbench.unsaved()) {
      recovery.clear();
      return;
    }
    var design = workbench.design();
    var file = workbench.file();
    workbench
        .lanes()
        .asked()
        .start(
            () -> recovery.keep(design, file),
            fault -> {
              if (!fault.isEmpty()) {
                workbench.say(fault);
              }
            },
            fault -> {});
  }

  /** Proposes values for all of the design. */
  void propose() {
    new Proposals(this, workbench, new Proposing(windows.workshop(), solving, commands.chooser()))
        .all();
  }

  /** Takes over a look that has changed. */
  void relook() {
    path.repaint();
    design.relook();
    refresh();
  }

  /** Closes the window, if its design may be let go. */
  void leave() {
    if (files.mayLeave()) {
      autosave.stop();
      recovery.clear();
      dispose();
    }
  }
}
