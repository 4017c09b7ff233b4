package earward.desktop.view;

import earward.desktop.model.CaseView;
import earward.desktop.model.CaseView.Signal;
import earward.desktop.model.Readings;
import earward.desktop.model.Standing;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import net.miginfocom.swing.MigLayout;

/** Says and sets the case that live values are shown in, and how far they may be trusted. */
final class CaseBar extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final List<Signal> SIGNALS = List.of(Signal.values());
  private static final int[] KNOB_PERCENT = {0, 10, 25, 50, 75, 100};

  private final transient Workbench workbench;
  private final JLabel standing = new JLabel();

  CaseBar(Workbench workbench) {
    super(new MigLayout("insets 2 8 2 8, gapx 6, fillx", "", "[]"));
    this.workbench = workbench;
    setName("case-bar");
    getAccessibleContext().setAccessibleName(Words.of("case.name"));
    choice(
        "case.signal",
        SIGNALS.stream()
            .map(signal -> Words.of("case.signal." + signal.name().toLowerCase(Locale.ROOT)))
            .toArray(String[]::new),
        SIGNALS.indexOf(Signal.TEST),
        (view, index) -> view.with(SIGNALS.get(index)));
    String[] knobs = new String[KNOB_PERCENT.length + 1];
    knobs[0] = Words.of("case.knob.set");
    for (int i = 0; i < KNOB_PERCENT.length; i++) {
      knobs[i + 1] = KNOB_PERCENT[i] + " %";
    }
    choice(
        "case.knob",
        knobs,
        0,
        (view, index) ->
            view.withKnob(
                index == 0
                    ? OptionalDouble.empty()
                    : OptionalDouble.of(KNOB_PERCENT[index - 1] / 100.0)));
    choice(
        "case.battery",
        new String[] {Words.of("case.battery.new"), Words.of("case.battery.low")},
        0,
        (view, index) -> view.withBatteryLow(index == 1));
    choice(
        "case.value",
        new String[] {Words.of("case.value.true"), Words.of("case.value.meter")},
        0,
        (view, index) -> view.withMeter(index == 1));
    standing.setName("standing");
    add(standing, "push, alignx right");
  }

  private void choice(
      String key, String[] words, int first, BiFunction<CaseView, Integer, CaseView> change) {
    JLabel label = new QuietLabel(Words.of(key));
    JComboBox<String> box = new JComboBox<>(words);
    box.setName(key);
    box.setSelectedIndex(first);
    box.getAccessibleContext().setAccessibleName(Words.of(key));
    label.setLabelFor(box);
    box.addActionListener(
        e -> workbench.look(change.apply(workbench.caseView(), box.getSelectedIndex())));
    add(label);
    add(box);
  }

  /** Says how far the figures may be trusted. */
  void refresh() {
    Readings readings = workbench.readings();
    Standing now = readings.standing();
    String text = readings.fault().isEmpty() ? now.word() : readings.fault();
    if (!standing.getText().equals(text)) {
      standing.setText(text);
    }
    standing.setForeground(now == Standing.SETTLED ? Look.quiet() : Look.copper());
  }
}
