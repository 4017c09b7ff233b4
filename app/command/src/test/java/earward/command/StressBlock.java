package earward.command;

import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.TOP;
import static earward.block.device.Terminal.WIPER;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.device.Capacitor;
import earward.block.device.Potentiometer;
import earward.block.device.Regulator;
import earward.block.device.RegulatorModel;
import earward.block.device.Resistor;
import earward.block.device.Taper;
import earward.block.device.Terminal;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/** A block for tests that puts one part under stress between the main rail and ground. */
final class StressBlock implements BlockType {
  static final String ID = "filter.stress";

  /** These types and this one. */
  static BlockTypes among(BlockTypes types) {
    BlockType own = new StressBlock();
    return new BlockTypes() {
      @Override
      public Optional<BlockType> find(String typeId) {
        return typeId.equals(ID) ? Optional.of(own) : types.find(typeId);
      }

      @Override
      public List<BlockType> all() {
        return Stream.concat(types.all().stream(), Stream.of(own)).toList();
      }
    };
  }

  @Override
  public String id() {
    return ID;
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("part", List.of("resistor", "track", "reversed", "leak", "regulator")),
        new Setting.Value("number", Unit.NUMBER, 1e4, 0, 1e9, Series.ANY));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    WiringPlan plan = Wiring.from(new Single("in")).run("r-through", new Resistor(1), "out");
    double number = values.amount("number");
    switch (values.choice("part")) {
      case "resistor" -> plan.at(MAIN_RAIL).down("r-hot", new Resistor(number), GROUND);
      case "track" ->
          plan.at(MAIN_RAIL)
              .body(
                  "track",
                  new Potentiometer(number, Taper.LINEAR, 0.5),
                  Map.of(TOP, MAIN_RAIL, WIPER, "wiper", BOTTOM, GROUND));
      case "leak" -> plan.at("out").bridge("r-leak", new Resistor(number), MAIN_RAIL, "out");
      case "reversed" ->
          plan.at(MAIN_RAIL)
              .down("r-top", new Resistor(10e3), "tap")
              .at("tap")
              .down("r-foot", new Resistor(number), GROUND)
              .down("c-reversed", Capacitor.electrolytic(10e-6, 25), Terminal.B, GROUND);
      default ->
          plan.at(MAIN_RAIL)
              .body("regulator", regulator(number), regulated())
              .at("regulated")
              .down("r-load", new Resistor(10e3), GROUND);
    }
    return BlockDescription.of(plan.at("out").to(new Single("out")));
  }

  private static Regulator regulator(double dropOutVolts) {
    return new Regulator(
        new RegulatorModel("sample", 2, dropOutVolts, 1e-3, 30, 0.1, 0.2, 125, 180));
  }

  private static Map<Terminal, String> regulated() {
    return Map.of(Terminal.INPUT, MAIN_RAIL, Terminal.GROUND, GROUND, Terminal.OUTPUT, "regulated");
  }
}
