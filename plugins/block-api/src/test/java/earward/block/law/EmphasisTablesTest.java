package earward.block.law;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Time constants of broadcasting and the curves that follow from them, in full. */
class EmphasisTablesTest {
  private static final double HALF_OF_LAST_DIGIT = 5.1e-3;

  @Test
  void theCornersOfTheTimeConstants() {
    // 75 µs 2122.07 Hz and 50 µs 3183.10 Hz (tables of broadcast standards); 18.294 µs is 8.7 kHz
    // (NRSC-1); ITU-R BS.450 gives 50 and 75 µs (from memory).
    assertThat(RcEdge.ofTimeConstant(75e-6)).isCloseTo(2122.07, within(HALF_OF_LAST_DIGIT));
    assertThat(RcEdge.ofTimeConstant(50e-6)).isCloseTo(3183.10, within(HALF_OF_LAST_DIGIT));
    assertThat(RcEdge.ofTimeConstant(18.294e-6))
        .isCloseTo(DeEmphasis.SECOND_CORNER_HERTZ, within(0.2));
    assertThat(DeEmphasis.NRSC_SECONDS).isEqualTo(75e-6);
  }

  @ParameterizedTest
  @CsvSource({
    "500, 0.11, 0.23",
    "1000, 0.41, 0.87",
    "2000, 1.45, 2.76",
    "3000, 2.76, 4.77",
    "4000, 4.11, 6.58",
    "5000, 5.40, 8.16",
    "7500, 8.16, 11.30",
    "10000, 10.36, 13.66",
    "12500, 12.15, 15.53",
    "15000, 13.66, 17.07"
  })
  void theSingleTimeConstants(double hertz, double fifty, double seventyFive) {
    // Computed from the admittance law of ITU-R BS.450 by a separate program; the end points 13.7
    // and 17.1 dB at 15 kHz are well known (from memory).
    assertThat(DeEmphasis.boostDecibels(hertz, 50e-6)).isCloseTo(fifty, within(HALF_OF_LAST_DIGIT));
    assertThat(DeEmphasis.boostDecibels(hertz, 75e-6))
        .isCloseTo(seventyFive, within(HALF_OF_LAST_DIGIT));
  }

  @ParameterizedTest
  @CsvSource({
    "50, 0.00, -0.81",
    "100, 0.01, -0.80",
    "400, 0.14, -0.67",
    "1000, 0.81, 0",
    "1500, 1.63, 0.82",
    "2000, 2.54, 1.72",
    "2500, 3.44, 2.62",
    "3000, 4.28, 3.47",
    "3500, 5.05, 4.24",
    "4000, 5.75, 4.94",
    "4500, 6.37, 5.56",
    "5000, 6.92, 6.11",
    "6000, 7.85, 7.04",
    "7000, 8.58, 7.77",
    "7500, 8.89, 8.07",
    "8000, 9.16, 8.35",
    "9000, 9.62, 8.81",
    "9500, 9.82, 9.01",
    "10000, 10.00, 9.19"
  })
  void theNorthAmericanCurve(double hertz, double overDirect, double overOneKilohertz) {
    // NRSC-1 as quoted over its value at 1 kHz: 1.72 dB at 2, 6.11 at 5 and 8.07 at 7.5 kHz; 10 dB
    // at 10 kHz over DC; the rows between are computed from the two corners by a separate program.
    double boost = DeEmphasis.nrscBoostDecibels(hertz);
    assertThat(boost).isCloseTo(overDirect, within(HALF_OF_LAST_DIGIT));
    assertThat(boost - DeEmphasis.nrscBoostDecibels(1000))
        .isCloseTo(overOneKilohertz, within(HALF_OF_LAST_DIGIT));
  }

  @Test
  void aPlainReceiverOvercutsABroadcastOfTheNorthAmericanCurve() {
    // 3.66 dB at 10 kHz, 1.24 dB at 5 kHz: the second corner alone.
    for (double[] row : new double[][] {{10e3, 3.66}, {5e3, 1.24}}) {
      assertThat(
              DeEmphasis.boostDecibels(row[0], DeEmphasis.NRSC_SECONDS)
                  - DeEmphasis.nrscBoostDecibels(row[0]))
          .isCloseTo(row[1], within(HALF_OF_LAST_DIGIT));
    }
  }

  @Test
  void theReceiversEdgeOfTheNorthAmericanCurveIsWhereTheBoostIsThreeDecibels() {
    assertThat(DeEmphasis.nrscBoostDecibels(DeEmphasis.nrscEdgeHertz()))
        .isCloseTo(10 * Math.log10(2), within(1e-9));
    // 18.294 µs is 8.7 kHz
    assertThat(DeEmphasis.NRSC_SECOND_SECONDS).isCloseTo(18.294e-6, within(1e-9));
  }
}
