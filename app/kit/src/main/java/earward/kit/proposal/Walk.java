package earward.kit.proposal;

import earward.block.check.Finding.Measured;
import earward.block.check.Relation;
import earward.block.check.RemedyHint.Direction;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.path.PlacedBlock;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A walk of one value through its preferred series, one way, to the first that makes the figure
 * stand as it must. The steps taken double until it does, and the way back is halved, so that a
 * walk of sixteen steps solves at most nine times.
 */
final class Walk {
  private static final int MOST_STEPS = 16;

  private final Bench bench;
  private final PlacedBlock block;
  private final Setting.Value setting;
  private final Measured measured;
  private final Relation relation;
  private final List<Double> values;

  Walk(
      Bench bench,
      PlacedBlock block,
      Setting.Value setting,
      Direction direction,
      Measured measured,
      Relation relation) {
    this.bench = bench;
    this.block = block;
    this.setting = setting;
    this.measured = measured;
    this.relation = relation;
    this.values = values(direction);
  }

  private List<Double> values(Direction direction) {
    List<Double> ahead = new ArrayList<>();
    double value = block.values().amount(setting.id());
    while (ahead.size() < MOST_STEPS && value > 0) {
      value =
          direction == Direction.UP
              ? setting.series().next(value)
              : setting.series().previous(value);
      if (value < setting.least() || value > setting.most()) {
        break;
      }
      ahead.add(value);
    }
    return ahead;
  }

  /**
   * By how much the first step brings the figure nearer to its limit, as a share of the figure;
   * negative where it leads away, 0 where the setting has no part in it.
   */
  double gain() {
    if (values.isEmpty()) {
      return 0;
    }
    double after = figure(0);
    double change = (after - measured.value()) / Math.abs(measured.value());
    double nearer = relation == Relation.AT_LEAST ? change : -change;
    return Double.isFinite(nearer) ? nearer : 0;
  }

  /** The first edit on the way that makes the figure stand as it must. */
  Optional<Edit> first() {
    int failing = -1;
    int step = 0;
    while (step < values.size() && !holds(step)) {
      failing = step;
      step = step + 1 < values.size() ? Math.min(2 * step + 1, values.size() - 1) : values.size();
    }
    if (step >= values.size()) {
      return Optional.empty();
    }
    while (step - failing > 1) {
      int middle = (step + failing) / 2;
      if (holds(middle)) {
        step = middle;
      } else {
        failing = middle;
      }
    }
    return Optional.of(edit(step));
  }

  private boolean holds(int step) {
    return relation.holds(figure(step), measured.limit());
  }

  private double figure(int step) {
    return bench.figure(edit(step).of(bench.design()), measured.figure());
  }

  private Edit edit(int step) {
    return new Edit(block, setting, new SettingValue.Amount(values.get(step)));
  }
}
