package earward.volume;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.SeamUse;
import earward.block.SeamUse.Kind;
import earward.block.check.RemedyHint;
import earward.block.device.Resistor;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;

/**
 * What stands between two blocks that do not suit one another: a resistor or a capacitor in line, a
 * resistor to ground, or a pad of two resistors.
 */
public final class MatchingSection implements BlockType {
  private static final String RESISTOR = "resistor";
  private static final String CAPACITOR = "capacitor";
  private static final String NONE = "none";
  private static final String SERIES = "series";
  private static final String SHUNT = "shunt";
  private static final String SERIES_OHMS = "series-ohms";
  private static final String SHUNT_OHMS = "shunt-ohms";
  private static final String FARADS = "series-farads";

  @Override
  public String id() {
    return "volume.matching-section";
  }

  @Override
  public Role role() {
    return Role.VOLUME;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice(SERIES, List.of(RESISTOR, CAPACITOR)),
        new Setting.Value(SERIES_OHMS, Unit.OHM, 10e3, 1, 10e6, Series.E12),
        new Setting.Value(
            FARADS, Unit.FARAD, 470e-9, Coupling.LEAST_FARADS, Coupling.MOST_FARADS, Series.E6),
        new Setting.Choice(SHUNT, List.of(NONE, RESISTOR)),
        new Setting.Value(SHUNT_OHMS, Unit.OHM, 10e3, 1, 10e6, Series.E12));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    WiringPlan plan = Wiring.from(new Single("in"));
    boolean coupled = values.chosen(SERIES, CAPACITOR);
    if (coupled) {
      plan.run("c-series", Coupling.capacitor(values.amount(FARADS)), "out");
    } else {
      plan.run("r-series", new Resistor(values.amount(SERIES_OHMS)), "out").fit("r-series");
    }
    if (values.chosen(SHUNT, RESISTOR)) {
      plan.down("r-shunt", new Resistor(values.amount(SHUNT_OHMS)), GROUND).fit("r-shunt");
    }
    if (coupled) {
      plan.fit("c-series");
    }
    Wiring wiring = plan.testPoint("out", "out").to(new Single("out"));
    return coupled
        ? BlockDescription.of(
            wiring, Coupling.edgeCheck("out", conditions, List.of(RemedyHint.raise(FARADS))))
        : BlockDescription.of(wiring);
  }

  @Override
  public List<SeamUse> seamUses() {
    SettingValue resistor = new SettingValue.Option(RESISTOR);
    SettingValue none = new SettingValue.Option(NONE);
    SettingValue little = new SettingValue.Amount(1);
    return List.of(
        new SeamUse(
            Kind.PAD, Map.of(SERIES, resistor, SHUNT, resistor), List.of(SERIES_OHMS, SHUNT_OHMS)),
        new SeamUse(
            Kind.COUPLING_CAPACITOR,
            Map.of(SERIES, new SettingValue.Option(CAPACITOR), SHUNT, none),
            List.of(FARADS)),
        new SeamUse(
            Kind.SERIES_RESISTOR, Map.of(SERIES, resistor, SHUNT, none), List.of(SERIES_OHMS)),
        new SeamUse(
            Kind.SHUNT_RESISTOR,
            Map.of(SERIES, resistor, SERIES_OHMS, little, SHUNT, resistor),
            List.of(SHUNT_OHMS)));
  }
}
