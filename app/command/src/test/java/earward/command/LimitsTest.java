package earward.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.design.AsWritten;
import earward.kit.design.Bench;
import earward.kit.design.Bench.AudioRange;
import earward.kit.design.Bench.Instrument;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembly;
import earward.study.batch.Batch;
import earward.study.batch.BatchOrder;
import earward.study.batch.BatchPlan;
import earward.study.batch.BatchProgress;
import earward.study.batch.Habits;
import earward.study.limits.KitLimits;
import earward.study.limits.LimitOrder;
import earward.study.limits.LimitStudy;
import earward.study.limits.PointLimits;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Limits of a starter kit's readings on its builders' instruments. */
class LimitsTest {
  private static final LimitOrder AT_REST = new LimitOrder(1000, 1, 2, false, Habits.USUAL);

  private static FigureName atRest(String place) {
    return new FigureName(place, Quantity.DC_VOLTS, CaseName.NO_SIGNAL);
  }

  private static KitLimits limits(KitDesign design, LimitOrder order) {
    return LimitStudy.of(TestKits.assembled(design), order, BatchProgress.NONE);
  }

  @Test
  void ninetyNineOfAHundredFreshKitsPassAllLimitsTogether() {
    Assembly assembly = TestKits.assembled(TestKits.starter("hayloft"));
    KitLimits limits = LimitStudy.of(assembly, AT_REST, BatchProgress.NONE);
    assertThat(limits.kits()).isEqualTo(1000);
    assertThat(limits.confidence()).isGreaterThan(0.95);
    assertThat(limits.supplyPlace()).contains("battery.rail");
    BatchPlan plan =
        BatchPlan.of(
            assembly,
            figure ->
                figure.quantity() == Quantity.DC_VOLTS
                    && figure.caseName().equals(CaseName.NO_SIGNAL),
            Habits.USUAL);
    int supply = plan.readings().indexOf(atRest("battery.rail"));
    int fresh = 3000;
    int[] passed = new int[1];
    Batch.each(
        plan,
        new BatchOrder(fresh, 99, 2, false, Habits.USUAL),
        BatchProgress.NONE,
        (number, row) -> {
          double above = row[supply] - limits.supplyVolts();
          boolean all =
              limits.points().stream()
                  .filter(PointLimits::readable)
                  .allMatch(
                      point -> {
                        int at = plan.readings().indexOf(point.figure());
                        return point.holds(row[at] * point.loadedShare(), above);
                      });
          passed[0] += all ? 1 : 0;
        });
    assertThat((double) passed[0] / fresh).isGreaterThanOrEqualTo(0.99);
  }

  /** Half of the supply stands at the output of a single-ended amplifier: limits follow it. */
  @Test
  void limitsFollowTheBuildersOwnSupply() {
    KitLimits limits = limits(TestKits.starter("hayloft"), AT_REST);
    PointLimits output = limits.of(atRest("power.output")).orElseThrow();
    assertThat(output.perSupplyVolt()).isCloseTo(0.5, within(0.01));
    assertThat(output.high() - output.low()).isLessThan(0.3);
    PointLimits rail = limits.of(atRest("battery.rail")).orElseThrow();
    assertThat(rail.perSupplyVolt()).isZero();
    assertThat(rail.high() - rail.low()).isGreaterThan(1);
  }

  @Test
  void aBetterMeterReadsAudioAndACheapOneSaysWhyNot() {
    KitDesign pocket = TestKits.starter("lantern");
    LimitOrder withSignal = new LimitOrder(40, 1, 2, true, Habits.USUAL);
    FigureName tone = new FigureName("loudspeaker.hot", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST);
    PointLimits unread = limits(pocket, withSignal).of(tone).orElseThrow();
    assertThat(unread.readable()).isFalse();
    assertThat(unread.trouble()).isEqualTo("no-audio");

    AudioRange audio = new AudioRange(true, 40, 1000, 0.001, 0.01);
    Instrument better =
        new Instrument("bench meter", 10e6, 0.005, 4000, Optional.of(audio), AsWritten.NEW);
    KitLimits limits =
        limits(pocket.withBench(new Bench(List.of(better), AsWritten.NEW)), withSignal);
    PointLimits read = limits.of(tone).orElseThrow();
    assertThat(read.instrument()).isEqualTo("bench meter");
    assertThat(read.expected()).isBetween(read.low(), read.high());
  }

  /** A needle of 20 kΩ/V on 2.5 V loads the detector: what it reads is told with its loading. */
  @Test
  void aNeedleIsToldWhatItReads() {
    Instrument needle = new Instrument("needle", 20e3, 0.03, 0, Optional.empty(), AsWritten.NEW);
    KitDesign design =
        TestKits.starter("hayloft").withBench(new Bench(List.of(needle), AsWritten.NEW));
    KitLimits limits = limits(design, new LimitOrder(20, 1, 2, true, Habits.USUAL));
    FigureName detected = new FigureName("detector.out", Quantity.DC_VOLTS, CaseName.TEST);
    PointLimits point = limits.of(detected).orElseThrow();
    assertThat(point.loadedShare()).isBetween(0.5, 0.95);
  }
}
