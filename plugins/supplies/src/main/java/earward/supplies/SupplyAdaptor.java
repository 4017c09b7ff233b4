package earward.supplies;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Severity;
import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.PartKind;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
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
    return BlockDescription.of(
        new RailFeed(values).wiring("adaptor", new Adaptor(model), Caution.ADAPTOR_VOLTAGE),
        Check.atMost(
            "supply-current",
            Severity.STOP,
            new FigureName("adaptor", Quantity.SUPPLY_AMPERES, CaseName.FULL_OUTPUT),
            model.ratedAmperes(),
            "rated current of the " + model.name() + ", as the parts library has it"));
  }
}
