package earward.filters;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.device.Resistor;
import earward.block.law.Butterworth;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A maximally flat low-pass of second or third order around a follower of unity gain, with equal
 * resistors. Its capacitors are the nearest of the series for the corner and the resistors.
 */
public final class ButterworthLowPass implements BlockType {
  private static final double LEAST_OHMS = 2.2e3;
  private static final double MOST_OHMS = 100e3;

  /** Above it the base current of a transistor costs level and flatness (judgement). */
  private static final double MOST_BASE_OHMS = 10e3;

  @Override
  public String id() {
    return "filter.butterworth";
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    List<Setting> settings = new ArrayList<>();
    settings.add(new Setting.Choice("order", List.of("second", "third")));
    settings.add(new Setting.Value("corner-hertz", Unit.HERTZ, 5e3, 300, 20e3, Series.ANY));
    settings.add(new Setting.Value("ohms", Unit.OHM, 47e3, LEAST_OHMS, MOST_OHMS, Series.E24));
    settings.addAll(Follower.settings());
    return settings;
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    double ohms = values.amount("ohms");
    double corner = values.amount("corner-hertz");
    WiringPlan plan = Wiring.from(new Single("in"));
    Follower.enter(plan, values);
    boolean third = third(values);
    plan.run("r1", new Resistor(ohms), third ? "first" : "second");
    if (third) {
      plan.down("c3", Film.of(fitted(Butterworth.THIRD_FIRST, ohms, corner)), GROUND)
          .run("r3", new Resistor(ohms), "second")
          .fit("r3", "c3");
    }
    plan.run("r2", new Resistor(ohms), "plus")
        .down(
            "c2",
            Film.of(
                fitted(third ? Butterworth.THIRD_INPUT : Butterworth.SECOND_INPUT, ohms, corner)),
            GROUND);
    Follower.follow(plan, values);
    plan.bridge(
            "c1",
            Film.of(
                fitted(
                    third ? Butterworth.THIRD_FEEDBACK : Butterworth.SECOND_FEEDBACK,
                    ohms,
                    corner)),
            "second",
            "drive")
        .fit("r1", "r2", "c1", "c2");
    Follower.leave(plan, values);
    return new BlockDescription(
        plan.to(new Single("out")),
        Follower.checks(values, conditions.highestToneHertz(), conditions.lowestToneHertz()),
        List.of());
  }

  private static boolean third(Values values) {
    return values.chosen("order", "third");
  }

  private static double fitted(double figure, double ohms, double corner) {
    return Series.E12.nearest(Butterworth.farads(figure, ohms, corner));
  }

  /** The resistors for which the capacitors of the series lie nearest to what is wanted. */
  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(
        asked -> {
          double best = LEAST_OHMS;
          boolean opAmp = asked.values().chosen("follower", "op-amp");
          double most = opAmp ? MOST_OHMS : MOST_BASE_OHMS;
          for (double ohms = LEAST_OHMS; ohms <= most; ohms = Series.E24.next(ohms)) {
            if (misfit(asked.values(), ohms) < misfit(asked.values(), best)) {
              best = ohms;
            }
          }
          return Map.of("ohms", new SettingValue.Amount(best));
        });
  }

  /** Sum of the squared relative misfits of the capacitors. */
  private static double misfit(Values values, double ohms) {
    List<Double> figures =
        third(values)
            ? List.of(Butterworth.THIRD_FIRST, Butterworth.THIRD_INPUT, Butterworth.THIRD_FEEDBACK)
            : List.of(Butterworth.SECOND_INPUT, Butterworth.SECOND_FEEDBACK);
    double sum = 0;
    for (double figure : figures) {
      double wanted = Butterworth.farads(figure, ohms, values.amount("corner-hertz"));
      double misfit = Math.log(Series.E12.nearest(wanted) / wanted);
      sum += misfit * misfit;
    }
    return sum;
  }
}
