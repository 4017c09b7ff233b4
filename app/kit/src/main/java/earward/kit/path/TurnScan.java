package earward.kit.path;

import earward.block.device.AudioAmplifier;
import earward.block.device.Diode;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Engine;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Where the listeners' knobs are at their worst: the whole turn of each is looked at. */
final class TurnScan {
  /** Difference in depth over the turn below which no position counts as the worst. */
  private static final double LEAST_SPREAD = 1e-3;

  private TurnScan() {}

  /** Where the clipping rule gives the least depth for the deepest modulation; empty: nowhere. */
  static Map<String, Double> deepest(Assembly assembly, KitCases cases) {
    return least(assembly, cases, cases.deepestOverTheTurn(), List.of());
  }

  /** Where detector or power stage let go first as the test signal grows deeper. */
  static Map<String, Double> test(Assembly assembly, KitCases cases) {
    List<String> amplifiers =
        assembly.circuit().parts().stream()
            .filter(part -> part.device() instanceof AudioAmplifier)
            .map(CircuitPart::name)
            .toList();
    return least(assembly, cases, cases.testOverTheTurn(), amplifiers);
  }

  private static Map<String, Double> least(
      Assembly assembly, KitCases cases, List<SolveCase> turn, List<String> amplifiers) {
    List<FigureName> wanted = new ArrayList<>();
    for (SolveCase position : turn) {
      for (CircuitPart part : assembly.circuit().parts()) {
        if (part.device() instanceof Diode) {
          wanted.add(new FigureName(part.name(), Quantity.CLIPPING_DEPTH, position.name()));
        }
      }
      for (String amplifier : amplifiers) {
        wanted.add(new FigureName(amplifier, Quantity.OVERLOAD_DECIBELS, position.name()));
      }
    }
    if (wanted.isEmpty()) {
      return Map.of();
    }
    CompiledCircuit compiled = Engine.compile(assembly.circuit(), turn, wanted);
    double[] row = new double[wanted.size()];
    var unused = compiled.newSolver().solve(compiled.nominalValues(), row);
    double depth = assembly.design().conditions().core().testDepth();
    int worst = -1;
    double least = Double.POSITIVE_INFINITY;
    double most = 0;
    for (int i = 0; i < turn.size(); i++) {
      double here = depthAt(turn.get(i).name(), wanted, row, depth);
      most = Double.isInfinite(here) ? most : Math.max(most, here);
      if (here < least) {
        least = here;
        worst = i;
      }
    }
    return worst < 0 || most - least < LEAST_SPREAD ? Map.of() : cases.scan().get(worst);
  }

  /** The least depth at one position, infinite where nothing was solved there. */
  private static double depthAt(
      CaseName position, List<FigureName> wanted, double[] row, double testDepth) {
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < row.length; i++) {
      if (wanted.get(i).caseName().equals(position) && !Double.isNaN(row[i])) {
        boolean rule = wanted.get(i).quantity() == Quantity.CLIPPING_DEPTH;
        least = Math.min(least, rule ? row[i] : PowerStageDepth.of(testDepth, row[i]));
      }
    }
    return least;
  }
}
