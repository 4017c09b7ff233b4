package earward.study.batch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;

class ChanceTest {
  private static final int DRAWS = 100_000;

  @Test
  void drawsAreEvenFromNoughtToOne() {
    long[] tenths = new long[10];
    double mean = 0;
    double squares = 0;
    for (int kit = 0; kit < DRAWS; kit++) {
      double draw = Chance.unit(7, kit, Chance.stream("volume.r1:ohms"));
      assertThat(draw).isGreaterThan(0).isLessThan(1);
      tenths[(int) (10 * draw)]++;
      mean += draw / DRAWS;
      squares += draw * draw / DRAWS;
    }
    double chiSquare = 0;
    for (long tenth : tenths) {
      chiSquare += Math.pow(tenth - DRAWS / 10.0, 2) / (DRAWS / 10.0);
    }
    assertThat(chiSquare).isLessThan(27.88); // 99.9 % of chi square with 9 degrees (tables)
    assertThat(mean).isCloseTo(0.5, within(0.004)); // 4 standard errors of 1/sqrt(12)
    assertThat(squares - mean * mean).isCloseTo(1 / 12.0, within(0.001));
  }

  @Test
  void partsAndKitsAndSeedsDrawApart() {
    double product = 0;
    double neighbours = 0;
    double seeds = 0;
    for (int kit = 0; kit < DRAWS; kit++) {
      double draw = Chance.evenly(7, kit, Chance.stream("volume.r1:ohms"));
      product += draw * Chance.evenly(7, kit, Chance.stream("volume.r2:ohms")) / DRAWS;
      neighbours += draw * Chance.evenly(7, kit + 1, Chance.stream("volume.r1:ohms")) / DRAWS;
      seeds += draw * Chance.evenly(8, kit, Chance.stream("volume.r1:ohms")) / DRAWS;
    }
    // independent even draws: the mean product is 0 with a standard error of 1/3/sqrt(N)
    assertThat(product).isCloseTo(0, within(0.0042));
    assertThat(neighbours).isCloseTo(0, within(0.0042));
    assertThat(seeds).isCloseTo(0, within(0.0042));
  }

  @Test
  void drawsAreTheSameOnEveryMachine() {
    Set<Long> streams = new HashSet<>();
    for (int i = 0; i < 10_000; i++) {
      streams.add(Chance.stream("part" + i + ":ohms"));
    }
    assertThat(streams).hasSize(10_000);
    assertThat(Chance.unit(1, 2, 3)).isEqualTo(Chance.unit(1, 2, 3));
    assertThat(Chance.unit(1, 2, 3)).isNotEqualTo(Chance.unit(1, 3, 2));
  }
}
