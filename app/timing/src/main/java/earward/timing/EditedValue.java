package earward.timing;

import earward.engine.CompiledCircuit;
import earward.engine.Slot;
import earward.engine.SolveOutcome;
import earward.engine.Solver;
import earward.kit.path.KitSolver;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;

/** The headline figures while one value after the other is edited; the structure stays. */
@State(Scope.Thread)
@SuppressWarnings("NullAway.Init") // JMH calls the method marked Setup first
public class EditedValue {
  /** One step of the E12 series (IEC 60063). */
  private static final double STEP = 1.2;

  /** The starter kit. */
  @Param("hayloft")
  public String name = "hayloft";

  private final List<double[]> rows = new ArrayList<>();
  private StarterKit kit;
  private Solver solver;
  private double[] figures;
  private int next;

  /** Compiles the kit; each row of values has one resistor or capacitor a step up. */
  @Setup
  public void compile() {
    kit = StarterKit.open(name);
    CompiledCircuit circuit = KitSolver.compileHeadline(kit.assembled()).circuit();
    List<Slot> slots = circuit.slots();
    for (int i = 0; i < slots.size(); i++) {
      if (slots.get(i).name().matches(".*:(ohms|farads)")) {
        double[] values = circuit.nominalValues();
        values[i] *= STEP;
        rows.add(values);
      }
    }
    if (rows.isEmpty()) {
      throw new IllegalStateException(name + " has no resistor and no capacitor");
    }
    solver = circuit.newSolver();
    figures = new double[circuit.figures().size()];
  }

  /** Closes its plug-ins. */
  @TearDown
  public void close() throws IOException {
    kit.close();
  }

  /** The headline after the next edit. */
  @Benchmark
  public double headline() {
    next = (next + 1) % rows.size();
    SolveOutcome outcome = solver.solve(rows.get(next), figures);
    if (!outcome.solved()) {
      throw new IllegalStateException("the edited kit was not solved: " + outcome.findings());
    }
    return figures[0];
  }
}
