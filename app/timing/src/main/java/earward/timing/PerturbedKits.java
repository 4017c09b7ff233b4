package earward.timing;

import earward.engine.CompiledCircuit;
import earward.engine.Slot;
import earward.engine.SolveOutcome;
import earward.engine.Solver;
import earward.kit.path.KitSolver;
import java.io.IOException;
import java.util.List;
import java.util.SplittableRandom;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;

/** A thousand kits of one design, each part off by up to its tolerance, through one solver. */
@State(Scope.Thread)
@SuppressWarnings("NullAway.Init") // JMH calls the method marked Setup first
public class PerturbedKits {
  static final int KITS = 1000;
  private static final long SEED = 20_261_201;

  /** The starter kit; Hayloft has the most parts. */
  @Param("hayloft")
  public String name = "hayloft";

  /** Whether all figures are solved, or those of a batch. */
  @Param({"false", "true"})
  public boolean all;

  private final double[][] rows = new double[KITS][];
  private StarterKit kit;
  private Solver solver;
  private double[] figures;
  private int next;

  /** Compiles the kit once and draws the thousand rows. */
  @Setup
  public void compile() {
    kit = StarterKit.open(name);
    CompiledCircuit circuit =
        (all ? KitSolver.compile(kit.assembled()) : KitSolver.compileBatch(kit.assembled()))
            .circuit();
    SplittableRandom random = new SplittableRandom(SEED);
    for (int i = 0; i < KITS; i++) {
      rows[i] = perturbed(circuit, random);
    }
    solver = circuit.newSolver();
    figures = new double[circuit.figures().size()];
  }

  /** Closes its plug-ins. */
  @TearDown
  public void close() throws IOException {
    kit.close();
  }

  /** Solves the next of the thousand. */
  @Benchmark
  public double oneKit() {
    next = (next + 1) % KITS;
    SolveOutcome outcome = solver.solve(rows[next], figures);
    if (!outcome.solved()) {
      throw new IllegalStateException("a kit was not solved: " + outcome.findings());
    }
    return figures[0];
  }

  private static double[] perturbed(CompiledCircuit circuit, SplittableRandom random) {
    double[] values = circuit.nominalValues();
    List<Slot> slots = circuit.slots();
    for (int i = 0; i < values.length; i++) {
      double tolerance = slots.get(i).tolerance().usualFraction();
      values[i] *= 1 + tolerance * (2 * random.nextDouble() - 1);
    }
    return values;
  }
}
