package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.KeyboardFocusManager;
import javax.accessibility.AccessibleContext;
import javax.swing.JLabel;
import javax.swing.JOptionPane;
import javax.swing.JScrollPane;
import org.jspecify.annotations.Nullable;

/** Help on the thing that has the focus, and the guide. */
final class HelpDialog {
  private HelpDialog() {}

  static void show(Component over, Workbench workbench) {
    @Nullable Component focus =
        KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner();
    StringBuilder text = new StringBuilder("<html>");
    AccessibleContext context = focus == null ? null : focus.getAccessibleContext();
    if (context != null && context.getAccessibleName() != null) {
      text.append("<h3>").append(Html.escaped(context.getAccessibleName())).append("</h3>");
      String says = context.getAccessibleDescription();
      text.append("<p width=420>").append(Html.escaped(says == null ? "" : says)).append("</p>");
    }
    String selected = workbench.selected();
    String name = workbench.forms().title(workbench.design(), selected);
    String help = workbench.forms().help(workbench.design(), selected);
    text.append("<h3>").append(Html.escaped(name)).append("</h3><p width=420>");
    text.append(Html.escaped(help)).append("</p>");
    JOptionPane.showMessageDialog(
        over, new JLabel(text.toString()), Words.of("help.title"), JOptionPane.PLAIN_MESSAGE);
  }

  static void guide(Component over) {
    JScrollPane scroll = new JScrollPane(new JLabel(Words.of("help.guide")));
    scroll.setPreferredSize(UIScale.scale(new Dimension(560, 420)));
    JOptionPane.showMessageDialog(over, scroll, Words.of("menu.guide"), JOptionPane.PLAIN_MESSAGE);
  }
}
