package earward.desktop.view;

import earward.desktop.model.Amounts;
import earward.desktop.model.Baseline;
import earward.desktop.model.Difference;
import earward.desktop.model.Findable;
import earward.desktop.model.Preferences;
import earward.desktop.model.Proposing;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** All commands of a window, in the order of its menus. */
final class WindowCommands {
  private final MainWindow window;
  private final OpenWindows windows;
  private final Workbench workbench;
  private final FileActions files;
  private final BlockCommands blocks;
  private final DesignDesk desk;
  private final CopyActions copies;
  private final List<Command> all = new ArrayList<>();

  WindowCommands(
      MainWindow window,
      OpenWindows windows,
      Workbench workbench,
      FileActions files,
      BlockCommands blocks,
      DesignDesk desk) {
    this.window = window;
    this.windows = windows;
    this.workbench = workbench;
    this.files = files;
    this.blocks = blocks;
    this.desk = desk;
    copies = new CopyActions(workbench, desk);
    file();
    edit();
    path();
    view();
    help();
  }

  List<Command> all() {
    return List.copyOf(all);
  }

  private void add(String menu, String key, String stroke, Runnable run) {
    all.add(Command.of(menu, key, stroke, run));
  }

  private void file() {
    add("menu.file", "menu.new", "menu N", files::startEmpty);
    all.add(Command.of("menu.file", "menu.window", windows::open));
    add("menu.file", "menu.open", "menu O", files::openChosen);
    add("menu.file", "menu.save", "menu S", files::save);
    add("menu.file", "menu.save-as", "menu shift S", files::saveAs);
    add("menu.file", "menu.export", "menu E", files::export);
    add("menu.file", "menu.print", "menu P", () -> Printing.print(workbench));
    add("menu.file", "menu.close", "menu W", window::leave);
    add("menu.file", "menu.quit", "menu Q", () -> windows.each(MainWindow::leave));
  }

  private void edit() {
    add("menu.edit", "menu.undo", "menu Z", workbench::undo);
    add("menu.edit", "menu.redo", "menu shift Z", workbench::redo);
    all.add(Command.of("menu.edit", "menu.copy-figures", copies::figures));
    all.add(Command.of("menu.edit", "menu.copy-drawing", copies::drawing));
    all.add(Command.of("menu.edit", "menu.copy-curve", copies::curve));
    add("menu.edit", "menu.find", "menu F", this::find);
    all.add(Command.of("menu.edit", "menu.preferences", this::prefer));
  }

  private void path() {
    add("menu.path", "menu.add", "menu shift A", blocks::add);
    add("menu.path", "menu.beside", "menu shift B", blocks::beside);
    add("menu.path", "menu.replace", "menu shift R", blocks::replace);
    add("menu.path", "menu.remove", "menu shift D", blocks::remove);
    add("menu.path", "menu.left", "menu shift LEFT", () -> blocks.move(-1));
    add("menu.path", "menu.right", "menu shift RIGHT", () -> blocks.move(1));
    add("menu.path", "menu.propose", "menu shift P", window::propose);
  }

  private void view() {
    add("menu.view", "menu.to-path", "F2", () -> window.path().requestFocusInWindow());
    add("menu.view", "menu.to-settings", "F3", () -> desk.toField(workbench.selected()));
    add("menu.view", "menu.to-drawing", "F4", () -> desk.drawing().pane().requestFocusInWindow());
    add("menu.view", "menu.twin", "F5", () -> desk.drawing().twin(!desk.drawing().twinShown()));
    add("menu.view", "menu.curves", "F6", () -> desk.openCurves(!desk.curvesOpen()));
    add("menu.view", "menu.findings", "F8", () -> desk.openFindings(!desk.findingsOpen()));
    for (int i = 0; i < window.deskKeys().size(); i++) {
      int index = i;
      add(
          "menu.view",
          window.deskKeys().get(i),
          "menu " + (i + 1),
          () -> window.desks().setSelectedIndex(index));
    }
    add("menu.view", "menu.pin", "menu B", this::pin);
    all.add(Command.of("menu.view", "menu.compare", this::compareBaseline));
    all.add(Command.of("menu.view", "menu.compare-open", this::compareOpen));
    add("menu.view", "menu.larger", "menu PLUS", desk.drawing()::larger);
    add("menu.view", "menu.smaller", "menu MINUS", desk.drawing()::smaller);
  }

  private void help() {
    add("menu.help", "menu.about-this", "F1", () -> HelpDialog.show(window, workbench));
    all.add(Command.of("menu.help", "menu.guide", () -> HelpDialog.guide(window)));
  }

  private void find() {
    List<Findable> found = new ArrayList<>();
    for (Command command : all) {
      String stroke =
          command.stroke().map(key -> key.toString().replace("pressed ", "")).orElse("");
      found.add(new Findable(command.name(), Words.of("find.command"), stroke, command.run()));
    }
    found.addAll(Findable.of(workbench, desk::toField));
    new ListDialog<>(
            window.getContentPane(),
            Words.of("menu.find"),
            found,
            each -> "<html>" + Html.escaped(each.name()) + "  <i>" + Html.escaped(each.kind()),
            Findable::matches,
            Findable::extra)
        .ask()
        .ifPresent(each -> each.go().run());
  }

  private void prefer() {
    Preferences preferences = windows.preferences();
    if (PreferencesDialog.ask(window, preferences)) {
      apply(preferences);
      windows.each(MainWindow::relook);
    }
  }

  /** Takes over what is preferred. */
  private static void apply(Preferences preferences) {
    Amounts.decimalsOf(preferences.decimalComma() ? Locale.GERMANY : Locale.ENGLISH);
    Look.change(preferences.theme(), preferences.textPercent());
  }

  private void pin() {
    if (workbench.baseline().isPresent()) {
      workbench.unpin();
    } else {
      workbench.pin();
    }
  }

  private void compareBaseline() {
    Optional<Baseline> pinned = workbench.baseline();
    if (pinned.isEmpty()) {
      workbench.say(Words.of("compare.none"));
      return;
    }
    compare(pinned.get(), Words.of("compare.baseline"));
  }

  /** With the design of another open window. */
  private void compareOpen() {
    List<MainWindow> others =
        windows.windows().stream()
            .filter(each -> !each.equals(window) && !each.atStart())
            .filter(each -> each.workbench().readings().good().isPresent())
            .toList();
    if (others.isEmpty()) {
      workbench.say(Words.of("compare.no-other"));
      return;
    }
    new ListDialog<>(
            window.getContentPane(),
            Words.of("menu.compare-open"),
            others,
            each -> each.workbench().design().title(),
            (each, typed) -> each.workbench().design().title().contains(typed),
            each -> each.workbench().file().map(Object::toString).orElse(""))
        .ask()
        .ifPresent(
            other ->
                compare(
                    new Baseline(
                        other.workbench().readings().good().orElseThrow(), Optional.empty()),
                    other.workbench().design().title()));
  }

  private void compare(Baseline with, String name) {
    List<Difference> lines =
        new ArrayList<>(
            Difference.ofValues(
                workbench.forms(), with.kit().solved().assembly().design(), workbench.design()));
    workbench
        .readings()
        .good()
        .ifPresent(now -> lines.addAll(Difference.ofFigures(with.kit().figures(), now.figures())));
    TableDialog.show(
        window.getContentPane(),
        Words.of("compare.title"),
        Words.of("compare.says", name),
        lines,
        name,
        Words.of("difference.now"),
        "");
  }

  /** How values are chosen. */
  Proposing.Chooser chooser() {
    return new earward.desktop.model.KitChooser(windows.workshop());
  }
}
