package earward.desktop.model;

import earward.block.figure.Quantity;
import earward.engine.CircuitException;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.CompiledKit;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import earward.kit.path.PlacedTestPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The values at the test points in the case that the case bar shows.
 *
 * @param points in the order of the path
 * @param standing of all of them
 */
public record LiveValues(List<Point> points, Standing standing) {
  /** Nothing is known yet. */
  public static final LiveValues NONE = new LiveValues(List.of(), Standing.NONE);

  /**
   * One test point.
   *
   * @param place its name in figures, {@code volume.wiper}
   * @param reference for instance TP3
   * @param where in words
   * @param dcVolts in V
   * @param audioVolts rms, in V
   * @param distortion as a share of 1
   * @param carrierVolts rms, in V
   */
  public record Point(
      String place,
      String reference,
      String where,
      double dcVolts,
      double audioVolts,
      double distortion,
      double carrierVolts) {}

  public LiveValues {
    points = List.copyOf(points);
  }

  /** The values that the readings of the design itself have; empty where the case is another. */
  public static Optional<LiveValues> of(Readings readings, CaseView view) {
    if (!view.ofTheDesign() || readings.assembly().isEmpty()) {
      return Optional.empty();
    }
    Assembly assembly = readings.assembly().get();
    List<Point> points = new ArrayList<>();
    for (PlacedTestPoint point : assembly.testPoints()) {
      points.add(
          point(
              assembly,
              point,
              quantity -> readings.find(point.place(), quantity, view.caseName()).value(),
              Double.NaN));
    }
    return Optional.of(new LiveValues(points, readings.standing()));
  }

  /** Solves the values of a case; off the event thread. */
  public static LiveValues solved(KitDesign design, CaseView view, Workshop workshop) {
    KitDesign variant = view.variant(design, workshop);
    Assembly assembly = Assembler.assemble(variant, workshop.types(), workshop.parts());
    if (!assembly.complete()) {
      return NONE;
    }
    try {
      CompiledKit compiled = KitSolver.compileHeadline(assembly);
      Figures figures = solve(compiled, Map.of());
      List<Point> points = new ArrayList<>();
      for (PlacedTestPoint point : assembly.testPoints()) {
        double read = view.asMeterReads() ? asRead(compiled, point, view, design) : Double.NaN;
        points.add(
            point(
                assembly,
                point,
                quantity ->
                    figures.find(point.place(), quantity, view.caseName()).orElse(Double.NaN),
                read));
      }
      return new LiveValues(points, Standing.SETTLED);
    } catch (CircuitException e) {
      return NONE; // the review says what is wrong with the circuit
    }
  }

  private static Figures solve(CompiledKit compiled, Map<String, Double> slots) {
    double[] values = compiled.circuit().nominalValues();
    slots.forEach((slot, value) -> values[compiled.circuit().slot(slot)] = value);
    double[] row = new double[compiled.circuit().figures().size()];
    compiled.circuit().newSolver().solve(values, row);
    return compiled.figures(row);
  }

  /** DC with the first meter of the bench on this point alone. */
  private static double asRead(
      CompiledKit compiled, PlacedTestPoint point, CaseView view, KitDesign design) {
    if (design.bench().instruments().isEmpty()) {
      return Double.NaN;
    }
    double ohms = design.bench().instruments().get(0).inputOhms();
    try {
      Figures figures = solve(compiled, Map.of(point.place() + ":meter-siemens", 1 / ohms));
      return figures.find(point.place(), Quantity.DC_VOLTS, view.caseName()).orElse(Double.NaN);
    } catch (IllegalArgumentException e) {
      return Double.NaN; // nothing can be hung on this place
    }
  }

  private static Point point(
      Assembly assembly,
      PlacedTestPoint point,
      java.util.function.ToDoubleFunction<Quantity> figure,
      double read) {
    return new Point(
        point.place(),
        point.reference(),
        where(assembly, point),
        Double.isNaN(read) ? figure.applyAsDouble(Quantity.DC_VOLTS) : read,
        figure.applyAsDouble(Quantity.AUDIO_RMS_VOLTS),
        figure.applyAsDouble(Quantity.DISTORTION),
        figure.applyAsDouble(Quantity.CARRIER_RMS_VOLTS));
  }

  private static String where(Assembly assembly, PlacedTestPoint point) {
    int dot = point.place().indexOf('.');
    if (!point.words().isEmpty() || dot < 0) {
      return point.words();
    }
    String id = point.place().substring(dot + 1);
    return assembly
        .block(point.place().substring(0, dot))
        .flatMap(block -> Texts.of(block.type()).find("test-point." + id))
        .orElse(point.place());
  }
}
