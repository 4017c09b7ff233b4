package reedbank.shelf;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Resistor;
import earward.block.figure.FigureName;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import java.util.List;

/**
 * Takes back the treble that a station lifted, and no more: a resistor along the signal, a second
 * resistor and a capacitor in series to ground. The usual values suit the North American AM curve
 * (75 µs and 8.7 kHz; source: NRSC-1).
 */
public final class TrebleShelf implements BlockType {
  @Override
  public String id() {
    return "filter.treble-shelf";
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Value("series", Unit.OHM, 5.6e3, 100, 1e6, Series.E24),
        new Setting.Value("foot", Unit.OHM, 1.8e3, 10, 1e6, Series.E24),
        new Setting.Value("capacitor", Unit.FARAD, 10e-9, 100e-12, 470e-9, Series.E12));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    Wiring wiring =
        Wiring.from(new Single("in"))
            .run("series", new Resistor(values.amount("series")), "out")
            .down("foot", new Resistor(values.amount("foot")), "shelf")
            .at("shelf")
            .down("capacitor", Capacitor.of(values.amount("capacitor"), 63), Nodes.GROUND)
            .testPoint("out", "out")
            .to(new Single("out"));
    Check load =
        Check.atMost(
            "heavy-load",
            Severity.WEIGH,
            FigureName.parse(":loading-loss-decibels@test"),
            6,
            "common practice: a stage gives no more than half of its signal away",
            RemedyHint.raise("series"));
    return BlockDescription.of(wiring, load);
  }
}
