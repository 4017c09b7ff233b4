package earward.engine.internal;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.CarrierGenerator;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.Drive;
import earward.engine.Slot;
import earward.engine.SolveCase;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** One adjoint solve says the same as a direct solve for each source (Director and Rohrer 1969). */
class AdjointTest {
  private static final String GROUND = Circuit.GROUND;

  private static CircuitPart two(
      String name, earward.block.device.Device part, String a, String b) {
    return new CircuitPart(name, part, Map.of(Terminal.A, a, Terminal.B, b));
  }

  private static Circuit circuit() {
    TransistorModel transistor =
        new TransistorModel("T", false, 1e-14, 150, 3, 60, 45, 0.5, 150, 200, 100);
    DiodeModel diode = DiodeModel.plain("D", DiodeMaterial.SCHOTTKY, 1e-7, 1.05, 20);
    return new Circuit(
        List.of(
            new CircuitPart(
                "feed.g",
                new CarrierGenerator(330),
                Map.of(Terminal.TOP, "in", Terminal.BOTTOM, GROUND)),
            new CircuitPart(
                "detector.d",
                new Diode(diode),
                Map.of(Terminal.ANODE, "in", Terminal.CATHODE, "a")),
            two("detector.r", new Resistor(22e3), "a", GROUND),
            two("detector.c", new Capacitor(1e-9, Dielectric.FILM, 63, 0, 0), "a", GROUND),
            two("amp.cc", new Capacitor(220e-9, Dielectric.FILM, 63, 0, 0), "a", "base"),
            two("amp.rb", new Resistor(470e3), "collector", "base"),
            two("amp.rc", new Resistor(4.7e3), "collector", "rail"),
            two("amp.cf", new Capacitor(100e-12, Dielectric.FILM, 63, 0, 0), "collector", "base"),
            new CircuitPart(
                "amp.t",
                new BipolarTransistor(transistor),
                Map.of(
                    Terminal.BASE, "base",
                    Terminal.COLLECTOR, "collector",
                    Terminal.EMITTER, GROUND)),
            new CircuitPart(
                "supply.b",
                new earward.block.device.Battery(
                    new earward.block.device.BatteryModel("B", 9, 2, 5, 10, 1, 0.1, 0, 9, 1)),
                Map.of(Terminal.PLUS, "rail", Terminal.MINUS, GROUND))),
        List.of(),
        List.of());
  }

  @Test
  void adjointAndDirectSolvesAgree() {
    SolveCase test =
        new SolveCase(
            CaseName.TEST, Drive.SIGNAL, Map.of(Slot.CARRIER_PEAK_VOLTS, 1.0, Slot.DEPTH, 0.3));
    FigureName any = new FigureName("collector", Quantity.DC_VOLTS, CaseName.TEST);
    Plan plan = new Plan(circuit(), List.of(test), List.of(any));
    CaseWork work = new CaseWork(plan.network, plan.cases.get(0), Fineness.USUAL);
    work.begin(plan.slots().all().stream().mapToDouble(Slot::nominal).toArray());
    assertThat(work.solved() && work.carrierSolved()).isTrue();
    int output = plan.network.node("collector");
    int size = plan.network.size;
    for (double hertz : new double[] {30, 1e3, 2e4}) {
      assertThat(SmallResponse.at(work, hertz)).isTrue();
      work.alternating.rest();
      work.alternating.re[output] = 1;
      work.alternating.solveTransposed();
      double[] re = work.alternating.re.clone();
      double[] im = work.alternating.im.clone();
      for (int source = 0; source < size; source++) {
        work.alternating.rest();
        work.alternating.re[source] = 1;
        work.alternating.solve();
        double there = Math.hypot(work.alternating.re[output], work.alternating.im[output]);
        double apart =
            Math.hypot(
                work.alternating.re[output] - re[source], work.alternating.im[output] - im[source]);
        assertThat(apart).as("row %s at %s Hz", source, hertz).isLessThanOrEqualTo(1e-9 * there);
      }
    }
  }
}
