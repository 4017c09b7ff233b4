package earward.engine;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** A circuit ready to be solved many times. Immutable; shared by all threads. */
public final class CompiledCircuit {
  private final List<Slot> slots = List.of();
  private final List<FigureName> figures;
  private final Map<String, Integer> slotIndex = new HashMap<>();

  CompiledCircuit(Circuit circuit, List<SolveCase> cases, List<FigureName> wanted) {
    figures = wanted;
  }

  /** The values of a row, in order. */
  public List<Slot> slots() {
    return slots;
  }

  /**
   * Index of a slot.
   *
   * @throws IllegalArgumentException when there is none of this name
   */
  public int slot(String name) {
    Integer index = slotIndex.get(name);
    if (index == null) {
      throw new IllegalArgumentException("there is no slot '" + name + "'");
    }
    return index;
  }

  /** A fresh row with the nominal values. */
  public double[] nominalValues() {
    return slots.stream().mapToDouble(Slot::nominal).toArray();
  }

  /** The figures of a row, in order. */
  public List<FigureName> figures() {
    return figures;
  }

  /**
   * Index of a figure.
   *
   * @throws IllegalArgumentException when it was not asked for
   */
  public int figure(FigureName name) {
    int index = figures.indexOf(name);
    if (index < 0) {
      throw new IllegalArgumentException("figure " + name + " was not asked for");
    }
    return index;
  }

  /** A solver for one thread. */
  public Solver newSolver() {
    return new Solver(this);
  }

  /**
   * The audio response from the recovered envelope to a place.
   *
   * @param values a row of values
   * @param caseName the case whose operating point holds
   * @param place probe or node
   * @param hertz frequencies
   */
  public Response response(double[] values, CaseName caseName, String place, double[] hertz) {
    return new Response(List.of());
  }
}
