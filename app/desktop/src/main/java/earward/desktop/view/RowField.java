package earward.desktop.view;

import earward.desktop.model.FormRow;
import javax.swing.JComponent;

/** What a line of a form is entered by. */
interface RowField {
  /** The widget that takes the focus. */
  JComponent focus();

  /** All of it: the widget, and what is said under it. */
  JComponent whole();

  /** Takes over the line as it stands; what is being entered stays. */
  void show(FormRow row);
}
