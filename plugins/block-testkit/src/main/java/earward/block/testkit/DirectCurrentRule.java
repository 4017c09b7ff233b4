package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.check.Finding;
import earward.block.device.Capacitor;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.block.wiring.Wiring;
import earward.engine.Circuit;
import earward.engine.CircuitException;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Drive;
import earward.engine.Engine;
import earward.engine.SolveCase;
import earward.engine.SolveOutcome;
import earward.engine.Solver;
import earward.kit.path.Assembly;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * In the smallest whole kit, with the supply on and no carrier, the block has a DC solution in
 * numbers; so it has with each of its parts open, short and the wrong way round; and no
 * electrolytic capacitor of it stands the wrong way round.
 */
public final class DirectCurrentRule implements BlockRule {
  private static final SolveCase AT_REST =
      new SolveCase(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, Map.of());

  private static final List<String> FAULTS = List.of("open", "short", "reversed");

  /** Reverse voltage that an electrolytic capacitor bears for long (common practice). */
  private static final double MOST_REVERSE_VOLTS = 0.5;

  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    Set<Wiring> seen = new HashSet<>();
    for (Variation variation : variations) {
      variation
          .attempt(type)
          .filter(description -> seen.add(description.wiring()))
          .ifPresent(description -> tried(type, description, variation, faults));
    }
    return faults.all();
  }

  private static void tried(
      BlockType type, BlockDescription description, Variation variation, Faults faults) {
    Assembly assembly = TrialKit.around(type, description, variation);
    if (!assembly.complete()) {
      faults.addIn(
          variation, "it does not fit into a kit: " + TrialKit.sentences(assembly.findings()));
      return;
    }
    try {
      new Trial(assembly.circuit(), variation, faults).run();
    } catch (CircuitException e) {
      faults.addIn(variation, e.finding().sentence());
    }
  }

  /** One circuit at DC, healthy and with each fault. */
  private static final class Trial {
    private final Circuit circuit;
    private final Variation variation;
    private final boolean withFaults;
    private final Faults faults;
    private final CompiledCircuit compiled;
    private final Solver solver;
    private final double[] figures;

    Trial(Circuit circuit, Variation variation, Faults faults) {
      this.circuit = circuit;
      this.variation = variation;
      this.withFaults = variation.usual();
      this.faults = faults;
      compiled = Engine.compile(circuit, List.of(AT_REST), wanted(circuit));
      solver = compiled.newSolver();
      figures = new double[compiled.figures().size()];
    }

    private static List<FigureName> wanted(Circuit circuit) {
      return circuit.parts().stream()
          .flatMap(part -> part.nodes().values().stream())
          .distinct()
          .filter(node -> !node.equals(Circuit.GROUND))
          .map(Trial::directVolts)
          .toList();
    }

    private static FigureName directVolts(String node) {
      return new FigureName(node, Quantity.DC_VOLTS, CaseName.NO_SIGNAL);
    }

    void run() {
      if (!solves(compiled.nominalValues(), "as it is")) {
        return;
      }
      ownParts().forEach(this::polarity);
      if (!withFaults) {
        return;
      }
      for (CircuitPart part : ownParts()) {
        for (String fault : FAULTS) {
          double[] values = compiled.nominalValues();
          values[compiled.slot(part.name() + ":" + fault)] = 1;
          solves(values, "with part '" + local(part) + "' " + fault);
        }
      }
    }

    private List<CircuitPart> ownParts() {
      String prefix = TrialKit.BLOCK + ".";
      return circuit.parts().stream().filter(part -> part.name().startsWith(prefix)).toList();
    }

    private static String local(CircuitPart part) {
      return part.name().substring(TrialKit.BLOCK.length() + 1);
    }

    private boolean solves(double[] values, String how) {
      SolveOutcome outcome = solver.solve(values, figures);
      if (!outcome.solved()) {
        List<String> sentences = outcome.findings().stream().map(Finding::sentence).toList();
        faults.addIn(
            variation,
            "no DC solution " + how,
            "no DC solution " + how + ": " + String.join(" ", sentences));
        return false;
      }
      for (int i = 0; i < figures.length; i++) {
        if (!Double.isFinite(figures[i])) {
          faults.addIn(
              variation,
              how + ", " + compiled.figures().get(i) + " is " + figures[i] + "; wanted a number");
          return false;
        }
      }
      return true;
    }

    private void polarity(CircuitPart part) {
      if (!(part.device() instanceof Capacitor capacitor)
          || !capacitor.dielectric().polarised()
          || !part.nodes().keySet().containsAll(Set.of(Terminal.A, Terminal.B))) {
        return;
      }
      double volts = volts(part, Terminal.A) - volts(part, Terminal.B);
      if (volts < -MOST_REVERSE_VOLTS) {
        String which = "the electrolytic capacitor '" + local(part) + "' has ";
        faults.addIn(
            variation,
            which,
            which
                + Shown.quantity(volts, Unit.VOLT)
                + " from A to B; put its terminal A at the more positive node");
      }
    }

    private double volts(CircuitPart part, Terminal terminal) {
      String node = part.nodes().get(terminal);
      return node == null || node.equals(Circuit.GROUND)
          ? 0
          : figures[compiled.figure(directVolts(node))];
    }
  }
}
