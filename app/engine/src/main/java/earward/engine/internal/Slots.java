package earward.engine.internal;

import earward.block.device.Parameter;
import earward.block.device.ToleranceClass;
import earward.block.figure.CaseName;
import earward.block.quantity.Unit;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.Probe;
import earward.engine.Slot;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** All values of a circuit in their order: parts with their faults, meters, signal, ambient. */
public final class Slots {
  private final List<Slot> all = new ArrayList<>();
  private final Map<String, Integer> index = new HashMap<>();

  /** The slots of a circuit; nominal signal and ambient are those of the test case. */
  Slots(Circuit circuit, List<SolveCase> cases) {
    for (CircuitPart part : circuit.parts()) {
      for (Parameter parameter : part.device().parameters()) {
        add(
            part.name() + ":" + parameter.name(),
            parameter.nominal(),
            parameter.unit(),
            parameter.tolerance());
      }
      for (String fault : List.of("open", "short", "reversed")) {
        add(part.name() + ":" + fault, 0, Unit.NUMBER, ToleranceClass.FIXED);
      }
    }
    for (Probe probe : circuit.probes()) {
      add(probe.name() + ":meter-siemens", 0, Unit.NUMBER, ToleranceClass.FIXED);
    }
    signal(Slot.CARRIER_HERTZ, 455e3, Unit.HERTZ, cases);
    signal(Slot.CARRIER_PEAK_VOLTS, 1, Unit.VOLT, cases);
    signal(Slot.DEPTH, 0.3, Unit.FRACTION, cases);
    signal(Slot.TONE_HERTZ, 400, Unit.HERTZ, cases);
    signal(Slot.HIGHEST_TONE_HERTZ, 5000, Unit.HERTZ, cases);
    signal(Slot.LOWEST_TONE_HERTZ, 100, Unit.HERTZ, cases);
    signal(Slot.AMBIENT_CELSIUS, 25, Unit.CELSIUS, cases);
    signal(Slot.LOAD_TOLERANCE, 0, Unit.FRACTION, cases);
  }

  private void signal(String name, double usual, Unit unit, List<SolveCase> cases) {
    double nominal = usual;
    for (SolveCase solveCase : cases) {
      if (solveCase.name().equals(CaseName.TEST)) {
        nominal = solveCase.overrides().getOrDefault(name, usual);
      }
    }
    add(name, nominal, unit, ToleranceClass.FIXED);
  }

  private void add(String name, double nominal, Unit unit, ToleranceClass tolerance) {
    index.put(name, all.size());
    all.add(new Slot(name, nominal, unit, tolerance));
  }

  /** All of them, in the order of a row. */
  public List<Slot> all() {
    return all;
  }

  /**
   * Index of a slot.
   *
   * @throws IllegalArgumentException when there is none of this name
   */
  public int of(String name) {
    Integer found = index.get(name);
    if (found == null) {
      throw new IllegalArgumentException("there is no slot '" + name + "'");
    }
    return found;
  }
}
