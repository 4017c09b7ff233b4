package earward.volume;

import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.TOP;
import static earward.block.device.Terminal.WIPER;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Relation;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Potentiometer;
import earward.block.device.Resistor;
import earward.block.device.Taper;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * The volume control: the detector's load itself, or behind a coupling capacitor with or without a
 * load resistor before it; its wiper goes on directly or through a capacitor.
 */
public final class PotentiometerControl implements BlockType {
  private static final String AFTER_CAPACITOR = "after-capacitor";
  private static final String CAPACITOR = "capacitor";
  private static final String RESISTOR = "resistor";

  /** DC that may go on from the wiper, V (common practice). */
  private static final double MOST_DC_VOLTS = 0.1;

  @Override
  public String id() {
    return "volume.potentiometer";
  }

  @Override
  public Role role() {
    return Role.VOLUME;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("coupling", List.of("detector-load", AFTER_CAPACITOR)),
        new Setting.Choice("load", List.of("none", RESISTOR)),
        new Setting.Value("r1", Unit.OHM, 22e3, 470, 10e6, Series.E12),
        new Setting.Value(
            "c-in", Unit.FARAD, 470e-9, Coupling.LEAST_FARADS, Coupling.MOST_FARADS, Series.E6),
        new Setting.Value("track-ohms", Unit.OHM, 22e3, 470, 4.7e6, Series.E6),
        new Setting.Choice(
            "taper", List.of("audio-15", "audio-10", "audio-20", "linear", "reverse-15")),
        new Setting.Position("knob", 0.7, "track"),
        new Setting.Choice("wiper-coupling", List.of(CAPACITOR, "direct")),
        new Setting.Value(
            "c-wiper", Unit.FARAD, 220e-9, Coupling.LEAST_FARADS, Coupling.MOST_FARADS, Series.E6));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    boolean coupled = values.chosen("coupling", AFTER_CAPACITOR);
    boolean wiperCoupled = values.chosen("wiper-coupling", CAPACITOR);
    String top = coupled ? "hot" : "in";
    WiringPlan plan = Wiring.from(new Single("in"));
    List<RemedyHint> moreBass = new ArrayList<>();
    if (values.chosen("load", RESISTOR)) {
      plan.down("r1", new Resistor(values.amount("r1")), GROUND).fit("r1");
    }
    if (coupled) {
      plan.run("c-in", Coupling.capacitor(values.amount("c-in")), top).fit("c-in");
      moreBass.add(RemedyHint.raise("c-in"));
    }
    plan.body("track", track(values), Map.of(TOP, top, BOTTOM, GROUND, WIPER, "wiper")).at("wiper");
    if (wiperCoupled) {
      plan.run("c-wiper", Coupling.capacitor(values.amount("c-wiper")), "out").fit("c-wiper");
      moreBass.add(RemedyHint.raise("c-wiper"));
    }
    String exit = wiperCoupled ? "out" : "wiper";
    Wiring wiring =
        plan.fit("track").testPoint("top", top).testPoint("wiper", "wiper").to(new Single(exit));
    return new BlockDescription(
        wiring,
        List.of(
            Coupling.edgeCheck(exit, conditions, moreBass),
            dcPassedOn(exit, Relation.AT_MOST, MOST_DC_VOLTS),
            dcPassedOn(exit, Relation.AT_LEAST, -MOST_DC_VOLTS)),
        List.of(
            new Curve(
                "level-over-turn",
                "knob",
                0,
                1,
                21,
                List.of(new FigureName(exit, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST)))));
  }

  /** DC at the wiper crackles when it is turned, and shifts the rest of what follows. */
  private static Check dcPassedOn(String exit, Relation relation, double limitVolts) {
    return new Check(
        "dc-passed-on",
        Severity.WEIGH,
        new FigureName(exit, Quantity.DC_VOLTS, CaseName.STRONG),
        relation,
        limitVolts,
        "common practice: a wiper that carries DC crackles",
        List.of(RemedyHint.change("wiper-coupling"), RemedyHint.change("coupling")));
  }

  private static Potentiometer track(Values values) {
    String taper = values.choice("taper").replace('-', '_').toUpperCase(Locale.ROOT);
    return new Potentiometer(
        values.amount("track-ohms"), Taper.valueOf(taper), values.position("knob"));
  }

  /** Coupling capacitors that keep the lowest tone, each an octave below it. */
  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(
        asked -> {
          double track = asked.values().amount("track-ohms");
          double lowest = asked.conditions().lowestToneHertz();
          return Map.<String, SettingValue>of(
              "c-in",
              new SettingValue.Amount(Coupling.farads(asked.sourceOhms() + track, lowest)),
              "c-wiper",
              new SettingValue.Amount(Coupling.farads(asked.loadOhms(), lowest)));
        });
  }
}
