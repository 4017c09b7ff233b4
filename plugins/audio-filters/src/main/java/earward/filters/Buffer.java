package earward.filters;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.SeamUse;
import earward.block.device.Resistor;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/**
 * A follower of unity gain: a source that bears little load drives one that takes much. An op-amp
 * or a transistor, from one supply, with a resistor before its input that keeps it from
 * oscillating.
 */
public final class Buffer implements BlockType {
  @Override
  public String id() {
    return "filter.buffer";
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    return Stream.concat(
            Stream.of(new Setting.Value("r-stop", Unit.OHM, 1e3, 10, 100e3, Series.E12)),
            Follower.settings().stream())
        .toList();
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    WiringPlan plan = Wiring.from(new Single("in"));
    Follower.enter(plan, values);
    plan.at("hot").run("r-stop", new Resistor(values.amount("r-stop")), "plus").fit("r-stop");
    Follower.follow(plan, values);
    Follower.leave(plan, values);
    return new BlockDescription(
        plan.to(new Single("out")),
        Follower.checks(values, conditions.highestToneHertz(), conditions.lowestToneHertz()),
        List.of());
  }

  @Override
  public List<SeamUse> seamUses() {
    return List.of(new SeamUse(SeamUse.Kind.BUFFER, Map.of(), List.of()));
  }
}
