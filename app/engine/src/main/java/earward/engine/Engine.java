package earward.engine;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.device.CarrierGenerator;
import earward.block.device.TunedFeed;
import earward.block.figure.FigureName;
import earward.engine.internal.Plan;
import java.util.List;

/** The door of the engine: a circuit in, something that can be solved out. */
public final class Engine {
  private Engine() {}

  /**
   * Compiles a circuit once for many solves.
   *
   * @param circuit parts, seams and probes
   * @param cases the states in which it is to be solved
   * @param wanted the figures of a row, in the order of the row
   * @throws CircuitException with a finding when the circuit or a wanted figure makes no sense
   */
  public static CompiledCircuit compile(
      Circuit circuit, List<SolveCase> cases, List<FigureName> wanted) {
    long feeds =
        circuit.parts().stream()
            .map(CircuitPart::device)
            .filter(device -> device instanceof CarrierGenerator || device instanceof TunedFeed)
            .count();
    if (feeds > 1) {
      throw refused("the circuit has " + feeds + " feeds; it can have one at most");
    }
    try {
      return new CompiledCircuit(new Plan(circuit, cases, wanted), wanted);
    } catch (IllegalArgumentException e) {
      String message = e.getMessage();
      throw refused(message == null ? "the circuit makes no sense" : message);
    }
  }

  private static CircuitException refused(String sentence) {
    return new CircuitException(
        Finding.of(
            Severity.STOP,
            "circuit-refused",
            "",
            Character.toUpperCase(sentence.charAt(0)) + sentence.substring(1) + "."));
  }
}
