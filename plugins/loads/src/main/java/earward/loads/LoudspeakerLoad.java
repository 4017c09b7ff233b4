package earward.loads;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.device.Loudspeaker;
import earward.block.device.LoudspeakerModel;
import earward.block.device.PartKind;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import java.util.List;

/** A loudspeaker at the end of the path. */
public final class LoudspeakerLoad implements BlockType {
  /** What bears no more than this is worn at the ear (common practice). */
  private static final double MOST_WATTS_AT_THE_EAR = 0.25;

  @Override
  public String id() {
    return "load.loudspeaker";
  }

  @Override
  public Role role() {
    return Role.LOAD;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        LoadPort.setting(), new Setting.Part("loudspeaker", PartKind.LOUDSPEAKER, "8 ohm 77 mm"));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    LoudspeakerModel model = values.part("loudspeaker", LoudspeakerModel.class);
    boolean atTheEar = model.ratedWatts() <= MOST_WATTS_AT_THE_EAR;
    return LoadPort.describe(
        values,
        "loudspeaker",
        new Loudspeaker(model),
        atTheEar ? List.of(Caution.HEARING) : List.of());
  }
}
