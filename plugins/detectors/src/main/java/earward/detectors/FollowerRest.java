package earward.detectors;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.B;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Resistor;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.WiringPlan;
import java.util.Map;

/** What both follower detectors have in common: rest near cut-off and a decoupled supply. */
final class FollowerRest {
  private static final double RATED_VOLTS = 35;

  private FollowerRest() {}

  static Setting feedResistor() {
    return new Setting.Value("r-feed", Unit.OHM, 1e3, 10, 100e3, Series.E12);
  }

  static Setting feedCapacitor() {
    return new Setting.Value("c-feed", Unit.FARAD, 100e-9, 1e-9, 1e-3, Series.E6);
  }

  /** The node "fed" from the rail through r-feed, held still by c-feed. */
  static void decouple(WiringPlan plan, Values values) {
    Capacitor decoupling = Capacitor.of(values.amount("c-feed"), RATED_VOLTS);
    plan.column("r-feed", new Resistor(values.amount("r-feed")), A, Map.of(A, MAIN_RAIL, B, "fed"))
        .column("c-feed", decoupling, A, Map.of(A, "fed", B, GROUND));
    if (decoupling.dielectric().polarised()) {
      plan.caution("c-feed", Caution.POLARITY);
    }
  }

  private static FigureName rest() {
    return new FigureName("q1", Quantity.DC_AMPERES, CaseName.NO_SIGNAL);
  }

  static Check least(double amperes, RemedyHint remedy) {
    return Check.atLeast(
        "little-rest", Severity.WEIGH, rest(), amperes, "common practice: just conducting", remedy);
  }

  static Check most(double amperes, RemedyHint remedy) {
    return Check.atMost(
        "much-rest",
        Severity.WEIGH,
        rest(),
        amperes,
        "common practice: near cut-off, where the curve bends",
        remedy);
  }
}
