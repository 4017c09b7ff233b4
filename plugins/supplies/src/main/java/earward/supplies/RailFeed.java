package earward.supplies;

import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Fuse;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.Switch;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.Nodes;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.ArrayList;
import java.util.List;

/**
 * What stands between a source of supply and the rails: fuse, switch, polarity diode, bypass, and a
 * second rail behind a resistor and a capacitor. Used once.
 */
final class RailFeed {
  private static final String QUIET_RAIL = Nodes.rail("quiet");
  private static final double RATED_VOLTS = 35;

  /** Cold resistance times rated current of a small glass fuse, in volts (common practice). */
  private static final double FUSE_VOLTS = 0.1;

  /** Share of its rated current that a fuse is to carry for long (common practice). */
  private static final double FUSE_SHARE = 0.75;

  /** What holds this much can hurt a meter set to ohms (common practice). */
  private static final double LEAST_FARADS_TO_DISCHARGE = 100e-6;

  private final Values values;
  private final WiringPlan plan = Wiring.start();
  private final List<Link> links = new ArrayList<>();
  private boolean germanium;

  /** One part between source and rail. */
  private record Link(String id, Device device) {}

  RailFeed(Values values) {
    this.values = values;
    if (values.chosen("fuse", "fuse")) {
      double amperes = values.amount("fuse-amperes");
      links.add(new Link("fuse", new Fuse(amperes, FUSE_VOLTS / amperes)));
    }
    if (values.chosen("switch", "switch")) {
      links.add(new Link("switch", Switch.closedInUse()));
    }
    if (values.chosen("polarity", "series-diode")) {
      DiodeModel model = values.part("polarity-diode", DiodeModel.class);
      links.add(new Link("polarity-diode", new Diode(model)));
      germanium = model.material() == DiodeMaterial.GERMANIUM;
    }
  }

  static List<Setting> settings(String usualFuse) {
    List<String> fuse =
        usualFuse.equals("fuse") ? List.of("fuse", "none") : List.of("none", "fuse");
    return List.of(
        new Setting.Choice("fuse", fuse),
        new Setting.Value("fuse-amperes", Unit.AMPERE, 0.5, 0.05, 10, Series.ANY),
        new Setting.Choice("switch", List.of("switch", "none")),
        new Setting.Choice("polarity", List.of("none", "series-diode")),
        new Setting.Part("polarity-diode", PartKind.DIODE, "1N5817"),
        new Setting.Choice("bypass", List.of("none", "capacitor")),
        new Setting.Value("bypass-capacitor", Unit.FARAD, 100e-6, 1e-6, 4.7e-3, Series.E6),
        new Setting.Choice("quiet-rail", List.of("none", "decoupled")),
        new Setting.Value("quiet-ohms", Unit.OHM, 100, 1, 100e3, Series.E12),
        new Setting.Value("quiet-capacitor", Unit.FARAD, 100e-6, 1e-6, 4.7e-3, Series.E6));
  }

  /** What the kit may draw from the source at full output: its own limit, and the fuse's. */
  List<Check> checks(String sourceId, Severity severity, double mostAmperes, String source) {
    FigureName drawn = new FigureName(sourceId, Quantity.SUPPLY_AMPERES, CaseName.FULL_OUTPUT);
    List<Check> checks = new ArrayList<>();
    checks.add(Check.atMost("supply-current", severity, drawn, mostAmperes, source));
    if (values.chosen("fuse", "fuse")) {
      checks.add(
          Check.atMost(
              "fuse-current",
              Severity.WEIGH,
              drawn,
              FUSE_SHARE * values.amount("fuse-amperes"),
              "common practice: three quarters of the fuse's rated current",
              RemedyHint.raise("fuse-amperes")));
    }
    return checks;
  }

  /** The whole supply: its source, what stands in the lead, and the rails. */
  Wiring wiring(String sourceId, Device source, List<Caution> cautions) {
    plan.at(links.isEmpty() ? MAIN_RAIL : "cell").down(sourceId, source, GROUND);
    for (Caution caution : cautions) {
      plan.caution(sourceId, caution);
    }
    for (int i = 0; i < links.size(); i++) {
      String to = i == links.size() - 1 ? MAIN_RAIL : "after-" + links.get(i).id();
      plan.run(links.get(i).id(), links.get(i).device(), to);
    }
    if (germanium) {
      plan.caution("polarity-diode", Caution.GERMANIUM_HEAT);
    }
    electrolyticDown("bypass-capacitor", values.chosen("bypass", "capacitor"));
    plan.testPoint("rail", MAIN_RAIL).offerRail("main", MAIN_RAIL);
    quietRail();
    lowPartsFirst(sourceId);
    return plan.end();
  }

  private void quietRail() {
    if (values.chosen("quiet-rail", "decoupled")) {
      plan.run("quiet-resistor", new Resistor(values.amount("quiet-ohms")), QUIET_RAIL);
      electrolyticDown("quiet-capacitor", true);
      plan.testPoint("quiet-rail", QUIET_RAIL).offerRail("quiet", QUIET_RAIL);
    }
  }

  private void electrolyticDown(String id, boolean fitted) {
    if (fitted) {
      plan.down(id, Capacitor.electrolytic(values.amount(id), RATED_VOLTS), GROUND)
          .caution(id, Caution.POLARITY);
      if (values.amount(id) >= LEAST_FARADS_TO_DISCHARGE) {
        plan.caution(id, Caution.CAPACITOR_DISCHARGE);
      }
    }
  }

  private void lowPartsFirst(String sourceId) {
    List<String> order = List.of("quiet-resistor", "polarity-diode", "fuse");
    List<String> ids = plan.end().parts().stream().map(part -> part.id()).toList();
    order.stream().filter(ids::contains).forEach(plan::fit);
    ids.stream().filter(id -> !order.contains(id) && !id.equals(sourceId)).forEach(plan::fit);
    plan.fit(sourceId);
  }
}
