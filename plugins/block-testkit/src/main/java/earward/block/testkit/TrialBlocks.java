package earward.block.testkit;

import static earward.block.device.Terminal.ANODE;
import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.CATHODE;
import static earward.block.device.Terminal.GROUND;
import static earward.block.device.Terminal.INPUT;
import static earward.block.device.Terminal.OUTPUT;
import static earward.block.device.Terminal.OUTPUT_TWO;
import static earward.block.device.Terminal.PRIMARY_END;
import static earward.block.device.Terminal.PRIMARY_START;
import static earward.block.device.Terminal.SUPPLY;
import static earward.block.device.Terminal.TAP;
import static earward.block.device.Terminal.TOP;

import earward.block.BlockDescription;
import earward.block.Role;
import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.AmplifierModel;
import earward.block.device.AudioAmplifier;
import earward.block.device.Capacitor;
import earward.block.device.CarrierGenerator;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.device.Transformer;
import earward.block.device.TunedFeed;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.block.wiring.Port.Pair;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Port.TappedPair;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.Map;
import java.util.Set;

/** Plain neighbours for a block under trial. */
final class TrialBlocks {
  private static final double FILM_VOLTS = 63;

  private TrialBlocks() {}

  private static FixedBlock block(String name, Role role, Wiring wiring) {
    return new FixedBlock("trial." + name, role, BlockDescription.of(wiring));
  }

  /** A feed for a detector that is entered by this port. */
  static FixedBlock feed(Port wanted) {
    if (wanted instanceof TappedPair) {
      return block(
          "feed",
          Role.FEED,
          Wiring.start()
              .body(
                  "can",
                  new TunedFeed(12e3, 40, 0, 0.5, 2),
                  Map.of(TOP, "plus", TAP, "tap", BOTTOM, "minus"))
              .to(new TappedPair("plus", "tap", "minus")));
    }
    return block(
        "feed",
        Role.FEED,
        Wiring.start()
            .body("front-end", new CarrierGenerator(330), Map.of(TOP, "out", BOTTOM, Nodes.GROUND))
            .to(new Single("out")));
  }

  /** A diode detector, its carrier filter and, before an audio block, a coupling capacitor. */
  static FixedBlock detector(boolean coupled) {
    DiodeModel diode = (DiodeModel) SampleParts.of(PartKind.DIODE).get(0);
    WiringPlan plan =
        Wiring.from(new Single("in"))
            .body("d1", new Diode(diode), Map.of(ANODE, "in", CATHODE, "detected"))
            .at("detected")
            .down("c1", film(1e-9), Nodes.GROUND)
            .down("r1", new Resistor(12e3), Nodes.GROUND)
            .run("r2", new Resistor(2.2e3), "filtered")
            .down("c2", film(1e-9), Nodes.GROUND);
    if (coupled) {
      plan.run("couple", film(1e-6), "out").down("r3", new Resistor(47e3), Nodes.GROUND);
    }
    return block("detector", Role.DETECTOR, plan.to(new Single(coupled ? "out" : "filtered")));
  }

  /** A full-wave detector after a feed with a tap, which it grounds. */
  static FixedBlock fullWave() {
    Diode diode = new Diode((DiodeModel) SampleParts.of(PartKind.DIODE).get(0));
    return block(
        "detector",
        Role.DETECTOR,
        Wiring.from(new TappedPair("plus", Nodes.GROUND, "minus"))
            .run("d1", diode, "filtered")
            .at("minus")
            .run("d2", diode, "filtered")
            .down("c1", film(1e-9), Nodes.GROUND)
            .down("r1", new Resistor(12e3), Nodes.GROUND)
            .to(new Single("filtered")));
  }

  private static Capacitor film(double farads) {
    return new Capacitor(farads, Dielectric.FILM, FILM_VOLTS, 0, 0);
  }

  /** What turns a single wire into a port of two or three. */
  static FixedBlock driver(Port wanted) {
    return wanted instanceof Pair ? bridge() : transformer();
  }

  private static FixedBlock bridge() {
    AmplifierModel model =
        SampleParts.of(PartKind.AMPLIFIER).stream()
            .map(AmplifierModel.class::cast)
            .filter(one -> one.bridge() && !one.has(Terminal.CONTROL))
            .findFirst()
            .orElseThrow();
    return block(
        "driver",
        Role.PREAMPLIFIER,
        Wiring.from(new Single("in"))
            .body(
                "amplifier",
                new AudioAmplifier(model),
                Map.of(
                    INPUT,
                    "in",
                    OUTPUT,
                    "plus",
                    OUTPUT_TWO,
                    "minus",
                    SUPPLY,
                    Nodes.MAIN_RAIL,
                    GROUND,
                    Nodes.GROUND))
            .to(new Pair("plus", "minus")));
  }

  private static FixedBlock transformer() {
    return block(
        "driver",
        Role.PREAMPLIFIER,
        Wiring.from(new Single("in"))
            .body(
                "transformer",
                new Transformer(1, 1, 100, 100),
                Map.of(
                    PRIMARY_START,
                    "in",
                    PRIMARY_END,
                    Nodes.GROUND,
                    TOP,
                    "plus",
                    TAP,
                    "tap",
                    BOTTOM,
                    "minus"))
            .to(new TappedPair("plus", "tap", "minus")));
  }

  static FixedBlock load(Port port, double ohms) {
    WiringPlan plan = Wiring.from(port);
    if (port instanceof Single) {
      plan.down("load", new Resistor(ohms), Nodes.GROUND);
    } else if (port instanceof Pair pair) {
      plan.at(pair.plus()).down("load", new Resistor(ohms), pair.minus());
    } else if (port instanceof TappedPair tapped) {
      plan.at(tapped.plus())
          .down("upper-load", new Resistor(ohms), tapped.tap())
          .at(tapped.tap())
          .down("lower-load", new Resistor(ohms), tapped.minus());
    }
    return block("load", Role.LOAD, plan.end());
  }

  /** A stiff supply that offers the rails. */
  static FixedBlock supply(Set<String> rails, double volts) {
    AdaptorModel model =
        new AdaptorModel("supply of the trial", true, volts, 2, volts, 0.1, 0.01, 100);
    WiringPlan plan = Wiring.start();
    for (String rail : rails) {
      plan.at(rail).down("source-" + rail, new Adaptor(model), Nodes.GROUND);
      plan.offerRail(rail.substring(Nodes.rail("").length()), rail);
    }
    return block("supply", Role.SUPPLY, plan.end());
  }

  /** What draws from the rails that a supply under trial offers. */
  static FixedBlock consumer(Set<String> rails) {
    WiringPlan plan = Wiring.from(new Single("in")).down("load", new Resistor(10e3), Nodes.GROUND);
    for (String rail : rails) {
      plan.at(rail).down("draw-" + rail, new Resistor(1e3), Nodes.GROUND);
    }
    return block("load", Role.LOAD, plan.end());
  }
}
