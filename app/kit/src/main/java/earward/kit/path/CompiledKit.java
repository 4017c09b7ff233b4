package earward.kit.path;

import earward.block.figure.FigureName;
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
 */
public record CompiledKit(
    Assembly assembly, CompiledCircuit circuit, Map<String, Double> deepestKnobs) {
  public CompiledKit {
    Objects.requireNonNull(assembly);
    Objects.requireNonNull(circuit);
    deepestKnobs = Map.copyOf(deepestKnobs);
  }

  /** The figures of a row that the engine gave, with those of the path that follow from them. */
  public Figures figures(double[] row) {
    Map<FigureName, Double> all = new HashMap<>();
    for (int i = 0; i < row.length; i++) {
      all.put(circuit.figures().get(i), row[i]);
    }
    all.putAll(DerivedFigures.of(assembly, name -> all.getOrDefault(name, Double.NaN)));
    return new Figures(all);
  }
}
