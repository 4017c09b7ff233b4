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

  static BlockDescription describe(
      Values values, String partId, Device device, List<Caution> cautions) {
    if (values.chosen("driven-by", BRIDGE)) {
      WiringPlan bridged =
          Wiring.from(new Pair("plus", "minus"))
              .down(partId, device, "minus")
              .testPoint("hot", "plus")
              .caution(partId, Caution.BRIDGE_NEVER_TO_GROUND);
      return ended(bridged, partId, cautions);
    }
    WiringPlan grounded =
        Wiring.from(new Single("in")).down(partId, device, GROUND).testPoint("hot", "in");
    return ended(grounded, partId, cautions);
  }

  private static BlockDescription ended(WiringPlan plan, String partId, List<Caution> cautions) {
    cautions.forEach(caution -> plan.caution(partId, caution));
    return BlockDescription.of(plan.end());
  }
}
