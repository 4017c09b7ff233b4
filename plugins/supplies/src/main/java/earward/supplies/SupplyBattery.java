package earward.supplies;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Severity;
import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.PartKind;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import java.util.List;
import java.util.stream.Stream;

/** A battery with its fuse, switch and protection, feeding the main rail and, if wanted, others. */
public final class SupplyBattery implements BlockType {
  @Override
  public String id() {
    return "supply.battery";
  }

  @Override
  public Role role() {
    return Role.SUPPLY;
  }

  @Override
  public List<Setting> settings() {
    return Stream.concat(
            Stream.of(new Setting.Part("battery", PartKind.BATTERY, "9 V block")),
            RailFeed.settings("fuse").stream())
        .toList();
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    BatteryModel model = values.part("battery", BatteryModel.class);
    boolean otherCells = model.highestVolts() > model.newVolts();
    RailFeed feed = new RailFeed(values);
    return new BlockDescription(
        feed.wiring(
            "battery",
            new Battery(model),
            otherCells
                ? List.of(Caution.BATTERY_SHORT, Caution.LITHIUM_IN_HOLDER)
                : List.of(Caution.BATTERY_SHORT)),
        feed.checks(
            "battery",
            Severity.WEIGH,
            model.mostAmperes(),
            "what the " + model.name() + " gives for long, as the parts library has it"),
        List.of());
  }
}
