package earward.study.limits;

import earward.block.Role;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Solver;
import earward.kit.design.Bench;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import earward.study.batch.Batch;
import earward.study.batch.BatchOrder;
import earward.study.batch.BatchPlan;
import earward.study.batch.BatchProgress;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Works out limits from many drawn kits. */
public final class LimitStudy {
  /** An instrument that takes more than this share of a voltage cannot read it. */
  private static final double MOST_TAKEN = 0.25;

  private final Assembly assembly;
  private final LimitOrder order;
  private final BatchPlan plan;
  private final List<Meter> meters;

  private LimitStudy(Assembly assembly, LimitOrder order) {
    this.assembly = assembly;
    this.order = order;
    plan = BatchPlan.of(assembly, this::asked, order.habits());
    Bench bench = assembly.design().bench();
    meters =
        (bench.instruments().isEmpty() ? Bench.USUAL : bench)
            .instruments().stream().map(Meter::new).toList();
  }

  /**
   * The limits of a complete assembly's readings for the instruments of its bench.
   *
   * @param progress may end it: then there are none
   * @throws earward.engine.CircuitException where the circuit makes no sense to the engine
   */
  public static KitLimits of(Assembly assembly, LimitOrder order, BatchProgress progress) {
    return assembly.testPoints().isEmpty()
        ? KitLimits.NONE
        : new LimitStudy(assembly, order).limits(progress);
  }

  private boolean asked(FigureName figure) {
    boolean rest = figure.quantity() == Quantity.DC_VOLTS;
    if (figure.caseName().equals(CaseName.NO_SIGNAL)) {
      return rest;
    }
    boolean audio =
        figure.quantity() == Quantity.AUDIO_RMS_VOLTS
            || (figure.quantity() == Quantity.DISTORTION && figure.place().equals("path"));
    return order.withSignal() && figure.caseName().equals(CaseName.TEST) && (rest || audio);
  }

  private KitLimits limits(BatchProgress progress) {
    List<FigureName> figures = plan.readings().stream().filter(this::isReading).toList();
    int[] index = figures.stream().mapToInt(plan.readings()::indexOf).toArray();
    List<double[]> rows = new ArrayList<>();
    BatchOrder batch =
        new BatchOrder(order.kits(), order.seed(), order.threads(), false, order.habits());
    Batch.each(
        plan,
        batch,
        progress,
        (number, row) -> {
          if (row.length > 0) {
            rows.add(picked(row, index));
          }
        });
    if (rows.size() < 2) {
      return KitLimits.NONE;
    }
    return new LimitTable(assembly, figures, rows, meters, loadings(figures)).limits();
  }

  private boolean isReading(FigureName figure) {
    return assembly.testPoints().stream().anyMatch(p -> p.place().equals(figure.place()));
  }

  private static double[] picked(double[] row, int[] index) {
    double[] picked = new double[index.length];
    for (int i = 0; i < index.length; i++) {
      picked[i] = row[index[i]];
    }
    return picked;
  }

  /**
   * For each meter and figure: nominal reading without it and the share that is left with it, from
   * solves of the nominal kit. That share is taken to hold for all kits: kits differ in it by their
   * tolerances, which is a small part of a small part.
   */
  private List<List<Loading>> loadings(List<FigureName> figures) {
    Solver solver = plan.kit().circuit().newSolver();
    double[] open = new double[plan.kit().circuit().figures().size()];
    double[] loaded = new double[open.length];
    double[] values = plan.draw().nominal();
    var unused = solver.solve(values, open);
    List<List<Loading>> all = new ArrayList<>();
    for (Meter meter : meters) {
      List<Loading> ofMeter = new ArrayList<>();
      for (FigureName figure : figures) {
        int at = plan.kit().circuit().figure(figure);
        double volts = open[at];
        int slot = plan.kit().circuit().slot(figure.place() + ":meter-siemens");
        values[slot] = 1 / meter.inputOhms(volts);
        boolean solved = solver.solve(values, loaded).solved();
        values[slot] = 0;
        double left = solved && Math.abs(volts) > 1e-6 ? loaded[at] / volts : 1;
        ofMeter.add(new Loading(volts, left));
      }
      all.add(ofMeter);
    }
    return all;
  }

  /**
   * What a meter does to a nominal reading.
   *
   * @param volts without it
   * @param left share that is left with it
   */
  record Loading(double volts, double left) {
    boolean tooMuch() {
      return left < 1 - MOST_TAKEN;
    }
  }

  /** The test point at which the supply is read: the first supply's own. */
  static Optional<String> supplyPlace(Assembly assembly) {
    Set<String> supplies =
        assembly.beside().stream()
            .filter(block -> block.type().role() == Role.SUPPLY)
            .map(PlacedBlock::id)
            .collect(java.util.stream.Collectors.toSet());
    return assembly.testPoints().stream()
        .map(PlacedTestPoint::place)
        .filter(place -> supplies.contains(place.substring(0, Math.max(0, place.indexOf('.')))))
        .findFirst();
  }
}
