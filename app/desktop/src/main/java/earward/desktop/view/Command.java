package earward.desktop.view;

import earward.desktop.model.Words;
import java.awt.Toolkit;
import java.util.Optional;
import javax.swing.KeyStroke;

/**
 * One thing that the window can do: it stands in a menu, has a key, and is found by its name.
 *
 * @param menu key of the menu's words
 * @param key of its own words
 * @param stroke its key; empty for none
 * @param run what it does
 */
record Command(String menu, String key, Optional<KeyStroke> stroke, Runnable run) {

  /** A command without a key. */
  static Command of(String menu, String key, Runnable run) {
    return new Command(menu, key, Optional.empty(), run);
  }

  /** A command with a key; {@code menu} in it stands for the system's own menu modifier. */
  static Command of(String menu, String key, String stroke, Runnable run) {
    String words = stroke.replace("menu ", "");
    KeyStroke plain = KeyStroke.getKeyStroke(words);
    if (plain == null) {
      throw new IllegalArgumentException("no key: " + stroke);
    }
    int own =
        stroke.startsWith("menu ") ? Toolkit.getDefaultToolkit().getMenuShortcutKeyMaskEx() : 0;
    return new Command(
        menu,
        key,
        Optional.of(KeyStroke.getKeyStroke(plain.getKeyCode(), plain.getModifiers() | own)),
        run);
  }

  String name() {
    return Words.of(key);
  }
}
