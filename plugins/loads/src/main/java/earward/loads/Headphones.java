package earward.loads;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.device.Loudspeaker;
import earward.block.device.LoudspeakerModel;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;

/**
 * Headphones against ground, as a jack's sleeve asks for: both earpieces side by side, in series,
 * or one alone, with or without the resistor that keeps a loudspeaker's stage from the ears.
 */
public final class Headphones implements BlockType {
  private static final String RESISTOR = "resistor";

  @Override
  public String id() {
    return "load.headphones";
  }

  @Override
  public Role role() {
    return Role.LOAD;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Part("earpiece", PartKind.LOUDSPEAKER, "32 ohm earpiece"),
        new Setting.Choice("earpieces", List.of("side-by-side", "in-series", "one")),
        new Setting.Choice("protection", List.of(RESISTOR, "none")),
        new Setting.Value("series-ohms", Unit.OHM, 220, 1, 100e3, Series.E12));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    Loudspeaker earpiece = new Loudspeaker(values.part("earpiece", LoudspeakerModel.class));
    WiringPlan plan = Wiring.from(new Single("in"));
    String hot = "in";
    if (values.chosen("protection", RESISTOR)) {
      hot = "hot";
      plan.run("r-series", new Resistor(values.amount("series-ohms")), hot).fit("r-series");
    }
    boolean series = values.chosen("earpieces", "in-series");
    plan.down("left", earpiece, series ? "middle" : GROUND).caution("left", Caution.HEARING);
    if (!values.chosen("earpieces", "one")) {
      plan.at(series ? "middle" : hot)
          .down("right", earpiece, GROUND)
          .caution("right", Caution.HEARING);
    }
    return BlockDescription.of(plan.testPoint("jack", hot).end());
  }
}
