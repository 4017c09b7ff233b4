package earward.detectors;

import static earward.block.device.Terminal.ANODE;
import static earward.block.device.Terminal.CATHODE;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.device.Diode;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** A diode, its reservoir capacitor and, where nothing else loads it, its load resistor. */
public final class EnvelopeDiode implements BlockType {
  @Override
  public String id() {
    return "detector.envelope-diode";
  }

  @Override
  public Role role() {
    return Role.DETECTOR;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Choice("direction", List.of("positive", "negative")),
        new Setting.Part("diode", PartKind.DIODE, "BAT46"),
        Reservoir.capacitor(1e-9),
        Reservoir.load(),
        Reservoir.resistor(22e3));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    DiodeModel model = values.part("diode", DiodeModel.class);
    WiringPlan plan =
        Wiring.from(new Single("in"))
            .run(
                "d1",
                new Diode(model),
                values.chosen("direction", "positive") ? ANODE : CATHODE,
                "out");
    Reservoir.hang(DiodeCautions.of(plan, "d1", model), values);
    boolean ownLoad = Reservoir.ownLoad(values);
    List<Check> checks =
        new ArrayList<>(DetectorChecks.of(List.of("d1"), model, conditions, ownLoad));
    checks.add(DetectorChecks.following("d1", ownLoad));
    return new BlockDescription(
        plan.fit("d1", "c1").testPoint("out", "out").to(new Single("out")),
        checks,
        List.of(Reservoir.clippingOverCapacitor(values, "d1")));
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    return Reservoir.judge(values, "d1", figure);
  }

  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(Reservoir::proposed);
  }
}
