package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.DesignReading;
import earward.kit.file.Designs;
import earward.kit.path.Assembler;
import earward.kit.path.KitSolver;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import earward.kit.stage.BuildStages;
import earward.sheet.SheetWriter;
import earward.sheet.Sheets;
import earward.sheet.content.SheetContent;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;

/**
 * One open kit: its history, its file, its last review. Lives on the event thread; solving goes
 * through a {@link Background}, and a review of a design that is no longer the present one is
 * dropped.
 */
public final class Workbench {
  /** A review with the sheet that belongs to it; both are made in the background. */
  private record Reviewed(ReviewedKit kit, SheetContent sheet) {}

  private final Workshop workshop;
  private final Background background;
  private final SettingRows forms;
  private final List<Runnable> watchers = new ArrayList<>();
  private History history;
  private KitDesign saved;
  private @Nullable Path file;
  private @Nullable Reviewed last;
  private String message = "";
  private String selected = "";
  private int version;
  private boolean busy;

  /** A workbench with a design on it that no file holds yet. */
  public Workbench(Workshop workshop, Background background, KitDesign design) {
    this.workshop = workshop;
    this.background = background;
    this.forms = new SettingRows(workshop);
    history = History.of(design);
    saved = design;
    selectFirst();
  }

  /** Calls a watcher after each change, on the event thread. */
  public void watch(Runnable watcher) {
    watchers.add(watcher);
  }

  private void changed() {
    List.copyOf(watchers).forEach(Runnable::run);
  }

  /** What the blocks of this workbench may be made of. */
  public Workshop workshop() {
    return workshop;
  }

  /** The forms of the blocks. */
  public SettingRows forms() {
    return forms;
  }

  /** The present design. */
  public KitDesign design() {
    return history.design();
  }

  /**
   * The last review that belongs to the present design or, while that is being solved, its
   * forerunner.
   */
  public Optional<ReviewedKit> kit() {
    return Optional.ofNullable(last).map(Reviewed::kit);
  }

  /** Whether figures are of a former design while the present one is being solved. */
  public boolean busy() {
    return busy;
  }

  /** What went wrong last, or was done last; may be empty. */
  public String message() {
    return message;
  }

  /** The block whose settings are shown. */
  public String selected() {
    return selected;
  }

  /** Whether the design differs from its file. */
  public boolean unsaved() {
    return !saved.equals(design());
  }

  /** Where the design is kept. */
  public Optional<Path> file() {
    return Optional.ofNullable(file);
  }

  /** Shows the settings of another block. */
  public void select(String blockId) {
    if (design().block(blockId).isPresent() && !selected.equals(blockId)) {
      selected = blockId;
      changed();
    }
  }

  private void selectFirst() {
    if (design().block(selected).isEmpty()) {
      selected = design().blocks().isEmpty() ? "" : design().blocks().get(0).id();
    }
  }

  /**
   * Opens a design file; where it cannot be read the present design stays and a sentence says why.
   */
  public void open(Path from) {
    try {
      DesignReading reading = Designs.read(from);
      history = History.of(reading.design());
      saved = reading.design();
      file = from;
      last = null;
      message = reading.findings().isEmpty() ? "" : reading.findings().get(0).sentence();
      selected = "";
      selectFirst();
      solve();
    } catch (DesignFileException e) {
      message = e.sentence();
      changed();
    }
  }

  /** Saves to a file; the sentence of a failure, empty where it went well. */
  public String save(Path to) {
    try {
      Designs.write(design(), to);
      saved = design();
      file = to;
      message = Words.of("saved", to.getFileName());
      changed();
      return "";
    } catch (DesignFileException e) {
      message = e.sentence();
      changed();
      return message;
    }
  }

  /** Changes one setting to words that {@link SettingRows#fault} found nothing wrong with. */
  public void set(SettingRow row, String words) {
    String now = words.strip();
    if (!now.equals(row.words())) {
      edit(
          Words.of("edit.setting", row.label(), now),
          design -> design.withSetting(row.blockId(), row.setting().id(), now));
    }
  }

  /** Changes the design; the name is what undo will say. */
  public void edit(String name, UnaryOperator<KitDesign> change) {
    history = history.edited(name, change.apply(design()));
    afterEdit();
  }

  /** Name of what {@link #undo} takes back. */
  public Optional<String> undoable() {
    return history.undoable();
  }

  /** Name of what {@link #redo} does again. */
  public Optional<String> redoable() {
    return history.redoable();
  }

  /** Takes the last edit back. */
  public void undo() {
    history = history.undone();
    afterEdit();
  }

  /** Does again what was taken back. */
  public void redo() {
    history = history.redone();
    afterEdit();
  }

  private void afterEdit() {
    message = "";
    selectFirst();
    solve();
  }

  /** Solves and reviews the present design in the background. */
  public void solve() {
    version++;
    int mine = version;
    KitDesign design = design();
    busy = true;
    changed();
    background.start(
        () -> review(design), reviewed -> settle(mine, reviewed), fault -> fail(mine, fault));
  }

  private Reviewed review(KitDesign design) {
    ReviewedKit kit =
        Reviewer.review(
            KitSolver.solve(Assembler.assemble(design, workshop.types(), workshop.parts())),
            Reviewer.USUAL_LANGUAGE);
    return new Reviewed(kit, Sheets.of(kit, BuildStages.solve(kit.solved().assembly())));
  }

  private void settle(int of, Reviewed reviewed) {
    if (of == version) {
      busy = false;
      last = reviewed;
      changed();
    }
  }

  private void fail(int of, Exception fault) {
    if (of == version) {
      busy = false;
      message = Words.of("solve.failed", String.valueOf(fault.getMessage()));
      changed();
    }
  }

  /** What the build sheet of the last review says; empty before the first. */
  public Optional<SheetContent> content() {
    return Optional.ofNullable(last).map(Reviewed::sheet);
  }

  /** The pages of the build sheet as they would be printed; empty before the first review. */
  public Optional<byte[]> sheet() throws IOException {
    if (last == null) {
      return Optional.empty();
    }
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    SheetWriter.write(last.sheet(), out);
    return Optional.of(out.toByteArray());
  }

  /** Writes the build sheet; the sentence of a failure, empty where it went well. */
  public String export(Path to) {
    try {
      Optional<byte[]> pages = sheet();
      if (pages.isPresent()) {
        Files.write(to, pages.get());
        message = Words.of("exported", to.getFileName());
      } else {
        message = Words.of("nothing.solved");
      }
      changed();
      return pages.isPresent() ? "" : message;
    } catch (IOException e) {
      message = Words.of("export.failed", to, String.valueOf(e.getMessage()));
      changed();
      return message;
    }
  }
}
