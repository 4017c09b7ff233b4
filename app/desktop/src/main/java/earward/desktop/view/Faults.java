package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.Words;
import java.awt.Component;
import java.awt.Dimension;
import java.io.PrintWriter;
import java.io.StringWriter;
import javax.swing.JLabel;
import javax.swing.JOptionPane;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.SwingUtilities;
import net.miginfocom.swing.MigLayout;
import org.jspecify.annotations.Nullable;

/** Says what went wrong: a sentence; of a fault of the program also a text that can be copied. */
final class Faults {
  private static boolean saying;

  private Faults() {}

  /** From now on every fault that nobody caught is said, once at a time; the work goes on. */
  static void sayUncaught() {
    Thread.setDefaultUncaughtExceptionHandler(
        (thread, fault) -> SwingUtilities.invokeLater(() -> say(fault)));
  }

  private static void say(Throwable fault) {
    if (saying) {
      return;
    }
    saying = true;
    StringWriter trace = new StringWriter();
    fault.printStackTrace(new PrintWriter(trace));
    JTextArea text = new JTextArea(trace.toString(), 12, 60);
    text.setEditable(false);
    text.getAccessibleContext().setAccessibleName(Words.of("fault.details"));
    JPanel panel = new JPanel(new MigLayout("insets 0, wrap 1", "[fill,grow]"));
    panel.add(new JLabel(Html.wrapped(Words.of("fault.program"), 460)));
    JScrollPane scroll = new JScrollPane(text);
    scroll.setPreferredSize(UIScale.scale(new Dimension(520, 180)));
    panel.add(scroll);
    JOptionPane.showMessageDialog(null, panel, Words.of("fault.title"), JOptionPane.ERROR_MESSAGE);
    saying = false;
  }

  /** Says one sentence over a window. */
  static void sentence(@Nullable Component over, String sentence) {
    JOptionPane.showMessageDialog(
        over, Html.wrapped(sentence, 420), Words.of("app"), JOptionPane.WARNING_MESSAGE);
  }
}
