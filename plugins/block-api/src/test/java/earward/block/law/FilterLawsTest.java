package earward.block.law;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FilterLawsTest {
  /** Filter handbooks (from memory): 1.414 and 0.7071; 3.546, 1.392 and 0.2024. */
  @Test
  void theCapacitorsAreThoseOfTheHandbooks() {
    assertThat(Butterworth.SECOND_FEEDBACK).isCloseTo(1.414, within(5e-4));
    assertThat(Butterworth.SECOND_INPUT).isCloseTo(0.7071, within(5e-5));
    assertThat(Butterworth.THIRD_FEEDBACK).isCloseTo(3.546, within(1e-3));
    assertThat(Butterworth.THIRD_FIRST).isCloseTo(1.392, within(1e-3));
    assertThat(Butterworth.THIRD_INPUT).isCloseTo(0.2024, within(1e-4));
  }

  /** The denominator of the third order is s³ + 2s² + 2s + 1. */
  @Test
  void theThirdOrderHasItsDenominator() {
    double first = Butterworth.THIRD_FIRST;
    double input = Butterworth.THIRD_INPUT;
    double feedback = Butterworth.THIRD_FEEDBACK;
    assertThat(first * input * feedback).isCloseTo(1, within(1e-12));
    assertThat(2 * input * (first + feedback)).isCloseTo(2, within(1e-6));
    assertThat(first + 3 * input).isCloseTo(2, within(1e-12));
  }

  /** Unity-gain Sallen-Key at 5 kHz with 10 kΩ: 4.502 and 2.251 nF; an octave above: 12.30 dB. */
  @Test
  void aWorkedLowPassComesOut() {
    assertThat(Butterworth.farads(Butterworth.SECOND_FEEDBACK, 10e3, 5e3))
        .isCloseTo(4.502e-9, within(5e-13));
    assertThat(Butterworth.farads(Butterworth.SECOND_INPUT, 10e3, 5e3))
        .isCloseTo(2.251e-9, within(5e-13));
    assertThat(Butterworth.decibels(2, 2)).isCloseTo(-12.30, within(0.005));
    assertThat(Butterworth.decibels(3, 1)).isCloseTo(-3.0103, within(5e-5));
  }

  /** The plain twin-T has Q of a quarter: 3 dB down at 0.236 of its notch (any network text). */
  @ParameterizedTest
  @CsvSource({"0.25, 0.2361", "2, 0.7808"})
  void theTwinTsEdgeFollowsFromItsQ(double quality, double ratio) {
    assertThat(TwinT.lowerEdgeRatio(quality)).isCloseTo(ratio, within(5e-5));
    assertThat(TwinT.response(ratio, TwinT.share(quality))).isCloseTo(Math.sqrt(0.5), within(1e-4));
    assertThat(TwinT.response(1, TwinT.share(quality))).isZero();
  }
}
