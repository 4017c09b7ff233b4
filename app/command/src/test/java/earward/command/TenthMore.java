package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Slot;
import earward.engine.Solver;
import earward.kit.path.CompiledKit;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/** A starter kit in which one value after the other is a tenth larger, and what that moves. */
final class TenthMore {
  /** What a reading must move by to have moved: solves agree to a few parts in 1e10 and better. */
  private static final double MOVED = 2e-9;

  private final CompiledKit kit;
  private final Solver solver;
  private final Map<String, Figures> changed = new HashMap<>();
  private final Figures nominal;

  /** What counts as not moved at all. */
  private final double still;

  TenthMore(String starterKit, double still) {
    this.still = still;
    kit = KitSolver.compileHeadline(TestKits.assembled(TestKits.starter(starterKit)));
    solver = kit.circuit().newSolver();
    nominal = solved(kit.circuit().nominalValues());
  }

  /** Names of the values that are there and can be a tenth larger. */
  Stream<String> slots() {
    return kit.circuit().slots().stream()
        .filter(slot -> slot.nominal() != 0 && Double.isFinite(slot.nominal()))
        .map(Slot::name);
  }

  void moves(String slot, List<String> places, Quantity quantity, CaseName name) {
    for (String place : places) {
      assertThat(share(slot, place, quantity, name))
          .as("%s by %s", place, slot)
          .isGreaterThan(MOVED);
    }
  }

  void leaves(String slot, List<String> places, Quantity quantity, CaseName name) {
    for (String place : places) {
      assertThat(share(slot, place, quantity, name)).as("%s by %s", place, slot).isLessThan(still);
    }
  }

  private double share(String slot, String place, Quantity quantity, CaseName name) {
    FigureName figure = new FigureName(place, quantity, name);
    double before = nominal.orNaN(figure);
    double after = changed.computeIfAbsent(slot, this::change).orNaN(figure);
    return before == 0 ? after : Math.abs(after / before - 1);
  }

  private Figures change(String slot) {
    double[] values = kit.circuit().nominalValues();
    values[kit.circuit().slot(slot)] *= 1.1;
    return solved(values);
  }

  private Figures solved(double[] values) {
    double[] row = new double[kit.circuit().figures().size()];
    assertThat(solver.solve(values, row).solved()).isTrue();
    return kit.figures(row);
  }
}
