package earward.desktop.view;

import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;

/** The menu bar: every command of the window in its place, with its key. */
final class WindowMenu extends JMenuBar {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final transient Map<String, JMenuItem> items = new LinkedHashMap<>();

  WindowMenu(Workbench workbench, List<Command> commands) {
    this.workbench = workbench;
    Map<String, JMenu> menus = new LinkedHashMap<>();
    for (Command command : commands) {
      JMenu menu =
          menus.computeIfAbsent(
              command.menu(),
              key -> {
                JMenu made = new JMenu(Words.of(key));
                made.setMnemonic(Words.of(key).charAt(0));
                add(made);
                return made;
              });
      JMenuItem item = new JMenuItem(command.name());
      item.setName(command.key());
      command.stroke().ifPresent(item::setAccelerator);
      item.addActionListener(e -> command.run().run());
      menu.add(item);
      items.put(command.key(), item);
    }
    refresh();
  }

  /** Says what undo and redo would do. */
  void refresh() {
    name("menu.undo", "menu.undo-what", workbench.undoable().orElse(""));
    name("menu.redo", "menu.redo-what", workbench.redoable().orElse(""));
  }

  private void name(String key, String with, String what) {
    JMenuItem item = items.get(key);
    if (item != null) {
      item.setText(what.isEmpty() ? Words.of(key) : Words.of(with, what));
      item.setEnabled(!what.isEmpty());
    }
  }
}
