package earward.study.matters;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** Shares held against functions whose indices are published or follow in closed form. */
class ShareTallyTest {
  private static final int KITS = 200_000;

  private interface Law {
    double of(double[] draws);
  }

  private static ShareTally tally(int inputs, Law law) {
    SplittableRandom random = new SplittableRandom(12);
    ShareTally tally = new ShareTally(inputs);
    double[] draws = new double[inputs];
    for (int kit = 0; kit < KITS; kit++) {
      for (int i = 0; i < inputs; i++) {
        draws[i] = 2 * random.nextDouble() - 1;
      }
      tally.add(draws, law.of(draws));
    }
    return tally;
  }

  /**
   * sin x1 + 7 sin² x2 + 0.1 x3⁴ sin x1, each from −π to π: first-order indices 0.3139, 0.4424, 0
   * (Ishigami and Homma 1990; Saltelli et al., Global Sensitivity Analysis, 2008).
   */
  @Test
  void sharesOfTheIshigamiFunctionAreThePublishedOnes() {
    ShareTally tally =
        tally(
            3,
            draws -> {
              double a = Math.PI * draws[0];
              double b = Math.PI * draws[1];
              double c = Math.PI * draws[2];
              double sine = Math.sin(b);
              return Math.sin(a) + 7 * sine * sine + 0.1 * Math.pow(c, 4) * Math.sin(a);
            });
    assertThat(tally.share(0)).isCloseTo(0.3139, within(0.012));
    assertThat(tally.share(1)).isCloseTo(0.4424, within(0.03)); // sixteen bins for two periods
    assertThat(tally.share(2)).isCloseTo(0, within(0.003));
  }

  /**
   * Product of (|4x − 2| + a)/(1 + a) with a = 0, 1, 4.5, 9, x from 0 to 1: first-order indices by
   * V_i = 1/(3(1 + a)²) over Π(1 + V_i) − 1 (Sobol' 1993).
   */
  @Test
  void sharesOfSobolsProductAreThoseOfItsClosedForm() {
    double[] a = {0, 1, 4.5, 9};
    ShareTally tally =
        tally(
            a.length,
            draws -> {
              double product = 1;
              for (int i = 0; i < a.length; i++) {
                product *= (Math.abs(2 * draws[i]) + a[i]) / (1 + a[i]);
              }
              return product;
            });
    double whole = 1;
    for (double each : a) {
      whole *= 1 + 1 / (3 * (1 + each) * (1 + each));
    }
    for (int i = 0; i < a.length; i++) {
      double own = 1 / (3 * (1 + a[i]) * (1 + a[i]));
      assertThat(tally.share(i)).isCloseTo(own / (whole - 1), within(0.015));
    }
  }

  @Test
  void aWeightedSumSharesByTheSquares() {
    ShareTally tally = tally(3, draws -> 3 * draws[0] + 2 * draws[1] + 0.0001 * draws[2]);
    assertThat(tally.share(0)).isCloseTo(9.0 / 13, within(0.01));
    assertThat(tally.share(1)).isCloseTo(4.0 / 13, within(0.01));
    assertThat(tally.share(2)).isCloseTo(0, within(0.002));
  }
}
