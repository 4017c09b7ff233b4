package earward.study.batch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class DistributionTest {
  private static final int KITS = 20_000;

  private static double[] even() {
    SplittableRandom random = new SplittableRandom(3);
    return random.doubles(KITS, 4, 6).toArray();
  }

  private static double[] normal() {
    SplittableRandom random = new SplittableRandom(4);
    NormalDistribution law = new NormalDistribution(null, 10, 0.5);
    return random.doubles(KITS).map(law::inverseCumulativeProbability).toArray();
  }

  private static Distribution of(double[] values) {
    Tally tally = new Tally(Arrays.copyOf(values, 128));
    for (double value : values) {
      tally.add(value);
    }
    return tally.distribution();
  }

  @Test
  void quantilesAreWithinTheStatedErrorOfTheSortedKits() {
    for (double[] values : new double[][] {even(), normal()}) {
      Distribution distribution = of(values);
      double[] sorted = values.clone();
      Arrays.sort(sorted);
      for (double share : new double[] {0.005, 0.05, 0.25, 0.5, 0.75, 0.95, 0.995}) {
        double exact = sorted[(int) Math.ceil(share * KITS) - 1];
        assertThat(distribution.quantile(share))
            .as("%s %%", 100 * share)
            .isCloseTo(exact, within(distribution.quantileError()));
      }
      assertThat(distribution.least()).isEqualTo(sorted[0]);
      assertThat(distribution.most()).isEqualTo(sorted[KITS - 1]);
      assertThat(distribution.bars(40).stream().mapToLong(Long::longValue).sum()).isEqualTo(KITS);
    }
  }

  /** Tails of the even law from 4 to 6 and of the normal law (tables: 2.5758 at 99.5 %). */
  @Test
  void tailsAreThoseOfTheLaw() {
    Distribution even = of(even());
    assertThat(even.quantile(0.995)).isCloseTo(5.99, within(0.004));
    assertThat(even.mean()).isCloseTo(5, within(0.017));
    assertThat(even.standardDeviation()).isCloseTo(2 / Math.sqrt(12), within(0.01));
    Distribution normal = of(normal());
    assertThat(normal.quantile(0.995)).isCloseTo(10 + 0.5 * 2.5758, within(0.05));
    assertThat(normal.standardDeviation()).isCloseTo(0.5, within(0.01));
  }

  @Test
  void whatDoesNotExistIsLeftOut() {
    Distribution none = of(new double[] {Double.NaN, Double.POSITIVE_INFINITY});
    assertThat(none.count()).isZero();
    assertThat(none.quantile(0.5)).isNaN();
    Distribution same = of(new double[] {0, 0, 0});
    assertThat(same.quantile(0.5)).isZero();
    assertThat(same.standardDeviation()).isZero();
  }
}
