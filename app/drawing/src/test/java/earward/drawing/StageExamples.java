package earward.drawing;

import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.B;
import static earward.block.device.Terminal.BASE;
import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.COLLECTOR;
import static earward.block.device.Terminal.EMITTER;
import static earward.block.device.Terminal.INPUT;
import static earward.block.device.Terminal.INVERTING;
import static earward.block.device.Terminal.OUTPUT;
import static earward.block.device.Terminal.PRIMARY_END;
import static earward.block.device.Terminal.PRIMARY_START;
import static earward.block.device.Terminal.SUPPLY;
import static earward.block.device.Terminal.TAP;
import static earward.block.device.Terminal.TOP;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.device.Terminal;
import earward.block.device.Transformer;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Port.TappedPair;
import earward.block.wiring.Wiring;
import java.util.Map;

/** Stages of discrete parts, for the placement words that the kits do not use. */
final class StageExamples {
  private StageExamples() {}

  /** An op-amp with feedback over it, biased from half the rail. */
  static SheetBlock preamplifier() {
    Wiring wiring =
        Wiring.from(new Single("in"))
            .run("c-in", Examples.farads(100e-9), "plus-in")
            .down("r-low", Examples.ohms(100e3), GROUND)
            .up("r-high", Examples.ohms(100e3), MAIN_RAIL)
            .body(
                "op-amp",
                Examples.opAmp(),
                Map.of(
                    INPUT,
                    "plus-in",
                    INVERTING,
                    "minus-in",
                    OUTPUT,
                    "amp",
                    SUPPLY,
                    MAIN_RAIL,
                    Terminal.GROUND,
                    GROUND))
            .bridge("r-feedback", Examples.ohms(47e3), "minus-in", "amp")
            .at("minus-in")
            .down("r-gain", Examples.ohms(4.7e3), "gain-foot")
            .at("gain-foot")
            .down("c-gain", Examples.farads(10e-6), GROUND)
            .at("amp")
            .run("c-out", Examples.farads(1e-6), "out")
            .testPoint("amp", "amp")
            .testPoint("foot", "gain-foot")
            .testPoint("supply", MAIN_RAIL)
            .testPoint("ground", GROUND)
            .to(new Single("out"));
    return SheetBlock.plain("preamplifier", wiring);
  }

  /** One transistor with its base divider, emitter network and collector load. */
  static SheetBlock commonEmitter(boolean pnp) {
    String upper = pnp ? GROUND : MAIN_RAIL;
    String lower = pnp ? MAIN_RAIL : GROUND;
    Wiring wiring =
        Wiring.from(new Single("in"))
            .run("c-in", Examples.farads(1e-6), "base")
            .up("r-high", Examples.ohms(100e3), pnp ? MAIN_RAIL : upper)
            .down("r-low", Examples.ohms(22e3), pnp ? GROUND : lower)
            .body(
                "q1",
                Examples.transistor(pnp),
                Map.of(BASE, "base", COLLECTOR, "collector", EMITTER, "emitter"))
            .at("collector")
            .up("r-collector", Examples.ohms(4.7e3), upper)
            .at("emitter")
            .down("r-emitter", Examples.ohms(1e3), lower)
            .down("c-emitter", Examples.farads(47e-6), lower)
            .at("collector")
            .run("c-out", Examples.farads(1e-6), "out")
            .bridge("r-feedback", Examples.ohms(1e6), "base", "collector")
            .to(new Single("out"));
    return SheetBlock.plain("stage", wiring);
  }

  /** A push-pull pair as a column, driven at both bases through diodes. */
  static SheetBlock pushPull() {
    Wiring wiring =
        Wiring.from(new Single("in"))
            .run("c-drive", Examples.farads(10e-6), "drive")
            .up("d-up", Examples.diode(), "upper-base")
            .at("upper-base")
            .up("r-up", Examples.ohms(1e3), MAIN_RAIL)
            .at("drive")
            .down("d-down", Examples.diode(), Terminal.CATHODE, "lower-base")
            .at("lower-base")
            .down("r-down", Examples.ohms(1e3), GROUND)
            .column(
                "q1",
                Examples.transistor(false),
                COLLECTOR,
                Map.of(COLLECTOR, MAIN_RAIL, BASE, "upper-base", EMITTER, "upper-emitter"))
            .column("re1", Examples.ohms(0.5), A, Map.of(A, "upper-emitter", B, "middle"))
            .column("re2", Examples.ohms(0.5), A, Map.of(A, "middle", B, "lower-emitter"))
            .column(
                "q2",
                Examples.transistor(true),
                EMITTER,
                Map.of(EMITTER, "lower-emitter", BASE, "lower-base", COLLECTOR, GROUND))
            .at("middle")
            .run("c-out", Examples.farads(470e-6), "out")
            .testPoint("middle", "middle")
            .to(new Single("out"));
    return SheetBlock.plain("push-pull", wiring);
  }

  /** A phase-splitting transformer into two halves. */
  static SheetBlock splitter() {
    Wiring wiring =
        Wiring.from(new Single("in"))
            .body(
                "transformer",
                new Transformer(1, 1, 100, 100),
                Map.of(
                    PRIMARY_START,
                    "in",
                    PRIMARY_END,
                    MAIN_RAIL,
                    TOP,
                    "plus",
                    TAP,
                    "tap",
                    BOTTOM,
                    "minus"))
            .to(new TappedPair("plus", "tap", "minus"));
    return SheetBlock.plain("splitter", wiring);
  }

  /** Two diodes on the halves of a tapped winding. */
  static SheetBlock fullWave() {
    Wiring wiring =
        Wiring.from(new TappedPair("plus", "tap", "minus"))
            .run("d1", Examples.diode(), "out")
            .at("minus")
            .run("d2", Examples.diode(), "out")
            .at("tap")
            .down("r-tap", Examples.ohms(1e3), GROUND)
            .at("out")
            .down("c1", Examples.farads(1e-9), GROUND)
            .testPoint("out", "out")
            .to(new Single("out"));
    return SheetBlock.plain("full-wave", wiring);
  }
}
