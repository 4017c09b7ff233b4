package earward.desktop.view;

import earward.desktop.model.CurveText;
import earward.desktop.model.Preferences;
import earward.desktop.model.Recovery;
import earward.desktop.model.SheetPages;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.drawing.curve.CurvePlot;
import earward.kit.design.KitDesign;
import earward.kit.review.ReviewedKit;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import javax.imageio.ImageIO;
import javax.swing.JFileChooser;
import javax.swing.JOptionPane;
import javax.swing.filechooser.FileNameExtensionFilter;

/** What the user does with files, in one window. */
final class FileActions implements Documents {
  private final MainWindow window;
  private final OpenWindows windows;
  private final Workbench workbench;

  FileActions(MainWindow window, OpenWindows windows, Workbench workbench) {
    this.window = window;
    this.windows = windows;
    this.workbench = workbench;
  }

  /** The window for the next design: this one while it shows its start page, else a new one. */
  private MainWindow next() {
    return window.atStart() ? window : windows.open();
  }

  @Override
  public void startEmpty() {
    MainWindow to = next();
    to.workbench().start(NewKit.design(), false);
    to.showDesk();
  }

  @Override
  public void startFrom(KitDesign design) {
    MainWindow to = next();
    to.workbench().start(design, false);
    to.showDesk();
  }

  @Override
  public void open(Path file) {
    MainWindow to = next();
    String fault = to.workbench().open(file);
    if (fault.isEmpty()) {
      windows.preferences().opened(file);
      to.showDesk();
    } else {
      Faults.sentence(to, fault);
    }
  }

  @Override
  public void openChosen() {
    choose(Words.of("menu.open"), "earward", false).ifPresent(this::open);
  }

  @Override
  public void recover(Recovery.Left left) {
    MainWindow to = next();
    to.workbench().recover(left.design(), left.original());
    to.showDesk();
    left.discard();
    to.autosave();
  }

  @Override
  public List<Recovery.Left> left() {
    return windows.left();
  }

  @Override
  public Preferences preferences() {
    return windows.preferences();
  }

  boolean save() {
    return workbench.file().isPresent() ? saveTo(workbench.file().get()) : saveAs();
  }

  boolean saveAs() {
    return choose(Words.of("menu.save-as"), "earward", true).filter(this::saveTo).isPresent();
  }

  private boolean saveTo(Path file) {
    boolean own = workbench.file().filter(file::equals).isPresent();
    if (own && workbench.changedOutside() && !confirm("outside.overwrite", file)) {
      return false;
    }
    String fault = workbench.save(file);
    if (fault.isEmpty()) {
      windows.preferences().opened(file);
      window.autosave();
      return true;
    }
    Faults.sentence(window, fault);
    return false;
  }

  /**
   * Asks, when the window comes to the front, what to do with a file that somebody else changed.
   */
  void noticeChange() {
    Optional<Path> file = workbench.file();
    if (file.isPresent() && workbench.changedOutside()) {
      if (confirm(workbench.unsaved() ? "outside.both" : "outside.changed", file.get())) {
        workbench.open(file.get());
      }
    }
  }

  private boolean confirm(String key, Path file) {
    return JOptionPane.showConfirmDialog(
            window,
            Html.wrapped(Words.of(key, file.getFileName()), 400),
            Words.of("outside.title"),
            JOptionPane.YES_NO_OPTION)
        == JOptionPane.YES_OPTION;
  }

  /** Exports the build sheet of the present design: waits for its review where that is to come. */
  void export() {
    choose(Words.of("menu.export"), "pdf", true).ifPresent(this::exportTo);
  }

  void exportTo(Path to) {
    KitDesign design = workbench.design();
    Optional<ReviewedKit> now = workbench.busy() ? Optional.empty() : workbench.kit();
    inBackground(
        () -> {
          SheetPages.write(now.orElseGet(() -> window.solving().review(design)), to);
          return Words.of("exported", to.getFileName());
        },
        to);
  }

  void exportCurve(CurvesDrawer drawer, boolean csv) {
    CurvePlot plot = drawer.pane().plot();
    if (plot == null) {
      workbench.say(Words.of("curves.none"));
      return;
    }
    BufferedImage image = drawer.pane().image();
    choose(Words.of(csv ? "curves.csv" : "curves.picture"), csv ? "csv" : "png", true)
        .ifPresent(
            to ->
                inBackground(
                    () -> {
                      SheetPages.write(
                          csv ? CurveText.csv(plot).getBytes(StandardCharsets.UTF_8) : png(image),
                          to);
                      return Words.of("exported", to.getFileName());
                    },
                    to));
  }

  private static byte[] png(BufferedImage image) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ImageIO.write(image, "png", out);
    return out.toByteArray();
  }

  private void inBackground(Callable<String> work, Path to) {
    workbench.say(Words.of("working"));
    workbench
        .lanes()
        .asked()
        .start(
            work,
            workbench::say,
            fault -> {
              String sentence = Words.of("export.failed", to, String.valueOf(fault.getMessage()));
              workbench.say(sentence);
              Faults.sentence(window, sentence);
            });
  }

  /** Whether the window may let go of its design: asks where something is not saved. */
  boolean mayLeave() {
    if (window.atStart() || !workbench.unsaved()) {
      return true;
    }
    Object[] options = {
      Words.of("unsaved.save"), Words.of("unsaved.discard"), Words.of("unsaved.cancel")
    };
    int answer =
        JOptionPane.showOptionDialog(
            window,
            Words.of("unsaved.question", workbench.design().title()),
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
    chooser.setName("files");
    chooser.setDialogTitle(title);
    chooser.setFileFilter(new FileNameExtensionFilter("*." + ending, ending));
    workbench.file().ifPresent(file -> chooser.setCurrentDirectory(file.toFile().getParentFile()));
    if (saving) {
      String name = workbench.design().title().strip().replaceAll("[^\\p{L}\\p{N} _-]", "");
      chooser.setSelectedFile(
          new File(chooser.getCurrentDirectory(), (name.isEmpty() ? "kit" : name) + "." + ending));
    }
    int answer = saving ? chooser.showSaveDialog(window) : chooser.showOpenDialog(window);
    File file = chooser.getSelectedFile();
    if (answer != JFileChooser.APPROVE_OPTION || file == null) {
      return Optional.empty();
    }
    boolean named = file.getName().contains(".");
    Path chosen = saving && !named ? Path.of(file.getPath() + "." + ending) : file.toPath();
    boolean other = workbench.file().filter(chosen::equals).isEmpty();
    boolean taken = saving && other && Files.exists(chosen);
    return taken && !confirm("overwrite", chosen) ? Optional.empty() : Optional.of(chosen);
  }
}
