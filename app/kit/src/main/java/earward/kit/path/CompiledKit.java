package earward.kit.path;

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
 */
public record CompiledKit(
    Assembly assembly, CompiledCircuit circuit, Map<String, Double> deepestKnobs) {
  /** Fundamental below which harmonics are related to nothing that could be heard or measured. */
  private static final double LEAST_FUNDAMENTAL_VOLTS = 1e-6;

  public CompiledKit {
    Objects.requireNonNull(assembly);
    Objects.requireNonNull(circuit);
    deepestKnobs = Map.copyOf(deepestKnobs);
  }

  /**
   * The figures of a row that the engine gave, with those of the path that follow from them, and
   * without the distortion of what is no audio, such as a rail that a bridge loads evenly.
   */
  public Figures figures(double[] row) {
    Map<FigureName, Double> all = new HashMap<>();
    for (int i = 0; i < row.length; i++) {
      all.put(circuit.figures().get(i), row[i]);
    }
    all.putAll(DerivedFigures.of(assembly, name -> all.getOrDefault(name, Double.NaN)));
    all.keySet().removeIf(name -> withoutFundamental(name, all));
    return new Figures(all);
  }

  private static boolean withoutFundamental(FigureName name, Map<FigureName, Double> all) {
    FigureName fundamental =
        new FigureName(name.place(), Quantity.AUDIO_RMS_VOLTS, name.caseName());
    return name.quantity() == Quantity.DISTORTION
        && all.getOrDefault(fundamental, Double.NaN) < LEAST_FUNDAMENTAL_VOLTS;
  }
}
