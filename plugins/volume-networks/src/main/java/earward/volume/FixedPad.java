package earward.volume;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.RemedyHint;
import earward.block.device.Resistor;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;

/**
 * A fixed level: the detector's load, a coupling capacitor and a pad, for a power stage that the
 * listener sets by its own control.
 */
public final class FixedPad implements BlockType {
  private static final String RESISTOR = "resistor";

  @Override
  public String id() {
    return "volume.fixed-pad";
  }

  @Override
  public Role role() {
    return Role.VOLUME;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("load", List.of(RESISTOR, "none")),
        new Setting.Value("r1", Unit.OHM, 12e3, 470, 10e6, Series.E12),
        new Setting.Value(
            "c-in", Unit.FARAD, 220e-9, Coupling.LEAST_FARADS, Coupling.MOST_FARADS, Series.E6),
        new Setting.Value("series-ohms", Unit.OHM, 10e3, 10, 10e6, Series.E12),
        new Setting.Choice("shunt", List.of("none", RESISTOR)),
        new Setting.Value("shunt-ohms", Unit.OHM, 10e3, 10, 10e6, Series.E12));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    WiringPlan plan = Wiring.from(new Single("in"));
    if (values.chosen("load", RESISTOR)) {
      plan.down("r1", new Resistor(values.amount("r1")), GROUND).fit("r1");
    }
    plan.run("c-in", Coupling.capacitor(values.amount("c-in")), "coupled")
        .run("r-series", new Resistor(values.amount("series-ohms")), "out")
        .fit("r-series");
    if (values.chosen("shunt", RESISTOR)) {
      plan.down("r-shunt", new Resistor(values.amount("shunt-ohms")), GROUND).fit("r-shunt");
    }
    return BlockDescription.of(
        plan.fit("c-in").testPoint("out", "out").to(new Single("out")),
        Coupling.edgeCheck("out", conditions, List.of(RemedyHint.raise("c-in"))));
  }
}
