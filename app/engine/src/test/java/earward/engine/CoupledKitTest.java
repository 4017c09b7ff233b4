package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.device.OutputSwing;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A whole small kit: what hangs together moves together, and nothing remembers the row before. */
class CoupledKitTest {
  private static final List<String> NODES = List.of("in", "a", "b", "w", "plus", "out");

  private static TrialCircuit kit() {
    TrialCircuit kit =
        new TrialCircuit()
            .tuned(12e3, 40, "in")
            .diode("detector.d1", 1e-7, 1.05, 20, "in", "a")
            .capacitor("detector.c1", 1.5e-9, "a", Circuit.GROUND)
            .resistor("detector.r1", 22e3, "a", Circuit.GROUND)
            .resistor("filter.r2", 2.2e3, "a", "b")
            .capacitor("filter.c2", 1e-9, "b", Circuit.GROUND)
            .capacitor("volume.cc", 220e-9, "b", "w")
            .resistor("volume.r", 47e3, "w", Circuit.GROUND)
            .battery(9, 2, "rail-main")
            .amplifier(false, 4e-3, new OutputSwing(1, 0.5, 0.5, 0.5, 0), "w", "rail-main")
            .capacitor("power.c", 470e-6, "plus", "out")
            .resistor("load.r", 8, "out", Circuit.GROUND)
            .signal(1.5, 0.3, 400);
    NODES.forEach(node -> kit.want(node, Quantity.DC_VOLTS));
    NODES.forEach(node -> kit.want(node, Quantity.AUDIO_RMS_VOLTS));
    return kit.want("supply.battery", Quantity.SUPPLY_AMPERES);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "feed.can:parallel-ohms",
        "detector.d1:saturation-amperes",
        "detector.c1:farads",
        "detector.r1:ohms",
        "filter.r2:ohms",
        "filter.c2:farads",
        "volume.cc:farads",
        "volume.r:ohms"
      })
  void everyPartUpToTheAmplifierMovesTheAudioOfAllAndTheDcOfItsOwnSide(String slot) {
    CompiledCircuit compiled = kit().compile();
    double[] before = solve(compiled, compiled.nominalValues());
    double[] values = compiled.nominalValues();
    values[compiled.slot(slot)] *= 1.1;
    double[] after = solve(compiled, values);
    for (int i = 0; i < NODES.size(); i++) {
      int audio = NODES.size() + i;
      assertThat(Math.abs(after[audio] / before[audio] - 1))
          .as("audio at %s", NODES.get(i))
          .isGreaterThan(1e-8);
    }
    // the volume resistor stands behind a capacitor: it moves no DC before it but for the mean of
    // the diode's curvature, and none at all at its own side
    assertThat(after[3])
        .as("DC at w")
        .isCloseTo(before[3], org.assertj.core.api.Assertions.within(1e-9));
  }

  @Test
  void theLoadMovesTheSupplyButNoDcBeforeTheCouplingCapacitor() {
    CompiledCircuit compiled = kit().compile();
    double[] before = solve(compiled, compiled.nominalValues());
    double[] values = compiled.nominalValues();
    values[compiled.slot("load.r:ohms")] *= 1.1;
    double[] after = solve(compiled, values);
    int supply = 2 * NODES.size();
    int plus = NODES.indexOf("plus");
    assertThat(after[supply]).isLessThan(before[supply] * 0.999);
    assertThat(after[plus]).as("rest of the output follows the rail").isGreaterThan(before[plus]);
    assertThat(Math.abs(after[1] - before[1])).as("DC at the detector").isLessThan(1e-6);
  }

  @Test
  void aSolveLeavesNoTraceInTheNext() {
    CompiledCircuit compiled = kit().compile();
    Solver solver = compiled.newSolver();
    double[] first = new double[compiled.figures().size()];
    double[] again = new double[first.length];
    double[] values = compiled.nominalValues();
    assertThat(solver.solve(values, first).solved()).isTrue();
    Random random = new Random(7);
    for (int kit = 0; kit < 5; kit++) {
      double[] other = values.clone();
      for (int i = 0; i < other.length; i++) {
        other[i] *= 1 + 0.2 * (random.nextDouble() - 0.5);
      }
      var unused = solver.solve(other, again);
    }
    assertThat(solver.solve(values, again).solved()).isTrue();
    assertThat(again).isEqualTo(first);
  }

  @Test
  void everySingleFaultHasASolution() {
    CompiledCircuit compiled = kit().compile();
    Solver solver = compiled.newSolver();
    double[] figures = new double[compiled.figures().size()];
    for (CircuitPart part : kit().circuit().parts()) {
      for (String fault : List.of("open", "short", "reversed")) {
        double[] values = compiled.nominalValues();
        values[compiled.slot(part.name() + ":" + fault)] = 1;
        SolveOutcome outcome = solver.solve(values, figures);
        assertThat(outcome.solved()).as("%s %s", part.name(), fault).isTrue();
        assertThat(Arrays.stream(figures).limit(NODES.size()))
            .as("%s %s", part.name(), fault)
            .allMatch(Double::isFinite);
      }
    }
  }

  @Test
  void aMeterLoadsWhatItMeasures() {
    TrialCircuit kit =
        kit().probe("tp", "a", Circuit.GROUND).want("tp", Quantity.DC_VOLTS, CaseName.TEST);
    CompiledCircuit compiled = kit.compile();
    int figure = compiled.figure(new FigureName("tp", Quantity.DC_VOLTS, CaseName.TEST));
    double bare = solve(compiled, compiled.nominalValues())[figure];
    double[] values = compiled.nominalValues();
    values[compiled.slot("tp:meter-siemens")] = 1e-6;
    assertThat(solve(compiled, values)[figure]).isLessThan(0.999 * bare);
  }

  private static double[] solve(CompiledCircuit compiled, double[] values) {
    double[] figures = new double[compiled.figures().size()];
    SolveOutcome outcome = compiled.newSolver().solve(values, figures);
    assertThat(outcome.findings()).isEmpty();
    return figures;
  }
}
