package earward.detectors;

import static earward.block.device.Terminal.DRAIN;
import static earward.block.device.Terminal.GATE;
import static earward.block.device.Terminal.SOURCE;
import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.RemedyHint;
import earward.block.device.Capacitor;
import earward.block.device.FieldEffectModel;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;

/**
 * The infinite-impedance detector with a junction field-effect transistor: the gate takes nothing
 * from the feed, the source charges C1 at the peaks, and R1, large, holds it near pinch-off.
 *
 * <p>Source: the source-follower form of the cathode-follower detector (common practice).
 */
public final class FieldEffectFollower implements BlockType {
  /** Share of Idss at rest above which the square law is too straight (common practice). */
  private static final double MOST_SHARE = 0.1;

  @Override
  public String id() {
    return "detector.field-effect-follower";
  }

  @Override
  public Role role() {
    return Role.DETECTOR;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Part("transistor", PartKind.FIELD_EFFECT_TRANSISTOR, "2N5457"),
        Reservoir.capacitor(470e-12),
        Reservoir.resistor(47e3),
        FollowerRest.feedResistor(),
        FollowerRest.feedCapacitor());
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    FieldEffectModel model = values.part("transistor", FieldEffectModel.class);
    if (model.pChannel()) {
      throw new IllegalArgumentException(
          "transistor "
              + model.name()
              + " has a p channel; one with an n channel is wanted, its drain at the rail");
    }
    WiringPlan plan = Wiring.from(new Single("in"));
    FollowerRest.decouple(plan, values);
    plan.body(
            "q1", new FieldEffectTransistor(model), Map.of(GATE, "in", DRAIN, "fed", SOURCE, "out"))
        .caution("q1", Caution.STATIC_DISCHARGE)
        .at("out")
        .down("c1", Capacitor.of(values.amount("c1"), Reservoir.FILM_RATED_VOLTS), GROUND)
        .down("r1", new Resistor(values.amount("r1")), GROUND);
    return BlockDescription.of(
        plan.fit("r1", "r-feed", "c1", "c-feed", "q1")
            .testPoint("out", "out")
            .to(new Single("out")),
        DetectorChecks.clipping("q1", conditions, true),
        FollowerRest.most(MOST_SHARE * model.saturatedDrainAmperes(), RemedyHint.raise("r1")));
  }
}
