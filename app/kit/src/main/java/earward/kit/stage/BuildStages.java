package earward.kit.stage;

import static earward.kit.stage.SolvedStage.AT_REST;
import static earward.kit.stage.SolvedStage.CELL_VOLTS;
import static earward.kit.stage.SolvedStage.FIRST_POWER;
import static earward.kit.stage.SolvedStage.INJECTED;
import static earward.kit.stage.SolvedStage.JOINT_OHMS;

import earward.block.Role;
import earward.block.device.Adaptor;
import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.engine.CircuitPart;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.PartialKit;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The door of the build stages: a kit in, its stages with their figures out. */
public final class BuildStages {
  /** What is put into the plus lead of the supply, in ohms, from the least: common values. */
  private static final List<Double> SERIES_OHMS = List.of(10.0, 22.0, 47.0, 100.0, 220.0, 470.0);

  /** Share of the supply that it may take from a kit at rest, which must still work. */
  private static final double MOST_TAKEN = 0.15;

  private static final double NO_VOLTS = 1e-3;

  private final Assembly whole;

  private BuildStages(Assembly whole) {
    this.whole = whole;
  }

  /**
   * The stages of a kit, each solved as it stands, side by side.
   *
   * @param whole one that is not complete has no stages
   */
  public static List<SolvedStage> solve(Assembly whole) {
    if (!whole.complete() || whole.path().isEmpty()) {
      return List.of();
    }
    BuildStages stages = new BuildStages(whole);
    List<BuildStage> plan = StagePlan.of(whole);
    double series = stages.seriesOhms(plan.get(0));
    return plan.parallelStream().map(stage -> stages.solved(stage, series)).toList();
  }

  private SolvedStage solved(BuildStage stage, double series) {
    List<String> joints = joints(stage);
    Assembly partial = PartialKit.from(whole, stage.first(), toGround(joints));
    Map<CaseName, Map<String, Double>> cases = new HashMap<>();
    cases.put(AT_REST, PartialKit.knobs(partial, 1));
    if (series > 0) {
      cases.put(FIRST_POWER, withSeries(partial, series));
    }
    Figures rest = PartialKit.atRest(partial, cases);
    if (joints.isEmpty() || entersPower(stage)) {
      return new SolvedStage(stage, partial, joints, 0, series, rest);
    }
    Figures plus = injected(stage, joints, false);
    Figures minus = injected(stage, joints, true);
    boolean reversed = moved(partial, rest, minus) > 1.01 * moved(partial, rest, plus);
    Map<FigureName, Double> all = new HashMap<>(rest.all());
    all.putAll((reversed ? minus : plus).all());
    double volts = reversed ? -CELL_VOLTS : CELL_VOLTS;
    return new SolvedStage(stage, partial, joints, volts, series, new Figures(all));
  }

  /**
   * A cell would put its DC on the power stage's own input, which shows nothing and may hurt it.
   */
  private static boolean entersPower(BuildStage stage) {
    return stage.path().get(0).type().role() == Role.POWER;
  }

  /** The nodes by which the first fitted block is entered. */
  private List<String> joints(BuildStage stage) {
    if (stage.first() == 0) {
      return List.of();
    }
    PlacedBlock first = stage.path().get(0);
    Optional<Port> entry = first.description().wiring().entry();
    return entry.map(Port::nodes).orElse(List.of()).stream()
        .map(first::globalNode)
        .filter(node -> !node.equals(Nodes.GROUND))
        .distinct()
        .toList();
  }

  private static List<CircuitPart> toGround(List<String> joints) {
    return through(joints, Nodes.GROUND);
  }

  private static List<CircuitPart> through(List<String> joints, String end) {
    List<CircuitPart> parts = new ArrayList<>();
    for (String node : joints) {
      parts.add(
          new CircuitPart(
              "stage.joint-" + (parts.size() + 1),
              new Resistor(JOINT_OHMS),
              Map.of(Terminal.A, node, Terminal.B, end)));
    }
    return parts;
  }

  private Figures injected(BuildStage stage, List<String> joints, boolean reversed) {
    String cell = "stage.cell";
    List<CircuitPart> parts = new ArrayList<>(through(joints, cell));
    // its capacity is not asked for; the figures are a single cell's
    BatteryModel model =
        new BatteryModel("1.5 V cell", CELL_VOLTS, 0.3, 0.9, 0.9, 1, 0.1, 0.1, CELL_VOLTS, 0.5);
    parts.add(
        new CircuitPart(
            cell,
            new Battery(model),
            Map.of(
                reversed ? Terminal.MINUS : Terminal.PLUS,
                cell,
                reversed ? Terminal.PLUS : Terminal.MINUS,
                Nodes.GROUND)));
    Assembly partial = PartialKit.from(whole, stage.first(), parts);
    return PartialKit.atRest(partial, Map.of(INJECTED, PartialKit.knobs(partial, 1)));
  }

  /** By how much the readings move together, behind the cut itself. */
  private static double moved(Assembly partial, Figures rest, Figures injected) {
    double sum = 0;
    for (PlacedTestPoint point : partial.testPoints()) {
      double before = rest.find(point.place(), Quantity.DC_VOLTS, AT_REST).orElse(0);
      double after = injected.find(point.place(), Quantity.DC_VOLTS, INJECTED).orElse(0);
      sum += Math.max(0, Math.abs(after - before) - NO_VOLTS);
    }
    return sum;
  }

  /** The largest that leaves the first stage most of its supply; 0 where nothing can be said. */
  private double seriesOhms(BuildStage first) {
    Assembly partial = PartialKit.from(whole, first.first(), toGround(joints(first)));
    Figures rest = PartialKit.atRest(partial, Map.of(AT_REST, Map.of()));
    double ohms = 0;
    for (double tried : SERIES_OHMS) {
      boolean fits = true;
      boolean any = false;
      for (CircuitPart source : sources(partial)) {
        double amperes = rest.find(source.name(), Quantity.SUPPLY_AMPERES, AT_REST).orElse(0);
        any |= amperes > 0;
        fits &= amperes * tried <= MOST_TAKEN * nominal(source, "volts");
      }
      ohms = any && fits ? tried : ohms;
    }
    return ohms;
  }

  private static List<CircuitPart> sources(Assembly partial) {
    return partial.circuit().parts().stream()
        .filter(part -> part.device() instanceof Battery || part.device() instanceof Adaptor)
        .toList();
  }

  private static Map<String, Double> withSeries(Assembly partial, double ohms) {
    Map<String, Double> slots = new HashMap<>(PartialKit.knobs(partial, 0));
    for (CircuitPart source : sources(partial)) {
      slots.put(source.name() + ":internal-ohms", nominal(source, "internal-ohms") + ohms);
    }
    return slots;
  }

  private static double nominal(CircuitPart source, String parameter) {
    return source.device().parameters().stream()
        .filter(each -> each.name().equals(parameter))
        .findFirst()
        .orElseThrow()
        .nominal();
  }
}
