package earward.study.limits;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class JointWidthTest {
  private static final int READINGS = 12;

  private static double[][] kits(long seed, int kits) {
    SplittableRandom random = new SplittableRandom(seed);
    double[][] columns = new double[READINGS][kits];
    for (int kit = 0; kit < kits; kit++) {
      double common = random.nextGaussian();
      for (int i = 0; i < READINGS; i++) {
        columns[i][kit] = i + 0.1 * (0.5 * common + random.nextGaussian());
      }
    }
    return columns;
  }

  @Test
  void atLeastNinetyNineOfAHundredFreshKitsPassAllLimitsTogether() {
    JointWidth width = new JointWidth(kits(1, 1000), ToleranceRank.of(1000, 0.99));
    int passed = 0;
    int fresh = 20_000;
    double[][] columns = kits(2, fresh);
    for (int kit = 0; kit < fresh; kit++) {
      boolean all = true;
      for (int i = 0; i < READINGS; i++) {
        all &= columns[i][kit] >= width.low(i) && columns[i][kit] <= width.high(i);
      }
      passed += all ? 1 : 0;
    }
    assertThat((double) passed / fresh).isBetween(0.99, 0.9999);
  }

  /** Published ranks: 299 kits are the least of which none may be left out, 473 for one (Wilks). */
  @Test
  void ranksAreThoseOfTheDistributionFreeToleranceLimit() {
    assertThat(ToleranceRank.of(299, 0.99)).isEqualTo(299);
    assertThat(ToleranceRank.confidence(299, 299, 0.99)).isCloseTo(0.9505, within(1e-4));
    assertThat(ToleranceRank.confidence(298, 298, 0.99)).isLessThan(0.95);
    assertThat(ToleranceRank.of(473, 0.99)).isEqualTo(472);
    assertThat(ToleranceRank.of(472, 0.99)).isEqualTo(472);
  }
}
