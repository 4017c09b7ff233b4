package earward.kit.path;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CompiledCircuit;
import java.util.HashMap;
import java.util.Map;
import java.util.Objects;

/**
 * A kit ready to be solved many times: one structure, any row of values. Immutable.
 *
 * @param assembly what was compiled
 * @param circuit for the engine
 * @param deepestKnobs where the deepest modulation is worst, by slot; see {@link SolvedKit}
 * @param worstKnobs where the test signal may be least deep, by slot; empty where it is all one
 */
public record CompiledKit(
    Assembly assembly,
    CompiledCircuit circuit,
    Map<String, Double> deepestKnobs,
    Map<String, Double> worstKnobs) {
  private static final String POSITION = ":position";

  public CompiledKit {
    Objects.requireNonNull(assembly);
    Objects.requireNonNull(circuit);
    deepestKnobs = Map.copyOf(deepestKnobs);
    worstKnobs = Map.copyOf(worstKnobs);
  }

  /** The figures of a row that the engine gave, with those of the path that follow from them. */
  public Figures figures(double[] row) {
    Map<FigureName, Double> all = new HashMap<>();
    for (int i = 0; i < row.length; i++) {
      all.put(circuit.figures().get(i), row[i]);
    }
    all.putAll(DerivedFigures.of(assembly, name -> all.getOrDefault(name, Double.NaN)));
    positions(deepestKnobs, CaseName.DEEPEST, all);
    positions(worstKnobs, CaseName.WORST_TURN, all);
    return new Figures(all);
  }

  private static void positions(
      Map<String, Double> knobs, CaseName caseName, Map<FigureName, Double> into) {
    knobs.forEach(
        (slot, position) -> {
          String part = slot.substring(0, slot.length() - POSITION.length());
          into.put(new FigureName(part, Quantity.KNOB_POSITION, caseName), position);
        });
  }
}
