package earward.desktop.view;

import java.awt.event.ActionEvent;
import javax.swing.AbstractAction;
import javax.swing.Action;
import javax.swing.JComponent;
import javax.swing.KeyStroke;

/** Actions and their keys. */
final class Keys {
  private Keys() {}

  /** An action that does one thing. */
  static Action action(Runnable run) {
    return new AbstractAction() {
      private static final long serialVersionUID = 1L;

      @Override
      public void actionPerformed(ActionEvent e) {
        run.run();
      }
    };
  }

  /** A key of a component while it has the focus. */
  static void on(JComponent component, String key, Runnable run) {
    bind(component, JComponent.WHEN_FOCUSED, key, run);
  }

  /** A key of a component while it or something within it has the focus. */
  static void within(JComponent component, String key, Runnable run) {
    bind(component, JComponent.WHEN_ANCESTOR_OF_FOCUSED_COMPONENT, key, run);
  }

  private static void bind(JComponent component, int when, String key, Runnable run) {
    component.getInputMap(when).put(KeyStroke.getKeyStroke(key), key);
    component.getActionMap().put(key, action(run));
  }
}
