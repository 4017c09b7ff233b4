package earward.study.matters;

import earward.block.figure.FigureName;
import earward.study.batch.Batch;
import earward.study.batch.BatchOrder;
import earward.study.batch.BatchPlan;
import earward.study.batch.BatchProgress;
import earward.study.batch.BatchResult;
import earward.study.batch.CheckOutcome;
import earward.study.batch.DrawnValue;
import earward.study.batch.Habits;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Finds which parts make the spread, and what other tolerances would do. */
public final class MattersStudy {
  private static final double TIGHTER = 0.5;
  private static final double LOOSER = 2;
  private static final int TRIED = 4;
  private static final double LEAST_SHARE = 0.01;

  private final BatchPlan plan;
  private final BatchOrder order;
  private final BatchProgress progress;

  private MattersStudy(BatchPlan plan, BatchOrder order, BatchProgress progress) {
    this.plan = plan;
    this.order = order;
    this.progress = progress;
  }

  /**
   * What matters in a batch. Shares are of kits without lots, whose parts are independent.
   *
   * @param plan of the batch
   * @param order its order
   * @param result what it gave
   * @param progress may end it: then what was found so far
   */
  public static Matters of(
      BatchPlan plan, BatchOrder order, BatchResult result, BatchProgress progress) {
    return new MattersStudy(plan, order, progress).run(result);
  }

  private Matters run(BatchResult result) {
    Habits usual = order.habits();
    Habits apart = new Habits(1, 0, usual.batteryUsed(), usual.ambientKelvin());
    BatchPlan independent = plan.with(plan.draw().with(apart));
    List<DrawnValue> values = plan.draw().values();
    List<FigureName> names = new ArrayList<>(plan.readings());
    plan.checks().forEach(held -> names.add(held.check().figure()));
    List<ShareTally> tallies = new ArrayList<>();
    names.forEach(name -> tallies.add(new ShareTally(values.size())));
    Batch.each(
        independent,
        order,
        progress,
        (number, figures) -> {
          double[] draws = independent.draw().draws(order.seed(), number);
          for (int i = 0; i < figures.length; i++) {
            tallies.get(i).add(draws, figures[i]);
          }
        });
    List<FigureShares> shares = new ArrayList<>();
    for (int i = 0; i < plan.readings().size(); i++) {
      FigureShares one = shares(names.get(i), tallies.get(i), values);
      if (!one.shares().isEmpty()) {
        shares.add(one);
      }
    }
    return new Matters(shares, trials(result, tallies, values));
  }

  private static FigureShares shares(FigureName name, ShareTally tally, List<DrawnValue> values) {
    List<PartShare> found = new ArrayList<>();
    for (int i = 0; i < values.size(); i++) {
      double share = tally.share(i);
      if (share >= LEAST_SHARE) {
        DrawnValue value = values.get(i);
        String parameter = value.name().substring(value.part().length() + 1);
        found.add(new PartShare(value.part(), parameter, share));
      }
    }
    found.sort(Comparator.comparingDouble(PartShare::share).reversed());
    return new FigureShares(name, found);
  }

  /** The parts that have most to do with failing checks tighter, those with least looser. */
  private List<ToleranceTrial> trials(
      BatchResult result, List<ShareTally> tallies, List<DrawnValue> values) {
    Map<String, Double> weight = new LinkedHashMap<>();
    values.forEach(value -> weight.put(value.part(), 0.0));
    for (int check = 0; check < result.checks().size(); check++) {
      CheckOutcome outcome = result.checks().get(check);
      if (outcome.held().forYield()) {
        double failing = outcome.failedShare() + 1e-6;
        ShareTally tally = tallies.get(plan.readings().size() + check);
        for (int i = 0; i < values.size(); i++) {
          weight.merge(values.get(i).part(), failing * tally.share(i), Double::sum);
        }
      }
    }
    List<String> parts = new ArrayList<>(weight.keySet());
    parts.sort(Comparator.comparingDouble((String part) -> -weight.getOrDefault(part, 0.0)));
    List<ToleranceTrial> trials = new ArrayList<>();
    int many = Math.min(TRIED, parts.size());
    if (result.passed() < result.kits()) {
      parts.subList(0, many).forEach(part -> trials.add(trial(part, TIGHTER, result)));
      trials.sort(Comparator.comparingDouble(ToleranceTrial::yieldAfter).reversed());
    }
    for (String part : parts.subList(parts.size() - many, parts.size())) {
      trials.add(trial(part, LOOSER, result));
    }
    return trials;
  }

  private ToleranceTrial trial(String part, double factor, BatchResult before) {
    List<DrawnValue> changed = new ArrayList<>();
    for (DrawnValue value : plan.draw().values()) {
      changed.add(value.part().equals(part) ? value.with(value.spread().scaled(factor)) : value);
    }
    BatchResult after = Batch.run(plan.with(plan.draw().with(changed)), order, progress);
    return new ToleranceTrial(part, factor, before.goodShare(), after.goodShare());
  }
}
