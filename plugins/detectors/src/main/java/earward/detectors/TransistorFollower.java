package earward.detectors;

import static earward.block.device.Terminal.BASE;
import static earward.block.device.Terminal.COLLECTOR;
import static earward.block.device.Terminal.EMITTER;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.RemedyHint;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.TransistorModel;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Map;

/**
 * A transistor that follows the peaks: its base hardly loads the feed, its emitter charges C1, and
 * R1 discharges it. A divider holds it at a few microamperes.
 *
 * <p>Source: the emitter-follower form of the infinite-impedance detector (common practice).
 */
public final class TransistorFollower implements BlockType {
  private static final double LEAST_AMPERES = 1e-6;
  private static final double MOST_AMPERES = 100e-6;

  @Override
  public String id() {
    return "detector.transistor-follower";
  }

  @Override
  public Role role() {
    return Role.DETECTOR;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Part("transistor", PartKind.TRANSISTOR, "BC547B"),
        new Setting.Value(
            "c-in", Unit.FARAD, 1e-9, Reservoir.LEAST_FARADS, Reservoir.MOST_FARADS, Series.E12),
        new Setting.Value("r-upper", Unit.OHM, 1e6, 10e3, 22e6, Series.E12),
        new Setting.Value("r-lower", Unit.OHM, 100e3, 1e3, 10e6, Series.E12),
        Reservoir.capacitor(1e-9),
        Reservoir.resistor(22e3),
        FollowerRest.feedResistor(),
        FollowerRest.feedCapacitor());
  }

  static boolean goTogether(Values values) {
    return !values.part("transistor", TransistorModel.class).pnp();
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    TransistorModel model = values.part("transistor", TransistorModel.class);
    if (!goTogether(values)) {
      throw new IllegalArgumentException(
          "transistor " + model.name() + " is a pnp; an npn is wanted, its collector at the rail");
    }
    WiringPlan plan = Wiring.from(new Single("in"));
    FollowerRest.decouple(plan, values);
    plan.run("c-in", Capacitor.of(values.amount("c-in"), Reservoir.FILM_RATED_VOLTS), "base")
        .up("r-upper", new Resistor(values.amount("r-upper")), MAIN_RAIL)
        .down("r-lower", new Resistor(values.amount("r-lower")), GROUND)
        .body(
            "q1",
            new BipolarTransistor(model),
            Map.of(BASE, "base", COLLECTOR, "fed", EMITTER, "out"))
        .at("out")
        .down("c1", Capacitor.of(values.amount("c1"), Reservoir.FILM_RATED_VOLTS), GROUND)
        .down("r1", new Resistor(values.amount("r1")), GROUND);
    return BlockDescription.of(
        plan.fit("r1", "r-upper", "r-lower", "r-feed", "c1", "c-in", "c-feed", "q1")
            .testPoint("base", "base")
            .testPoint("out", "out")
            .to(new Single("out")),
        DetectorChecks.clipping("q1", conditions, true),
        FollowerRest.least(LEAST_AMPERES, RemedyHint.lower("r-upper")),
        FollowerRest.most(MOST_AMPERES, RemedyHint.raise("r-upper")));
  }
}
