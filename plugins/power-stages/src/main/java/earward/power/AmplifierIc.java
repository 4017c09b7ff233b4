package earward.power;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.device.AmplifierModel;
import earward.block.device.AmplifierTraits;
import earward.block.device.PartKind;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.RcEdge;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * An audio amplifier IC from the parts library with all that its pins need: which parts there are
 * follows from the pins of the chosen type.
 */
public final class AmplifierIc implements BlockType {
  static final double MOST_FARADS = 4.7e-3;

  /** How far below the lowest tone one corner of several should lie (common practice). */
  private static final double BELOW_LOWEST_TONE = 2;

  @Override
  public String id() {
    return "power.amplifier-ic";
  }

  @Override
  public Role role() {
    return Role.POWER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Part("amplifier", PartKind.AMPLIFIER, "TBA820M"),
        new Setting.Value("gain-resistor", Unit.OHM, 56, 1, 10e3, Series.E12),
        electrolytic("gain-capacitor", 100e-6),
        electrolytic("inverting-capacitor", 100e-6),
        new Setting.Choice("ripple", List.of("capacitor", "none")),
        electrolytic("ripple-capacitor", 47e-6),
        new Setting.Choice("bootstrap", List.of("capacitor", "none")),
        electrolytic("bootstrap-capacitor", 100e-6),
        new Setting.Value("bootstrap-resistor", Unit.OHM, 56, 1, 10e3, Series.E12),
        new Setting.Value("compensation-capacitor", Unit.FARAD, 680e-12, 10e-12, 100e-9, Series.E6),
        electrolytic("output-capacitor", 470e-6),
        new Setting.Choice("network", List.of("fitted", "none")),
        new Setting.Value("network-resistor", Unit.OHM, 1, 0.47, 100, Series.E12),
        new Setting.Value("network-capacitor", Unit.FARAD, 220e-9, 10e-9, 820e-9, Series.E6),
        electrolytic("bypass-capacitor", 470e-6),
        new Setting.Value("control-series", Unit.OHM, 82e3, 100, 10e6, Series.E12),
        new Setting.Value("control-track", Unit.OHM, 10e3, 470, 1e6, Series.E6),
        new Setting.Position("control-knob", 0.7, "control-track"),
        electrolytic("control-capacitor", 1e-6),
        new Setting.Choice("cooling", List.of("bare", "heat-sink")),
        new Setting.Value("heat-sink", Unit.KELVIN_PER_WATT, 15, 0.5, 100, Series.E12),
        new Setting.Choice("output", List.of("open", "loudspeaker")),
        new Setting.Part("loudspeaker", PartKind.LOUDSPEAKER, "8 ohm 77 mm"));
  }

  private static Setting electrolytic(String id, double usualFarads) {
    return new Setting.Value(id, Unit.FARAD, usualFarads, 1e-6, MOST_FARADS, Series.E6);
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    AmplifierModel model = values.part("amplifier", AmplifierModel.class);
    Surroundings surroundings = new Surroundings(values, model);
    Curve heat =
        new Curve(
            "heat-over-sink",
            "heat-sink",
            1,
            60,
            21,
            List.of(
                new FigureName("amplifier", Quantity.JUNCTION_CELSIUS, CaseName.HOTTEST),
                new FigureName("amplifier", Quantity.SURFACE_CELSIUS, CaseName.HOTTEST)));
    return new BlockDescription(
        surroundings.wiring(),
        AmplifierChecks.of(values, model, conditions, surroundings.exitNode()),
        values.chosen("cooling", "heat-sink") ? List.of(heat) : List.of());
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    AmplifierTraits traits = values.part("amplifier", AmplifierModel.class).traits();
    List<Finding> findings = new ArrayList<>();
    if (traits.needsOutputNetwork() && !values.chosen("network", "fitted")) {
      findings.add(Finding.inWords(Severity.WEIGH, "output-network-missing"));
    }
    if (traits.switching()) {
      findings.add(Finding.inWords(Severity.WEIGH, "switching-amplifier"));
    }
    return findings;
  }

  /** Gain and output capacitors that each put their corner an octave below the lowest tone. */
  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(
        asked -> {
          AmplifierModel model = asked.values().part("amplifier", AmplifierModel.class);
          double corner = asked.conditions().lowestToneHertz() / BELOW_LOWEST_TONE;
          Map<String, SettingValue> proposed = new HashMap<>();
          if (model.has(Terminal.GAIN) && model.gain().setFromOutside()) {
            proposed.put("gain-capacitor", above(asked.values().amount("gain-resistor"), corner));
          }
          if (!model.bridge()) {
            double ohms = Math.max(model.ratings().leastLoadOhms(), asked.loadOhms());
            proposed.put("output-capacitor", above(ohms, corner));
          }
          return proposed;
        });
  }

  private static SettingValue above(double ohms, double cornerHertz) {
    double least = Math.max(1e-6, RcEdge.farads(ohms, cornerHertz));
    double fitted = Series.E6.contains(least) ? least : Series.E6.next(least);
    return new SettingValue.Amount(Math.min(MOST_FARADS, fitted));
  }
}
