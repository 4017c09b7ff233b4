package earward.kit.parts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.offset;
import static org.assertj.core.api.Assertions.within;

import earward.block.law.ThermalVoltage;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class DiodeFitTest {
  /** kT/q at 300.0 K. */
  private static final double VOLTS_AT_300_KELVIN = 0.025852;

  /**
   * Voltages that follow, rounded to 1 mV, from the maker's own figures of the HSMS-280x: 30 nA,
   * 1.08, 30 Ω (Avago's table of the HSMS-280x/281x/282x/286x families).
   */
  @Test
  void theMakersFiguresComeBackFromTheVoltagesThatTheyGive() {
    DiodeFit fit =
        DiodeFit.of(
            List.of(at(0.163, 0.01e-3), at(0.230, 0.1e-3), at(0.321, 1e-3), at(0.655, 10e-3)),
            VOLTS_AT_300_KELVIN);
    assertThat(fit.emissionCoefficient()).isCloseTo(1.08, within(0.02));
    assertThat(fit.saturationAmperes()).isBetween(25e-9, 36e-9);
    assertThat(fit.seriesOhms()).isCloseTo(30, within(0.5));
    assertThat(fit.report().points()).isEqualTo(4);
    assertThat(fit.report().residualFraction()).isPresent();
    assertThat(fit.report().residualFraction().getAsDouble()).isLessThan(0.03);
    assertThat(fit.sentence())
        .contains("4 typical points")
        .contains("extrapolated below the lowest point, 10\u202fµA");
  }

  @Test
  void anyDiodeComesBackFromItsOwnCurve() {
    Random random = new Random(1904);
    for (int k = 0; k < 200; k++) {
      double n = 1 + random.nextDouble();
      double saturation = Math.pow(10, -9 + 3 * random.nextDouble());
      double ohms = 60 * random.nextDouble();
      DiodeCurve curve = new DiodeCurve(Math.log(saturation), n, ohms);
      List<DiodePoint> points = new ArrayList<>();
      for (double amperes : new double[] {1e-6, 1e-5, 1e-4, 1e-3, 1e-2}) {
        points.add(at(curve.volts(amperes, VOLTS_AT_300_KELVIN), amperes));
      }
      DiodeFit fit = DiodeFit.of(points, VOLTS_AT_300_KELVIN);
      assertThat(fit.emissionCoefficient()).isCloseTo(n, within(0.002));
      assertThat(fit.saturationAmperes() / saturation).isCloseTo(1, within(0.02));
      assertThat(fit.seriesOhms()).isCloseTo(ohms, within(0.1));
    }
  }

  @Test
  void threePointsAreMetButLeaveNoResidual() {
    DiodeFit fit =
        DiodeFit.of(
            List.of(at(0.230, 0.1e-3), at(0.321, 1e-3), at(0.655, 10e-3)), VOLTS_AT_300_KELVIN);
    DiodeCurve curve =
        new DiodeCurve(
            Math.log(fit.saturationAmperes()), fit.emissionCoefficient(), fit.seriesOhms());
    assertThat(curve.volts(1e-3, VOLTS_AT_300_KELVIN)).isCloseTo(0.321, offset(1e-4));
    assertThat(fit.report().residualFraction()).isEmpty();
    assertThat(fit.sentence()).contains("nothing tells how well");
  }

  @Test
  void pointsAboveThirtyMilliamperesAndLimitsHaveNoSay() {
    List<DiodePoint> points =
        new ArrayList<>(
            List.of(at(0.163, 0.01e-3), at(0.230, 0.1e-3), at(0.321, 1e-3), at(0.655, 10e-3)));
    DiodeFit before = DiodeFit.of(points);
    points.add(at(9, 0.1));
    points.add(new DiodePoint(0.5, 1e-3, false));
    assertThat(DiodeFit.of(points)).isEqualTo(before);
  }

  @Test
  void theEmissionCoefficientStaysWithinItsBounds() {
    List<DiodePoint> steep = List.of(at(0.30, 1e-6), at(0.31, 1e-4), at(0.32, 1e-2));
    assertThat(DiodeFit.of(steep).emissionCoefficient()).isEqualTo(1);
    List<DiodePoint> flat = List.of(at(0.1, 1e-6), at(0.5, 1e-5), at(0.9, 1e-4));
    assertThat(DiodeFit.of(flat).emissionCoefficient()).isEqualTo(2);
  }

  @Test
  void tooFewPointsAndAFallingCurveAreRefused() {
    assertThatThrownBy(() -> DiodeFit.of(List.of(at(0.1, 1e-6), at(0.2, 1e-5), at(3, 0.2))))
        .hasMessageContaining("2 typical points at or below 30 mA; a fit wants at least 3");
    assertThatThrownBy(() -> DiodeFit.of(List.of(at(0.1, 1e-6), at(0.2, 1e-5), at(0.3, 0.9e-5))))
        .hasMessageContaining("does not rise");
  }

  /** A slip of the pen in one of six points of a known curve is found, and only there. */
  @Test
  void theOnePointThatStandsAgainstTheOthersIsNamed() {
    DiodeCurve curve = new DiodeCurve(Math.log(30e-9), 1.08, 30);
    List<DiodePoint> points = new ArrayList<>();
    for (double amperes : new double[] {1e-6, 1e-5, 1e-4, 5e-4, 2e-3, 1e-2}) {
      points.add(at(curve.volts(amperes, ThermalVoltage.volts(25)), amperes));
    }
    assertThat(DiodeFit.of(points).report().suspect()).isFalse();
    DiodePoint good = points.get(2);
    points.set(2, at(good.volts() + 0.03, good.amperes()));
    FitReport report = DiodeFit.of(points).report();
    assertThat(report.suspect()).isTrue();
    assertThat(report.sentence())
        .contains("look at the point")
        .contains("100\u202fµA again")
        .contains("% below what the others say");
    assertThat(DiodeFit.of(points.subList(0, 4)).report().suspect())
        .as("four points do not tell which is wrong")
        .isFalse();
  }

  /**
   * Avago HSMS-285x: 3 µA and 1.06, of which its sheet says about 9 kΩ at no bias, 8.77 kΩ by its
   * own 8.33e-5·n·T/Is, whose constant is 3.4 % below k/q.
   */
  @Test
  void aDiodeOfItsZeroBiasResistanceIsThatOfItsMaker() {
    DiodeFit fit = DiodeFit.ofZeroBias(8771, 1.06, 25);
    assertThat(fit.saturationAmperes()).isCloseTo(3e-6 * 8.617 / 8.33, within(0.01e-6));
    assertThat(fit.seriesOhms()).isEqualTo(25);
    assertThat(fit.report().residualFraction()).isEmpty();
    assertThat(fit.sentence()).contains("zero-bias resistance").contains("extrapolated");
    assertThatThrownBy(() -> DiodeFit.ofZeroBias(0, 1.06, 0)).hasMessageContaining("above 0");
  }

  private static DiodePoint at(double volts, double amperes) {
    return new DiodePoint(volts, amperes, true);
  }
}
