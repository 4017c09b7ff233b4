package earward.desktop.view;

import earward.desktop.model.Preferences;
import earward.desktop.model.Preferences.Theme;
import earward.desktop.model.Words;
import java.awt.Component;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JOptionPane;
import javax.swing.JPanel;
import net.miginfocom.swing.MigLayout;

/** Asks what the user prefers: theme, size of text, decimal sign. */
final class PreferencesDialog {
  private static final List<Theme> THEMES = List.of(Theme.values());
  private static final int[] PERCENTS = {80, 90, 100, 115, 130, 150, 175, 200};

  private PreferencesDialog() {}

  /** Asks; returns whether anything may have changed. */
  static boolean ask(Component over, Preferences preferences) {
    JComboBox<String> theme =
        new JComboBox<>(
            THEMES.stream()
                .map(each -> Words.of("theme." + each.name().toLowerCase(Locale.ROOT)))
                .toArray(String[]::new));
    theme.setSelectedIndex(THEMES.indexOf(preferences.theme()));
    JComboBox<String> text =
        new JComboBox<>(Arrays.stream(PERCENTS).mapToObj(p -> p + " %").toArray(String[]::new));
    text.setSelectedIndex(Math.max(0, Arrays.binarySearch(PERCENTS, preferences.textPercent())));
    JComboBox<String> decimal =
        new JComboBox<>(new String[] {Words.of("decimal.point"), Words.of("decimal.comma")});
    decimal.setSelectedIndex(preferences.decimalComma() ? 1 : 0);
    JPanel panel = new JPanel(new MigLayout("insets 0, wrap 2", "[][grow,fill]", ""));
    add(panel, "preferences.theme", theme);
    add(panel, "preferences.text", text);
    add(panel, "preferences.decimal", decimal);
    int answer =
        JOptionPane.showConfirmDialog(
            over,
            panel,
            Words.of("preferences.title"),
            JOptionPane.OK_CANCEL_OPTION,
            JOptionPane.PLAIN_MESSAGE);
    if (answer != JOptionPane.OK_OPTION) {
      return false;
    }
    preferences.theme(THEMES.get(theme.getSelectedIndex()));
    preferences.textPercent(PERCENTS[text.getSelectedIndex()]);
    preferences.decimalComma(decimal.getSelectedIndex() == 1);
    return true;
  }

  private static void add(JPanel panel, String key, JComboBox<String> box) {
    JLabel label = new JLabel(Words.of(key));
    label.setLabelFor(box);
    box.setName(key);
    box.getAccessibleContext().setAccessibleName(Words.of(key));
    panel.add(label);
    panel.add(box);
  }
}
