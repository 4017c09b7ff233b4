package earward.kit.path;

import earward.block.device.Adaptor;
import earward.block.device.Battery;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.wiring.Nodes;
import earward.engine.Circuit;
import earward.engine.CircuitException;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Drive;
import earward.engine.Engine;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/**
 * A kit of which only the end is fitted: the blocks from one of the path on, the supplies, and the
 * take-offs that hang on what is fitted. It is a circuit of the same engine, with whatever the
 * builder connects where the path is cut; references and test-point numbers are the whole kit's.
 */
public final class PartialKit {
  private PartialKit() {}

  /**
   * The assembly of the blocks from one of the path on.
   *
   * @param whole a complete assembly
   * @param first index of the first block of the path that is fitted
   * @param connected what the builder connects beside the kit's own parts
   */
  public static Assembly from(Assembly whole, int first, List<CircuitPart> connected) {
    List<PlacedBlock> path = whole.path().subList(first, whole.path().size());
    List<PlacedBlock> beside = fitted(whole, path);
    Set<String> nodes = new LinkedHashSet<>(Set.of(Nodes.GROUND));
    Stream.concat(path.stream(), beside.stream())
        .forEach(block -> nodes.addAll(block.globalNodes().values()));
    TestPoints testPoints = new TestPoints(whole.design(), path, beside, nodes);
    Circuit own = new CircuitBuilder(path, beside, testPoints).build(whole.design().conditions());
    List<CircuitPart> parts = new ArrayList<>(own.parts());
    parts.addAll(connected);
    Circuit circuit = new Circuit(parts, own.seams(), own.probes(), own.frontEnd(), own.curve());
    return new Assembly(
        whole.design(),
        path,
        beside,
        circuit,
        testPoints.placed(whole.references()),
        whole.references(),
        List.of(),
        true);
  }

  /** Supplies, and the take-offs whose every node belongs to what is fitted. */
  private static List<PlacedBlock> fitted(Assembly whole, List<PlacedBlock> path) {
    Set<String> nodes = new LinkedHashSet<>(Set.of(Nodes.GROUND));
    path.forEach(block -> nodes.addAll(block.globalNodes().values()));
    return whole.beside().stream()
        .filter(
            block ->
                block.entry().joinsAt().map(nodes::contains).orElse(true)
                    || block.entry().joinsAt().filter(Nodes::isShared).isPresent())
        .toList();
  }

  /**
   * DC of every test point and the current of every source, without a signal, in each of the cases.
   *
   * @param partial from {@link #from}
   * @param cases slots that differ from the nominal kit, by case
   * @return no figures where the circuit has no solution
   */
  public static Figures atRest(Assembly partial, Map<CaseName, Map<String, Double>> cases) {
    List<SolveCase> solved = new ArrayList<>();
    List<FigureName> wanted = new ArrayList<>();
    Map<String, Double> usual = new KitCases(partial).atTest();
    cases.forEach(
        (name, slots) -> {
          Map<String, Double> overrides = new HashMap<>(usual);
          overrides.putAll(slots);
          solved.add(new SolveCase(name, Drive.NO_SIGNAL, overrides));
          wanted.addAll(wanted(partial, name));
        });
    try {
      CompiledCircuit circuit = Engine.compile(partial.circuit(), solved, wanted);
      double[] row = new double[wanted.size()];
      if (!circuit.newSolver().solve(circuit.nominalValues(), row).solved()) {
        return Figures.NONE;
      }
      Map<FigureName, Double> figures = new HashMap<>();
      for (int i = 0; i < row.length; i++) {
        figures.put(wanted.get(i), row[i]);
      }
      return new Figures(figures);
    } catch (CircuitException e) {
      return Figures.NONE; // the sheet then prints dashes: nothing is known of this stage
    }
  }

  /**
   * The slots of every knob that is fitted, all at one place of their turn.
   *
   * @param partial from {@link #from}
   * @param turn from 0 to 1
   */
  public static Map<String, Double> knobs(Assembly partial, double turn) {
    Map<String, Double> slots = new HashMap<>();
    new Knobs(partial).slots().forEach(slot -> slots.put(slot, turn));
    return slots;
  }

  private static List<FigureName> wanted(Assembly partial, CaseName name) {
    List<FigureName> wanted = new ArrayList<>();
    for (PlacedTestPoint point : partial.testPoints()) {
      wanted.add(new FigureName(point.place(), Quantity.DC_VOLTS, name));
    }
    for (CircuitPart part : partial.circuit().parts()) {
      if (part.device() instanceof Battery || part.device() instanceof Adaptor) {
        wanted.add(new FigureName(part.name(), Quantity.SUPPLY_AMPERES, name));
      }
    }
    return wanted;
  }
}
