package earward.block.testkit;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.ANODE;
import static earward.block.device.Terminal.B;
import static earward.block.device.Terminal.BASE;
import static earward.block.device.Terminal.CATHODE;
import static earward.block.device.Terminal.COLLECTOR;
import static earward.block.device.Terminal.EMITTER;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.TransistorModel;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import java.util.List;
import java.util.Map;

/** A complementary pair of emitter followers: two columns, and parts that can be the wrong ones. */
public final class PushPull implements BlockType {
  @Override
  public String id() {
    return "power.push-pull";
  }

  @Override
  public Role role() {
    return Role.POWER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Part("upper", PartKind.TRANSISTOR, "BD139"),
        new Setting.Part("lower", PartKind.TRANSISTOR, "BD140"));
  }

  static boolean goTogether(Values values) {
    return !values.part("upper", TransistorModel.class).pnp()
        && values.part("lower", TransistorModel.class).pnp();
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    if (!goTogether(values)) {
      throw new IllegalArgumentException("the upper transistor is an npn, the lower one a pnp");
    }
    Device upper = new BipolarTransistor(values.part("upper", TransistorModel.class));
    Device lower = new BipolarTransistor(values.part("lower", TransistorModel.class));
    Diode diode = new Diode((DiodeModel) SampleParts.of(PartKind.DIODE).get(0));
    return BlockDescription.of(
        Wiring.from(new Single("in"))
            .run("couple", Capacitor.of(10e-6, 25), B, "middle-bias")
            .column("r1", new Resistor(1e3), A, Map.of(A, MAIN_RAIL, B, "upper-base"))
            .column("d1", diode, ANODE, Map.of(ANODE, "upper-base", CATHODE, "middle-bias"))
            .column("d2", diode, ANODE, Map.of(ANODE, "middle-bias", CATHODE, "lower-base"))
            .column("r2", new Resistor(1e3), A, Map.of(A, "lower-base", B, GROUND))
            .column(
                "upper",
                upper,
                COLLECTOR,
                Map.of(COLLECTOR, MAIN_RAIL, BASE, "upper-base", EMITTER, "middle"))
            .column(
                "lower",
                lower,
                EMITTER,
                Map.of(EMITTER, "middle", BASE, "lower-base", COLLECTOR, GROUND))
            .at("middle")
            .testPoint("middle", "middle")
            .run("output-capacitor", Capacitor.of(470e-6, 25), "out")
            .caution("couple", Caution.POLARITY)
            .caution("output-capacitor", Caution.POLARITY)
            .to(new Single("out")));
  }
}
