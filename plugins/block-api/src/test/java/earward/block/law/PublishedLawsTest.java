package earward.block.law;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Offset;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The laws against published examples; each case names its source. */
class PublishedLawsTest {
  private static final Offset<Double> LAST_DIGIT = within(5e-6);

  @Test
  void diagonalClippingComesOutAsInAPublishedWorkedAnswer() {
    // Objective question with worked answer (interviewmania 70595): 1 kΩ, 10 nF, 10 kHz -> 0.847.
    assertThat(ClippingDepth.diagonal(1000, 10e-9, 10e3)).isCloseTo(0.847, within(5e-4));
  }

  @Test
  void theLooseRuleIsKinderThanTheStrictOneAsPublished() {
    // Worked answer (myaptitude): 100 kΩ, 250 pF, m = 0.6 -> 10.61 kHz by the loose rule.
    assertThat(ClippingDepth.looseDiagonal(100e3, 250e-12, 10_610)).isCloseTo(0.6, within(5e-4));
    assertThat(ClippingDepth.diagonal(100e3, 250e-12, 8488)).isCloseTo(0.6, within(5e-4));
  }

  @Test
  void theOneRuleHoldsBothLimits() {
    double reactance = -1 / (2 * Math.PI * 5e3 * 4.7e-9);
    double resistance = 10e3;
    double size = resistance * resistance + reactance * reactance;
    double real = resistance * reactance * reactance / size;
    double imaginary = resistance * resistance * reactance / size;
    assertThat(ClippingDepth.ofLoad(real, imaginary, resistance, 0))
        .isCloseTo(ClippingDepth.diagonal(10e3, 4.7e-9, 5e3), within(1e-12));
    // 220 kΩ coupled to 470 kΩ: 149.9/220 (divider of two resistors).
    assertThat(ClippingDepth.ofLoad(149.9e3, 0, 220e3, 0)).isCloseTo(0.681, within(5e-4));
  }

  @Test
  void theLongestTimeConstantGivesBackItsDepth() {
    double seconds = ClippingDepth.longestTimeConstant(0.8, 5e3);
    assertThat(ClippingDepth.diagonal(1e3, seconds / 1e3, 5e3)).isCloseTo(0.8, within(1e-12));
  }

  @ParameterizedTest
  @CsvSource({
    "1, 1.35182, 0.2172, 2.7563, 2.3017",
    "10, 0.86917, 0.6455, 0.8352, 0.7746",
    "100, 0.44285, 0.9035, 0.5643, 0.5534",
    "1000, 0.20998, 0.9780, 0.5135, 0.5112",
    "10000, 0.09792, 0.9952, 0.5029, 0.5024"
  })
  void conductionAngleTable(
      double loadOverDiode, double radians, double efficiency, double exact, double shortForm) {
    // tan θ − θ = π·Rd/R (Terman; Radiotron Designer's Handbook ch. 27), computed independently.
    assertThat(ConductionAngle.radians(loadOverDiode)).isCloseTo(radians, within(1e-5));
    assertThat(ConductionAngle.efficiency(loadOverDiode)).isCloseTo(efficiency, within(1e-4));
    assertThat(ConductionAngle.inputOverLoad(loadOverDiode)).isCloseTo(exact, within(1e-4));
    assertThat(ConductionAngle.inputOverLoadShort(loadOverDiode))
        .isCloseTo(shortForm, within(1e-4));
  }

  @ParameterizedTest
  @CsvSource({
    "0.1, 0.9071009258, 0.0452984468",
    "1, 0.4657596076, 0.2079104153",
    "4.5, 0.1941982776, 0.1709588223",
    "10, 0.1278333372, 0.1212626814",
    "20, 0.0897803119, 0.0875062222"
  })
  void besselTable(double x, double zeroth, double first) {
    // Layout of Abramowitz and Stegun Table 9.8; e^-4.5·I0(4.5) = 0.194198 stands in two
    // mathematics-library manuals.
    assertThat(Bessel.scaled(0, x)).isCloseTo(zeroth, within(1e-9));
    assertThat(Bessel.scaled(1, x)).isCloseTo(first, within(1e-9));
    assertThat(Bessel.scaled(1, -x)).isCloseTo(-first, within(1e-9));
  }

  @ParameterizedTest
  @CsvSource({
    "2e-7, 1.3, 0.01, 0.000277, 167570",
    "2e-7, 1.3, 0.1, 0.025206, 136860",
    "2e-7, 1.3, 1, 0.787939, 62953",
    "2e-7, 1.3, 5, 4.701448, 53129",
    "3e-6, 1.06, 0.05, 0.017726, 11801",
    "2.52e-9, 1.752, 1, 0.541060, 94535"
  })
  void exponentialDiodeTable(
      double saturationAmperes, double n, double peakVolts, double directVolts, double inputOhms) {
    // Clarke and Hess 1971, R = 100 kΩ, Vt = 25.852 mV, solved independently.
    double scaled = n * 25.852e-3;
    assertThat(ExponentialDetector.directVolts(peakVolts, 100e3, saturationAmperes, scaled))
        .isCloseTo(directVolts, within(1e-6));
    assertThat(ExponentialDetector.inputOhms(peakVolts, 100e3, saturationAmperes, scaled))
        .isCloseTo(inputOhms, Percentage.withPercentage(0.02));
  }

  @Test
  void aWeakCarrierFollowsTheSquareLaw() {
    // Expansion of I0: 0.0002776 V for 10 mV, R 100 kΩ, Is 0.2 µA, n 1.3.
    assertThat(ExponentialDetector.squareLawVolts(0.01, 100e3, 2e-7, 1.3 * 25.852e-3))
        .isCloseTo(0.0002776, within(1e-7));
    assertThat(ExponentialDetector.squareLawDistortion(1)).isEqualTo(0.25);
  }

  @Test
  void loadedPotentiometers() {
    // Divider arithmetic; the 50 kΩ input on a 10 kΩ track at half turn is common practice.
    assertThat(LoadedPotentiometer.ratio(0.5, 1, 1)).isCloseTo(0.4, LAST_DIGIT);
    assertThat(LoadedPotentiometer.ratio(2 / 3.0, 1, 1)).isCloseTo(0.5455, within(5e-5));
    assertThat(LoadedPotentiometer.ratio(0.5, 10e3, 50e3)).isCloseTo(0.4762, within(5e-5));
    double worst = 2 / 3.0 - LoadedPotentiometer.ratio(2 / 3.0, 0.1, 1);
    assertThat(worst).isCloseTo(0.0148, within(6e-4)); // (4/27)·Rp/RL, first order in Rp/RL
    assertThat(LoadedPotentiometer.inputOhms(1, 22e3, 50e3)).isCloseTo(15_280, within(10.0));
  }

  @Test
  void classBComesOutAsInTheTextbook() {
    // Boylestad and Nashelsky, Ex. 12.8: ±30 V, 16 Ω: 28.125 W out, 35.81 W in, 5.7 W a transistor.
    assertThat(ClassB.sineWatts(30, 16)).isCloseTo(28.125, within(1e-9));
    assertThat(60 * ClassB.meanAmperes(30, 16)).isCloseTo(35.81, within(5e-3));
    assertThat(ClassB.worstSineWatts(60, 16) / 2).isCloseTo(5.7, within(5e-3));
    // NXP TDA7052B (1997) and TDA7056B (1997): 0.9 W at 6 V, 8 Ω; 1.8 W at 12 V, 16 Ω.
    assertThat(ClassB.bridgeWorstSineWatts(6, 8)).isCloseTo(0.9, within(0.02));
    assertThat(ClassB.bridgeWorstSineWatts(12, 16)).isCloseTo(1.8, within(0.03));
  }

  @Test
  void theDataSheetsEfficiencyFollowsFromTheSupplyCurrent() {
    // ST TDA2003 (Oct 1998): 14.4 V, 4 Ω, 6 W, 44 mA at rest: 69 %.
    double peak = Math.sqrt(2 * 6 * 4.0);
    double watts = 14.4 * (ClassB.meanAmperes(peak, 4) + 0.044);
    assertThat(6 / watts).isCloseTo(0.69, within(0.015));
  }

  @Test
  void overdriveHeatsMoreThanTheWorstSineWhereLittleVoltageIsLost() {
    assertThat(ClassB.bridgeSquareWatts(12, 9.33, 16)).isCloseTo(1.557, within(1e-3));
    assertThat(ClassB.squareWatts(9, 3.0, 8)).isCloseTo(0.5625, within(1e-9));
  }

  @ParameterizedTest
  @CsvSource({
    "0.01, 1.0293, 1.0475",
    "0.03, 1.0797, 1.1119",
    "0.05, 1.1319, 1.1668",
    "0.10, 1.2843, 1.2878"
  })
  void clippedSineTable(double distortion, double overdrive, double power) {
    // Fourier series of the clipped sine; the folk rule "10 % is 1.25 to 1.3 times" from memory.
    assertThat(ClippedSine.overdriveOf(distortion)).isCloseTo(overdrive, within(2e-4));
    assertThat(ClippedSine.powerRatio(ClippedSine.overdriveOf(distortion)))
        .isCloseTo(power, within(2e-4));
  }

  @Test
  void heatSinksComeOutAsPublished() {
    // Philips TDA2613 (July 1994) p. 5: 4.1 W, 60 °C, 150 °C, 8 K/W -> 14 K/W.
    assertThat(ThermalChain.heatSinkKelvinPerWatt(4.1, 60, 150, 8, 0)).isCloseTo(14, within(0.1));
    // Philips TDA1521A (July 1994) p. 5: 7.8 W, 6 K/W -> 5.5 K/W.
    assertThat(ThermalChain.heatSinkKelvinPerWatt(7.8, 60, 150, 6, 0)).isCloseTo(5.5, within(0.05));
    // Course slides (TO-220, 5 W, 3 + 1 K/W, 50 to 150 °C): below 16 K/W.
    assertThat(ThermalChain.heatSinkKelvinPerWatt(5, 50, 150, 3, 1)).isCloseTo(16, within(1e-9));
    // NXP TDA7056B (1997): 1.8 W at 55 K/W is allowed up to 51 °C.
    assertThat(ThermalChain.junctionCelsius(51, 1.8, 55)).isCloseTo(150, within(0.1));
    assertThat(ThermalChain.withHeatSink(55, 15, Double.POSITIVE_INFINITY)).isEqualTo(55);
    assertThat(ThermalChain.withHeatSink(60, 15, 15)).isCloseTo(20, within(1e-9));
  }

  @Test
  void cornersAndTimeConstants() {
    assertThat(RcEdge.hertz(10e3, 3.3e-9)).isCloseTo(4822.9, within(0.05)); // arithmetic
    // 75 and 50 µs in FM standards tables: 2122 and 3183 Hz.
    assertThat(RcEdge.ofTimeConstant(75e-6)).isCloseTo(2122.07, within(5e-3));
    assertThat(RcEdge.ofTimeConstant(50e-6)).isCloseTo(3183.10, within(5e-3));
    assertThat(RcEdge.farads(8, 42.3)).isCloseTo(470e-6, Percentage.withPercentage(0.1));
    assertThat(RcEdge.ripplePeakToPeakVolts(1, 22e3, 4.7e-9, 455e3))
        .isCloseTo(21.26e-3, within(5e-6));
  }

  @ParameterizedTest
  @CsvSource({"2000, 1.72", "5000, 6.11", "7500, 8.07"})
  void theNorthAmericanCurveStandsAsQuotedOverItsValueAtOneKilohertz(double hertz, double quoted) {
    // NRSC-1-C figures as quoted in secondary sources.
    double relative = DeEmphasis.nrscBoostDecibels(hertz) - DeEmphasis.nrscBoostDecibels(1000);
    assertThat(relative).isCloseTo(quoted, within(6e-3));
  }

  @Test
  void preEmphasisEndPoints() {
    // 13.7 and 17.1 dB at 15 kHz, well known; 10 dB at 10 kHz for the AM curve (broadcast
    // practice).
    assertThat(DeEmphasis.boostDecibels(15e3, 50e-6)).isCloseTo(13.7, within(0.05));
    assertThat(DeEmphasis.boostDecibels(15e3, 75e-6)).isCloseTo(17.1, within(0.05));
    assertThat(DeEmphasis.nrscBoostDecibels(10e3)).isCloseTo(10.0, within(0.01));
  }
}
