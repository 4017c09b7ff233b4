package earward.feeds;

import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.TAP;
import static earward.block.device.Terminal.TOP;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.device.TunedFeed;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Port.TappedPair;
import earward.block.wiring.Wiring;
import java.util.List;
import java.util.Map;

/**
 * The last IF transformer, either by what it is at the winding that the diode hangs on, or by what
 * is printed on its can.
 */
public final class TunedIf implements BlockType {
  private static final String AS_CAN = "as-can";
  private static final String TAPPED = "centre-tapped";

  @Override
  public String id() {
    return "feed.tuned-if";
  }

  @Override
  public Role role() {
    return Role.FEED;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("given", List.of("at-winding", AS_CAN)),
        new Setting.Value("parallel-ohms", Unit.OHM, 12e3, 100, 1e6, Series.ANY),
        new Setting.Value("quality", Unit.NUMBER, 41, 1, 300, Series.ANY),
        new Setting.Value("can-capacitance", Unit.FARAD, 180e-12, 10e-12, 10e-9, Series.ANY),
        new Setting.Value("unloaded-quality", Unit.NUMBER, 110, 2, 500, Series.ANY),
        new Setting.Value("turns-ratio", Unit.NUMBER, 0.5, 0.01, 10, Series.ANY),
        new Setting.Value("stage-ohms", Unit.OHM, 100e3, 100, 10e6, Series.ANY),
        new Setting.Value("detuning", Unit.HERTZ, 0, -50e3, 50e3, Series.ANY),
        new Setting.Value("winding-ohms", Unit.OHM, 2, 0, 1000, Series.ANY),
        new Setting.Choice("winding", List.of("plain", TAPPED)));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    AtWinding at =
        values.chosen("given", AS_CAN)
            ? AtWinding.ofCan(
                values.amount("can-capacitance"),
                values.amount("unloaded-quality"),
                values.amount("turns-ratio"),
                values.amount("stage-ohms"),
                conditions.carrierHertz())
            : new AtWinding(values.amount("parallel-ohms"), values.amount("quality"));
    boolean tapped = values.chosen("winding", TAPPED);
    TunedFeed can =
        new TunedFeed(
            at.parallelOhms(),
            at.quality(),
            values.amount("detuning"),
            tapped ? 0.5 : 1,
            values.amount("winding-ohms"));
    return BlockDescription.of(tapped ? tapped(can) : plain(can));
  }

  private static Wiring plain(TunedFeed can) {
    return Wiring.start()
        .body("can", can, Map.of(TOP, "out", BOTTOM, GROUND))
        .at("out")
        .testPoint("winding", "out")
        .caution("can", Caution.OUTDOOR_AERIAL)
        .fit("can")
        .to(new Single("out"));
  }

  /** The tap is left to the next block, which knows what it is to be joined to. */
  private static Wiring tapped(TunedFeed can) {
    return Wiring.start()
        .body("can", can, Map.of(TOP, "plus", TAP, "tap", BOTTOM, "minus"))
        .at("plus")
        .testPoint("winding", "plus")
        .caution("can", Caution.OUTDOOR_AERIAL)
        .fit("can")
        .to(new TappedPair("plus", "tap", "minus"));
  }
}
