package earward.filters;

import earward.block.BlockType;
import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.CarrierGenerator;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.testkit.Variation;
import earward.block.testkit.Variations;
import earward.block.wiring.Nodes;
import earward.block.wiring.Wiring;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Drive;
import earward.engine.Engine;
import earward.engine.Response;
import earward.engine.Slot;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A filter between a detector and a load of 100 MΩ, solved for the ratio of its output to its
 * input, in which the detector cancels.
 */
final class FilterBench {
  private final CompiledCircuit circuit;

  FilterBench(BlockType type, Values values) {
    List<CircuitPart> parts = new ArrayList<>();
    Wiring wiring = type.describe(values, Variation.PLAIN_CONDITIONS).wiring();
    wiring
        .parts()
        .forEach(p -> parts.add(new CircuitPart("filter." + p.id(), p.device(), p.nodes())));
    DiodeModel diode = DiodeModel.plain("diode", DiodeMaterial.SCHOTTKY, 1e-7, 1.05, 10);
    parts.add(
        new CircuitPart(
            "feed.generator",
            new CarrierGenerator(330),
            Map.of(Terminal.TOP, "feed", Terminal.BOTTOM, Nodes.GROUND)));
    parts.add(
        new CircuitPart(
            "detector.d1",
            new Diode(diode),
            Map.of(Terminal.ANODE, "feed", Terminal.CATHODE, "in")));
    parts.add(resistor("detector.r1", 10e3, "in", Nodes.GROUND));
    parts.add(new CircuitPart("detector.c1", Film.of(1e-9), ends("in", Nodes.GROUND)));
    parts.add(resistor("load.ohms", 100e6, "out", Nodes.GROUND));
    parts.add(
        new CircuitPart(
            "supply.adaptor",
            new Adaptor(new AdaptorModel("stiff", true, 9, 1, 9, 0.01, 0, 100)),
            Map.of(Terminal.PLUS, Nodes.MAIN_RAIL, Terminal.MINUS, Nodes.GROUND)));
    SolveCase signal =
        new SolveCase(
            CaseName.TEST,
            Drive.SIGNAL,
            Map.of(Slot.CARRIER_PEAK_VOLTS, 1.0, Slot.DEPTH, 0.3, Slot.TONE_HERTZ, 400.0));
    circuit = Engine.compile(new Circuit(parts, List.of(), List.of()), List.of(signal), List.of());
  }

  private static CircuitPart resistor(String name, double ohms, String a, String b) {
    return new CircuitPart(name, new Resistor(ohms), ends(a, b));
  }

  private static Map<Terminal, String> ends(String a, String b) {
    return Map.of(Terminal.A, a, Terminal.B, b);
  }

  /** Output over input, as a plain number. */
  double ratio(double hertz) {
    return magnitude("out", hertz) / magnitude("in", hertz);
  }

  /** The response over that at another frequency, in dB. */
  double decibels(double hertz, double overHertz) {
    return 20 * Math.log10(ratio(hertz) / ratio(overHertz));
  }

  private double magnitude(String place, double hertz) {
    Response response =
        circuit.response(circuit.nominalValues(), CaseName.TEST, place, new double[] {hertz});
    return response.points().get(0).magnitude();
  }

  /** The values of a new block with some changed. */
  static Values values(BlockType type, Map<String, Object> changed) {
    Map<String, SettingValue> all = new HashMap<>(Variations.usual(type).all());
    for (Setting setting : type.settings()) {
      Object value = changed.get(setting.id());
      if (value instanceof String word) {
        all.put(setting.id(), new SettingValue.Option(word));
      } else if (value instanceof Number number) {
        all.put(setting.id(), new SettingValue.Amount(number.doubleValue()));
      }
    }
    return Values.of(all);
  }
}
