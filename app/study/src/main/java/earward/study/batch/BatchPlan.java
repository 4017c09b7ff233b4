package earward.study.batch;

import earward.block.check.Check;
import earward.block.check.Severity;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.path.Assembly;
import earward.kit.path.CompiledKit;
import earward.kit.path.KitSolver;
import earward.kit.path.PlacedTestPoint;
import earward.kit.review.KitCheck;
import earward.kit.review.Reviewer;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;

/**
 * A design made ready for a batch: compiled circuit, draw, readings and checks. Immutable; shared
 * by all threads.
 */
public final class BatchPlan {
  /** Cases of a batch that is not full. */
  private static final Set<CaseName> CASES =
      Set.of(CaseName.NO_SIGNAL, CaseName.TEST, CaseName.FULL_OUTPUT, CaseName.HOTTEST);

  private static final Set<Quantity> QUANTITIES =
      EnumSet.of(
          Quantity.DC_VOLTS,
          Quantity.AUDIO_RMS_VOLTS,
          Quantity.SUPPLY_AMPERES,
          Quantity.DISSIPATION_WATTS,
          Quantity.JUNCTION_CELSIUS,
          Quantity.CLIP_WATTS);

  /** Searches and sweeps of many solves, which only a full batch makes. */
  private static final Set<Quantity> SLOW =
      EnumSet.of(
          Quantity.CLEAN_DEPTH,
          Quantity.REVERSAL_DEPTH,
          Quantity.NOISE_RMS_VOLTS,
          Quantity.A_WEIGHTED_NOISE_RMS_VOLTS,
          Quantity.RIPPLE_REJECTION_DECIBELS,
          Quantity.HUM_RMS_VOLTS,
          Quantity.RAIL_LOOP_MARGIN_DECIBELS,
          Quantity.RESPONSE_DEVIATION_DECIBELS,
          Quantity.RESPONSE_DEVIATION_HERTZ);

  /**
   * Cases with a modulated carrier of their own: there only what the bare carrier gives is quick.
   */
  private static final Set<CaseName> MODULATED =
      Set.of(CaseName.WEAK, CaseName.STRONG, CaseName.DEEPEST, CaseName.FULL_VOLUME);

  private static final Set<Quantity> OF_BARE_CARRIER =
      EnumSet.of(Quantity.CLIPPING_DEPTH, Quantity.CARRIER_PEAK_VOLTS);

  private final Assembly assembly;
  private final CompiledKit kit;
  private final KitDraw draw;
  private final List<BatchCheck> checks;
  private final List<String> notLookedAt;
  private final KitFigures figures;
  private final int readings;

  private BatchPlan(
      Assembly assembly,
      CompiledKit kit,
      KitDraw draw,
      List<BatchCheck> checks,
      List<String> notLookedAt,
      List<FigureName> readings) {
    this.assembly = assembly;
    this.kit = kit;
    this.draw = draw;
    this.checks = List.copyOf(checks);
    this.notLookedAt = List.copyOf(notLookedAt);
    this.readings = readings.size();
    List<FigureName> names = new ArrayList<>(readings);
    checks.forEach(held -> names.add(held.check().figure()));
    figures = new KitFigures(kit, names);
  }

  /**
   * A complete assembly made ready.
   *
   * @throws earward.engine.CircuitException where the circuit makes no sense to the engine
   */
  public static BatchPlan of(Assembly assembly, boolean full, Habits habits) {
    Set<FigureName> checked = new HashSet<>();
    checks(assembly).forEach(held -> checked.addAll(namesOf(held.check().figure())));
    return of(
        assembly,
        figure -> full || isUsual(figure) || (checked.contains(figure) && isQuick(figure)),
        habits);
  }

  private static boolean isQuick(FigureName figure) {
    return !SLOW.contains(figure.quantity())
        && (!MODULATED.contains(figure.caseName()) || OF_BARE_CARRIER.contains(figure.quantity()));
  }

  /**
   * A complete assembly made ready for some of its figures: those readings and checks that they
   * suffice for.
   *
   * @param asked which figures of the kit are solved
   * @throws earward.engine.CircuitException where the circuit makes no sense to the engine
   */
  public static BatchPlan of(Assembly assembly, Predicate<FigureName> asked, Habits habits) {
    List<BatchCheck> all = checks(assembly);
    CompiledKit kit = KitSolver.compileKits(assembly, asked);
    KitDraw draw =
        new KitDraw(
            assembly.circuit(),
            kit.circuit(),
            assembly.design().tolerances(),
            assembly.design().conditions().core().ambientCelsius(),
            habits);
    double[] any = new double[kit.circuit().figures().size()];
    Arrays.fill(any, 1);
    Set<FigureName> there = kit.figures(any).all().keySet();
    List<BatchCheck> held = new ArrayList<>();
    List<String> left = new ArrayList<>();
    for (BatchCheck each : all) {
      namesOf(each.check().figure()).stream()
          .filter(there::contains)
          .findFirst()
          .ifPresentOrElse(name -> held.add(at(each, name)), () -> left.add(each.check().code()));
    }
    List<FigureName> readings = readings(assembly).stream().filter(there::contains).toList();
    return new BatchPlan(assembly, kit, draw, held, left.stream().distinct().toList(), readings);
  }

  private static boolean isUsual(FigureName figure) {
    if (!CASES.contains(figure.caseName())) {
      return false;
    }
    boolean ofPath = figure.place().equals("path");
    return QUANTITIES.contains(figure.quantity())
        || (ofPath
            && (figure.quantity() == Quantity.DISTORTION
                || figure.quantity() == Quantity.LOW_EDGE_HERTZ));
  }

  private static List<BatchCheck> checks(Assembly assembly) {
    List<BatchCheck> checks = new ArrayList<>();
    for (KitCheck each : Reviewer.checks(assembly)) {
      boolean forYield = each.wanted() || each.check().severity() == Severity.STOP;
      checks.add(new BatchCheck(each.check(), each.subject(), forYield));
    }
    return checks;
  }

  /** A block's own place stands for the seam by which it is entered. */
  private static List<FigureName> namesOf(FigureName name) {
    return List.of(name, new FigureName("seam." + name.place(), name.quantity(), name.caseName()));
  }

  private static BatchCheck at(BatchCheck held, FigureName name) {
    Check check = held.check();
    Check placed =
        new Check(
            check.code(),
            check.severity(),
            name,
            check.relation(),
            check.limit(),
            check.source(),
            check.remedies());
    return new BatchCheck(placed, held.subject(), held.forYield());
  }

  private static Set<FigureName> readings(Assembly assembly) {
    Set<FigureName> names = new LinkedHashSet<>();
    for (PlacedTestPoint point : assembly.testPoints()) {
      names.add(new FigureName(point.place(), Quantity.DC_VOLTS, CaseName.NO_SIGNAL));
      names.add(new FigureName(point.place(), Quantity.DC_VOLTS, CaseName.TEST));
      names.add(new FigureName(point.place(), Quantity.AUDIO_RMS_VOLTS, CaseName.TEST));
    }
    names.add(new FigureName("path", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST));
    names.add(new FigureName("path", Quantity.DISTORTION, CaseName.TEST));
    names.add(new FigureName("path", Quantity.LOW_EDGE_HERTZ, CaseName.TEST));
    names.add(new FigureName("path", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT));
    for (CaseName name : List.of(CaseName.NO_SIGNAL, CaseName.TEST, CaseName.FULL_OUTPUT)) {
      names.add(new FigureName("path", Quantity.SUPPLY_AMPERES, name));
    }
    assembly
        .circuit()
        .parts()
        .forEach(
            part -> {
              names.add(new FigureName(part.name(), Quantity.DISSIPATION_WATTS, CaseName.HOTTEST));
              names.add(new FigureName(part.name(), Quantity.JUNCTION_CELSIUS, CaseName.HOTTEST));
            });
    return names;
  }

  /** What was made ready. */
  public Assembly assembly() {
    return assembly;
  }

  /** The compiled kit: the slots and figures of a row. */
  public CompiledKit kit() {
    return kit;
  }

  /** How kits are drawn. */
  public KitDraw draw() {
    return draw;
  }

  /** The same plan with another draw of the same circuit. */
  public BatchPlan with(KitDraw other) {
    return new BatchPlan(assembly, kit, other, checks, notLookedAt, readings());
  }

  /** The checks that are held. */
  public List<BatchCheck> checks() {
    return checks;
  }

  /** Codes of the checks whose figures are not solved. */
  public List<String> notLookedAt() {
    return notLookedAt;
  }

  /** The readings whose spread is told. */
  public List<FigureName> readings() {
    return figures.names().subList(0, readings);
  }

  /** Readings, then the checks' figures, out of a solved row. */
  double[] figures(double[] row) {
    return figures.of(row);
  }
}
