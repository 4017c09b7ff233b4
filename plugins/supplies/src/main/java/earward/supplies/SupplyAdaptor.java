package earward.supplies;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Severity;
import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.PartKind;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import java.util.List;
import java.util.stream.Stream;

/** A plug-in mains adaptor with a SELV output, with switch and protection inside the kit. */
public final class SupplyAdaptor implements BlockType {
  @Override
  public String id() {
    return "supply.adaptor";
  }

  @Override
  public Role role() {
    return Role.SUPPLY;
  }

  @Override
  public List<Setting> settings() {
    return Stream.concat(
            Stream.of(new Setting.Part("adaptor", PartKind.ADAPTOR, "12 V 1 A regulated")),
            RailFeed.settings("none").stream())
        .toList();
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    AdaptorModel model = values.part("adaptor", AdaptorModel.class);
    RailFeed feed = new RailFeed(values);
    return new BlockDescription(
        feed.wiring("adaptor", new Adaptor(model), List.of(Caution.ADAPTOR_VOLTAGE)),
        feed.checks(
            "adaptor",
            Severity.STOP,
            model.ratedAmperes(),
            "rated current of the " + model.name() + ", as the parts library has it"),
        List.of());
  }
}
