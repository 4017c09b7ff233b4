package earward.volume;

import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.TAP;
import static earward.block.device.Terminal.TOP;
import static earward.block.device.Terminal.WIPER;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.RemedyHint;
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
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * A volume control with a tap: a resistor and a capacitor from the tap to ground take middle and
 * treble down where the listener has it low, and leave the bass, of which the ear hears less then.
 *
 * <p>Source: the tapped control of broadcast receivers (common practice).
 */
public final class LoudnessControl implements BlockType {
  private static final double FILM_FARADS = 100e-9;

  /**
   * Rotation counts for nothing here: the share of the track's end resistance (common practice).
   */
  private static final double END_SHARE = 0.002;

  @Override
  public String id() {
    return "volume.loudness";
  }

  @Override
  public Role role() {
    return Role.VOLUME;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Value(
            "c-in", Unit.FARAD, 470e-9, Coupling.LEAST_FARADS, Coupling.MOST_FARADS, Series.E6),
        new Setting.Value("track-ohms", Unit.OHM, 47e3, 470, 4.7e6, Series.E6),
        new Setting.Choice("taper", List.of("audio-15", "audio-10", "audio-20", "linear")),
        new Setting.Value("tap", Unit.FRACTION, 0.2, 0.02, 0.8, Series.ANY),
        new Setting.Value("loudness-ohms", Unit.OHM, 1e3, 10, 470e3, Series.E12),
        new Setting.Value("loudness-farads", Unit.FARAD, FILM_FARADS, 1e-9, 4.7e-6, Series.E6),
        new Setting.Position("knob", 0.5, "track"),
        new Setting.Value(
            "c-wiper", Unit.FARAD, 220e-9, Coupling.LEAST_FARADS, Coupling.MOST_FARADS, Series.E6));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    Wiring wiring =
        Wiring.from(new Single("in"))
            .run("c-in", Coupling.capacitor(values.amount("c-in")), "hot")
            .body(
                "track",
                track(values),
                Map.of(TOP, "hot", BOTTOM, GROUND, WIPER, "wiper", TAP, "tap"))
            .at("tap")
            .down("r-loudness", new Resistor(values.amount("loudness-ohms")), "foot")
            .at("foot")
            .down("c-loudness", Coupling.capacitor(values.amount("loudness-farads")), GROUND)
            .at("wiper")
            .run("c-wiper", Coupling.capacitor(values.amount("c-wiper")), "out")
            .fit("r-loudness", "c-loudness", "c-in", "c-wiper", "track")
            .testPoint("top", "hot")
            .testPoint("wiper", "wiper")
            .to(new Single("out"));
    return new BlockDescription(
        wiring,
        List.of(
            Coupling.edgeCheck(
                "out", conditions, List.of(RemedyHint.raise("c-in"), RemedyHint.raise("c-wiper")))),
        List.of(
            new Curve(
                "level-over-turn",
                "knob",
                0,
                1,
                21,
                List.of(new FigureName("out", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST)))));
  }

  private static Potentiometer track(Values values) {
    double ohms = values.amount("track-ohms");
    String taper = values.choice("taper").replace('-', '_').toUpperCase(Locale.ROOT);
    return new Potentiometer(
        ohms,
        Taper.valueOf(taper),
        END_SHARE * ohms,
        values.position("knob"),
        false,
        values.amount("tap"));
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
