package earward.desktop.view;

import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.Toolkit;
import java.awt.event.KeyEvent;
import java.nio.file.Path;
import javax.swing.JCheckBoxMenuItem;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;
import javax.swing.KeyStroke;

/** The menu bar; every command of the window has its place and its key here. */
final class Menu extends JMenuBar {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final JMenuItem undo = new JMenuItem();
  private final JMenuItem redo = new JMenuItem();

  Menu(Workbench workbench, MainWindow window) {
    this.workbench = workbench;
    JMenu file = menu("menu.file", KeyEvent.VK_F);
    file.add(item("menu.open", KeyEvent.VK_O, 0, window::open));
    JMenu starters = new JMenu(Words.of("menu.starters"));
    for (Path kit : workbench.workshop().starterKits()) {
      JMenuItem item = new JMenuItem(kit.getFileName().toString().replace(".earward", ""));
      item.addActionListener(e -> window.openKit(kit));
      starters.add(item);
    }
    file.add(starters);
    file.addSeparator();
    file.add(item("menu.save", KeyEvent.VK_S, 0, window::save));
    file.add(item("menu.save-as", KeyEvent.VK_S, KeyEvent.SHIFT_DOWN_MASK, window::saveAs));
    file.add(item("menu.export", KeyEvent.VK_E, 0, window::export));
    file.addSeparator();
    file.add(item("menu.quit", KeyEvent.VK_Q, 0, window::quit));
    JMenu edit = menu("menu.edit", KeyEvent.VK_E);
    prepare(undo, KeyEvent.VK_Z, 0, workbench::undo);
    prepare(redo, KeyEvent.VK_Z, KeyEvent.SHIFT_DOWN_MASK, workbench::redo);
    edit.add(undo);
    edit.add(redo);
    JMenu view = menu("menu.view", KeyEvent.VK_V);
    JCheckBoxMenuItem dark = new JCheckBoxMenuItem(Words.of("menu.dark"), Look.dark());
    dark.addActionListener(e -> window.dark(dark.isSelected()));
    view.add(dark);
    view.add(item("menu.larger", KeyEvent.VK_PLUS, 0, window::larger));
    view.add(item("menu.smaller", KeyEvent.VK_MINUS, 0, window::smaller));
    refresh();
  }

  private JMenu menu(String key, int mnemonic) {
    JMenu menu = new JMenu(Words.of(key));
    menu.setMnemonic(mnemonic);
    add(menu);
    return menu;
  }

  private static JMenuItem item(String key, int code, int modifiers, Runnable action) {
    JMenuItem item = new JMenuItem(Words.of(key));
    prepare(item, code, modifiers, action);
    return item;
  }

  private static void prepare(JMenuItem item, int code, int modifiers, Runnable action) {
    int shortcut = Toolkit.getDefaultToolkit().getMenuShortcutKeyMaskEx();
    item.setAccelerator(KeyStroke.getKeyStroke(code, shortcut | modifiers));
    item.addActionListener(e -> action.run());
  }

  /** Says what undo and redo would do. */
  void refresh() {
    undo.setText(
        workbench
            .undoable()
            .map(what -> Words.of("menu.undo-what", what))
            .orElse(Words.of("menu.undo")));
    undo.setEnabled(workbench.undoable().isPresent());
    redo.setText(
        workbench
            .redoable()
            .map(what -> Words.of("menu.redo-what", what))
            .orElse(Words.of("menu.redo")));
    redo.setEnabled(workbench.redoable().isPresent());
  }
}
