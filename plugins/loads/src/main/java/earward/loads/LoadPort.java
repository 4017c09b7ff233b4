package earward.loads;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.device.Device;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Pair;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;

/** How a load hangs on what drives it: against ground, or between the two outputs of a bridge. */
final class LoadPort {
  private static final String BRIDGE = "bridge";

  private LoadPort() {}

  static Setting setting() {
    return new Setting.Choice("driven-by", List.of("single", BRIDGE));
  }

  static BlockDescription describe(Values values, String partId, Device device) {
    if (values.chosen("driven-by", BRIDGE)) {
      return BlockDescription.of(
          ended(Wiring.from(new Pair("plus", "minus")).down(partId, device, "minus"), "plus")
              .caution(partId, Caution.BRIDGE_NEVER_TO_GROUND)
              .end());
    }
    return BlockDescription.of(
        ended(Wiring.from(new Single("in")).down(partId, device, GROUND), "in").end());
  }

  private static WiringPlan ended(WiringPlan plan, String hot) {
    return plan.testPoint("hot", hot);
  }
}
