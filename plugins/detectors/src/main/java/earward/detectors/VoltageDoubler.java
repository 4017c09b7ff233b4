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
import earward.block.check.RemedyHint;
import earward.block.device.Capacitor;
import earward.block.device.Diode;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.device.Terminal;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * The half-wave voltage doubler: D1 charges the pump capacitor to one peak of the carrier, D2 lays
 * it on top of the other, so that C1 comes near to twice the peak.
 *
 * <p>The pump capacitor discharges through the load too, so that D1 is what lets go first; it is to
 * be no larger than need be.
 *
 * <p>Source: Greinacher 1914 (from memory); Terman, Radio Engineers' Handbook, voltage-doubling
 * rectifiers (from memory).
 */
public final class VoltageDoubler implements BlockType {
  @Override
  public String id() {
    return "detector.voltage-doubler";
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
        new Setting.Value(
            "c-pump", Unit.FARAD, 1e-9, Reservoir.LEAST_FARADS, Reservoir.MOST_FARADS, Series.E12),
        Reservoir.capacitor(470e-12),
        Reservoir.load(),
        Reservoir.resistor(47e3));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    DiodeModel model = values.part("diode", DiodeModel.class);
    boolean positive = values.chosen("direction", "positive");
    Terminal atPump = positive ? CATHODE : ANODE;
    Terminal entering = positive ? ANODE : CATHODE;
    WiringPlan plan =
        Wiring.from(new Single("in"))
            .run(
                "c-pump", Capacitor.of(values.amount("c-pump"), Reservoir.FILM_RATED_VOLTS), "pump")
            .down("d1", new Diode(model), atPump, GROUND)
            .run("d2", new Diode(model), entering, "out");
    DiodeCautions.of(DiodeCautions.of(plan, "d1", model), "d2", model);
    Reservoir.hang(plan, values);
    return new BlockDescription(
        plan.fit("d1", "d2", "c-pump", "c1")
            .testPoint("pump", "pump")
            .testPoint("out", "out")
            .to(new Single("out")),
        DetectorChecks.of(
            List.of("d1", "d2"),
            model,
            conditions,
            Reservoir.ownLoad(values),
            RemedyHint.lower("c-pump")),
        List.of(Reservoir.clippingOverCapacitor(values, "d1")));
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    return Reservoir.judge(values, "d2", figure);
  }

  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(Reservoir::proposed);
  }
}
