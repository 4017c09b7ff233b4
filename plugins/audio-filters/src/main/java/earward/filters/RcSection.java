package earward.filters;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.device.Capacitor;
import earward.block.device.Dielectric;
import earward.block.device.Resistor;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;

/** One series resistor and one capacitor to ground. */
final class RcSection {
  private static final double RATED_VOLTS = 63;

  private RcSection() {}

  static Wiring of(double ohms, double farads) {
    return Wiring.from(new Single("in"))
        .run("r2", new Resistor(ohms), "out")
        .down("c2", capacitor(farads), GROUND)
        .testPoint("out", "out")
        .fit("r2", "c2")
        .to(new Single("out"));
  }

  /** Never an electrolytic: no polarity to mind, whichever way round the detector's DC is. */
  private static Capacitor capacitor(double farads) {
    Dielectric usual = Dielectric.usualFor(farads);
    return new Capacitor(farads, usual.polarised() ? Dielectric.FILM : usual, RATED_VOLTS, 0, 0);
  }
}
