package earward.study.batch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.device.ToleranceClass;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Drive;
import earward.engine.Engine;
import earward.engine.SolveCase;
import earward.engine.Solver;
import earward.kit.design.Tolerances;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Draws held against theory, on circuits whose answer is known in closed form. */
class KitDrawTest {
  private static final int KITS = 20_000;
  private static final FigureName MIDDLE =
      new FigureName("m", Quantity.DC_VOLTS, CaseName.NO_SIGNAL);

  private static CircuitPart part(String name, Device device, String first, String second) {
    List<Terminal> ends = device.terminals();
    return new CircuitPart(name, device, Map.of(ends.get(0), first, ends.get(1), second));
  }

  /** 10 V over 10 kΩ and a lower resistor. */
  private static Circuit divider(double lowerOhms) {
    AdaptorModel source = new AdaptorModel("bench", true, 10, 1, 10, 1e-6, 0, 100);
    return new Circuit(
        List.of(
            part("v.source", new Adaptor(source), "top", Circuit.GROUND),
            part("d.upper", new Resistor(10e3), "top", "m"),
            part("d.lower", new Resistor(lowerOhms), "m", Circuit.GROUND)),
        List.of(),
        List.of());
  }

  private static CompiledCircuit compiled(Circuit circuit) {
    SolveCase rest = new SolveCase(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, Map.of());
    return Engine.compile(circuit, List.of(rest), List.of(MIDDLE));
  }

  private static Tolerances resistorsOf(double share) {
    return Tolerances.USUAL.with(ToleranceClass.RESISTOR, share).with(ToleranceClass.SUPPLY, 0);
  }

  private static Distribution middle(Circuit circuit, Tolerances tolerances, Habits habits) {
    CompiledCircuit compiled = compiled(circuit);
    KitDraw draw = new KitDraw(circuit, compiled, tolerances, 25, habits);
    Solver solver = compiled.newSolver();
    double[] values = draw.nominal();
    double[] row = new double[1];
    double[] first = new double[128];
    Tally tally = null;
    for (int kit = 0; kit < KITS; kit++) {
      draw.draw(5, kit, values);
      assertThat(solver.solve(values, row).solved()).isTrue();
      if (kit < first.length) {
        first[kit] = row[0];
      }
      if (kit == first.length - 1) {
        tally = new Tally(first);
        for (double each : first) {
          tally.add(each);
        }
      } else if (tally != null) {
        tally.add(row[0]);
      }
    }
    return tally.distribution();
  }

  /**
   * V = 10·R2/(R1 + R2): dV = V·R1/(R1 + R2)·(dR2/R2 − dR1/R1), with even draws of variance t²/3
   * each (law of propagation of uncertainty, GUM, JCGM 100:2008, equation 10).
   */
  @Test
  void aDividerSpreadsAsTheLawOfPropagationSays() {
    double share = 0.01;
    for (double lower : new double[] {1e3, 10e3, 47e3}) {
      Distribution found = middle(divider(lower), resistorsOf(share), Habits.NONE);
      double volts = 10 * lower / (10e3 + lower);
      double deviation = volts * 10e3 / (10e3 + lower) * Math.sqrt(2.0 / 3) * share;
      assertThat(found.mean()).isCloseTo(volts, within(4 * deviation / Math.sqrt(KITS)));
      assertThat(found.standardDeviation()).isCloseTo(deviation, within(0.015 * deviation));
    }
  }

  /** Like parts with all of their tolerance in common leave an even divider as it is. */
  @Test
  void likePartsOfOneLotMoveTogether() {
    Habits oneBag = new Habits(50, 1, 0, 0);
    Distribution like = middle(divider(10e3), resistorsOf(0.05), oneBag);
    assertThat(like.standardDeviation()).isLessThan(1e-9);
    Distribution unlike = middle(divider(47e3), resistorsOf(0.05), oneBag);
    assertThat(unlike.standardDeviation()).isGreaterThan(0.01);
  }

  @Test
  void aToleranceOfOnePartLeavesTheDrawsOfAllOthers() {
    Circuit circuit = divider(47e3);
    CompiledCircuit compiled = compiled(circuit);
    Tolerances usual = resistorsOf(0.05);
    KitDraw one = new KitDraw(circuit, compiled, usual, 25, Habits.USUAL);
    KitDraw other = new KitDraw(circuit, compiled, usual.with("d.upper", 0.01), 25, Habits.USUAL);
    double[] before = one.nominal();
    double[] after = one.nominal();
    int upper = compiled.slot("d.upper:ohms");
    int lower = compiled.slot("d.lower:ohms");
    for (int kit = 0; kit < 100; kit++) {
      one.draw(1, kit, before);
      other.draw(1, kit, after);
      assertThat(after[lower]).isEqualTo(before[lower]);
      assertThat(after[upper] / 10e3 - 1).isCloseTo((before[upper] / 10e3 - 1) / 5, within(1e-12));
    }
  }

  @Test
  void aDiodeLiesEvenlyInTheLogarithmWithinItsBand() {
    DiodeModel germanium =
        new DiodeModel(
            "band", DiodeMaterial.GERMANIUM, 5e-7, 1.5e-7, 2e-6, 1.2, 60, 0, 0.5, 0.5, 5e5, 40, 0);
    Circuit circuit =
        new Circuit(
            List.of(part("x.d", new Diode(germanium), "m", Circuit.GROUND)), List.of(), List.of());
    CompiledCircuit compiled = compiled(circuit);
    KitDraw draw = new KitDraw(circuit, compiled, Tolerances.USUAL, 25, Habits.NONE);
    int slot = compiled.slot("x.d:saturation-amperes");
    double[] row = draw.nominal();
    double sum = 0;
    double least = Double.POSITIVE_INFINITY;
    double most = 0;
    for (int kit = 0; kit < KITS; kit++) {
      draw.draw(9, kit, row);
      sum += Math.log(row[slot]) / KITS;
      least = Math.min(least, row[slot]);
      most = Math.max(most, row[slot]);
    }
    assertThat(least).isBetween(1.5e-7, 1.51e-7);
    assertThat(most).isBetween(1.99e-6, 2e-6);
    // middle of ln(0.15 µA) to ln(2 µA); standard error of an even draw
    assertThat(sum).isCloseTo(Math.log(Math.sqrt(1.5e-7 * 2e-6)), within(0.022));
  }
}
