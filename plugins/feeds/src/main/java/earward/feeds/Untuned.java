package earward.feeds;

import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.TOP;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.device.CarrierGenerator;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import java.util.List;
import java.util.Map;

/** A front end that drives the detector without a tuned circuit, from a source resistance. */
public final class Untuned implements BlockType {
  @Override
  public String id() {
    return "feed.untuned";
  }

  @Override
  public Role role() {
    return Role.FEED;
  }

  @Override
  public List<Setting> settings() {
    return List.of(new Setting.Value("source-ohms", Unit.OHM, 330, 0.1, 100e3, Series.ANY));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    return BlockDescription.of(
        Wiring.start()
            .body(
                "front-end",
                new CarrierGenerator(values.amount("source-ohms")),
                Map.of(TOP, "out", BOTTOM, GROUND))
            .at("out")
            .testPoint("carrier", "out")
            .caution("front-end", Caution.OUTDOOR_AERIAL)
            .to(new Single("out")));
  }
}
