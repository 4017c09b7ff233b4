package earward.engine;

import earward.block.figure.FigureName;
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
    return new CompiledCircuit(circuit, List.copyOf(cases), List.copyOf(wanted));
  }
}
