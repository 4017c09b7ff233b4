package earward.preamplifiers;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.BlockType;
import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.CarrierGenerator;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.ThermalVoltage;
import earward.block.testkit.Variation;
import earward.block.testkit.Variations;
import earward.block.wiring.Nodes;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Drive;
import earward.engine.Engine;
import earward.engine.Slot;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Gains in the band, of new blocks with 10 kΩ behind them. */
class GainTest {
  private static final double LOAD_OHMS = 10e3;

  private static CompiledCircuit solved(BlockType type, FigureName wanted) {
    List<CircuitPart> parts = new ArrayList<>();
    type.describe(Variations.usual(type), Variation.PLAIN_CONDITIONS)
        .wiring()
        .parts()
        .forEach(p -> parts.add(new CircuitPart("block." + p.id(), p.device(), p.nodes())));
    DiodeModel diode = DiodeModel.plain("diode", DiodeMaterial.SCHOTTKY, 1e-7, 1.05, 10);
    parts.add(part("feed.generator", new CarrierGenerator(330), "feed", Nodes.GROUND));
    parts.add(part("detector.d1", new Diode(diode), "feed", "in"));
    parts.add(part("detector.r1", new Resistor(10e3), "in", Nodes.GROUND));
    parts.add(part("load.ohms", new Resistor(LOAD_OHMS), "out", Nodes.GROUND));
    Adaptor supply = new Adaptor(new AdaptorModel("stiff", true, 9, 1, 9, 0.01, 0, 100));
    parts.add(part("supply.adaptor", supply, Nodes.MAIN_RAIL, Nodes.GROUND));
    SolveCase signal =
        new SolveCase(
            CaseName.TEST, Drive.SIGNAL, Map.of(Slot.CARRIER_PEAK_VOLTS, 1.0, Slot.DEPTH, 0.3));
    return Engine.compile(
        new Circuit(parts, List.of(), List.of()), List.of(signal), List.of(wanted));
  }

  private static CircuitPart part(String name, Device device, String first, String second) {
    List<Terminal> ends = device.terminals();
    return new CircuitPart(name, device, Map.of(ends.get(0), first, ends.get(1), second));
  }

  private static double gain(CompiledCircuit circuit, double hertz) {
    return magnitude(circuit, "out", hertz) / magnitude(circuit, "in", hertz);
  }

  private static double magnitude(CompiledCircuit circuit, String place, double hertz) {
    return circuit
        .response(circuit.nominalValues(), CaseName.TEST, place, new double[] {hertz})
        .points()
        .get(0)
        .magnitude();
  }

  /** 1 + 100 kΩ/10 kΩ, any op-amp text; 1.7 MHz of gain-bandwidth leave it at 1 kHz. */
  @Test
  void theOpAmpsGainIsThatOfItsResistors() {
    FigureName any = new FigureName("drive", Quantity.DC_VOLTS, CaseName.TEST);
    assertThat(gain(solved(new OpAmpStage(), any), 1e3)).isCloseTo(11, within(0.05));
  }

  /** Collector resistor beside the load, over gain resistor and Vt/I (common practice). */
  @Test
  void theTransistorsGainIsThatOfItsResistors() {
    FigureName rest = new FigureName("block.q1", Quantity.DC_AMPERES, CaseName.TEST);
    CompiledCircuit circuit = solved(new CommonEmitter(), rest);
    double[] figures = new double[1];
    assertThat(circuit.newSolver().solve(circuit.nominalValues(), figures).solved()).isTrue();
    double collector = 1 / (1 / 4.7e3 + 1 / LOAD_OHMS);
    double wanted = collector / (220 + ThermalVoltage.volts(25) / figures[0]);
    assertThat(gain(circuit, 1e3)).isCloseTo(wanted, within(0.04 * wanted));
  }
}
