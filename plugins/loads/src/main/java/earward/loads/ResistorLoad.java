package earward.loads;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.device.Resistor;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import java.util.List;

/** A plain resistor at the end of the path, as on the bench. */
public final class ResistorLoad implements BlockType {
  @Override
  public String id() {
    return "load.resistor";
  }

  @Override
  public Role role() {
    return Role.LOAD;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        LoadPort.setting(),
        new Setting.Value("ohms", Unit.OHM, 8, 0.5, 10e6, Series.ANY),
        new Setting.Value("rated-watts", Unit.WATT, 5, 0.1, 100, Series.ANY));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    return LoadPort.describe(
        values,
        "load",
        new Resistor(values.amount("ohms"), values.amount("rated-watts")),
        List.of());
  }
}
