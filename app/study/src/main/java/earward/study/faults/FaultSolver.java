package earward.study.faults;

import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.Loudspeaker;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Engine;
import earward.engine.SolveCase;
import earward.engine.Solver;
import earward.kit.design.Tolerances;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedTestPoint;
import earward.study.batch.Habits;
import earward.study.batch.KitDraw;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** The compiled circuit of a kit's faults, and how readings come out of a row. Immutable. */
public final class FaultSolver {
  private static final double HOT_WATTS = 0.5;
  private static final double HOT_SHARE = 2;

  private final Assembly assembly;
  private final CompiledCircuit circuit;
  private final KitDraw draw;
  private final List<Fault> faults;
  private final List<FaultReading> readings = new ArrayList<>();
  private final List<FigureName> figures = new ArrayList<>();
  private final List<Integer> heat = new ArrayList<>();
  private final List<Integer> supplies = new ArrayList<>();
  private final List<Integer> loudspeakers = new ArrayList<>();
  private int tone = -1;
  private int distortion = -1;

  /**
   * Compiles the faults of a complete assembly.
   *
   * @throws earward.engine.CircuitException where the circuit makes no sense to the engine
   */
  public FaultSolver(Assembly assembly, Habits habits) {
    this.assembly = assembly;
    FaultCircuit with = new FaultCircuit(assembly);
    List<SolveCase> cases = with.cases();
    List<CaseName> names = cases.stream().map(SolveCase::name).toList();
    wanted(with, names);
    circuit = Engine.compile(with.circuit(), cases, figures);
    for (CircuitPart part : assembly.circuit().parts()) {
      if (part.device() instanceof Loudspeaker) {
        loudspeakers.add(circuit.slot(part.name() + ":open"));
      }
    }
    faults = FaultList.of(assembly.circuit().parts(), with);
    Tolerances tolerances = assembly.design().tolerances();
    for (CircuitPart part : with.circuit().parts()) {
      if (assembly.circuit().parts().stream().noneMatch(p -> p.name().equals(part.name()))) {
        tolerances = tolerances.with(part.name(), 0);
      }
    }
    double ambient = assembly.design().conditions().core().ambientCelsius();
    draw = new KitDraw(with.circuit(), circuit, tolerances, ambient, habits);
  }

  private void wanted(FaultCircuit with, List<CaseName> cases) {
    for (PlacedTestPoint point : assembly.testPoints()) {
      if (with.ohmPlaces().contains(point.place())) {
        reading(point, "no-signal", Unit.VOLT, CaseName.NO_SIGNAL);
        if (cases.contains(CaseName.TEST)) {
          reading(point, "test", Unit.VOLT, CaseName.TEST);
        }
        if (with.injects()) {
          reading(point, "injection", Unit.VOLT, FaultCircuit.INJECTION);
        }
        reading(point, "ohms", Unit.OHM, FaultCircuit.ohms(point));
      }
    }
    FigureName supply = new FigureName("path", Quantity.SUPPLY_AMPERES, CaseName.NO_SIGNAL);
    readings.add(new FaultReading("supply:no-signal", "path", Unit.AMPERE, supply, false));
    for (CircuitPart part : assembly.circuit().parts()) {
      FigureName own = new FigureName(part.name(), Quantity.SUPPLY_AMPERES, CaseName.NO_SIGNAL);
      if (part.device() instanceof Battery || part.device() instanceof Adaptor) {
        supplies.add(add(own));
      } else if (part.device() instanceof AudioAmplifier) {
        heat.add(add(new FigureName(part.name(), Quantity.DISSIPATION_WATTS, CaseName.NO_SIGNAL)));
      }
    }
    if (cases.contains(CaseName.TEST)) {
      tone = add(new FigureName("path", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST));
      distortion = add(new FigureName("path", Quantity.DISTORTION, CaseName.TEST));
    }
  }

  private int add(FigureName figure) {
    figures.add(figure);
    return figures.size() - 1;
  }

  private void reading(PlacedTestPoint point, String kind, Unit unit, CaseName caseName) {
    FigureName figure = new FigureName(point.place(), Quantity.DC_VOLTS, caseName);
    add(figure);
    readings.add(
        new FaultReading(
            point.reference() + ":" + kind,
            point.place(),
            unit,
            figure,
            caseName.equals(CaseName.TEST)));
  }

  /** What was compiled. */
  public Assembly assembly() {
    return assembly;
  }

  /** All faults, the probable ones first. */
  public List<Fault> faults() {
    return faults;
  }

  /** All readings that a builder may take. */
  public List<FaultReading> readings() {
    return List.copyOf(readings);
  }

  /**
   * Index of a slot in a row of values.
   *
   * @throws IllegalArgumentException when there is none of this name
   */
  public int slot(String name) {
    return circuit.slot(name);
  }

  /** A solver for one thread. */
  public OneThread oneThread() {
    return new OneThread();
  }

  /** How healthy kits are drawn. */
  public KitDraw draw() {
    return draw;
  }

  /** Solves rows for one thread. */
  public final class OneThread {
    private final Solver solver = circuit.newSolver();
    private final double[] row = new double[figures.size()];
    private final double[] nominal = new double[figures.size()];

    /** A thread's own solver. */
    public OneThread() {
      double[] values = draw.nominal();
      var unused = solver.solve(values, nominal);
    }

    /** What a kit of these values with these faults shows. */
    public Signs signs(double[] values, List<Map<String, Double>> wrong) {
      double[] with = values.clone();
      for (Map<String, Double> one : wrong) {
        one.forEach((slot, value) -> with[circuit.slot(slot)] = value);
      }
      var unused = solver.solve(with, row);
      return read(with);
    }

    /** What the nominal kit with one fault shows; without any, an empty map. */
    public Signs signs(Map<String, Double> fault) {
      return signs(draw.nominal(), List.of(fault));
    }

    private Signs read(double[] solved) {
      List<Double> values = new ArrayList<>();
      for (int i = 0; i < readings.size() - 1; i++) {
        values.add(readings.get(i).unit() == Unit.OHM ? ohms(row[i]) : row[i]);
      }
      double amperes = 0;
      for (int supply : supplies) {
        amperes += row[supply];
      }
      values.add(amperes);
      return new Signs(values, tone(solved), hot());
    }

    private double ohms(double volts) {
      double left = FaultCircuit.OHMMETER_VOLTS - volts;
      double ohms = volts * FaultCircuit.OHMMETER_OHMS / left;
      return Double.isNaN(ohms)
          ? Double.NaN
          : left <= 0 ? ReadingError.MOST_OHMS : Math.min(ReadingError.MOST_OHMS, ohms);
    }

    /** A loudspeaker that is not connected is silent, whatever stands across its wires. */
    private Tone tone(double[] solved) {
      boolean open = loudspeakers.stream().allMatch(slot -> solved[slot] > 0.5);
      return tone < 0 || (open && !loudspeakers.isEmpty())
          ? Tone.SILENT
          : Tone.of(row[tone] / nominal[tone], row[distortion]);
    }

    private boolean hot() {
      for (int each : heat) {
        if (row[each] > HOT_WATTS && row[each] > HOT_SHARE * nominal[each]) {
          return true;
        }
      }
      return false;
    }
  }
}
