package earward.filters;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.B;
import static earward.block.device.Terminal.BASE;
import static earward.block.device.Terminal.COLLECTOR;
import static earward.block.device.Terminal.EMITTER;
import static earward.block.device.Terminal.INPUT;
import static earward.block.device.Terminal.INVERTING;
import static earward.block.device.Terminal.OUTPUT;
import static earward.block.device.Terminal.SUPPLY;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.OpAmpModel;
import earward.block.device.OperationalAmplifier;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Caution;
import earward.block.wiring.WiringPlan;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * Unity gain from one supply, for active filters: an op-amp or an emitter follower, its decoupled
 * supply at the node "fed", the divider that holds its input at half of that, and both coupling
 * capacitors. It is solved at its real operating point.
 */
final class Follower {
  private static final double RATED_VOLTS = 35;
  private static final String FED = "fed";

  private Follower() {}

  static List<Setting> settings() {
    return List.of(
        new Setting.Choice("follower", List.of("op-amp", "transistor")),
        new Setting.Part("op-amp", PartKind.OP_AMP, "TLC272 half"),
        new Setting.Part("transistor", PartKind.TRANSISTOR, "BC547B"),
        new Setting.Value("r-emitter", Unit.OHM, 4.7e3, 100, 100e3, Series.E12),
        new Setting.Value("bias-ohms", Unit.OHM, 220e3, 10e3, 10e6, Series.E12),
        new Setting.Value("c-in", Unit.FARAD, 470e-9, 1e-9, 4.7e-6, Series.E6),
        new Setting.Value("c-out", Unit.FARAD, 470e-9, 1e-9, 4.7e-6, Series.E6),
        new Setting.Value("r-feed", Unit.OHM, 470, 10, 10e3, Series.E12),
        new Setting.Value("c-feed", Unit.FARAD, 47e-6, 100e-9, 1e-3, Series.E6));
  }

  /** Whether the chosen transistor, where one is used, is an npn. */
  static boolean goTogether(Values values) {
    return values.chosen("follower", "op-amp")
        || !values.part("transistor", TransistorModel.class).pnp();
  }

  /** From the entry at the cursor to the node "hot", which rests at half of the supply. */
  static void enter(WiringPlan plan, Values values) {
    Capacitor decoupling = Capacitor.of(values.amount("c-feed"), RATED_VOLTS);
    plan.column("r-feed", new Resistor(values.amount("r-feed")), A, Map.of(A, MAIN_RAIL, B, FED))
        .column("c-feed", decoupling, A, Map.of(A, FED, B, GROUND))
        .run("c-in", Film.of(values.amount("c-in")), "hot")
        .up("r-upper", new Resistor(values.amount("bias-ohms")), FED)
        .down("r-lower", new Resistor(values.amount("bias-ohms")), GROUND)
        .fit("r-feed", "r-upper", "r-lower");
    if (decoupling.dielectric().polarised()) {
      plan.caution("c-feed", Caution.POLARITY);
    }
  }

  /** From the node "plus" to the node "drive". */
  static void follow(WiringPlan plan, Values values) {
    plan.at("plus");
    if (values.chosen("follower", "op-amp")) {
      Map<Terminal, String> nodes =
          Map.of(
              INPUT,
              "plus",
              INVERTING,
              "drive",
              OUTPUT,
              "drive",
              SUPPLY,
              FED,
              Terminal.GROUND,
              GROUND);
      plan.body(
          "follower", new OperationalAmplifier(values.part("op-amp", OpAmpModel.class)), nodes);
      return;
    }
    TransistorModel model = values.part("transistor", TransistorModel.class);
    if (model.pnp()) {
      throw new IllegalArgumentException(
          "transistor " + model.name() + " is a pnp; an npn is wanted, its collector at the rail");
    }
    plan.body(
            "follower",
            new BipolarTransistor(model),
            Map.of(BASE, "plus", COLLECTOR, FED, EMITTER, "drive"))
        .at("drive")
        .down("r-emitter", new Resistor(values.amount("r-emitter")), GROUND)
        .fit("r-emitter");
  }

  /** From "drive" to the exit, and what remains of the fitting order. */
  static void leave(WiringPlan plan, Values values) {
    plan.at("drive")
        .run("c-out", Film.of(values.amount("c-out")), "out")
        .fit("c-in", "c-out", "c-feed", "follower")
        .testPoint("drive", "drive")
        .testPoint("out", "out");
  }

  /** The band's edges and what the follower bears. */
  static List<Check> checks(Values values, double highestToneHertz, double lowestToneHertz) {
    List<Check> checks = new ArrayList<>();
    checks.add(
        Check.atMost(
            "coupling-edge",
            Severity.WEIGH,
            new FigureName("out", Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
            lowestToneHertz,
            "the kit design's own audio band",
            RemedyHint.raise("c-in"),
            RemedyHint.raise("c-out")));
    checks.add(
        Check.atLeast(
            "treble-edge",
            Severity.NOTE,
            new FigureName("out", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST),
            highestToneHertz,
            "the kit design's own audio band"));
    boolean opAmp = values.chosen("follower", "op-amp");
    OpAmpModel model = values.part("op-amp", OpAmpModel.class);
    checks.add(
        Check.atMost(
            "supply-high",
            Severity.STOP,
            fedVolts(CaseName.HIGHEST_SUPPLY),
            opAmp
                ? model.mostVolts()
                : values.part("transistor", TransistorModel.class).mostVolts(),
            "absolute maximum of the part"));
    if (opAmp) {
      checks.add(
          Check.atLeast(
              "supply-low",
              Severity.WEIGH,
              fedVolts(CaseName.BATTERY_LOW),
              model.leastVolts(),
              "lowest supply of the op-amp",
              RemedyHint.lower("r-feed")));
    }
    return checks;
  }

  private static FigureName fedVolts(CaseName caseName) {
    return new FigureName(FED, Quantity.DC_VOLTS, caseName);
  }
}
