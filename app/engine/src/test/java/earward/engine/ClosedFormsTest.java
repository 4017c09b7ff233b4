package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.figure.Quantity;
import earward.block.law.ClippingDepth;
import earward.block.law.ConductionAngle;
import earward.block.law.LoadedPotentiometer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The engine against closed forms, each in its own domain. */
class ClosedFormsTest {
  /** At 26.85 °C, 300.0 K, the table's thermal voltage holds. */
  private static final double TABLE_CELSIUS = 26.85;

  private static TrialCircuit stiff(double saturation, double n, double peakVolts) {
    double ratio =
        earward.engine.law.Temperature.saturationRatio(
            earward.block.device.DiodeMaterial.SCHOTTKY, n, TABLE_CELSIUS);
    return new TrialCircuit()
        .generator(1e-3, "in")
        .diode("detector.d1", saturation / ratio, n, 0, "in", "out")
        .resistor("detector.r", 100e3, "out", Circuit.GROUND)
        .capacitor("detector.c", 100e-9, "out", Circuit.GROUND)
        .solved(
            earward.block.figure.CaseName.TEST,
            Drive.SIGNAL,
            java.util.Map.of(
                Slot.CARRIER_PEAK_VOLTS,
                peakVolts,
                Slot.DEPTH,
                0.0,
                Slot.AMBIENT_CELSIUS,
                TABLE_CELSIUS));
  }

  @ParameterizedTest
  @CsvSource({
    "2e-7, 1.3, 0.01, 0.000277, 167.57",
    "2e-7, 1.3, 0.05, 0.006748, 157.59",
    "2e-7, 1.3, 0.1, 0.025206, 136.86",
    "2e-7, 1.3, 0.2, 0.084392, 105.08",
    "2e-7, 1.3, 0.5, 0.328039, 74.376",
    "2e-7, 1.3, 1, 0.787939, 62.953",
    "2e-7, 1.3, 2, 1.749865, 56.982",
    "2e-7, 1.3, 5, 4.701448, 53.129",
    "3e-6, 1.06, 0.05, 0.017726, 11.801",
    "3e-6, 1.06, 0.2, 0.137738, 24.598",
    "3e-6, 1.06, 1, 0.887916, 42.679",
    "2.117e-7, 1.016, 0.1, 0.034124, 105.68",
    "2.117e-7, 1.016, 0.5, 0.361330, 67.148",
    "2.117e-7, 1.016, 1, 0.831094, 59.453",
    "2.52e-9, 1.752, 0.2, 0.003532, 3010.7",
    "2.52e-9, 1.752, 0.5, 0.123772, 211.39",
    "2.52e-9, 1.752, 1, 0.541060, 94.535",
    "2.52e-9, 1.752, 5, 4.409397, 56.952"
  })
  void theExponentialDiodeDetectsAsBesselFunctionsSay(
      double saturation, double n, double peak, double direct, double inputKilohms) {
    // Clarke and Hess 1971: I0(x) = exp(V/nVt)(1 + V/(R Is)), E/K from I1; R 100 kΩ, 300.0 K,
    // computed independently.
    double[] figures =
        stiff(saturation, n, peak)
            .want("out", Quantity.DC_VOLTS)
            .want("detector.d1", Quantity.CARRIER_INPUT_OHMS)
            .figures();
    assertThat(figures[0]).isCloseTo(direct, within(Math.max(6e-7, 5e-4 * direct)));
    assertThat(figures[1] / 1e3).isCloseTo(inputKilohms, within(3e-3 * inputKilohms));
  }

  @ParameterizedTest
  @CsvSource({
    "1, 0.2172, 2.7563",
    "2, 0.3365, 1.7248",
    "5, 0.5170, 1.0741",
    "10, 0.6455, 0.8352",
    "20, 0.7518, 0.7004",
    "50, 0.8529, 0.6042",
    "100, 0.9035, 0.5643",
    "200, 0.9376, 0.5400",
    "500, 0.9654, 0.5215"
  })
  void aNearlyStraightDiodeDetectsAsTheConductionAngleSays(
      double loadOverDiode, double efficiency, double inputOverLoad) {
    // tan θ − θ = π·Rd/R (Terman; Radiotron Designer's Handbook ch. 27), computed independently.
    // Driven so hard that the exponential part is some thousandths of the level; beyond R/Rd = 500
    // it is not, whatever the level that a detector bears.
    double load = 100e3;
    double peak = 200;
    double[] figures =
        new TrialCircuit()
            .generator(1e-3, "in")
            .diode("detector.d1", 1e-5, 1, load / loadOverDiode, "in", "out")
            .resistor("detector.r", load, "out", Circuit.GROUND)
            .capacitor("detector.c", 100e-9, "out", Circuit.GROUND)
            .signal(peak, 0, 400)
            .want("out", Quantity.DC_VOLTS)
            .want("detector.d1", Quantity.CARRIER_INPUT_OHMS)
            .figures();
    assertThat(ConductionAngle.efficiency(loadOverDiode)).isCloseTo(efficiency, within(1e-4));
    assertThat(figures[0] / peak).isCloseTo(efficiency, within(0.005));
    assertThat(figures[1] / load).isCloseTo(inputOverLoad, within(0.015 * inputOverLoad));
  }

  @Test
  void aNearlyStraightDiodeHeatsAsItsCurrentPulsesSay() {
    // Rd·mean of i², i = (E/Rd)(cos φ − cos θ) within ±θ (Terman's straight-line diode); R/Rd = 10.
    double theta = 0.86917;
    double rd = 10e3;
    double cos = Math.cos(theta);
    double meanSquare =
        (theta / 2 + Math.sin(2 * theta) / 4 - 2 * cos * Math.sin(theta) + theta * cos * cos)
            / Math.PI;
    double watts =
        new TrialCircuit()
            .generator(1e-3, "in")
            .diode("detector.d1", 1e-6, 1, rd, "in", "out")
            .resistor("detector.r", 100e3, "out", Circuit.GROUND)
            .capacitor("detector.c", 100e-9, "out", Circuit.GROUND)
            .signal(20, 0, 400)
            .want("detector.d1", Quantity.DISSIPATION_WATTS)
            .figure();
    double expected = 20 * 20 / rd * meanSquare;
    assertThat(watts).isCloseTo(expected, within(0.05 * expected));
  }

  @Test
  void theClippingRuleComesDownToTheStrictDiagonalOne() {
    // Worked answer (interviewmania 70595): 1 kΩ, 10 nF, 10 kHz -> 0.847; a diode without
    // resistance.
    double depth =
        new TrialCircuit()
            .generator(1e-3, "in")
            .diode("detector.d1", 1e-6, 1, 0, "in", "out")
            .resistor("detector.r", 1e3, "out", Circuit.GROUND)
            .capacitor("detector.c", 10e-9, "out", Circuit.GROUND)
            .signal(8, 0.3, 10e3)
            .want("detector.d1", Quantity.CLIPPING_DEPTH)
            .figure();
    assertThat(depth).isCloseTo(0.847, within(0.004));
    assertThat(ClippingDepth.diagonal(1e3, 10e-9, 10e3)).isCloseTo(0.847, within(5e-4));
  }

  @Test
  void theCauseIsNamedByTakingAwayWhatLimits() {
    // 220 kΩ coupled to 470 kΩ: 149.9/220 = 0.681 (divider); C1 far below its diagonal limit.
    double[] depths =
        new TrialCircuit()
            .generator(1e-3, "in")
            .diode("detector.d1", 1e-6, 1, 0, "in", "out")
            .resistor("detector.r", 220e3, "out", Circuit.GROUND)
            .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
            .capacitor("detector.cc", 10e-6, "out", "next")
            .resistor("detector.rl", 470e3, "next", Circuit.GROUND)
            .signal(8, 0.3, 50)
            .want("detector.d1", Quantity.CLIPPING_DEPTH)
            .want("detector.d1", Quantity.CLIPPING_DEPTH_WITHOUT_CAPACITOR)
            .want("detector.d1", Quantity.CLIPPING_DEPTH_WITHOUT_COUPLING)
            .figures();
    assertThat(depths[0]).isCloseTo(0.681, within(0.015));
    assertThat(depths[1] - depths[0]).isLessThan(0.01);
    assertThat(depths[2]).isGreaterThan(0.98);
  }

  @Test
  void aLoadedPotentiometerFollowsItsLaw() {
    // a/(1 + a(1 − a)Rp/RL): 10 kΩ linear at half turn with 10 kΩ hung on it gives 0.4.
    double[] figures =
        new TrialCircuit()
            .battery(10, 1e-6, "top")
            .part(
                "volume.track",
                new earward.block.device.Potentiometer(
                    10e3, earward.block.device.Taper.LINEAR, 0.5),
                java.util.Map.of(
                    earward.block.device.Terminal.TOP, "top",
                    earward.block.device.Terminal.WIPER, "wiper",
                    earward.block.device.Terminal.BOTTOM, Circuit.GROUND))
            .resistor("load.r", 10e3, "wiper", Circuit.GROUND)
            .solved(earward.block.figure.CaseName.NO_SIGNAL, Drive.NO_SIGNAL, java.util.Map.of())
            .want("wiper", Quantity.DC_VOLTS, earward.block.figure.CaseName.NO_SIGNAL)
            .figures();
    assertThat(figures[0] / 10).isCloseTo(0.4, within(1e-6));
    assertThat(LoadedPotentiometer.ratio(0.5, 10e3, 10e3)).isCloseTo(0.4, within(1e-12));
  }

  @Test
  void edgesOfAPathAreThoseOfItsCoupling() {
    // 1/(2π·R·C) with R the load alone behind a detector of low resistance.
    double[] edges =
        new TrialCircuit()
            .generator(1e-3, "in")
            .diode("detector.d1", 1e-5, 1, 0, "in", "out")
            .resistor("detector.r", 1e3, "out", Circuit.GROUND)
            .capacitor("detector.c", 10e-9, "out", Circuit.GROUND)
            .capacitor("detector.cc", 1e-6, "out", "next")
            .resistor("detector.rl", 10e3, "next", Circuit.GROUND)
            .signal(5, 0.3, 400)
            .want("next", Quantity.LOW_EDGE_HERTZ)
            .figures();
    assertThat(edges[0]).isCloseTo(1 / (2 * Math.PI * 10e3 * 1e-6), within(0.2));
  }

  @Test
  void aSeamShowsBothSidesOfADivider() {
    double[] figures =
        new TrialCircuit()
            .battery(9, 1000, "a")
            .seam("next", "a", "b")
            .resistor("next.r", 3000, "b", Circuit.GROUND)
            .signal(1, 0.3, 400)
            .want("seam.next", Quantity.ONWARD_OHMS)
            .want("seam.next", Quantity.BACKWARD_OHMS)
            .want("seam.next", Quantity.LOADING_LOSS_DECIBELS)
            .figures();
    assertThat(figures[0]).isCloseTo(3000, within(1e-3));
    assertThat(figures[1]).isCloseTo(1000, within(1e-3));
    assertThat(figures[2]).isCloseTo(20 * Math.log10(4 / 3.0), within(1e-6));
  }
}
