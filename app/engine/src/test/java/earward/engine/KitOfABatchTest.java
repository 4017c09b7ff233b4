package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.OutputSwing;
import earward.block.figure.Quantity;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/**
 * A kit that is solved from the nominal kit's solution equals the same kit compiled and solved by
 * itself: the short way through detection and the sparse way through the circuit change nothing.
 */
class KitOfABatchTest {
  private static final List<String> SLOTS =
      List.of(
          "feed.can:parallel-ohms",
          "detector.d1:saturation-amperes",
          "detector.c1:farads",
          "detector.r1:ohms",
          "filter.r2:ohms",
          "volume.r:ohms",
          "supply.battery:internal-ohms",
          "load.r:ohms");

  private static final double[] NOMINAL = {12e3, 1e-7, 1.5e-9, 22e3, 2.2e3, 47e3, 2, 8};
  private static final List<String> NODES = List.of("in", "a", "b", "w", "plus", "out");

  private static TrialCircuit kit(double[] of) {
    TrialCircuit kit =
        new TrialCircuit()
            .tuned(of[0], 40, "in")
            .diode("detector.d1", of[1], 1.05, 20, "in", "a")
            .capacitor("detector.c1", of[2], "a", Circuit.GROUND)
            .resistor("detector.r1", of[3], "a", Circuit.GROUND)
            .resistor("filter.r2", of[4], "a", "b")
            .capacitor("filter.c2", 1e-9, "b", Circuit.GROUND)
            .capacitor("volume.cc", 220e-9, "b", "w")
            .resistor("volume.r", of[5], "w", Circuit.GROUND)
            .battery(9, of[6], "rail-main")
            .amplifier(false, 4e-3, new OutputSwing(1, 0.5, 0.5, 0.5, 0), "w", "rail-main")
            .capacitor("power.c", 470e-6, "plus", "out")
            .resistor("load.r", of[7], "out", Circuit.GROUND)
            .signal(1.5, 0.7, 400);
    NODES.forEach(node -> kit.want(node, Quantity.DC_VOLTS));
    NODES.forEach(node -> kit.want(node, Quantity.AUDIO_RMS_VOLTS));
    NODES.forEach(node -> kit.want(node, Quantity.DISTORTION));
    NODES.forEach(node -> kit.want(node, Quantity.CARRIER_RMS_VOLTS));
    return kit.want("supply.battery", Quantity.SUPPLY_AMPERES);
  }

  @Test
  void everyKitEqualsItsSingleSolve() {
    CompiledCircuit compiled = kit(NOMINAL).compile();
    Solver solver = compiled.newSolver();
    double[] figures = new double[compiled.figures().size()];
    SplittableRandom random = new SplittableRandom(20_261_201);
    for (int round = 0; round < 12; round++) {
      double[] of = NOMINAL.clone();
      double[] values = compiled.nominalValues();
      for (int i = 0; i < of.length; i++) {
        of[i] *= 1 + 0.2 * (2 * random.nextDouble() - 1);
        values[compiled.slot(SLOTS.get(i))] = of[i];
      }
      assertThat(solver.solve(values, figures).solved()).isTrue();
      double[] single = kit(of).figures();
      for (int i = 0; i < single.length; i++) {
        assertThat(figures[i])
            .as("%s in round %d", compiled.figures().get(i), round)
            .isCloseTo(single[i], within(1e-9 * (0.1 + Math.abs(single[i]))));
      }
    }
  }
}
