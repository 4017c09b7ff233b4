package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.BipolarTransistor;
import earward.block.device.DiodeMaterial;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.engine.law.Temperature;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What physics keeps whatever the values: power, and the laws of scale that temperature obeys. */
class ConservationTest {
  /** Power from the carrier ends as heat of the diode and as DC in its load. */
  @ParameterizedTest
  @CsvSource({
    "0.05, 1e-7, 1.05, 20, 22e3",
    "0.5, 1e-7, 1.05, 20, 22e3",
    "2, 1e-7, 1.05, 20, 4700",
    "2, 1e-6, 1.2, 60, 100e3",
    "5, 3e-9, 1.75, 1, 10e3"
  })
  void whatADetectorTakesFromTheCarrierIsHeatAndDc(
      double peakVolts, double saturation, double n, double seriesOhms, double loadOhms) {
    double[] figures =
        new TrialCircuit()
            .generator(1e-3, "in")
            .diode("detector.d1", saturation, n, seriesOhms, "in", "out")
            .resistor("detector.r", loadOhms, "out", Circuit.GROUND)
            .capacitor("detector.c", 1e-6, "out", Circuit.GROUND)
            .signal(peakVolts, 0, 400)
            .want("detector.d1", Quantity.CARRIER_INPUT_OHMS)
            .want("detector.d1", Quantity.CARRIER_PEAK_VOLTS)
            .want("detector.d1", Quantity.DISSIPATION_WATTS)
            .want("out", Quantity.DC_VOLTS)
            .figures();
    double taken = figures[1] * figures[1] / (2 * figures[0]);
    double kept = figures[2] + figures[3] * figures[3] / loadOhms;
    assertThat(kept).isCloseTo(taken, within(1e-5 * taken));
  }

  @Test
  void whatABatteryGivesIsTheHeatOfAllParts() {
    TransistorModel model =
        new TransistorModel("T", false, 1e-14, 200, 3, 80, 45, 0.5, 150, 200, 100);
    List<String> heated = List.of("pre.up", "pre.down", "pre.rc", "pre.re", "pre.t");
    TrialCircuit circuit =
        new TrialCircuit()
            .battery(9, 10, "rail")
            .resistor("pre.up", 33e3, "rail", "base")
            .resistor("pre.down", 10e3, "base", Circuit.GROUND)
            .resistor("pre.rc", 4.7e3, "rail", "collector")
            .resistor("pre.re", 1e3, "emitter", Circuit.GROUND)
            .part(
                "pre.t",
                new BipolarTransistor(model),
                Map.of(
                    Terminal.BASE, "base",
                    Terminal.COLLECTOR, "collector",
                    Terminal.EMITTER, "emitter"))
            .solved(CaseName.TEST, Drive.NO_SIGNAL, Map.of())
            .want("supply.battery", Quantity.SUPPLY_AMPERES);
    heated.forEach(part -> circuit.want(part, Quantity.DISSIPATION_WATTS));
    double[] figures = circuit.figures();
    double heat = 10 * figures[0] * figures[0];
    for (int i = 1; i < figures.length; i++) {
      heat += figures[i];
    }
    assertThat(heat).isCloseTo(9 * figures[0], within(1e-9));
  }

  /**
   * The exponential diode knows no volt but n·kT/q and no ampere but its saturation current
   * (Shockley 1949): with these two scaled as temperature does, and all impedances by their
   * quotient, the whole solution is scaled.
   */
  @ParameterizedTest
  @CsvSource({"-10, 0.1", "0, 1", "40, 0.3", "60, 2"})
  void aWarmerDetectorIsAScaledOne(double celsius, double peakVolts) {
    double volts = Temperature.thermalVolts(celsius) / Temperature.thermalVolts(25);
    double amperes =
        Temperature.saturationRatio(DiodeMaterial.SCHOTTKY, 1.05, celsius)
            / Temperature.saturationRatio(DiodeMaterial.SCHOTTKY, 1.05, 25);
    double[] cool = detector(1, peakVolts, 25);
    double[] warm = detector(volts / amperes, volts * peakVolts, celsius);
    for (int i = 0; i < 2; i++) {
      assertThat(warm[i]).isCloseTo(volts * cool[i], within(1e-6 * warm[i]));
    }
    assertThat(warm[2]).isCloseTo(cool[2], within(1e-6));
  }

  private static double[] detector(double scale, double peakVolts, double celsius) {
    return new TrialCircuit()
        .generator(330 * scale, "in")
        .diode("detector.d1", 1e-7, 1.05, 20 * scale, "in", "out")
        .resistor("detector.r", 22e3 * scale, "out", Circuit.GROUND)
        .capacitor("detector.c", 1e-9 / scale, "out", Circuit.GROUND)
        .solved(
            CaseName.TEST,
            Drive.SIGNAL,
            Map.of(
                Slot.CARRIER_PEAK_VOLTS,
                peakVolts,
                Slot.DEPTH,
                0.4,
                Slot.TONE_HERTZ,
                1000.0,
                Slot.AMBIENT_CELSIUS,
                celsius))
        .want("out", Quantity.DC_VOLTS)
        .want("out", Quantity.AUDIO_RMS_VOLTS)
        .want("out", Quantity.DISTORTION)
        .figures();
  }
}
