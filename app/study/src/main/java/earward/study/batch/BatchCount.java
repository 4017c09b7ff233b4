package earward.study.batch;

import earward.block.check.Check;
import earward.block.check.Relation;
import earward.block.figure.FigureName;
import earward.engine.Slot;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Counts the kits of a batch as they come, in the order of their numbers. The first ones are held
 * until bins and scales can be laid out by them. For one thread.
 */
final class BatchCount {
  private static final int FIRST = 128;

  /** What stands for the deviation of a figure that hardly moves, as a share of its limit. */
  private static final double LEAST_DEVIATION = 1e-6;

  private final BatchPlan plan;
  private final BatchOrder order;
  private final int readings;
  private final List<double[]> first = new ArrayList<>();
  private final List<Tally> tallies = new ArrayList<>();
  private final long[] failed;
  private final long[] seen;
  private final double[] deviations;
  private final double[] means;
  private boolean laidOut;
  private long kits;
  private long passed;
  private long unsolved;
  private long worst = -1;
  private double worstMargin = Double.POSITIVE_INFINITY;
  private int worstCheck = -1;
  private double[] worstFigures = new double[0];

  BatchCount(BatchPlan plan, BatchOrder order) {
    this.plan = plan;
    this.order = order;
    readings = plan.readings().size();
    failed = new long[plan.checks().size()];
    seen = new long[failed.length];
    deviations = new double[readings + failed.length];
    means = new double[deviations.length];
  }

  void add(double[] figures) {
    if (laidOut) {
      count(figures);
      return;
    }
    first.add(figures);
    if (first.size() == FIRST) {
      layOut();
    }
  }

  private void layOut() {
    laidOut = true;
    List<double[]> solved = first.stream().filter(row -> row.length > 0).toList();
    for (int i = 0; i < deviations.length; i++) {
      int column = i;
      double[] values = solved.stream().mapToDouble(row -> row[column]).toArray();
      Tally trial = new Tally(values);
      for (double each : values) {
        trial.add(each);
      }
      deviations[i] = trial.standardDeviation();
      means[i] = trial.mean();
      tallies.add(new Tally(values));
    }
    first.forEach(this::count);
    first.clear();
  }

  private void count(double[] figures) {
    long number = kits++;
    if (figures.length == 0) {
      unsolved++;
      if (worstMargin > Double.NEGATIVE_INFINITY) {
        worst(number, Double.NEGATIVE_INFINITY, -1, figures);
      }
      return;
    }
    for (int i = 0; i < figures.length; i++) {
      tallies.get(i).add(figures[i]);
    }
    boolean good = true;
    double least = Double.POSITIVE_INFINITY;
    int leastCheck = -1;
    for (int i = 0; i < failed.length; i++) {
      BatchCheck held = plan.checks().get(i);
      double figure = figures[readings + i];
      if (!Double.isNaN(figure)) {
        boolean holds = held.check().relation().holds(figure, held.check().limit());
        seen[i]++;
        failed[i] += holds ? 0 : 1;
        good &= holds || !held.forYield();
        double margin = margin(held.check(), figure, deviations[readings + i]);
        if (held.forYield() && margin < least) {
          least = margin;
          leastCheck = i;
        }
      }
    }
    passed += good ? 1 : 0;
    double margin = leastCheck < 0 ? -distance(figures) : least;
    if (margin < worstMargin) {
      worst(number, margin, leastCheck, figures);
    }
  }

  private static double margin(Check check, double figure, double deviation) {
    double scale = Math.max(deviation, LEAST_DEVIATION * Math.abs(check.limit()));
    double inside =
        check.relation() == Relation.AT_MOST ? check.limit() - figure : figure - check.limit();
    double margin = inside / scale;
    return Double.isNaN(margin) ? Double.POSITIVE_INFINITY : margin;
  }

  /** How far a kit lies from the middle of all readings, in standard deviations. */
  private double distance(double[] figures) {
    double sum = 0;
    for (int i = 0; i < readings; i++) {
      double off = (figures[i] - means[i]) / deviations[i];
      sum += Double.isFinite(off) ? off * off : 0;
    }
    return Math.sqrt(sum);
  }

  private void worst(long number, double margin, int check, double[] figures) {
    worst = number;
    worstMargin = margin;
    worstCheck = check;
    worstFigures = figures;
  }

  BatchResult result() {
    if (!laidOut) {
      layOut();
    }
    double[] nominal = new KitRun(plan).nominal();
    List<ReadingSpread> spreads = new ArrayList<>();
    List<FigureName> names = plan.readings();
    for (int i = 0; i < readings; i++) {
      spreads.add(new ReadingSpread(names.get(i), at(nominal, i), tallies.get(i).distribution()));
    }
    List<CheckOutcome> outcomes = new ArrayList<>();
    for (int i = 0; i < failed.length; i++) {
      Distribution distribution = tallies.get(readings + i).distribution();
      outcomes.add(
          new CheckOutcome(
              plan.checks().get(i), seen[i], failed[i], at(nominal, readings + i), distribution));
    }
    return new BatchResult(
        order, kits, passed, unsolved, spreads, outcomes, plan.notLookedAt(), worstKit());
  }

  private static double at(double[] figures, int index) {
    return index < figures.length ? figures[index] : Double.NaN;
  }

  private Optional<WorstKit> worstKit() {
    if (worst < 0) {
      return Optional.empty();
    }
    double[] nominal = plan.draw().nominal();
    double[] row = nominal.clone();
    plan.draw().draw(order.seed(), worst, row);
    Map<String, Double> values = new LinkedHashMap<>();
    List<Slot> slots = plan.kit().circuit().slots();
    for (int i = 0; i < row.length; i++) {
      if (row[i] != nominal[i]) {
        values.put(slots.get(i).name(), row[i]);
      }
    }
    Map<FigureName, Double> figures = new LinkedHashMap<>();
    for (int i = 0; i < readings && i < worstFigures.length; i++) {
      figures.put(plan.readings().get(i), worstFigures[i]);
    }
    String code = worstCheck < 0 ? "" : plan.checks().get(worstCheck).check().code();
    return Optional.of(new WorstKit(worst, worstMargin, code, values, figures));
  }
}
