package earward.kit.path;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitException;
import earward.engine.CompiledCircuit;
import earward.engine.Engine;
import earward.engine.Slot;
import earward.engine.SolveCase;
import earward.engine.SolveOutcome;
import java.util.Collection;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;

/** Solves an assembled kit in all its cases. */
public final class KitSolver {
  /** What an edit shows at once: the kit at rest, at the test signal and at full output. */
  private static final Set<CaseName> HEADLINE =
      Set.of(CaseName.NO_SIGNAL, CaseName.TEST, CaseName.FULL_OUTPUT);

  /** What an edit does not wait for: searches, and what takes many solves. */
  private static final Set<Quantity> LATER =
      EnumSet.of(
          Quantity.CLEAN_DEPTH,
          Quantity.REVERSAL_DEPTH,
          Quantity.NOISE_RMS_VOLTS,
          Quantity.A_WEIGHTED_NOISE_RMS_VOLTS,
          Quantity.RIPPLE_REJECTION_DECIBELS,
          Quantity.HUM_RMS_VOLTS,
          Quantity.RESPONSE_DEVIATION_DECIBELS,
          Quantity.RESPONSE_DEVIATION_HERTZ);

  /** What is solved for each kit of a batch. */
  private static final Set<CaseName> BATCH =
      Set.of(CaseName.NO_SIGNAL, CaseName.TEST, CaseName.FULL_OUTPUT, CaseName.HOTTEST);

  private static final Set<Quantity> BATCH_FIGURES =
      Set.of(
          Quantity.DC_VOLTS,
          Quantity.AUDIO_RMS_VOLTS,
          Quantity.DISTORTION,
          Quantity.SUPPLY_AMPERES,
          Quantity.DISSIPATION_WATTS,
          Quantity.JUNCTION_CELSIUS);

  private KitSolver() {}

  /**
   * The kit with its figures. An assembly that is not complete has none; its findings say why.
   *
   * @param assembly of the nominal kit
   */
  public static SolvedKit solve(Assembly assembly) {
    if (!assembly.complete()) {
      return new SolvedKit(assembly, Figures.NONE, List.of(), false);
    }
    try {
      CompiledKit compiled = compile(assembly);
      double[] row = new double[compiled.circuit().figures().size()];
      SolveOutcome outcome =
          compiled.circuit().newSolver().solve(compiled.circuit().nominalValues(), row);
      return new SolvedKit(
          assembly,
          compiled.figures(row),
          outcome.findings(),
          outcome.solved(),
          compiled.deepestKnobs());
    } catch (CircuitException e) {
      return new SolvedKit(assembly, Figures.NONE, List.of(e.finding()), false);
    }
  }

  /**
   * The kit compiled once for many solves. The deepest modulation is solved where the knobs are at
   * their worst, and so is the largest clean modulation: the turn of each is scanned.
   *
   * @param assembly a complete one
   * @throws CircuitException with a finding when the circuit makes no sense to the engine
   */
  public static CompiledKit compile(Assembly assembly) {
    KitCases cases = new KitCases(assembly);
    Map<String, Double> deepest = TurnScan.deepest(assembly, cases);
    Map<String, Double> worst = TurnScan.test(assembly, cases);
    List<FigureName> wanted =
        WantedFigures.of(assembly, new Places(assembly.circuit()), !worst.isEmpty());
    CompiledCircuit circuit = Engine.compile(assembly.circuit(), cases.all(deepest, worst), wanted);
    return new CompiledKit(assembly, circuit, deepest, worst);
  }

  /**
   * One figure of an assembly, with no more solved than it needs; NaN where it does not exist.
   *
   * @param assembly a complete one
   * @param name of the figure in the whole path
   */
  public static double figure(Assembly assembly, FigureName name) {
    Figures figures = figures(assembly, List.of(name));
    double own = figures.orNaN(name);
    return Double.isNaN(own)
        ? figures.orNaN(new FigureName("seam." + name.place(), name.quantity(), name.caseName()))
        : own;
  }

  /**
   * Some figures of an assembly, with no more solved than they need. A block's own place stands for
   * the seam by which it is entered. None at all where a case has no solution: whoever proves an
   * edit solves it whole and sees the finding.
   *
   * @param assembly a complete one
   * @param names of figures in the whole path
   */
  public static Figures figures(Assembly assembly, Collection<FigureName> names) {
    SolvedKit solved = solve(assembly, names);
    return solved.solved() ? solved.figures() : Figures.NONE;
  }

  /**
   * The kit with some of its figures, and what was found on solving for them: no more is solved
   * than they need.
   *
   * @param assembly a complete one
   * @param names of figures in the whole path
   */
  public static SolvedKit solve(Assembly assembly, Collection<FigureName> names) {
    try {
      CompiledKit kit = compile(assembly, names);
      double[] row = new double[kit.circuit().figures().size()];
      if (row.length == 0) {
        return new SolvedKit(assembly, Figures.NONE, List.of(), true);
      }
      SolveOutcome outcome = kit.circuit().newSolver().solve(kit.circuit().nominalValues(), row);
      return new SolvedKit(
          assembly, kit.figures(row), outcome.findings(), outcome.solved(), kit.deepestKnobs());
    } catch (CircuitException e) {
      return new SolvedKit(assembly, Figures.NONE, List.of(e.finding()), false);
    }
  }

  private static CompiledKit compile(Assembly assembly, Collection<FigureName> names) {
    Set<CaseName> asked = names.stream().map(FigureName::caseName).collect(Collectors.toSet());
    KitCases cases = new KitCases(assembly);
    Map<String, Double> deepest =
        asked.contains(CaseName.DEEPEST) ? TurnScan.deepest(assembly, cases) : Map.of();
    Map<String, Double> worst =
        asked.contains(CaseName.WORST_TURN) ? TurnScan.test(assembly, cases) : Map.of();
    Places places = new Places(assembly.circuit());
    List<FigureName> standing = WantedFigures.of(assembly, places, !worst.isEmpty());
    Set<FigureName> needed = new FigureNeeds(places, standing).of(names);
    List<SolveCase> only =
        cases.all(deepest, worst).stream()
            .filter(each -> needed.stream().anyMatch(of -> of.caseName().equals(each.name())))
            .toList();
    List<FigureName> wanted =
        needed.stream()
            .filter(of -> only.stream().anyMatch(each -> each.name().equals(of.caseName())))
            .toList();
    CompiledCircuit circuit = Engine.compile(assembly.circuit(), only, wanted);
    return new CompiledKit(assembly, circuit, deepest, worst);
  }

  /**
   * The kit compiled for the figures that an edit shows at once: all of {@link #compile} at rest,
   * at the test signal and at full output, but for depths that are a search, noise, hum, and the
   * deviation from the curve wanted. They are the same figures; the rest is left to a solve that
   * may take longer.
   *
   * @param assembly a complete one
   * @throws CircuitException with a finding when the circuit makes no sense to the engine
   */
  public static CompiledKit compileHeadline(Assembly assembly) {
    List<SolveCase> cases =
        new KitCases(assembly)
            .all(Map.of(), Map.of()).stream().filter(one -> HEADLINE.contains(one.name())).toList();
    List<FigureName> wanted =
        WantedFigures.of(assembly, new Places(assembly.circuit()), false).stream()
            .filter(figure -> HEADLINE.contains(figure.caseName()))
            .filter(figure -> !LATER.contains(figure.quantity()))
            .toList();
    CompiledCircuit circuit = Engine.compile(assembly.circuit(), cases, wanted);
    return new CompiledKit(assembly, circuit, Map.of(), Map.of());
  }

  /**
   * The kit compiled for what is asked of each kit of a batch: readings at all test points at rest
   * and with the test signal, the test distortion, supply currents and heat.
   *
   * @param assembly a complete one
   * @throws CircuitException with a finding when the circuit makes no sense to the engine
   */
  public static CompiledKit compileBatch(Assembly assembly) {
    List<SolveCase> cases =
        new KitCases(assembly)
            .all(Map.of(), Map.of()).stream().filter(one -> BATCH.contains(one.name())).toList();
    List<FigureName> wanted =
        WantedFigures.of(assembly, new Places(assembly.circuit()), false).stream()
            .filter(figure -> BATCH.contains(figure.caseName()))
            .filter(figure -> BATCH_FIGURES.contains(figure.quantity()))
            .toList();
    CompiledCircuit circuit = Engine.compile(assembly.circuit(), cases, wanted);
    return new CompiledKit(assembly, circuit, Map.of(), Map.of());
  }

  /**
   * The kit compiled for those of its figures that are asked for, with no more cases than they
   * need. The ambient is that of a row of values, but for the hottest case: a caller sets it.
   *
   * @param assembly a complete one
   * @param asked which figures of {@link #compile} are wanted
   * @throws CircuitException with a finding when the circuit makes no sense to the engine
   */
  public static CompiledKit compileKits(Assembly assembly, Predicate<FigureName> asked) {
    KitCases cases = new KitCases(assembly);
    List<FigureName> wanted =
        WantedFigures.of(assembly, new Places(assembly.circuit()), true).stream()
            .filter(asked)
            .toList();
    Set<CaseName> needed =
        wanted.stream().map(FigureName::caseName).collect(Collectors.toUnmodifiableSet());
    Map<String, Double> deepest =
        needed.contains(CaseName.DEEPEST) ? TurnScan.deepest(assembly, cases) : Map.of();
    Map<String, Double> worst =
        needed.contains(CaseName.WORST_TURN) ? TurnScan.test(assembly, cases) : Map.of();
    List<SolveCase> solved =
        cases.all(deepest, worst).stream()
            .filter(one -> needed.contains(one.name()))
            .map(KitSolver::atTheAmbientOfTheRow)
            .toList();
    Set<CaseName> there =
        solved.stream().map(SolveCase::name).collect(Collectors.toUnmodifiableSet());
    List<FigureName> found = wanted.stream().filter(f -> there.contains(f.caseName())).toList();
    CompiledCircuit circuit = Engine.compile(assembly.circuit(), solved, found);
    return new CompiledKit(assembly, circuit, deepest, worst);
  }

  private static SolveCase atTheAmbientOfTheRow(SolveCase one) {
    if (one.name().equals(CaseName.HOTTEST)) {
      return one;
    }
    Map<String, Double> overrides = new HashMap<>(one.overrides());
    overrides.remove(Slot.AMBIENT_CELSIUS);
    return new SolveCase(one.name(), one.drive(), overrides);
  }
}
