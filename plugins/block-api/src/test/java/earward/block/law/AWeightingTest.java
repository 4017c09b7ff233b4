package earward.block.law;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The weighting curve against its printed table. */
class AWeightingTest {
  /** IEC 61672-1, table of design goals, exact frequencies of the nominal ones; from memory. */
  @ParameterizedTest
  @CsvSource({
    "31.62, -39.4",
    "100, -19.1",
    "199.5, -10.9",
    "501.2, -3.2",
    "1000, 0",
    "1995, 1.2",
    "3981, 1.0",
    "10000, -2.5",
    "19953, -9.3"
  })
  void theTableOfTheStandard(double hertz, double decibels) {
    assertThat(AWeighting.decibels(hertz)).isCloseTo(decibels, within(0.06));
  }
}
