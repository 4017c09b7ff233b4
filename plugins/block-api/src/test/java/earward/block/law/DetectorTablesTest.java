package earward.block.law;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The closed forms of the diode detector, table by table in full, each in its own domain. */
class DetectorTablesTest {
  /** kT/q at 300.0 K, at which the table of the exponential diode stands. */
  private static final double THERMAL_VOLTS = 25.852e-3;

  private static final double LOAD_OHMS = 100e3;

  @ParameterizedTest
  @CsvSource({
    "1, 77.453, 1.35182, 0.2172, 2.7563, 2.3017",
    "2, 70.336, 1.22759, 0.3365, 1.7248, 1.4858",
    "5, 58.871, 1.02749, 0.5170, 1.0741, 0.9672",
    "10, 49.800, 0.86917, 0.6455, 0.8352, 0.7746",
    "20, 41.254, 0.72002, 0.7518, 0.7004, 0.6651",
    "50, 31.471, 0.54927, 0.8529, 0.6042, 0.5862",
    "100, 25.373, 0.44285, 0.9035, 0.5643, 0.5534",
    "200, 20.341, 0.35502, 0.9376, 0.5400, 0.5333",
    "500, 15.106, 0.26364, 0.9654, 0.5215, 0.5179",
    "1000, 12.031, 0.20998, 0.9780, 0.5135, 0.5112",
    "2000, 9.570, 0.16703, 0.9861, 0.5085, 0.5071",
    "10000, 5.610, 0.09792, 0.9952, 0.5029, 0.5024"
  })
  void theStraightLineDiode(
      double loadOverDiode,
      double degrees,
      double radians,
      double efficiency,
      double exact,
      double shortForm) {
    // tan θ − θ = π·Rd/R (Terman, Radio Engineers' Handbook; Radiotron Designer's Handbook 4th ed.
    // ch. 27, both from memory); figures computed from the formula by a separate program.
    double angle = ConductionAngle.radians(loadOverDiode);
    assertThat(Math.toDegrees(angle)).isCloseTo(degrees, within(1e-3));
    assertThat(angle).isCloseTo(radians, within(1e-5));
    assertThat(ConductionAngle.efficiency(loadOverDiode)).isCloseTo(efficiency, within(1e-4));
    assertThat(ConductionAngle.inputOverLoad(loadOverDiode)).isCloseTo(exact, within(1e-4));
    assertThat(ConductionAngle.inputOverLoadShort(loadOverDiode))
        .isCloseTo(shortForm, within(1e-4));
  }

  @Test
  void theHandbooksRoundFiguresHold() {
    // Terman and Radiotron Designer's Handbook (from memory): efficiency 80 to 90 % in ordinary
    // practice, input resistance about half the load; for small angles θ ≈ (3π·Rd/R)^(1/3).
    assertThat(ConductionAngle.efficiency(30)).isBetween(0.79, 0.90);
    assertThat(ConductionAngle.efficiency(100)).isBetween(0.80, 0.91);
    assertThat(ConductionAngle.inputOverLoad(1000)).isCloseTo(0.5, within(0.02));
    assertThat(ConductionAngle.radians(1000))
        .isCloseTo(Math.cbrt(3 * Math.PI / 1000), Percentage.withPercentage(0.7));
  }

  @ParameterizedTest
  @CsvSource({
    "EX-1, 2e-7, 1.3, 0.01, 0.000277, 167.57",
    "EX-2, 2e-7, 1.3, 0.05, 0.006748, 157.59",
    "EX-3, 2e-7, 1.3, 0.1, 0.025206, 136.86",
    "EX-4, 2e-7, 1.3, 0.2, 0.084392, 105.08",
    "EX-5, 2e-7, 1.3, 0.5, 0.328039, 74.376",
    "EX-6, 2e-7, 1.3, 1, 0.787939, 62.953",
    "EX-7, 2e-7, 1.3, 2, 1.749865, 56.982",
    "EX-8, 2e-7, 1.3, 5, 4.701448, 53.129",
    "EX-9, 3e-6, 1.06, 0.05, 0.017726, 11.801",
    "EX-10, 3e-6, 1.06, 0.2, 0.137738, 24.598",
    "EX-11, 3e-6, 1.06, 1, 0.887916, 42.679",
    "EX-12, 2.117e-7, 1.016, 0.1, 0.034124, 105.68",
    "EX-13, 2.117e-7, 1.016, 0.5, 0.361330, 67.148",
    "EX-14, 2.117e-7, 1.016, 1, 0.831094, 59.453",
    "EX-15, 2.52e-9, 1.752, 0.2, 0.003532, 3010.7",
    "EX-16, 2.52e-9, 1.752, 0.5, 0.123772, 211.39",
    "EX-17, 2.52e-9, 1.752, 1, 0.541060, 94.535",
    "EX-18, 2.52e-9, 1.752, 5, 4.409397, 56.952"
  })
  void theExponentialDiode(
      String row,
      double saturationAmperes,
      double n,
      double peakVolts,
      double directVolts,
      double inputKilohms) {
    // Clarke and Hess, Communication Circuits, 1971: I0(x) = exp(V/nVt)(1 + V/(R·Is)); figures
    // computed from the formula by a separate program, R 100 kΩ, 300.0 K. HSMS-285x (rows 9 to 11):
    // model figures of its data sheet.
    double scaled = n * THERMAL_VOLTS;
    assertThat(ExponentialDetector.directVolts(peakVolts, LOAD_OHMS, saturationAmperes, scaled))
        .isCloseTo(directVolts, within(1e-6));
    assertThat(ExponentialDetector.inputOhms(peakVolts, LOAD_OHMS, saturationAmperes, scaled))
        .isCloseTo(inputKilohms * 1e3, Percentage.withPercentage(0.02));
  }

  @Test
  void theExponentialDiodeHasItsLimitsAtBothEnds() {
    // Clarke and Hess 1971: for x far below 1 Rin goes to Rj = nVt/Is beside the load's small
    // share; for x far above 1 Vdc ≈ Vpk − nVt·(ln(Vdc/(R·Is)) + ½·ln(2πx)) and Rin goes to R/2.
    double scaled = 1.3 * THERMAL_VOLTS;
    assertThat(ExponentialDetector.inputOhms(1e-4, LOAD_OHMS, 2e-7, scaled))
        .isCloseTo(scaled / 2e-7, Percentage.withPercentage(0.01));
    double high = ExponentialDetector.directVolts(50, LOAD_OHMS, 2e-7, scaled);
    double asymptote =
        50
            - scaled
                * (Math.log(high / (LOAD_OHMS * 2e-7)) + Math.log(2 * Math.PI * 50 / scaled) / 2);
    assertThat(high).isCloseTo(asymptote, within(2e-4));
    assertThat(ExponentialDetector.inputOhms(50, LOAD_OHMS, 2e-7, scaled))
        .isCloseTo(LOAD_OHMS / 2, Percentage.withPercentage(1));
  }
}
