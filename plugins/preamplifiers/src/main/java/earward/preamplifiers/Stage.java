package earward.preamplifiers;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.B;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.Conditions;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Dielectric;
import earward.block.device.Resistor;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.RcEdge;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.WiringPlan;
import java.util.Map;

/** What every stage has: coupling capacitors, and a supply of its own behind a resistor. */
final class Stage {
  static final String FED = "fed";
  private static final double RATED_VOLTS = 35;
  private static final double FILM_RATED_VOLTS = 63;
  private static final double LEAST_FARADS = 1e-9;
  private static final double MOST_FARADS = 4.7e-6;

  /** How far below the lowest tone one corner of several should lie (common practice). */
  private static final double BELOW_LOWEST_TONE = 2;

  private Stage() {}

  static Setting coupling(String id) {
    return new Setting.Value(id, Unit.FARAD, 470e-9, LEAST_FARADS, MOST_FARADS, Series.E6);
  }

  static Setting feedResistor() {
    return new Setting.Value("r-feed", Unit.OHM, 470, 10, 10e3, Series.E12);
  }

  static Setting feedCapacitor() {
    return new Setting.Value("c-feed", Unit.FARAD, 47e-6, 100e-9, 1e-3, Series.E6);
  }

  /** Film throughout: no polarity to mind, whichever side is the more positive. */
  static Capacitor film(double farads) {
    return new Capacitor(farads, Dielectric.FILM, FILM_RATED_VOLTS, 0, 0);
  }

  /** The node "fed" from the rail through r-feed, held still by c-feed. */
  static void feed(WiringPlan plan, Values values) {
    plan.column("r-feed", new Resistor(values.amount("r-feed")), A, Map.of(A, MAIN_RAIL, B, FED));
    Capacitor decoupling = Capacitor.of(values.amount("c-feed"), RATED_VOLTS);
    plan.column("c-feed", decoupling, A, Map.of(A, FED, B, GROUND));
    mind(plan, "c-feed", decoupling);
  }

  /** A capacitor from the cursor to ground, positive end up. */
  static void bypass(WiringPlan plan, String id, double farads) {
    Capacitor capacitor = Capacitor.of(farads, RATED_VOLTS);
    plan.down(id, capacitor, A, GROUND);
    mind(plan, id, capacitor);
  }

  private static void mind(WiringPlan plan, String id, Capacitor capacitor) {
    if (capacitor.dielectric().polarised()) {
      plan.caution(id, Caution.POLARITY);
    }
  }

  /** The capacitance of the series whose corner lies an octave below the lowest tone. */
  static double fitted(double ohms, double lowestToneHertz) {
    double least = RcEdge.farads(ohms, lowestToneHertz / BELOW_LOWEST_TONE);
    if (!(least > LEAST_FARADS)) {
      return LEAST_FARADS;
    }
    double fitted = Series.E6.contains(least) ? least : Series.E6.next(least);
    return Math.min(MOST_FARADS, fitted);
  }

  static Check couplingEdge(Conditions conditions, RemedyHint... remedies) {
    return Check.atMost(
        "coupling-edge",
        Severity.WEIGH,
        new FigureName("out", Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
        conditions.lowestToneHertz(),
        "the kit design's own audio band",
        remedies);
  }

  static Check supplyHigh(double mostVolts) {
    return Check.atMost(
        "supply-high",
        Severity.STOP,
        new FigureName(FED, Quantity.DC_VOLTS, CaseName.HIGHEST_SUPPLY),
        mostVolts,
        "absolute maximum of the part");
  }
}
