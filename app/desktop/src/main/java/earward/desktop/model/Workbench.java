package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.DesignReading;
import earward.kit.path.KitCurves;
import earward.kit.review.ReviewedKit;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;

/**
 * One open kit: its history, what is being typed, its file, what was solved of it. Lives on the
 * event thread; nothing is solved there.
 */
public final class Workbench {
  private final Workshop workshop;
  private final Lanes lanes;
  private final SolveFlow flow;
  private final Forms forms;
  private final PathEdits path;
  private final List<Runnable> watchers = new ArrayList<>();
  private final KitFile file;
  private History history;
  private @Nullable KitDesign draft;
  private @Nullable Baseline baseline;
  private CaseView caseView = CaseView.USUAL;
  private String message = "";

  /** The visit to a field from which the last edit came; empty where it came otherwise. */
  private String session = "";

  private String selected = Selection.CONDITIONS;
  private long changes;

  /** A workbench with a design on it that no file holds yet. */
  public Workbench(Workshop workshop, Solving solving, Lanes lanes, KitDesign design) {
    this.workshop = workshop;
    this.lanes = lanes;
    flow = new SolveFlow(solving, lanes, this::changed);
    forms = new Forms(workshop);
    path = new PathEdits(workshop);
    file = new KitFile(design);
    history = History.of(design);
  }

  /** Calls a watcher after each change, on the event thread. */
  public void watch(Runnable watcher) {
    watchers.add(watcher);
  }

  private void changed() {
    changes++;
    List.copyOf(watchers).forEach(Runnable::run);
  }

  /** Grows with every change: who keeps it knows whether anything is new. */
  public long changes() {
    return changes;
  }

  /** What the blocks of this workbench may be made of. */
  public Workshop workshop() {
    return workshop;
  }

  /** Where its work is done. */
  public Lanes lanes() {
    return lanes;
  }

  /** The forms of blocks, conditions, tolerances, bench and sheet. */
  public Forms forms() {
    return forms;
  }

  /** What may be done to the path. */
  public PathEdits path() {
    return path;
  }

  /** The present design, without what is being typed. */
  public KitDesign design() {
    return history.design();
  }

  /** The present design with what is being typed. */
  public KitDesign shown() {
    return draft == null ? design() : draft;
  }

  /** All that was solved, with its standing. */
  public Readings readings() {
    return flow.readings();
  }

  /** The last review that belongs to the present design or to its forerunner. */
  public Optional<ReviewedKit> kit() {
    return flow.readings().reviewed();
  }

  /** Whether the whole review of the present design is still to come. */
  public boolean busy() {
    return flow.busy();
  }

  /** Whether remedies are being looked for. */
  public boolean seekingRemedies() {
    return flow.seeking();
  }

  /** What went wrong last, or was done last; may be empty. */
  public String message() {
    return message;
  }

  /** Says something in the window's foot. */
  public void say(String sentence) {
    message = sentence;
    changed();
  }

  /** What is selected: a block, a seam, or one of the kit's own forms; see {@link Selection}. */
  public String selected() {
    return selected;
  }

  /** Whether the design differs from its file. */
  public boolean unsaved() {
    return file.differs(design());
  }

  /** Where the design is kept. */
  public Optional<Path> file() {
    return file.path();
  }

  /** Selects what is there. */
  public void select(String what) {
    if (!selected.equals(what) && Selection.exists(design(), what)) {
      selected = what;
      changed();
    }
  }

  private void selectWhatIsThere() {
    if (!Selection.exists(design(), selected)) {
      selected = Selection.CONDITIONS;
    }
  }

  /** Puts a design on the bench that no file holds. */
  public void start(KitDesign design, boolean unsaved) {
    file.detach(null);
    file.forget(unsaved ? design.withTitle(design.title() + " ") : design);
    begin(design, "");
  }

  /** Puts a recovered design on the bench: unsaved, its file that which it was of. */
  public void recover(KitDesign design, Optional<Path> original) {
    file.detach(original.orElse(null));
    file.forget(design.withTitle(design.title() + " "));
    begin(design, Words.of("recovered", design.title()));
  }

  private void begin(KitDesign design, String said) {
    history = History.of(design);
    draft = null;
    baseline = null;
    selected = Selection.CONDITIONS;
    message = said;
    flow.clear();
    solve();
  }

  /**
   * Opens a design file; where it cannot be read the present design stays and a sentence says why.
   * Empty where it went well.
   */
  public String open(Path from) {
    try {
      DesignReading reading = file.read(from);
      begin(
          reading.design(),
          reading.findings().isEmpty() ? "" : reading.findings().get(0).sentence());
      return "";
    } catch (DesignFileException e) {
      say(e.sentence());
      return e.sentence();
    }
  }

  /** Saves to a file; the sentence of a failure, empty where it went well. */
  public String save(Path to) {
    try {
      file.write(design(), to);
      say(Words.of("saved", to.getFileName()));
      return "";
    } catch (DesignFileException e) {
      say(e.sentence());
      return e.sentence();
    }
  }

  /** Whether somebody else changed the design's file since it was read or written; says so once. */
  public boolean changedOutside() {
    return file.changedOutside();
  }

  /** Shows figures for a design that is being typed and is no edit yet. */
  public void type(KitDesign typed) {
    if (!typed.equals(shown())) {
      draft = typed;
      flow.preview(typed);
      changed();
    }
  }

  /** What was typed is no more. */
  public void untype() {
    if (draft != null) {
      draft = null;
      flow.unpreview();
      changed();
    }
  }

  /** Changes the design; the name is what undo will say. An edit that changes nothing is none. */
  public void edit(String name, UnaryOperator<KitDesign> change) {
    KitDesign after = change.apply(design());
    if (after.equals(design())) {
      untype();
    } else {
      history = history.edited(name, after);
      session = "";
      afterEdit();
    }
  }

  /**
   * Changes the design from a field: what is entered there until it is left is one step.
   *
   * @param visit a name of the field and of this visit to it
   */
  public void enter(String visit, String name, UnaryOperator<KitDesign> change) {
    boolean goesOn = visit.equals(session) && history.undoable().isPresent();
    KitDesign after = change.apply(design());
    if (after.equals(design())) {
      untype();
    } else {
      history = goesOn ? history.amended(name, after) : history.edited(name, after);
      session = visit;
      afterEdit();
    }
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
    session = "";
    afterEdit();
  }

  /** Does again what was taken back. */
  public void redo() {
    history = history.redone();
    session = "";
    afterEdit();
  }

  private void afterEdit() {
    draft = null;
    message = "";
    selectWhatIsThere();
    solve();
  }

  /** Solves and reviews the present design in the background. */
  public void solve() {
    flow.settle(design());
    changed();
  }

  /** Solves curves after each review from now on, or no more. */
  public void askCurves(boolean asked) {
    flow.askCurves(asked);
  }

  /** Looks for remedies after each review from now on, or no more. */
  public void askRemedies(boolean asked) {
    flow.askRemedies(asked);
  }

  /** The curves last solved. */
  public Optional<KitCurves> curves() {
    return flow.curves();
  }

  /** Whether the curves are those of the present design. */
  public boolean curvesCurrent() {
    return flow.curvesCurrent();
  }

  /** What the present design is compared with. */
  public Optional<Baseline> baseline() {
    return Optional.ofNullable(baseline);
  }

  /** Pins the present design as it was last solved; without a solve nothing is pinned. */
  public void pin() {
    readings()
        .good()
        .ifPresent(
            kit -> {
              baseline = new Baseline(kit, curvesCurrent() ? curves() : Optional.empty());
              changed();
            });
  }

  /** Compares with nothing any more. */
  public void unpin() {
    baseline = null;
    changed();
  }

  /** The case in which live values are shown. */
  public CaseView caseView() {
    return caseView;
  }

  /** Shows live values in another case. */
  public void look(CaseView changed) {
    if (!caseView.equals(changed)) {
      caseView = changed;
      changed();
    }
  }

  /** The name of the field that makes a part what it is, {@code volume.track-ohms}. */
  public String settingOf(String partPlace) {
    int dot = partPlace.indexOf('.');
    String blockId = dot < 0 ? partPlace : partPlace.substring(0, dot);
    return readings()
        .assembly()
        .flatMap(assembly -> assembly.block(blockId))
        .flatMap(
            block ->
                SettingOfPart.find(
                    block,
                    partPlace.substring(dot + 1),
                    design().conditions().core(),
                    workshop.parts()))
        .map(setting -> blockId + "." + setting.id())
        .orElse(blockId);
  }
}
