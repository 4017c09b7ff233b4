package earward.filters;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.device.Resistor;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;

/** One series resistor and one capacitor to ground. */
final class RcSection {
  private RcSection() {}

  static Wiring of(double ohms, double farads) {
    return Wiring.from(new Single("in"))
        .run("r2", new Resistor(ohms), "out")
        .down("c2", Film.of(farads), GROUND)
        .testPoint("out", "out")
        .fit("r2", "c2")
        .to(new Single("out"));
  }
}
