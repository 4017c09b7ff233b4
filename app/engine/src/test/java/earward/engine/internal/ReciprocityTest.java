package earward.engine.internal;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.device.Capacitor;
import earward.block.device.Dielectric;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.Drive;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A passive network answers alike both ways round (reciprocity theorem, Lorentz 1896). */
class ReciprocityTest {
  private static final int NODES = 9;

  /** Resistors and capacitors at random between nodes at random, each node held to ground. */
  private static Circuit mesh(SplittableRandom random) {
    List<CircuitPart> parts = new ArrayList<>();
    for (int i = 0; i < NODES; i++) {
      parts.add(resistor("m.g" + i, random, "n" + i, Circuit.GROUND));
    }
    for (int i = 0; i < 3 * NODES; i++) {
      int from = random.nextInt(NODES);
      int to = (from + 1 + random.nextInt(NODES - 1)) % NODES;
      parts.add(resistor("m.r" + i, random, "n" + from, "n" + to));
      double farads = Math.pow(10, random.nextDouble(-11, -5));
      parts.add(
          new CircuitPart(
              "m.c" + i,
              new Capacitor(farads, Dielectric.FILM, 63, 0, 0),
              Map.of(
                  Terminal.A, "n" + to, Terminal.B, "n" + random.nextInt(to, NODES + to) % NODES)));
    }
    return new Circuit(parts, List.of(), List.of());
  }

  private static CircuitPart resistor(String name, SplittableRandom random, String a, String b) {
    double ohms = Math.pow(10, random.nextDouble(1, 6));
    return new CircuitPart(name, new Resistor(ohms), Map.of(Terminal.A, a, Terminal.B, b));
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void whatIsPushedHereIsSeenThereAsPushedThereItIsSeenHere(long seed) {
    Plan plan =
        new Plan(
            mesh(new SplittableRandom(seed)),
            List.of(new SolveCase(CaseName.TEST, Drive.NO_SIGNAL, Map.of())),
            List.of(new FigureName("n0", Quantity.DC_VOLTS, CaseName.TEST)));
    CaseWork work = new CaseWork(plan.network, plan.cases.get(0), Fineness.USUAL);
    work.begin(plan.slots().all().stream().mapToDouble(slot -> slot.nominal()).toArray());
    assertThat(work.solved()).isTrue();
    for (double hertz : new double[] {50, 1e3, 455e3}) {
      assertThat(work.alternating.audio(2 * Math.PI * hertz)).isTrue();
      double[][] re = new double[NODES][];
      double[][] im = new double[NODES][];
      for (int i = 0; i < NODES; i++) {
        work.alternating.rest();
        work.alternating.push(-1, plan.network.node("n" + i), 1, 0);
        work.alternating.solve();
        re[i] = work.alternating.re.clone();
        im[i] = work.alternating.im.clone();
      }
      for (int i = 0; i < NODES; i++) {
        for (int j = 0; j < i; j++) {
          int there = plan.network.node("n" + j);
          int here = plan.network.node("n" + i);
          double apart = Math.hypot(re[i][there] - re[j][here], im[i][there] - im[j][here]);
          assertThat(apart).isLessThanOrEqualTo(1e-9 * Math.hypot(re[i][there], im[i][there]));
        }
      }
    }
  }
}
