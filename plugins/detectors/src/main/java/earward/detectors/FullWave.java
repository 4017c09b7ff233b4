package earward.detectors;

import static earward.block.device.Terminal.ANODE;
import static earward.block.device.Terminal.CATHODE;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Finding;
import earward.block.device.Diode;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.device.Terminal;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Port.TappedPair;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * Full-wave detection from a centre tap: each half of the winding has its diode, so that C1 is
 * charged twice in a cycle, and of the carrier only its even harmonics are left.
 *
 * <p>Source: full-wave rectifier with a centre-tapped winding, any handbook (common practice).
 */
public final class FullWave implements BlockType {
  @Override
  public String id() {
    return "detector.full-wave";
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
        Reservoir.capacitor(470e-12),
        Reservoir.load(),
        Reservoir.resistor(22e3));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    DiodeModel model = values.part("diode", DiodeModel.class);
    Terminal entering = values.chosen("direction", "positive") ? ANODE : CATHODE;
    WiringPlan plan =
        Wiring.from(new TappedPair("plus", GROUND, "minus"))
            .run("d1", new Diode(model), entering, "out")
            .at("minus")
            .run("d2", new Diode(model), entering, "out");
    DiodeCautions.of(DiodeCautions.of(plan, "d1", model), "d2", model);
    Reservoir.hang(plan, values);
    return new BlockDescription(
        plan.fit("d1", "d2", "c1").testPoint("out", "out").to(new Single("out")),
        DetectorChecks.of(List.of("d1", "d2"), model, conditions, Reservoir.ownLoad(values)),
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
