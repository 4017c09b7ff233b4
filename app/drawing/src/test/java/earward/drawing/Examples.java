package earward.drawing;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.B;
import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.GAIN;
import static earward.block.device.Terminal.INPUT;
import static earward.block.device.Terminal.INVERTING;
import static earward.block.device.Terminal.OUTPUT;
import static earward.block.device.Terminal.OUTPUT_TWO;
import static earward.block.device.Terminal.SUPPLY;
import static earward.block.device.Terminal.TOP;
import static earward.block.device.Terminal.WIPER;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.device.AmplifierGain;
import earward.block.device.AmplifierModel;
import earward.block.device.AmplifierRatings;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Fuse;
import earward.block.device.Loudspeaker;
import earward.block.device.LoudspeakerModel;
import earward.block.device.OpAmpModel;
import earward.block.device.OperationalAmplifier;
import earward.block.device.OutputSwing;
import earward.block.device.Pin;
import earward.block.device.Potentiometer;
import earward.block.device.Resistor;
import earward.block.device.Switch;
import earward.block.device.Taper;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.device.TunedFeed;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port.Pair;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/** Blocks to draw; their values play no part, only what is joined to what. */
final class Examples {
  private Examples() {}

  static Font font() {
    try (InputStream in =
        Objects.requireNonNull(
            Examples.class.getResourceAsStream("/liberation/LiberationSans-Regular.ttf"))) {
      return Font.createFont(Font.TRUETYPE_FONT, in);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (FontFormatException e) {
      throw new IllegalStateException(e);
    }
  }

  static SheetBlock block(String id, String title, Wiring wiring, Map<String, PartLabel> labels) {
    return block(id, title, wiring, Map.of(), labels, Map.of());
  }

  static SheetBlock block(
      String id,
      String title,
      Wiring wiring,
      Map<String, String> nodes,
      Map<String, PartLabel> labels,
      Map<String, String> flags) {
    return new SheetBlock(id, title, wiring, nodes, labels, flags);
  }

  static PartLabel label(String reference, String value) {
    return new PartLabel(reference, value);
  }

  static Resistor ohms(double ohms) {
    return new Resistor(ohms);
  }

  static Capacitor farads(double farads) {
    return Capacitor.of(farads, 63);
  }

  static Diode diode() {
    return new Diode(DiodeModel.plain("BAT46", DiodeMaterial.SCHOTTKY, 1e-7, 1.05, 5));
  }

  static Loudspeaker loudspeaker() {
    return new Loudspeaker(new LoudspeakerModel("16 ohm", 16, 14, 0.1, 1e-4, 250, 3, 1.5, 85, 1));
  }

  static Battery battery() {
    return new Battery(new BatteryModel("4 x AA", 6.4, 0.6, 3.6, 2, 2.2, 0.1, 0.1, 7, 1));
  }

  static BipolarTransistor transistor(boolean pnp) {
    return new BipolarTransistor(
        new TransistorModel("BC547B", pnp, 1e-14, 290, 5, 80, 45, 0.1, 150, 250));
  }

  static OperationalAmplifier opAmp() {
    return new OperationalAmplifier(
        new OpAmpModel("TL071", 2e5, 3e6, 1e12, 100, 1.5, 1.5, 1.4e-3, 1e-10, 18e-9, 7, 36));
  }

  static AmplifierModel amplifier(
      String name, boolean bridge, double feedbackOhms, Map<Integer, Terminal> pins) {
    return new AmplifierModel(
        name,
        bridge,
        new AmplifierGain(90, feedbackOhms, 5000, 100e3, 0, List.of()),
        new OutputSwing(0.6, 0.5, 0.6, 0.5, 0),
        new AmplifierRatings(3, 15, 4, 1, 150, 100, 50),
        6e-3,
        0.5,
        0,
        100e3,
        1e-7,
        40,
        10,
        2e-6,
        "DIP-8",
        pins.entrySet().stream()
            .sorted(Map.Entry.comparingByKey())
            .map(e -> new Pin(e.getKey(), e.getValue()))
            .toList());
  }

  static SheetBlock feed() {
    Wiring wiring =
        Wiring.start()
            .body("can", new TunedFeed(12e3, 41, 0, 1, 2), Map.of(TOP, "out", BOTTOM, GROUND))
            .at("out")
            .testPoint("winding", "out")
            .to(new Single("out"));
    return block(
        "feed",
        "IF feed",
        wiring,
        Map.of(),
        Map.of("can", label("T1", "455 kHz")),
        Map.of("winding", "TP1"));
  }

  static SheetBlock detector(boolean ownLoad) {
    var plan =
        Wiring.from(new Single("in")).run("d1", diode(), "out").down("c1", farads(1e-9), GROUND);
    if (ownLoad) {
      plan.down("r1", ohms(22e3), GROUND);
    }
    return block(
        "detector",
        "Diode detector",
        plan.testPoint("out", "out").to(new Single("out")),
        Map.of(),
        Map.of("d1", label("D1", "BAT46"), "c1", label("C1", "1.5 nF"), "r1", label("R1", "22 kΩ")),
        Map.of("out", "TP2"));
  }

  static SheetBlock filter() {
    return block(
        "filter",
        "Carrier filter",
        Wiring.from(new Single("in"))
            .run("r2", ohms(1e3), "out")
            .down("c2", farads(1e-9), GROUND)
            .testPoint("out", "out")
            .to(new Single("out")),
        Map.of(),
        Map.of("r2", label("R2", "1 kΩ"), "c2", label("C2", "1 nF")),
        Map.of("out", "TP3"));
  }

  static SheetBlock volume(boolean coupled) {
    var plan = Wiring.from(new Single("in"));
    String top = coupled ? "hot" : "in";
    if (coupled) {
      plan.down("r1", ohms(22e3), GROUND).run("c-in", farads(470e-9), "hot");
    }
    plan.body(
            "track",
            new Potentiometer(22e3, Taper.AUDIO_15, 0.7),
            Map.of(TOP, top, BOTTOM, GROUND, WIPER, "wiper"))
        .at("wiper")
        .run("c-wiper", farads(220e-9), "out");
    return block(
        "volume",
        "Volume",
        plan.testPoint("top", top).testPoint("wiper", "wiper").to(new Single("out")),
        Map.of(),
        Map.of(
            "r1", label("R3", "22 kΩ"),
            "c-in", label("C3", "470 nF"),
            "track", label("P1", "22 kΩ audio"),
            "c-wiper", label("C4", "220 nF")),
        Map.of("top", "TP4", "wiper", "TP5"));
  }

  static SheetBlock bridgePower(boolean withLoudspeaker) {
    AmplifierModel model =
        amplifier(
            "TDA2822M",
            true,
            Double.POSITIVE_INFINITY,
            Map.of(
                1,
                OUTPUT,
                2,
                SUPPLY,
                3,
                OUTPUT_TWO,
                4,
                Terminal.GROUND,
                6,
                Terminal.GROUND,
                7,
                INPUT,
                8,
                INVERTING));
    var plan =
        Wiring.from(new Single("in"))
            .testPoint("in", "in")
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
                    MAIN_RAIL,
                    Terminal.GROUND,
                    GROUND,
                    INVERTING,
                    "inverting"))
            .at("inverting")
            .down("inverting-capacitor", farads(10e-6), GROUND)
            .at(MAIN_RAIL)
            .down("bypass-capacitor", farads(100e-6), GROUND)
            .at("plus")
            .down("network-resistor", ohms(4.7), "network")
            .at("network")
            .down("network-capacitor", farads(100e-9), GROUND)
            .at("minus")
            .down("network-resistor-two", ohms(4.7), "network-two")
            .at("network-two")
            .down("network-capacitor-two", farads(100e-9), GROUND)
            .testPoint("plus", "plus")
            .testPoint("minus", "minus");
    if (withLoudspeaker) {
      plan.at("plus").down("loudspeaker", loudspeaker(), "minus");
    }
    return block(
        "power",
        "Audio power stage",
        plan.to(new Pair("plus", "minus")),
        Map.of(),
        Map.of(
            "amplifier", label("IC1", "TDA2822M"),
            "inverting-capacitor", label("C5", "10 µF"),
            "bypass-capacitor", label("C6", "100 µF"),
            "network-resistor", label("R4", "4.7 Ω"),
            "network-capacitor", label("C7", "100 nF"),
            "network-resistor-two", label("R5", "4.7 Ω"),
            "network-capacitor-two", label("C8", "100 nF"),
            "loudspeaker", label("LS1", "16 Ω")),
        Map.of("in", "TP6", "plus", "TP7", "minus", "TP8"));
  }

  static SheetBlock bridgeLoad() {
    return block(
        "load",
        "Loudspeaker",
        Wiring.from(new Pair("plus", "minus"))
            .down("loudspeaker", loudspeaker(), "minus")
            .testPoint("hot", "plus")
            .end(),
        Map.of(),
        Map.of("loudspeaker", label("LS1", "16 Ω")),
        Map.of("hot", "TP9"));
  }

  static SheetBlock singlePower() {
    AmplifierModel model =
        amplifier(
            "TBA820M",
            false,
            6e3,
            Map.of(
                1,
                Terminal.COMPENSATION,
                2,
                GAIN,
                3,
                INPUT,
                4,
                Terminal.GROUND,
                5,
                OUTPUT,
                6,
                SUPPLY,
                7,
                Terminal.BOOTSTRAP,
                8,
                Terminal.RIPPLE));
    Wiring wiring =
        Wiring.from(new Single("in"))
            .testPoint("in", "in")
            .body(
                "amplifier",
                new AudioAmplifier(model),
                Map.of(
                    INPUT,
                    "in",
                    OUTPUT,
                    "amp-out",
                    SUPPLY,
                    MAIN_RAIL,
                    Terminal.GROUND,
                    GROUND,
                    GAIN,
                    "gain",
                    Terminal.RIPPLE,
                    "ripple",
                    Terminal.BOOTSTRAP,
                    "bootstrap",
                    Terminal.COMPENSATION,
                    "compensation"))
            .at("gain")
            .down("gain-resistor", ohms(56), "gain-foot")
            .at("gain-foot")
            .down("gain-capacitor", farads(100e-6), GROUND)
            .at("ripple")
            .down("ripple-capacitor", farads(47e-6), GROUND)
            .bridge("bootstrap-capacitor", farads(100e-6), "bootstrap", "amp-out")
            .bridge("compensation-capacitor", farads(680e-12), "compensation", "amp-out")
            .at(MAIN_RAIL)
            .down("bypass-capacitor", farads(470e-6), GROUND)
            .at("amp-out")
            .down("network-resistor", ohms(1), "network")
            .at("network")
            .down("network-capacitor", farads(220e-9), GROUND)
            .at("amp-out")
            .run("output-capacitor", farads(470e-6), "out")
            .testPoint("output", "amp-out")
            .at("out")
            .down("loudspeaker", loudspeaker(), GROUND)
            .to(new Single("out"));
    return block(
        "power",
        "Audio power stage",
        wiring,
        Map.of(),
        Map.of(
            "amplifier", label("IC1", "TBA820M"),
            "gain-resistor", label("R4", "56 Ω"),
            "gain-capacitor", label("C5", "100 µF"),
            "ripple-capacitor", label("C6", "47 µF"),
            "bootstrap-capacitor", label("C7", "100 µF"),
            "compensation-capacitor", label("C8", "680 pF"),
            "bypass-capacitor", label("C9", "470 µF"),
            "network-resistor", label("R5", "1 Ω"),
            "network-capacitor", label("C10", "220 nF"),
            "output-capacitor", label("C11", "470 µF")),
        Map.of("in", "TP6", "output", "TP7"));
  }

  static SheetBlock controlledPower() {
    AmplifierModel model =
        amplifier(
            "TDA7056B",
            true,
            Double.POSITIVE_INFINITY,
            Map.of(
                2,
                SUPPLY,
                3,
                INPUT,
                4,
                Terminal.GROUND,
                5,
                Terminal.CONTROL,
                6,
                OUTPUT,
                7,
                Terminal.GROUND,
                8,
                OUTPUT_TWO));
    Wiring wiring =
        Wiring.from(new Single("in"))
            .testPoint("in", "in")
            .column("control-series", ohms(33e3), A, Map.of(A, MAIN_RAIL, B, "control-top"))
            .column(
                "control-track",
                new Potentiometer(10e3, Taper.LINEAR, 0.7),
                TOP,
                Map.of(TOP, "control-top", WIPER, "control", BOTTOM, GROUND))
            .at("control")
            .down("control-capacitor", farads(1e-6), GROUND)
            .testPoint("control", "control")
            .at("in")
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
                    MAIN_RAIL,
                    Terminal.GROUND,
                    GROUND,
                    Terminal.CONTROL,
                    "control"))
            .at(MAIN_RAIL)
            .down("bypass-capacitor", farads(220e-6), GROUND)
            .testPoint("plus", "plus")
            .testPoint("minus", "minus")
            .at("plus")
            .down("loudspeaker", loudspeaker(), "minus")
            .to(new Pair("plus", "minus"));
    return block(
        "power",
        "Audio power stage with DC volume",
        wiring,
        Map.of(),
        Map.of(
            "amplifier", label("IC1", "TDA7056B"),
            "control-series", label("R4", "33 kΩ"),
            "control-track", label("P1", "10 kΩ lin"),
            "control-capacitor", label("C5", "1 µF"),
            "bypass-capacitor", label("C6", "220 µF"),
            "loudspeaker", label("LS1", "16 Ω")),
        Map.of("in", "TP6", "plus", "TP7", "minus", "TP8", "control", "TP9"));
  }

  static SheetBlock agc() {
    return block(
        "agc",
        "AGC",
        Wiring.from(new Single("in"))
            .run("r-agc", ohms(33e3), "agc")
            .down("c-agc", farads(10e-6), GROUND)
            .down("r-load", ohms(47e3), GROUND)
            .testPoint("agc", "agc")
            .end(),
        Map.of("in", "detector.out"),
        Map.of(
            "r-agc", label("R10", "33 kΩ"),
            "c-agc", label("C10", "10 µF"),
            "r-load", label("R11", "47 kΩ")),
        Map.of("agc", "TP10"));
  }

  static SheetBlock supply() {
    String quiet = Nodes.rail("quiet");
    return block(
        "supply",
        "Battery",
        Wiring.start()
            .at("cell")
            .down("battery", battery(), GROUND)
            .run("fuse", new Fuse(0.5, 0.2), "after-fuse")
            .run("switch", Switch.closedInUse(), "after-switch")
            .run("polarity-diode", diode(), MAIN_RAIL)
            .down("bypass-capacitor", farads(470e-6), GROUND)
            .testPoint("rail", MAIN_RAIL)
            .offerRail("main", MAIN_RAIL)
            .run("quiet-resistor", ohms(100), quiet)
            .down("quiet-capacitor", farads(100e-6), GROUND)
            .testPoint("quiet-rail", quiet)
            .offerRail("quiet", quiet)
            .end(),
        Map.of(),
        Map.of(
            "battery", label("BT1", "4 × AA"),
            "fuse", label("F1", "500 mA"),
            "switch", label("S1", ""),
            "polarity-diode", label("D2", "1N5817"),
            "bypass-capacitor", label("C12", "470 µF"),
            "quiet-resistor", label("R12", "100 Ω"),
            "quiet-capacitor", label("C13", "100 µF")),
        Map.of("rail", "TP11", "quiet-rail", "TP12"));
  }

  static List<SheetBlock> lantern() {
    return List.of(feed(), detector(false), filter(), volume(false), bridgePower(true));
  }

  /** Every path that is drawn in tests and in the gallery. */
  static List<DrawingRuleTest.Case> cases() {
    List<SheetBlock> beside = List.of(supply(), agc());
    return List.of(
        new DrawingRuleTest.Case("lantern", lantern(), beside),
        new DrawingRuleTest.Case(
            "hayloft",
            List.of(feed(), detector(true), filter(), volume(true), singlePower()),
            beside),
        new DrawingRuleTest.Case(
            "boathouse", List.of(feed(), detector(true), filter(), controlledPower()), beside),
        new DrawingRuleTest.Case("load", List.of(bridgePower(false), bridgeLoad()), List.of()),
        new DrawingRuleTest.Case("preamplifier", List.of(StageExamples.preamplifier()), List.of()),
        new DrawingRuleTest.Case(
            "transistors",
            List.of(StageExamples.commonEmitter(false), StageExamples.pushPull()),
            List.of()),
        new DrawingRuleTest.Case("pnp", List.of(StageExamples.commonEmitter(true)), List.of()),
        new DrawingRuleTest.Case(
            "split", List.of(StageExamples.splitter(), StageExamples.fullWave()), List.of()));
  }
}
